CREATE TABLE `practice_answers` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`question_id` text NOT NULL,
	`member_id` integer NOT NULL,
	`photo_id` text NOT NULL,
	`case_id` integer NOT NULL,
	`drill_id` integer,
	`called_class` text,
	`sure` integer NOT NULL,
	`confirmed_class` text NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`question_id`) REFERENCES `practice_questions`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`called_class`) REFERENCES `library_classes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`confirmed_class`) REFERENCES `library_classes`(`shop_id`,`slug`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `practice_answers_question` ON `practice_answers` (`shop_id`,`question_id`);--> statement-breakpoint
CREATE INDEX `practice_answers_member` ON `practice_answers` (`shop_id`,`member_id`,`at`);--> statement-breakpoint
CREATE INDEX `practice_answers_photo` ON `practice_answers` (`shop_id`,`photo_id`);--> statement-breakpoint
CREATE TABLE `practice_drill_members` (
	`shop_id` integer NOT NULL,
	`drill_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	PRIMARY KEY(`drill_id`, `member_id`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`drill_id`) REFERENCES `practice_drills`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `practice_drill_members_member` ON `practice_drill_members` (`shop_id`,`member_id`);--> statement-breakpoint
CREATE TABLE `practice_drills` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`title` text NOT NULL,
	`class_slugs` text NOT NULL,
	`photo_count` integer NOT NULL,
	`set_by_id` integer NOT NULL,
	`set_at` integer NOT NULL,
	`due_at` integer,
	`withdrawn_at` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`set_by_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `practice_drills_set` ON `practice_drills` (`shop_id`,`withdrawn_at`,`set_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `practice_drills_row` ON `practice_drills` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `practice_memories` (
	`shop_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`photo_id` text NOT NULL,
	`due_at` integer NOT NULL,
	`memory` text NOT NULL,
	PRIMARY KEY(`shop_id`, `member_id`, `photo_id`),
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`photo_id`) REFERENCES `photos`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `practice_memories_due` ON `practice_memories` (`shop_id`,`member_id`,`due_at`);--> statement-breakpoint
CREATE TABLE `practice_questions` (
	`id` text PRIMARY KEY NOT NULL,
	`shop_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`photo_id` text NOT NULL,
	`case_id` integer NOT NULL,
	`drill_id` integer,
	`asked_at` integer NOT NULL,
	`answered_at` integer,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`photo_id`) REFERENCES `photos`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`case_id`) REFERENCES `cases`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`drill_id`) REFERENCES `practice_drills`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `practice_questions_open` ON `practice_questions` (`shop_id`,`member_id`,`answered_at`,`asked_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `practice_questions_row` ON `practice_questions` (`shop_id`,`id`);--> statement-breakpoint
CREATE TABLE `saved_searches` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`shop_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`name` text NOT NULL,
	`query` text NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shop_id`,`member_id`) REFERENCES `members`(`shop_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `saved_searches_name` ON `saved_searches` (`shop_id`,`member_id`,`name`);--> statement-breakpoint
ALTER TABLE `library_revisions` ADD `base_revision` integer;--> statement-breakpoint
ALTER TABLE `library_revisions` ADD `note` text DEFAULT '' NOT NULL;