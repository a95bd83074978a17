ALTER TABLE `sit_predictions` ADD `score` real;--> statement-breakpoint
ALTER TABLE `sit_predictions` ADD `wind_from_deg` real;