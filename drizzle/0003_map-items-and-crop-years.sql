CREATE TABLE `map_items` (
	`id` text PRIMARY KEY NOT NULL,
	`club_id` text NOT NULL,
	`layer` text NOT NULL,
	`name` text DEFAULT '' NOT NULL,
	`geometry` text NOT NULL,
	`props` text DEFAULT '{}' NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `map_items_by_club` ON `map_items` (`club_id`);--> statement-breakpoint
ALTER TABLE `features` ADD `rotation` text DEFAULT '[]' NOT NULL;