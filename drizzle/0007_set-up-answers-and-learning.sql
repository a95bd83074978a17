CREATE TABLE `sit_predictions` (
	`sit_id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`stand_id` text NOT NULL,
	`quiet` real NOT NULL,
	`adjusted_by` real DEFAULT 0 NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sit_predictions_by_club` ON `sit_predictions` (`club_id`,`at`);--> statement-breakpoint
CREATE TABLE `stand_adjustments` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`stand_id` text NOT NULL,
	`points` real NOT NULL,
	`sits` integer NOT NULL,
	`low_points` real NOT NULL,
	`high_points` real NOT NULL,
	`applied_by` text NOT NULL,
	`applied_at` integer NOT NULL,
	`ended_by` text,
	`ended_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`applied_by`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`ended_by`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `stand_adjustments_by_club` ON `stand_adjustments` (`club_id`,`ended_at`);--> statement-breakpoint
CREATE TABLE `setup_answers` (
	`club_id` text NOT NULL,
	`finding_key` text NOT NULL,
	`print` text NOT NULL,
	`text` text NOT NULL,
	`answer` text NOT NULL,
	`reason` text DEFAULT '' NOT NULL,
	`chore_id` text,
	`by_member_id` text NOT NULL,
	`at` integer NOT NULL,
	PRIMARY KEY(`club_id`, `finding_key`),
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`chore_id`) REFERENCES `chores`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`by_member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
