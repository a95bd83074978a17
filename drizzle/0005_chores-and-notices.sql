CREATE TABLE `chores` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`title` text NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`assignee_id` text,
	`place_name` text DEFAULT '' NOT NULL,
	`place` text DEFAULT '' NOT NULL,
	`lat` real,
	`lon` real,
	`due_on` text,
	`created_by` text NOT NULL,
	`created_at` integer NOT NULL,
	`done_on` text,
	`done_by` text,
	`hours` real,
	`version` integer DEFAULT 1 NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`assignee_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`done_by`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `chores_by_club` ON `chores` (`club_id`,`done_on`);--> statement-breakpoint
CREATE TABLE `inspections` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`stand_id` text NOT NULL,
	`by_member_id` text NOT NULL,
	`day` text NOT NULL,
	`result` text NOT NULL,
	`answers` text NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`strap_fitted_on` text,
	`strap_years` real,
	`next_due_on` text NOT NULL,
	`closure_id` text,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`by_member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`closure_id`) REFERENCES `closures`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `inspections_by_stand` ON `inspections` (`stand_id`,`day`);--> statement-breakpoint
CREATE INDEX `inspections_by_club` ON `inspections` (`club_id`,`day`);--> statement-breakpoint
CREATE TABLE `work_day_members` (
	`club_id` text NOT NULL,
	`work_day_id` text NOT NULL,
	`member_id` text NOT NULL,
	`hours` real,
	`at` integer NOT NULL,
	PRIMARY KEY(`work_day_id`, `member_id`),
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`work_day_id`) REFERENCES `work_days`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `work_day_members_by_club` ON `work_day_members` (`club_id`);--> statement-breakpoint
CREATE TABLE `work_days` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`title` text NOT NULL,
	`day` text NOT NULL,
	`start_at` integer NOT NULL,
	`end_at` integer NOT NULL,
	`meet` text DEFAULT '' NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`sequence` integer DEFAULT 0 NOT NULL,
	`cancelled_at` integer,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `work_days_by_club` ON `work_days` (`club_id`,`day`);--> statement-breakpoint
CREATE TABLE `notice_choices` (
	`member_id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`kinds` text NOT NULL,
	`wind_points` integer NOT NULL,
	`quiet_from` text NOT NULL,
	`quiet_to` text NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `notice_links` (
	`secret_hash` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`member_id` text NOT NULL,
	`kind` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `sit_outlooks` (
	`sit_id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`about` text NOT NULL,
	`quiet` real NOT NULL,
	`hold` real,
	`wind_from_deg` real,
	`forecast_at` integer,
	`told` integer DEFAULT 0 NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sit_outlooks_by_club` ON `sit_outlooks` (`club_id`);