CREATE TABLE `outings` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`sit_id` text NOT NULL,
	`member_id` text NOT NULL,
	`approach_id` text,
	`parking_id` text,
	`vehicle` text DEFAULT '' NOT NULL,
	`signed_in_at` integer NOT NULL,
	`signed_in_by` text NOT NULL,
	`back_by` integer NOT NULL,
	`first_back_by` integer NOT NULL,
	`moves` integer DEFAULT 0 NOT NULL,
	`tracking` integer DEFAULT false NOT NULL,
	`last_sign_at` integer NOT NULL,
	`contact_off` integer DEFAULT false NOT NULL,
	`signed_out_at` integer,
	`signed_out_by` text,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`approach_id`) REFERENCES `approaches`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`parking_id`) REFERENCES `parkings`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `outings_one_open_a_sit` ON `outings` (`sit_id`) WHERE signed_out_at is null;--> statement-breakpoint
CREATE UNIQUE INDEX `outings_one_open_a_member` ON `outings` (`member_id`) WHERE signed_out_at is null;--> statement-breakpoint
CREATE INDEX `outings_by_sit` ON `outings` (`sit_id`);--> statement-breakpoint
CREATE INDEX `outings_open` ON `outings` (`signed_out_at`,`back_by`);--> statement-breakpoint
CREATE INDEX `outings_by_club` ON `outings` (`club_id`,`signed_in_at`);--> statement-breakpoint
CREATE TABLE `overdue_steps` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`outing_id` text NOT NULL,
	`step` text NOT NULL,
	`moves` integer NOT NULL,
	`outcome` text NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`outing_id`) REFERENCES `outings`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `overdue_steps_by_outing` ON `overdue_steps` (`outing_id`);--> statement-breakpoint
CREATE TABLE `safety_contacts` (
	`user_id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`email` text NOT NULL,
	`secret_hash` text NOT NULL,
	`asked_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`consented_at` integer,
	`declined_at` integer,
	`off` integer DEFAULT false NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `safety_contacts_secretHash_unique` ON `safety_contacts` (`secret_hash`);--> statement-breakpoint
CREATE TABLE `sit_links` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`outing_id` text NOT NULL,
	`kind` text NOT NULL,
	`secret_hash` text NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`revoked_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`outing_id`) REFERENCES `outings`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sit_links_secretHash_unique` ON `sit_links` (`secret_hash`);--> statement-breakpoint
CREATE INDEX `sit_links_by_outing` ON `sit_links` (`outing_id`);