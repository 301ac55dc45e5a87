CREATE TABLE `bulletin` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`kit_id` integer NOT NULL,
	`number` text NOT NULL,
	`issued_on` text NOT NULL,
	`serials` text NOT NULL,
	`summary` text NOT NULL,
	`entered_by` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`kit_id`) REFERENCES `kit`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`entered_by`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `bulletin_number` ON `bulletin` (`kit_id`,`number`);--> statement-breakpoint
CREATE TABLE `bulletin_step` (
	`bulletin_id` integer NOT NULL,
	`position` integer NOT NULL,
	`page` text NOT NULL,
	`step` text,
	`revision` text DEFAULT '' NOT NULL,
	PRIMARY KEY(`bulletin_id`, `position`),
	FOREIGN KEY (`bulletin_id`) REFERENCES `bulletin`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `bulletin_step_page` ON `bulletin_step` (`page`);--> statement-breakpoint
CREATE TABLE `closing_item` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`section_id` integer NOT NULL,
	`position` integer NOT NULL,
	`text` text NOT NULL,
	`origin` text NOT NULL,
	`reference` text DEFAULT '' NOT NULL,
	`entered_by` integer,
	`created_at` integer NOT NULL,
	`ended_at` integer,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`entered_by`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `closing_item_section` ON `closing_item` (`section_id`,`position`);--> statement-breakpoint
CREATE TABLE `hardware_item` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`section_id` integer NOT NULL,
	`position` integer NOT NULL,
	`designation` text NOT NULL,
	`length` text DEFAULT '' NOT NULL,
	`left_count` integer NOT NULL,
	`right_count` integer NOT NULL,
	`place` text DEFAULT '' NOT NULL,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `hardware_item_section` ON `hardware_item` (`section_id`,`position`);--> statement-breakpoint
CREATE TABLE `plan_step` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`section_id` integer NOT NULL,
	`position` integer NOT NULL,
	`page` text NOT NULL,
	`step` text NOT NULL,
	`revision` text DEFAULT '' NOT NULL,
	`task_id` integer,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`task_id`) REFERENCES `task`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `plan_step_place` ON `plan_step` (`section_id`,`page`,`step`);--> statement-breakpoint
CREATE TABLE `build` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`member_id` integer NOT NULL,
	`kit_id` integer NOT NULL,
	`name` text NOT NULL,
	`serial` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	`ended_at` integer,
	FOREIGN KEY (`member_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`kit_id`) REFERENCES `kit`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `build_member` ON `build` (`member_id`);--> statement-breakpoint
CREATE TABLE `build_section` (
	`build_id` integer NOT NULL,
	`section_id` integer NOT NULL,
	`state` text NOT NULL,
	`updated_at` integer NOT NULL,
	PRIMARY KEY(`build_id`, `section_id`),
	FOREIGN KEY (`build_id`) REFERENCES `build`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `bulletin_seen` (
	`build_id` integer NOT NULL,
	`bulletin_id` integer NOT NULL,
	`revision` text NOT NULL,
	`at` integer NOT NULL,
	PRIMARY KEY(`build_id`, `bulletin_id`),
	FOREIGN KEY (`build_id`) REFERENCES `build`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`bulletin_id`) REFERENCES `bulletin`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `closing_answer` (
	`build_id` integer NOT NULL,
	`closing_item_id` integer NOT NULL,
	`is_done` integer NOT NULL,
	`note` text NOT NULL,
	`at` integer NOT NULL,
	PRIMARY KEY(`build_id`, `closing_item_id`),
	FOREIGN KEY (`build_id`) REFERENCES `build`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`closing_item_id`) REFERENCES `closing_item`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `debrief` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`build_id` integer NOT NULL,
	`section_id` integer NOT NULL,
	`key` text NOT NULL,
	`task_order` text NOT NULL,
	`minutes` integer,
	`tools` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	`undone_at` integer,
	FOREIGN KEY (`build_id`) REFERENCES `build`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `debrief_key` ON `debrief` (`build_id`,`key`);--> statement-breakpoint
CREATE INDEX `debrief_section` ON `debrief` (`section_id`);--> statement-breakpoint
CREATE TABLE `debrief_lesson` (
	`debrief_id` integer NOT NULL,
	`post_id` integer NOT NULL,
	PRIMARY KEY(`debrief_id`, `post_id`),
	FOREIGN KEY (`debrief_id`) REFERENCES `debrief`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `finding` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`visit_id` integer NOT NULL,
	`number` integer NOT NULL,
	`text` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`visit_id`) REFERENCES `visit`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `finding_number` ON `finding` (`visit_id`,`number`);--> statement-breakpoint
CREATE TABLE `hold` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`build_id` integer NOT NULL,
	`section_id` integer NOT NULL,
	`key` text NOT NULL,
	`kind` text NOT NULL,
	`what` text NOT NULL,
	`page` text DEFAULT '' NOT NULL,
	`step` text DEFAULT '' NOT NULL,
	`until_what` text NOT NULL,
	`not_waiting` text DEFAULT '' NOT NULL,
	`until_section_id` integer,
	`code` text NOT NULL,
	`finding_id` integer,
	`created_at` integer NOT NULL,
	`released_at` integer,
	`release_note` text DEFAULT '' NOT NULL,
	FOREIGN KEY (`build_id`) REFERENCES `build`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`until_section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `hold_code_unique` ON `hold` (`code`);--> statement-breakpoint
CREATE UNIQUE INDEX `hold_key` ON `hold` (`build_id`,`key`);--> statement-breakpoint
CREATE INDEX `hold_section` ON `hold` (`build_id`,`section_id`);--> statement-breakpoint
CREATE TABLE `nameless_author` (
	`post_id` integer PRIMARY KEY NOT NULL,
	`member_id` integer NOT NULL,
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `notice` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`member_id` integer NOT NULL,
	`kind` text NOT NULL,
	`post_id` integer,
	`bulletin_id` integer,
	`created_at` integer NOT NULL,
	`closed_at` integer,
	FOREIGN KEY (`member_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`bulletin_id`) REFERENCES `bulletin`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `notice_member` ON `notice` (`member_id`) WHERE closed_at is null;--> statement-breakpoint
CREATE TABLE `visit` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`build_id` integer NOT NULL,
	`section_id` integer NOT NULL,
	`visitor` text NOT NULL,
	`token_hash` text NOT NULL,
	`expires_at` integer NOT NULL,
	`revoked_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`build_id`) REFERENCES `build`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `visit_tokenHash_unique` ON `visit` (`token_hash`);--> statement-breakpoint
CREATE TABLE `work_session` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`build_id` integer NOT NULL,
	`section_id` integer NOT NULL,
	`key` text NOT NULL,
	`day` text NOT NULL,
	`minutes` integer NOT NULL,
	`page` text DEFAULT '' NOT NULL,
	`steps` text DEFAULT '' NOT NULL,
	`helpers` text DEFAULT '' NOT NULL,
	`line` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`build_id`) REFERENCES `build`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `work_session_key` ON `work_session` (`build_id`,`key`);--> statement-breakpoint
CREATE INDEX `work_session_section` ON `work_session` (`section_id`);