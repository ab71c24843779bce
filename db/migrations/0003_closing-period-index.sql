DROP INDEX `cases_closed`;--> statement-breakpoint
DROP INDEX `cases_by_closed_time`;--> statement-breakpoint
CREATE INDEX `cases_by_closed_time` ON `cases` (`shop_id`,`closed_at`,`id`,`state`,`closing`,`confirmed_cause_id`,(case when "state" = 'held' and "called_class" is not null then "called_class" else "confirmed_class" end),`traced_station_id`,`work_order_id`,`base_metal`);