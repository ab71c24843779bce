DROP INDEX `cases_queue`;--> statement-breakpoint
CREATE INDEX `cases_queue` ON `cases` (`shop_id`,`state`,"at_risk_cents" desc,`held_at`,`id`);