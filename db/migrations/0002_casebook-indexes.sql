CREATE INDEX `work_orders_customer` ON `work_orders` (`shop_id`,`customer_id`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_standing_class` ON `cases` (`shop_id`,(case when "state" = 'held' and "called_class" is not null then "called_class" else "confirmed_class" end),`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_closing` ON `cases` (`shop_id`,`closing`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_stage` ON `cases` (`shop_id`,`stage_found`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_job` ON `cases` (`shop_id`,`work_order_id`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_closed_time` ON `cases` (`shop_id`,`closed_at`,`id`);