CREATE TABLE `kit_limit` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`kit_id` integer NOT NULL,
	`shop_table` text NOT NULL,
	`result` text NOT NULL,
	`inputs` text NOT NULL,
	`value` text NOT NULL,
	`unit` text NOT NULL,
	`display` text NOT NULL,
	`reference` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`entered_by` integer,
	`created_at` integer NOT NULL,
	`ended_at` integer,
	`end_reason` text,
	FOREIGN KEY (`kit_id`) REFERENCES `kit`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`entered_by`) REFERENCES `member`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `kit_limit_kit` ON `kit_limit` (`kit_id`,`shop_table`);--> statement-breakpoint
CREATE TABLE `measurement` (
	`post_id` integer NOT NULL,
	`position` integer NOT NULL,
	`parser` integer NOT NULL,
	`kind` text NOT NULL,
	`si_value` real NOT NULL,
	`found` text NOT NULL,
	PRIMARY KEY(`post_id`, `position`),
	FOREIGN KEY (`post_id`) REFERENCES `post`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `measurement_value` ON `measurement` (`kind`,`si_value`);--> statement-breakpoint
ALTER TABLE `member` ADD `units` text;--> statement-breakpoint
ALTER TABLE `post` ADD `measured_by` integer DEFAULT 0 NOT NULL;