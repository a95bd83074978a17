CREATE TABLE `draw_entries` (
	`draw_id` text NOT NULL,
	`club_id` text NOT NULL,
	`member_id` text NOT NULL,
	`weapon` text NOT NULL,
	`choices` text NOT NULL,
	`any_by_score` integer NOT NULL,
	`at` integer NOT NULL,
	`points` integer,
	`turn` integer,
	`stand_id` text,
	`reasons` text,
	`sit_id` text,
	`swap_with` text,
	PRIMARY KEY(`draw_id`, `member_id`),
	FOREIGN KEY (`draw_id`) REFERENCES `draws`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`swap_with`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `draw_entries_by_club` ON `draw_entries` (`club_id`,`member_id`);--> statement-breakpoint
CREATE TABLE `draws` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`day` text NOT NULL,
	`windows` text NOT NULL,
	`stand_ids` text NOT NULL,
	`closes_at` integer NOT NULL,
	`point_rules` text NOT NULL,
	`seed` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`state` text NOT NULL,
	`result` text,
	`created_by` text NOT NULL,
	`created_at` integer NOT NULL,
	`drawn_at` integer,
	`published_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `draws_by_club` ON `draws` (`club_id`,`day`);