CREATE TABLE `rate_limits` (
	`key` text PRIMARY KEY NOT NULL,
	`window_start_at` integer NOT NULL,
	`count` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`expires_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`user_agent` text NOT NULL,
	`address` text NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sessions_by_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE TABLE `tokens` (
	`id` text PRIMARY KEY NOT NULL,
	`purpose` text NOT NULL,
	`token_hash` text NOT NULL,
	`user_id` text NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `tokens_tokenHash_unique` ON `tokens` (`token_hash`);--> statement-breakpoint
CREATE INDEX `tokens_by_user` ON `tokens` (`user_id`,`purpose`);--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`email_verified_at` integer,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email_unique` ON `users` (`email`);--> statement-breakpoint
CREATE TABLE `calendar_feeds` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`member_id` text NOT NULL,
	`scope` text NOT NULL,
	`with_place` integer NOT NULL,
	`secret_hash` text NOT NULL,
	`created_at` integer NOT NULL,
	`revoked_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `calendar_feeds_secretHash_unique` ON `calendar_feeds` (`secret_hash`);--> statement-breakpoint
CREATE INDEX `calendar_feeds_by_member` ON `calendar_feeds` (`member_id`);--> statement-breakpoint
CREATE TABLE `claims` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`sit_id` text NOT NULL,
	`stand_id` text NOT NULL,
	`member_id` text NOT NULL,
	`day` text NOT NULL,
	`window` text NOT NULL,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `claims_stand_once` ON `claims` (`stand_id`,`day`,`window`);--> statement-breakpoint
CREATE UNIQUE INDEX `claims_member_once` ON `claims` (`member_id`,`day`,`window`);--> statement-breakpoint
CREATE INDEX `claims_by_sit` ON `claims` (`sit_id`);--> statement-breakpoint
CREATE TABLE `sit_logs` (
	`sit_id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`start_at` integer NOT NULL,
	`end_at` integer NOT NULL,
	`antlered_bucks` integer NOT NULL,
	`does` integer NOT NULL,
	`fawns` integer NOT NULL,
	`unknown` integer NOT NULL,
	`bumped_in` integer NOT NULL,
	`bumped_sitting` integer NOT NULL,
	`bumped_out` integer NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `sits` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`stand_id` text NOT NULL,
	`member_id` text NOT NULL,
	`day` text NOT NULL,
	`windows` text NOT NULL,
	`start_at` integer NOT NULL,
	`end_at` integer NOT NULL,
	`weapon` text NOT NULL,
	`approach_id` text,
	`guests` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`status` text NOT NULL,
	`cancel_reason` text,
	`cancelled_at` integer,
	`request_key` text NOT NULL,
	`sequence` integer DEFAULT 0 NOT NULL,
	`booked_by` text NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`approach_id`) REFERENCES `approaches`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sits_once_a_request` ON `sits` (`club_id`,`request_key`);--> statement-breakpoint
CREATE INDEX `sits_by_day` ON `sits` (`club_id`,`day`);--> statement-breakpoint
CREATE INDEX `sits_by_member` ON `sits` (`member_id`,`day`);--> statement-breakpoint
CREATE INDEX `sits_by_stand` ON `sits` (`stand_id`,`day`);--> statement-breakpoint
CREATE TABLE `clubs` (
	`id` text PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`name` text NOT NULL,
	`lat` real NOT NULL,
	`lon` real NOT NULL,
	`zone` text NOT NULL,
	`units` text NOT NULL,
	`rules` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `clubs_slug_unique` ON `clubs` (`slug`);--> statement-breakpoint
CREATE TABLE `invitations` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`role` text NOT NULL,
	`sponsor_id` text,
	`guest_from` text,
	`guest_to` text,
	`token_hash` text NOT NULL,
	`invited_by` text NOT NULL,
	`created_at` integer NOT NULL,
	`sent_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`accepted_at` integer,
	`revoked_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_tokenHash_unique` ON `invitations` (`token_hash`);--> statement-breakpoint
CREATE INDEX `invitations_by_club` ON `invitations` (`club_id`);--> statement-breakpoint
CREATE TABLE `memberships` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`user_id` text NOT NULL,
	`role` text NOT NULL,
	`sponsor_id` text,
	`guest_from` text,
	`guest_to` text,
	`joined_at` integer NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `memberships_one_a_club` ON `memberships` (`club_id`,`user_id`);--> statement-breakpoint
CREATE INDEX `memberships_by_user` ON `memberships` (`user_id`);--> statement-breakpoint
CREATE TABLE `approaches` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`stand_id` text NOT NULL,
	`parking_id` text,
	`name` text NOT NULL,
	`direction` text NOT NULL,
	`points` text NOT NULL,
	`vehicle_to_index` integer DEFAULT 0 NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`parking_id`) REFERENCES `parkings`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `approaches_by_club` ON `approaches` (`club_id`);--> statement-breakpoint
CREATE INDEX `approaches_by_stand` ON `approaches` (`stand_id`);--> statement-breakpoint
CREATE TABLE `closures` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`stand_id` text,
	`from_day` text NOT NULL,
	`to_day` text,
	`reason` text NOT NULL,
	`by_member_id` text NOT NULL,
	`created_at` integer NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `closures_by_club` ON `closures` (`club_id`);--> statement-breakpoint
CREATE TABLE `features` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`name` text NOT NULL,
	`kind` text NOT NULL,
	`geometry` text NOT NULL,
	`months` text NOT NULL,
	`use` text,
	`notes` text DEFAULT '' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `features_by_club` ON `features` (`club_id`);--> statement-breakpoint
CREATE TABLE `parkings` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`name` text NOT NULL,
	`lat` real NOT NULL,
	`lon` real NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `parkings_by_club` ON `parkings` (`club_id`);--> statement-breakpoint
CREATE TABLE `stands` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`name` text NOT NULL,
	`kind` text NOT NULL,
	`lat` real NOT NULL,
	`lon` real NOT NULL,
	`seat_height_m` real NOT NULL,
	`facing_deg` real,
	`shot_side` text NOT NULL,
	`shot_range_m` text NOT NULL,
	`shelter` text NOT NULL,
	`seats` integer NOT NULL,
	`arcs` text NOT NULL,
	`morning` text NOT NULL,
	`evening` text NOT NULL,
	`rest_days` integer,
	`most_sits_season` integer,
	`drain_bearing_deg` real,
	`slope_percent` real,
	`allowed_member_ids` text,
	`notes` text DEFAULT '' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `stands_by_club` ON `stands` (`club_id`);--> statement-breakpoint
CREATE TABLE `visits` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`kind` text NOT NULL,
	`at` integer NOT NULL,
	`lat` real NOT NULL,
	`lon` real NOT NULL,
	`stand_id` text,
	`member_id` text NOT NULL,
	`bumped` integer DEFAULT 0 NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `visits_by_club` ON `visits` (`club_id`,`at`);--> statement-breakpoint
CREATE TABLE `audit_log` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text,
	`at` integer NOT NULL,
	`actor_user_id` text,
	`actor_name` text NOT NULL,
	`action` text NOT NULL,
	`subject_type` text NOT NULL,
	`subject_id` text NOT NULL,
	`summary` text NOT NULL,
	`detail` text NOT NULL
);
--> statement-breakpoint
CREATE INDEX `audit_by_club` ON `audit_log` (`club_id`,`at`);--> statement-breakpoint
CREATE TABLE `job_runs` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`slot_at` integer NOT NULL,
	`lease_until` integer,
	`attempts` integer DEFAULT 0 NOT NULL,
	`started_at` integer NOT NULL,
	`finished_at` integer,
	`error` text,
	`result` text
);
--> statement-breakpoint
CREATE INDEX `job_runs_by_name` ON `job_runs` (`name`,`slot_at`);--> statement-breakpoint
CREATE TABLE `kept_mail` (
	`id` text PRIMARY KEY NOT NULL,
	`message_id` text NOT NULL,
	`to_email` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`html` text,
	`calendar` text,
	`at` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text,
	`kind` text NOT NULL,
	`dedupe_key` text NOT NULL,
	`to_email` text NOT NULL,
	`to_name` text NOT NULL,
	`subject` text NOT NULL,
	`message` text,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_attempt_at` integer NOT NULL,
	`lease_until` integer,
	`created_at` integer NOT NULL,
	`sent_at` integer,
	`dead_at` integer,
	`last_error` text
);
--> statement-breakpoint
CREATE UNIQUE INDEX `outbox_dedupeKey_unique` ON `outbox` (`dedupe_key`);--> statement-breakpoint
CREATE INDEX `outbox_due` ON `outbox` (`sent_at`,`dead_at`,`next_attempt_at`);--> statement-breakpoint
CREATE TABLE `forecasts` (
	`place_key` text PRIMARY KEY NOT NULL,
	`issued_at` integer,
	`fetched_at` integer,
	`source` text,
	`body` text,
	`next_fetch_at` integer NOT NULL,
	`lease_until` integer,
	`lease_by` text,
	`last_tried_at` integer,
	`last_error` text,
	`failures` integer DEFAULT 0 NOT NULL
);
