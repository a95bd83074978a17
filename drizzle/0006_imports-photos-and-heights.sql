CREATE TABLE `imports` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`member_id` text NOT NULL,
	`file_name` text NOT NULL,
	`format` text NOT NULL,
	`state` text NOT NULL,
	`things` text NOT NULL,
	`remarks` text NOT NULL,
	`swapped` integer DEFAULT false NOT NULL,
	`made` text DEFAULT '[]' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`saved_at` integer,
	`undone_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `imports_by_club` ON `imports` (`club_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `photos` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`subject_type` text NOT NULL,
	`subject_id` text NOT NULL,
	`caption` text DEFAULT '' NOT NULL,
	`width` integer NOT NULL,
	`height` integer NOT NULL,
	`bytes` integer NOT NULL,
	`taken_at` text,
	`by_member_id` text NOT NULL,
	`created_at` integer NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `photos_by_subject` ON `photos` (`club_id`,`subject_type`,`subject_id`);--> statement-breakpoint
CREATE TABLE `elevation_tiles` (
	`source` text NOT NULL,
	`row` integer NOT NULL,
	`column` integer NOT NULL,
	`heights` text NOT NULL,
	`fetched_at` integer NOT NULL,
	PRIMARY KEY(`source`, `row`, `column`)
);
