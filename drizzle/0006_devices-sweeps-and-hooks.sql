CREATE TABLE `device` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`name` text NOT NULL,
	`notes` text,
	`version` integer DEFAULT 1 NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `device_once` ON `device` (`team_id`,`name`);--> statement-breakpoint
CREATE TABLE `firmware_version` (
	`id` text PRIMARY KEY NOT NULL,
	`device_id` text NOT NULL,
	`name` text NOT NULL,
	`place` integer NOT NULL,
	`notes` text,
	`created_by` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`device_id`) REFERENCES `device`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `firmware_version_once` ON `firmware_version` (`device_id`,`name`);--> statement-breakpoint
CREATE INDEX `firmware_version_in_order` ON `firmware_version` (`device_id`,`place`);--> statement-breakpoint
CREATE TABLE `gate_result` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`version_id` text NOT NULL,
	`inputs` text NOT NULL,
	`outcome` text NOT NULL,
	`document` text NOT NULL,
	`engine_version` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`version_id`) REFERENCES `firmware_version`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `gate_result_once` ON `gate_result` (`version_id`,`inputs`);--> statement-breakpoint
CREATE INDEX `gate_result_last` ON `gate_result` (`version_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `gate_rule` (
	`device_id` text PRIMARY KEY NOT NULL,
	`reference_id` text,
	`reference_name` text NOT NULL,
	`tolerance` real NOT NULL,
	`alpha` real NOT NULL,
	`groups` text,
	`version` integer DEFAULT 1 NOT NULL,
	`updated_by` text,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`device_id`) REFERENCES `device`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`reference_id`) REFERENCES `firmware_version`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE TABLE `sweep` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`name` text NOT NULL,
	`notes` text,
	`document` text NOT NULL,
	`sha256` text NOT NULL,
	`options` text NOT NULL,
	`engine_version` text NOT NULL,
	`datasets` text NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`deleted_at` integer,
	`deleted_by` text,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`deleted_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `sweep_by_team` ON `sweep` (`team_id`,`deleted_at`,`created_at`);--> statement-breakpoint
CREATE TABLE `site_map` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`name` text NOT NULL,
	`file_id` text NOT NULL,
	`counts_id` text,
	`kinks_id` text,
	`geometry` text NOT NULL,
	`sites` integer NOT NULL,
	`shots` integer NOT NULL,
	`alpha` real NOT NULL,
	`device` text,
	`firmware` text,
	`group_name` text,
	`document` text NOT NULL,
	`sha256` text NOT NULL,
	`engine_version` text NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`deleted_at` integer,
	`deleted_by` text,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`file_id`) REFERENCES `original_file`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`counts_id`) REFERENCES `dataset`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`kinks_id`) REFERENCES `dataset`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`deleted_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `site_map_by_team` ON `site_map` (`team_id`,`deleted_at`,`created_at`);--> statement-breakpoint
CREATE INDEX `site_map_by_device` ON `site_map` (`team_id`,`deleted_at`,`device`,`firmware`);--> statement-breakpoint
CREATE TABLE `webhook` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`name` text NOT NULL,
	`url` text NOT NULL,
	`sealed_secret` text NOT NULL,
	`actions` text NOT NULL,
	`last_event` integer NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`resting_since` integer,
	`resting_why` text,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `webhook_by_team` ON `webhook` (`team_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `webhook_delivery` (
	`id` text PRIMARY KEY NOT NULL,
	`webhook_id` text NOT NULL,
	`event_id` integer NOT NULL,
	`action` text NOT NULL,
	`body` text NOT NULL,
	`status` text NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`due_at` integer,
	`answered` integer,
	`trouble` text,
	`created_at` integer NOT NULL,
	`ended_at` integer,
	FOREIGN KEY (`webhook_id`) REFERENCES `webhook`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `webhook_delivery_once` ON `webhook_delivery` (`webhook_id`,`event_id`);--> statement-breakpoint
CREATE INDEX `webhook_delivery_due` ON `webhook_delivery` (`status`,`due_at`);--> statement-breakpoint
CREATE INDEX `webhook_delivery_by_webhook` ON `webhook_delivery` (`webhook_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `watch` (
	`person_id` text NOT NULL,
	`team_id` text NOT NULL,
	`about` text NOT NULL,
	`rhythm` text NOT NULL,
	`last_event` integer NOT NULL,
	`last_digest_at` integer,
	`updated_at` integer NOT NULL,
	PRIMARY KEY(`person_id`, `team_id`),
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `watch_by_team` ON `watch` (`team_id`);--> statement-breakpoint
DROP INDEX `dataset_for_list`;--> statement-breakpoint
DROP INDEX `dataset_by_device`;--> statement-breakpoint
ALTER TABLE `dataset` ADD `group_name` text;--> statement-breakpoint
CREATE INDEX `dataset_for_list` ON `dataset` (`team_id`,`deleted_at`,`created_at`,`id`,`name`,`device`,`firmware`,`group_name`,`quench_time`,`quench_unit`,`geometry`,`unit`,`trials`,`shots`,`mean`,`largest`,`measured_on`,`created_by`,`notes`);--> statement-breakpoint
CREATE INDEX `dataset_by_device` ON `dataset` (`team_id`,`deleted_at`,`device`,`firmware`,`group_name`,`created_at`);--> statement-breakpoint
PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE `__new_link` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`report_id` text,
	`sweep_id` text,
	`token_hash` text NOT NULL,
	`label` text NOT NULL,
	`audience` text NOT NULL,
	`people` text DEFAULT '[]' NOT NULL,
	`shows` text NOT NULL,
	`blind` integer NOT NULL,
	`hides_referees` integer NOT NULL,
	`allows_remarks` integer NOT NULL,
	`visit_limit` integer,
	`expires_at` integer,
	`revoked_at` integer,
	`created_by` text,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`report_id`) REFERENCES `report`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`sweep_id`) REFERENCES `sweep`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "link_opens_one" CHECK(("report_id" IS NULL) <> ("sweep_id" IS NULL))
);
--> statement-breakpoint
INSERT INTO `__new_link`("id", "team_id", "report_id", "sweep_id", "token_hash", "label", "audience", "people", "shows", "blind", "hides_referees", "allows_remarks", "visit_limit", "expires_at", "revoked_at", "created_by", "created_at") SELECT "id", "team_id", "report_id", NULL, "token_hash", "label", "audience", "people", "shows", "blind", "hides_referees", "allows_remarks", "visit_limit", "expires_at", "revoked_at", "created_by", "created_at" FROM `link`;--> statement-breakpoint
DROP TABLE `link`;--> statement-breakpoint
ALTER TABLE `__new_link` RENAME TO `link`;--> statement-breakpoint
PRAGMA foreign_keys=ON;--> statement-breakpoint
CREATE UNIQUE INDEX `link_token_hash_unique` ON `link` (`token_hash`);--> statement-breakpoint
CREATE INDEX `link_by_report` ON `link` (`report_id`);--> statement-breakpoint
CREATE INDEX `link_by_sweep` ON `link` (`sweep_id`);