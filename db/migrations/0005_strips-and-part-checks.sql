CREATE TABLE `strip_rows` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`slug` text NOT NULL,
	`row` text NOT NULL,
	`retired` integer DEFAULT false NOT NULL,
	`position` integer NOT NULL,
	`set_by_id` integer,
	`set_at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`set_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `strip_rows_slug` ON `strip_rows` (`shop_id`,`slug`,`id`);--> statement-breakpoint
CREATE TABLE `part_checks` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`work_order_id` integer NOT NULL,
	`case_id` integer,
	`weight_air_g` real NOT NULL,
	`weight_water_g` real NOT NULL,
	`water_temp_c` real NOT NULL,
	`balance_error_g` real NOT NULL,
	`pull` text,
	`colour` text,
	`density_g_per_cm3` real NOT NULL,
	`uncertainty_g_per_cm3` real NOT NULL,
	`declared_base_metal` text NOT NULL,
	`declared_alloy` text,
	`fits` integer NOT NULL,
	`likely_base_metal` text,
	`member_id` integer NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`work_order_id`) REFERENCES `work_orders`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `part_checks_job` ON `part_checks` (`shop_id`,`work_order_id`,`id`);--> statement-breakpoint
CREATE INDEX `part_checks_case` ON `part_checks` (`shop_id`,`case_id`,`id`);--> statement-breakpoint
ALTER TABLE `shops` ADD `cost_model` integer DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `cases` ADD `strip_method` text;--> statement-breakpoint
ALTER TABLE `case_costs` ADD `method` text;--> statement-breakpoint
ALTER TABLE `case_costs` ADD `minutes` real;--> statement-breakpoint
ALTER TABLE `case_costs` ADD `minutes_correction` real DEFAULT 1 NOT NULL;