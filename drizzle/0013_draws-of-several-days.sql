CREATE TABLE `draw_results` (
	`draw_id` text NOT NULL,
	`club_id` text NOT NULL,
	`member_id` text NOT NULL,
	`slot` integer NOT NULL,
	`stand_id` text,
	`reasons` text NOT NULL,
	`sit_id` text,
	`swap_with` text,
	PRIMARY KEY(`draw_id`, `member_id`, `slot`),
	FOREIGN KEY (`draw_id`) REFERENCES `draws`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stand_id`) REFERENCES `stands`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sit_id`) REFERENCES `sits`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`swap_with`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `draw_results_by_club` ON `draw_results` (`club_id`,`member_id`);--> statement-breakpoint
CREATE TABLE `draw_runs` (
	`id` text PRIMARY KEY NOT NULL,
	`draw_id` text NOT NULL,
	`club_id` text NOT NULL,
	`started_by` text NOT NULL,
	`started_at` integer NOT NULL,
	`lease_until` integer NOT NULL,
	`value` integer,
	`bound` integer,
	`ended_at` integer,
	`outcome` text,
	`message` text,
	FOREIGN KEY (`draw_id`) REFERENCES `draws`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`club_id`) REFERENCES `clubs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `draw_runs_by_draw` ON `draw_runs` (`draw_id`,`started_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `draw_runs_one_at_work` ON `draw_runs` (`draw_id`) WHERE "draw_runs"."ended_at" is null;--> statement-breakpoint
ALTER TABLE `draw_entries` ADD `slots` text DEFAULT '[0]' NOT NULL;--> statement-breakpoint
ALTER TABLE `draw_entries` ADD `guests` text DEFAULT '[]' NOT NULL;--> statement-breakpoint
ALTER TABLE `draws` ADD `slots` text DEFAULT '[]' NOT NULL;--> statement-breakpoint
UPDATE `draws` SET `slots` = json_array(json_object('day', `day`, 'windows', `windows`));--> statement-breakpoint
UPDATE `draws` SET `result` = json_set(json_remove(`result`, '$.timeUp'), '$.cutBy', CASE json_extract(`result`, '$.timeUp') WHEN 1 THEN 'time' END) WHERE `result` IS NOT NULL;--> statement-breakpoint
INSERT INTO `draw_results` (`draw_id`, `club_id`, `member_id`, `slot`, `stand_id`, `reasons`, `sit_id`, `swap_with`) SELECT `e`.`draw_id`, `e`.`club_id`, `e`.`member_id`, 0, `e`.`stand_id`, coalesce(`e`.`reasons`, '[]'), `e`.`sit_id`, `e`.`swap_with` FROM `draw_entries` `e` INNER JOIN `draws` `d` ON `d`.`id` = `e`.`draw_id` WHERE `d`.`state` IN ('drawn', 'published');
