CREATE TABLE `setup_settings` (
	`club_id` text PRIMARY KEY NOT NULL,
	`settings` text NOT NULL,
	`version` integer NOT NULL,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
