ALTER TABLE `dataset` ADD `misread_uncertainty` real;--> statement-breakpoint
ALTER TABLE `dataset` ADD `kept` text;