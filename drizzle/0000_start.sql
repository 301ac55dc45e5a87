CREATE TABLE `attempt` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`key` text NOT NULL,
	`at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `attempt_key` ON `attempt` (`key`,`at`);--> statement-breakpoint
CREATE TABLE `member` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`email` text,
	`name` text NOT NULL,
	`bio` text DEFAULT '' NOT NULL,
	`password_hash` text,
	`role` text DEFAULT 'member' NOT NULL,
	`state` text DEFAULT 'active' NOT NULL,
	`state_reason` text,
	`state_by` integer,
	`state_at` integer,
	`session_epoch` integer DEFAULT 0 NOT NULL,
	`created_at` integer NOT NULL,
	CONSTRAINT "member_role" CHECK("member"."role" in ('member','moderator','steward')),
	CONSTRAINT "member_state" CHECK("member"."state" in ('active','suspended','closed')),
	CONSTRAINT "member_email_lower" CHECK("member"."email" = lower("member"."email"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `member_email_unique` ON `member` (`email`);--> statement-breakpoint
CREATE TABLE `mentorship` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`member_id` integer NOT NULL,
	`number` text NOT NULL,
	`fields` text NOT NULL,
	`reason` text NOT NULL,
	`granted_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	`ended_at` integer,
	`ended_by` integer,
	`end_reason` text,
	FOREIGN KEY (`member_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`granted_by`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`ended_by`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "mentorship_by_another" CHECK("mentorship"."granted_by" <> "mentorship"."member_id")
);
--> statement-breakpoint
CREATE UNIQUE INDEX `mentorship_number_unique` ON `mentorship` (`number`);--> statement-breakpoint
CREATE UNIQUE INDEX `mentorship_one_live` ON `mentorship` (`member_id`) WHERE ended_at is null;--> statement-breakpoint
CREATE TABLE `token` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`member_id` integer NOT NULL,
	`name` text NOT NULL,
	`hash` text NOT NULL,
	`created_at` integer NOT NULL,
	`revoked_at` integer,
	FOREIGN KEY (`member_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `token_hash_unique` ON `token` (`hash`);--> statement-breakpoint
CREATE INDEX `token_member` ON `token` (`member_id`);--> statement-breakpoint
CREATE TABLE `kit` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`slug` text NOT NULL,
	`name` text NOT NULL,
	`maker` text NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `kit_slug_unique` ON `kit` (`slug`);--> statement-breakpoint
CREATE TABLE `operation` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`position` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `operation_slug_unique` ON `operation` (`slug`);--> statement-breakpoint
CREATE TABLE `section` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`kit_id` integer NOT NULL,
	`code` text NOT NULL,
	`title` text NOT NULL,
	`position` integer NOT NULL,
	`jasc` text,
	FOREIGN KEY (`kit_id`) REFERENCES `kit`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `section_code` ON `section` (`kit_id`,`code`);--> statement-breakpoint
CREATE TABLE `task` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`operation_id` integer NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`operation_id`) REFERENCES `operation`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `task_slug_unique` ON `task` (`slug`);--> statement-breakpoint
CREATE TABLE `outcome` (
	`post_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`revision` integer NOT NULL,
	`result` text NOT NULL,
	`note` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`post_id`, `member_id`),
	FOREIGN KEY (`member_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`post_id`,`revision`) REFERENCES `revision`(`post_id`,`number`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "outcome_result" CHECK("outcome"."result" in ('as-written','with-change','did-not-work'))
);
--> statement-breakpoint
CREATE TABLE `post` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`kind` text NOT NULL,
	`parent_id` integer,
	`author_id` integer,
	`author_name` text,
	`ref` text,
	`state` text DEFAULT 'visible' NOT NULL,
	`state_reason` text,
	`state_by` integer,
	`state_at` integer,
	`current_revision` integer NOT NULL,
	`stamp_state` text DEFAULT 'none' NOT NULL,
	`needs_two` integer DEFAULT false NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`parent_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`state_by`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "post_kind" CHECK(("post"."kind" = 'answer') = ("post"."parent_id" is not null))
);
--> statement-breakpoint
CREATE INDEX `post_parent` ON `post` (`parent_id`);--> statement-breakpoint
CREATE INDEX `post_author` ON `post` (`author_id`);--> statement-breakpoint
CREATE INDEX `post_recent` ON `post` (`state`,`created_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `post_entry_ref` ON `post` (`ref`) WHERE parent_id is null;--> statement-breakpoint
CREATE UNIQUE INDEX `post_answer_ref` ON `post` (`parent_id`,`ref`);--> statement-breakpoint
CREATE TABLE `post_hardware` (
	`post_id` integer NOT NULL,
	`name` text NOT NULL,
	PRIMARY KEY(`post_id`, `name`),
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `post_hardware_name` ON `post_hardware` (`name`);--> statement-breakpoint
CREATE TABLE `post_operation` (
	`post_id` integer NOT NULL,
	`operation_id` integer NOT NULL,
	PRIMARY KEY(`post_id`, `operation_id`),
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`operation_id`) REFERENCES `operation`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `post_operation_operation` ON `post_operation` (`operation_id`);--> statement-breakpoint
CREATE TABLE `post_section` (
	`post_id` integer NOT NULL,
	`section_id` integer NOT NULL,
	`position` integer NOT NULL,
	PRIMARY KEY(`post_id`, `section_id`),
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`section_id`) REFERENCES `section`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `post_section_section` ON `post_section` (`section_id`);--> statement-breakpoint
CREATE TABLE `post_task` (
	`post_id` integer NOT NULL,
	`task_id` integer NOT NULL,
	PRIMARY KEY(`post_id`, `task_id`),
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`task_id`) REFERENCES `task`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `post_task_task` ON `post_task` (`task_id`);--> statement-breakpoint
CREATE TABLE `reliance` (
	`post_id` integer NOT NULL,
	`member_id` integer NOT NULL,
	`revision` integer NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`post_id`, `member_id`),
	FOREIGN KEY (`member_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`post_id`,`revision`) REFERENCES `revision`(`post_id`,`number`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `remark` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`post_id` integer NOT NULL,
	`author_id` integer,
	`author_name` text,
	`body` text NOT NULL,
	`state` text DEFAULT 'visible' NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `remark_post` ON `remark` (`post_id`);--> statement-breakpoint
CREATE TABLE `rendering` (
	`key` text PRIMARY KEY NOT NULL,
	`renderer` integer NOT NULL,
	`html` text NOT NULL,
	`plain` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `revision` (
	`post_id` integer NOT NULL,
	`number` integer NOT NULL,
	`author_id` integer,
	`author_name` text,
	`title` text DEFAULT '' NOT NULL,
	`kit_id` integer,
	`sections` text NOT NULL,
	`tasks` text NOT NULL,
	`operations` text NOT NULL,
	`hardware` text NOT NULL,
	`plans` text NOT NULL,
	`order_advice` text NOT NULL,
	`parts` text,
	`body` text NOT NULL,
	`maker_reply_scope` text,
	`content_hash` text NOT NULL,
	`redacted_reason` text,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`post_id`, `number`),
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`kit_id`) REFERENCES `kit`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `asked_for` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`post_id` integer NOT NULL,
	`mentor_id` integer NOT NULL,
	`what` text NOT NULL,
	`created_at` integer NOT NULL,
	`answered_at` integer,
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`mentor_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `asked_for_post` ON `asked_for` (`post_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `asked_for_one_open` ON `asked_for` (`post_id`,`what`) WHERE answered_at is null;--> statement-breakpoint
CREATE TABLE `stamp` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`post_id` integer NOT NULL,
	`revision` integer NOT NULL,
	`question_revision` integer DEFAULT 0 NOT NULL,
	`mentor_id` integer,
	`mark` text NOT NULL,
	`basis` text NOT NULL,
	`reference` text NOT NULL,
	`plans_revision` text,
	`scope` text,
	`conflict_reason` text,
	`created_at` integer NOT NULL,
	`withdrawn_at` integer,
	`withdrawn_reason` text,
	FOREIGN KEY (`mentor_id`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`post_id`,`revision`) REFERENCES `revision`(`post_id`,`number`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "stamp_basis" CHECK("stamp"."basis" in ('plans','standard','own-build','maker-reply','imported')),
	CONSTRAINT "stamp_scope" CHECK(("stamp"."scope" is not null) = ("stamp"."basis" = 'maker-reply')),
	CONSTRAINT "stamp_imported" CHECK(("stamp"."mentor_id" is null) = ("stamp"."basis" = 'imported'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `stamp_one_live` ON `stamp` (`post_id`,`revision`,`question_revision`,`mentor_id`) WHERE withdrawn_at is null;--> statement-breakpoint
CREATE INDEX `stamp_mentor` ON `stamp` (`mentor_id`);--> statement-breakpoint
CREATE TABLE `post_caution` (
	`post_id` integer NOT NULL,
	`code` text NOT NULL,
	`origin` text NOT NULL,
	`because` text NOT NULL,
	`created_at` integer NOT NULL,
	`acknowledged_at` integer,
	`added_by` integer,
	`waived_at` integer,
	`waived_by` integer,
	`waived_reason` text,
	PRIMARY KEY(`post_id`, `code`),
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`added_by`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`waived_by`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "post_caution_waived" CHECK(("post_caution"."waived_at" is null) = ("post_caution"."waived_reason" is null))
);
--> statement-breakpoint
CREATE TABLE `audit` (
	`sequence` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`at` integer NOT NULL,
	`actor_id` integer,
	`verb` text NOT NULL,
	`subject` text NOT NULL,
	`detail` text DEFAULT '' NOT NULL,
	`previous_hash` text NOT NULL,
	`hash` text NOT NULL
);
--> statement-breakpoint
CREATE INDEX `audit_subject` ON `audit` (`subject`);--> statement-breakpoint
CREATE TABLE `change` (
	`sequence` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`post_id` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `idempotency` (
	`member_id` integer NOT NULL,
	`route` text NOT NULL,
	`key` text NOT NULL,
	`body_hash` text NOT NULL,
	`status` integer NOT NULL,
	`body` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`member_id`, `route`, `key`)
);
--> statement-breakpoint
CREATE INDEX `idempotency_created` ON `idempotency` (`created_at`);--> statement-breakpoint
CREATE TABLE `setting` (
	`key` text PRIMARY KEY NOT NULL,
	`value` text NOT NULL
);
