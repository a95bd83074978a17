PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE `__new_draw_entries` (
	`draw_id` text NOT NULL,
	`club_id` text NOT NULL,
	`member_id` text NOT NULL,
	`weapon` text NOT NULL,
	`slots` text DEFAULT '[0]' NOT NULL,
	`choices` text NOT NULL,
	`any_by_score` integer NOT NULL,
	`guests` text DEFAULT '[]' NOT NULL,
	`at` integer NOT NULL,
	`points` integer,
	`turn` integer,
	PRIMARY KEY(`draw_id`, `member_id`),
	FOREIGN KEY (`draw_id`) REFERENCES `draws`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
INSERT INTO `__new_draw_entries`("draw_id", "club_id", "member_id", "weapon", "slots", "choices", "any_by_score", "guests", "at", "points", "turn") SELECT "draw_id", "club_id", "member_id", "weapon", "slots", "choices", "any_by_score", "guests", "at", "points", "turn" FROM `draw_entries`;--> statement-breakpoint
DROP TABLE `draw_entries`;--> statement-breakpoint
ALTER TABLE `__new_draw_entries` RENAME TO `draw_entries`;--> statement-breakpoint
PRAGMA foreign_keys=ON;--> statement-breakpoint
CREATE INDEX `draw_entries_by_club` ON `draw_entries` (`club_id`,`member_id`);--> statement-breakpoint
ALTER TABLE `draws` DROP COLUMN `windows`;