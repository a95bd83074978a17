CREATE TABLE `harvests` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`member_id` text NOT NULL,
	`guest_name` text DEFAULT '' NOT NULL,
	`guest_id` text,
	`sit_id` text,
	`day` text NOT NULL,
	`taken_at` integer NOT NULL,
	`stand_id` text,
	`place` text DEFAULT '' NOT NULL,
	`weapon` text NOT NULL,
	`sex` text NOT NULL,
	`antlered` integer NOT NULL,
	`age` text,
	`age_method` text,
	`dressed_kg` real,
	`live_kg` real,
	`points_left` integer,
	`points_right` integer,
	`inside_spread_mm` real,
	`main_beam_left_mm` real,
	`main_beam_right_mm` real,
	`lactating` integer,
	`notes` text DEFAULT '' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`written_by` text NOT NULL,
	`request_key` text NOT NULL,
	`created_at` integer NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`guest_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `harvests_once_a_request` ON `harvests` (`club_id`,`request_key`);--> statement-breakpoint
CREATE INDEX `harvests_by_club` ON `harvests` (`club_id`,`day`);--> statement-breakpoint
CREATE INDEX `harvests_by_member` ON `harvests` (`member_id`,`day`);--> statement-breakpoint
CREATE TABLE `sit_log_versions` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`sit_id` text NOT NULL,
	`version` integer NOT NULL,
	`saved_by` text NOT NULL,
	`saved_at` integer NOT NULL,
	`log` text NOT NULL,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sit_log_versions_once` ON `sit_log_versions` (`sit_id`,`version`);--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `bumped_where` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `shot` text DEFAULT 'none' NOT NULL;--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `shot_at` integer;--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `hit_place` text;--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `follow_up` text;--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `follow_up_notes` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `version` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `saved_by` text;--> statement-breakpoint
ALTER TABLE `sit_logs` ADD `updated_at` integer;