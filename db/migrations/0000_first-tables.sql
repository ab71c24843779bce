CREATE TABLE `audit_entries` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`member_id` integer,
	`action` text NOT NULL,
	`subject` text NOT NULL,
	`detail` text NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `audit_entries_shop` ON `audit_entries` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `invites` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`roles` text NOT NULL,
	`token_hash` text NOT NULL,
	`invited_by_id` integer NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`accepted_at` integer,
	`revoked_at` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`invited_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invites_token` ON `invites` (`token_hash`);--> statement-breakpoint
CREATE INDEX `invites_shop` ON `invites` (`shop_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `mail_refusals` (
	`shop_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`kind` text NOT NULL,
	PRIMARY KEY(`member_id`, `kind`),
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `member_roles` (
	`shop_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`role` text NOT NULL,
	PRIMARY KEY(`member_id`, `role`),
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `members` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text,
	`session_version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `members_email` ON `members` (`email`);--> statement-breakpoint
CREATE UNIQUE INDEX `members_shop_row` ON `members` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `password_resets` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`token_hash` text NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `password_resets_token` ON `password_resets` (`token_hash`);--> statement-breakpoint
CREATE TABLE `shops` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`slug` text NOT NULL,
	`name` text NOT NULL,
	`time_zone` text NOT NULL,
	`currency` text NOT NULL,
	`units` text DEFAULT 'metric' NOT NULL,
	`is_demo` integer DEFAULT false NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `shops_slug` ON `shops` (`slug`);--> statement-breakpoint
CREATE TABLE `sign_in_attempts` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`key` text NOT NULL,
	`at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `sign_in_attempts_key` ON `sign_in_attempts` (`key`,`at`);--> statement-breakpoint
CREATE TABLE `customers` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`name` text NOT NULL,
	`email` text,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `customers_name` ON `customers` (`shop_id`,`name`);--> statement-breakpoint
CREATE UNIQUE INDEX `customers_shop_row` ON `customers` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `run_solutions` (
	`shop_id` integer NOT NULL,
	`run_id` integer NOT NULL,
	`solution_id` integer NOT NULL,
	PRIMARY KEY(`run_id`, `solution_id`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`run_id`) REFERENCES `runs`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`solution_id`) REFERENCES `solutions`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `runs` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`code` text NOT NULL,
	`work_order_id` integer NOT NULL,
	`method` text NOT NULL,
	`member_id` integer NOT NULL,
	`parts_struck` integer NOT NULL,
	`struck_at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`work_order_id`) REFERENCES `work_orders`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `runs_code` ON `runs` (`shop_id`,`code`);--> statement-breakpoint
CREATE INDEX `runs_struck` ON `runs` (`shop_id`,`struck_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `runs_shop_row` ON `runs` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `solution_checks` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`solution_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`bath_temp_c` real,
	`volts` real,
	`seconds_to_deposit` real,
	`note` text DEFAULT '' NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`solution_id`) REFERENCES `solutions`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `solution_checks_solution` ON `solution_checks` (`shop_id`,`solution_id`,`at`);--> statement-breakpoint
CREATE TABLE `solution_events` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`solution_id` integer NOT NULL,
	`kind` text NOT NULL,
	`member_id` integer NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`solution_id`) REFERENCES `solutions`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `solution_events_solution` ON `solution_events` (`shop_id`,`solution_id`,`at`);--> statement-breakpoint
CREATE TABLE `solutions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`station_id` integer NOT NULL,
	`code` text NOT NULL,
	`name` text NOT NULL,
	`method` text,
	`window_days` integer NOT NULL,
	`made_up_at` integer NOT NULL,
	`retired_at` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`station_id`) REFERENCES `stations`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `solutions_code` ON `solutions` (`shop_id`,`code`);--> statement-breakpoint
CREATE INDEX `solutions_station` ON `solutions` (`shop_id`,`station_id`,`retired_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `solutions_shop_row` ON `solutions` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `stations` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`slug` text NOT NULL,
	`kind` text NOT NULL,
	`name` text NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `stations_slug` ON `stations` (`shop_id`,`slug`);--> statement-breakpoint
CREATE UNIQUE INDEX `stations_shop_row` ON `stations` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `work_orders` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`customer_id` integer NOT NULL,
	`number` text NOT NULL,
	`part_name` text NOT NULL,
	`base_metal` text NOT NULL,
	`alloy` text,
	`quantity` integer NOT NULL,
	`area_dm2` real NOT NULL,
	`part_value_cents` integer NOT NULL,
	`final_stack` text NOT NULL,
	`opened_at` integer NOT NULL,
	`closed_at` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`customer_id`) REFERENCES `customers`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `work_orders_number` ON `work_orders` (`shop_id`,`number`);--> statement-breakpoint
CREATE INDEX `work_orders_open` ON `work_orders` (`shop_id`,`closed_at`,`opened_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `work_orders_shop_row` ON `work_orders` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `library_cause_fixes` (
	`shop_id` integer NOT NULL,
	`cause_slug` text NOT NULL,
	`fix_slug` text NOT NULL,
	`position` integer NOT NULL,
	PRIMARY KEY(`shop_id`, `cause_slug`, `fix_slug`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`cause_slug`) REFERENCES `library_causes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`fix_slug`) REFERENCES `library_fixes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `library_causes` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`station_kind` text NOT NULL,
	`why` text NOT NULL,
	`proof` text NOT NULL,
	`likelihood` real NOT NULL,
	`base_metals` text NOT NULL,
	`synonyms` text NOT NULL,
	`source_keys` text NOT NULL,
	`revision` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `library_causes_row` ON `library_causes` (`shop_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `library_causes_slug` ON `library_causes` (`shop_id`,`slug`);--> statement-breakpoint
CREATE TABLE `library_cautions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`key` text NOT NULL,
	`level` text NOT NULL,
	`text` text NOT NULL,
	`source_key` text NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`source_key`) REFERENCES `library_sources`(`shop_id`,`key`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `library_cautions_key` ON `library_cautions` (`shop_id`,`key`);--> statement-breakpoint
CREATE TABLE `library_class_causes` (
	`shop_id` integer NOT NULL,
	`class_slug` text NOT NULL,
	`cause_slug` text NOT NULL,
	`position` integer NOT NULL,
	PRIMARY KEY(`shop_id`, `class_slug`, `cause_slug`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`class_slug`) REFERENCES `library_classes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`cause_slug`) REFERENCES `library_causes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `library_classes` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`short` text NOT NULL,
	`at_strike` text NOT NULL,
	`in_final_plate` text NOT NULL,
	`tells` text NOT NULL,
	`checks` text NOT NULL,
	`prevention` text NOT NULL,
	`strip_note` text NOT NULL,
	`other_likelihood` real NOT NULL,
	`synonyms` text NOT NULL,
	`source_keys` text NOT NULL,
	`position` integer NOT NULL,
	`revision` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `library_classes_slug` ON `library_classes` (`shop_id`,`slug`);--> statement-breakpoint
CREATE TABLE `library_fixes` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`steps` text NOT NULL,
	`when_not` text NOT NULL,
	`materials` text NOT NULL,
	`source_keys` text NOT NULL,
	`revision` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `library_fixes_row` ON `library_fixes` (`shop_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `library_fixes_slug` ON `library_fixes` (`shop_id`,`slug`);--> statement-breakpoint
CREATE TABLE `library_revisions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`entry` text NOT NULL,
	`slug` text NOT NULL,
	`revision` integer NOT NULL,
	`state` text NOT NULL,
	`body` text NOT NULL,
	`member_id` integer,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `library_revisions_entry` ON `library_revisions` (`shop_id`,`entry`,`slug`,`revision`);--> statement-breakpoint
CREATE TABLE `library_sources` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`key` text NOT NULL,
	`kind` text NOT NULL,
	`citation` text NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `library_sources_key` ON `library_sources` (`shop_id`,`key`);--> statement-breakpoint
CREATE TABLE `calls` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`case_id` integer NOT NULL,
	`round` integer NOT NULL,
	`kind` text NOT NULL,
	`member_id` integer NOT NULL,
	`as_trainee` integer NOT NULL,
	`class_slug` text,
	`sure` integer NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`class_slug`) REFERENCES `library_classes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `calls_case` ON `calls` (`shop_id`,`case_id`,`id`);--> statement-breakpoint
CREATE INDEX `calls_member` ON `calls` (`shop_id`,`member_id`,`at`);--> statement-breakpoint
CREATE TABLE `case_events` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`case_id` integer NOT NULL,
	`round` integer NOT NULL,
	`event` text NOT NULL,
	`from_state` text,
	`to_state` text NOT NULL,
	`member_id` integer NOT NULL,
	`why` text DEFAULT '' NOT NULL,
	`detail` text NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `case_events_case` ON `case_events` (`shop_id`,`case_id`,`id`);--> statement-breakpoint
CREATE TABLE `case_numbers` (
	`shop_id` integer NOT NULL,
	`year_month` text NOT NULL,
	`last` integer NOT NULL,
	PRIMARY KEY(`shop_id`, `year_month`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `case_solutions` (
	`shop_id` integer NOT NULL,
	`case_id` integer NOT NULL,
	`solution_id` integer NOT NULL,
	PRIMARY KEY(`case_id`, `solution_id`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`solution_id`) REFERENCES `solutions`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `case_texts` (
	`case_id` integer PRIMARY KEY NOT NULL,
	`shop_id` integer NOT NULL,
	`scope` text GENERATED ALWAYS AS ('s' || shop_id) STORED,
	`ref` text NOT NULL,
	`job` text NOT NULL,
	`class` text NOT NULL,
	`cause` text NOT NULL,
	`notes` text NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `case_texts_shop` ON `case_texts` (`shop_id`);--> statement-breakpoint
CREATE TABLE `cases` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`ref` text NOT NULL,
	`snap_key` text NOT NULL,
	`state` text NOT NULL,
	`closing` text,
	`round` integer DEFAULT 1 NOT NULL,
	`work_order_id` integer NOT NULL,
	`run_id` integer,
	`base_metal` text NOT NULL,
	`alloy` text,
	`method` text NOT NULL,
	`stage_found` text NOT NULL,
	`quantity` integer NOT NULL,
	`found_station_id` integer NOT NULL,
	`traced_station_id` integer,
	`symptoms` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`opened_by_id` integer NOT NULL,
	`opened_at` integer NOT NULL,
	`held_at` integer NOT NULL,
	`called_class` text,
	`called_sure` integer,
	`confirmed_class` text,
	`confirmed_cause_id` integer,
	`confirmed_by_id` integer,
	`confirmed_at` integer,
	`self_confirmed` integer DEFAULT false NOT NULL,
	`disposition` text,
	`closed_at` integer,
	`at_risk_cents` integer NOT NULL,
	`cost_cents` integer NOT NULL,
	`cost_basis` text NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`work_order_id`) REFERENCES `work_orders`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`run_id`) REFERENCES `runs`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`found_station_id`) REFERENCES `stations`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`traced_station_id`) REFERENCES `stations`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`opened_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`confirmed_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`called_class`) REFERENCES `library_classes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`confirmed_class`) REFERENCES `library_classes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`confirmed_cause_id`) REFERENCES `library_causes`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `cases_ref` ON `cases` (`shop_id`,`ref`);--> statement-breakpoint
CREATE UNIQUE INDEX `cases_snap_key` ON `cases` (`shop_id`,`snap_key`);--> statement-breakpoint
CREATE INDEX `cases_by_time` ON `cases` (`shop_id`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_state` ON `cases` (`shop_id`,`state`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_class` ON `cases` (`shop_id`,`confirmed_class`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_cause` ON `cases` (`shop_id`,`confirmed_cause_id`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_traced` ON `cases` (`shop_id`,`traced_station_id`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_metal` ON `cases` (`shop_id`,`base_metal`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_by_opener` ON `cases` (`shop_id`,`opened_by_id`,`opened_at`);--> statement-breakpoint
CREATE INDEX `cases_queue` ON `cases` (`shop_id`,`state`,`at_risk_cents`,`held_at`,`id`);--> statement-breakpoint
CREATE INDEX `cases_closed` ON `cases` (`shop_id`,`closed_at`,`confirmed_cause_id`,`cost_cents`);--> statement-breakpoint
CREATE UNIQUE INDEX `cases_shop_row` ON `cases` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `rework_cards` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`case_id` integer NOT NULL,
	`round` integer NOT NULL,
	`fix_id` integer,
	`title` text NOT NULL,
	`made_by_id` integer NOT NULL,
	`made_at` integer NOT NULL,
	`done_at` integer,
	`outcome` text,
	`outcome_note` text DEFAULT '' NOT NULL,
	`outcome_by_id` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`fix_id`) REFERENCES `library_fixes`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`made_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`outcome_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `rework_cards_round` ON `rework_cards` (`shop_id`,`case_id`,`round`);--> statement-breakpoint
CREATE UNIQUE INDEX `rework_cards_row` ON `rework_cards` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `rework_steps` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`card_id` integer NOT NULL,
	`position` integer NOT NULL,
	`title` text NOT NULL,
	`detail` text NOT NULL,
	`planned_minutes` integer NOT NULL,
	`cautions` text NOT NULL,
	`ticked_by_id` integer,
	`ticked_at` integer,
	`spent_minutes` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`card_id`) REFERENCES `rework_cards`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`ticked_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `rework_steps_position` ON `rework_steps` (`shop_id`,`card_id`,`position`);--> statement-breakpoint
CREATE TABLE `exemplars` (
	`shop_id` integer NOT NULL,
	`class_slug` text NOT NULL,
	`photo_id` text NOT NULL,
	`chosen_by_id` integer NOT NULL,
	`at` integer NOT NULL,
	PRIMARY KEY(`shop_id`, `class_slug`, `photo_id`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`class_slug`) REFERENCES `library_classes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`photo_id`) REFERENCES `photos`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`chosen_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `photo_sizes` (
	`shop_id` integer NOT NULL,
	`photo_id` text NOT NULL,
	`size` text NOT NULL,
	`path` text NOT NULL,
	`mime` text NOT NULL,
	`bytes` integer NOT NULL,
	`width` integer NOT NULL,
	`height` integer NOT NULL,
	PRIMARY KEY(`photo_id`, `size`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`photo_id`) REFERENCES `photos`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `photos` (
	`id` text PRIMARY KEY NOT NULL,
	`shop_id` integer NOT NULL,
	`case_id` integer,
	`round` integer DEFAULT 1 NOT NULL,
	`purpose` text NOT NULL,
	`position` integer DEFAULT 0 NOT NULL,
	`state` text NOT NULL,
	`refusal` text,
	`member_id` integer NOT NULL,
	`file_name` text NOT NULL,
	`bytes` integer,
	`format` text,
	`width` integer,
	`height` integer,
	`taken_at` integer,
	`placeholder` text,
	`is_rendered` integer DEFAULT false NOT NULL,
	`created_at` integer NOT NULL,
	`ready_at` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `photos_case` ON `photos` (`shop_id`,`case_id`,`round`,`position`);--> statement-breakpoint
CREATE INDEX `photos_loose` ON `photos` (`shop_id`,`state`,`created_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `photos_shop_row` ON `photos` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `uploaded_files` (
	`custom_id` text PRIMARY KEY NOT NULL,
	`key` text NOT NULL,
	`callback` text NOT NULL,
	`finished_at` integer,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `uploaded_files_key` ON `uploaded_files` (`key`);--> statement-breakpoint
CREATE TABLE `case_costs` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`case_id` integer NOT NULL,
	`round` integer NOT NULL,
	`basis` text NOT NULL,
	`mean_cents` integer NOT NULL,
	`low90_cents` integer NOT NULL,
	`high90_cents` integer NOT NULL,
	`lines` text NOT NULL,
	`rates_id` integer NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`rates_id`) REFERENCES `shop_rates`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `case_costs_case` ON `case_costs` (`shop_id`,`case_id`,`id`);--> statement-breakpoint
CREATE TABLE `shop_rates` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`valid_from_at` integer NOT NULL,
	`rates` text NOT NULL,
	`set_by_id` integer,
	`set_at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`set_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `shop_rates_from` ON `shop_rates` (`shop_id`,`valid_from_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `shop_rates_row` ON `shop_rates` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `jobs` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`kind` text NOT NULL,
	`payload` text NOT NULL,
	`once_key` text,
	`state` text DEFAULT 'waiting' NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`run_after_at` integer NOT NULL,
	`started_at` integer,
	`done_at` integer,
	`last_error` text,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `jobs_once` ON `jobs` (`once_key`);--> statement-breakpoint
CREATE INDEX `jobs_due` ON `jobs` (`state`,`run_after_at`,`id`);--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`kind` text NOT NULL,
	`to_email` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`html` text NOT NULL,
	`created_at` integer NOT NULL,
	`sent_at` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `outbox_shop` ON `outbox` (`shop_id`,`id`);