CREATE TABLE `sample` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`about` text NOT NULL,
	`cause` text NOT NULL,
	`source` text NOT NULL,
	`invented` integer NOT NULL,
	`trials` integer,
	`unit` text NOT NULL,
	`geometry` text NOT NULL,
	`file_name` text NOT NULL,
	`text` text NOT NULL,
	`order` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sample_slug_unique` ON `sample` (`slug`);