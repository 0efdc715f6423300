CREATE TABLE `dataset` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`name` text NOT NULL,
	`file_id` text NOT NULL,
	`reading` text NOT NULL,
	`part` text,
	`counts` text NOT NULL,
	`kind` text NOT NULL,
	`digest` text NOT NULL,
	`shots` integer NOT NULL,
	`mean` real NOT NULL,
	`largest` integer NOT NULL,
	`device` text,
	`firmware` text,
	`quench_time` real,
	`quench_unit` text,
	`hold_time` real,
	`hold_unit` text,
	`geometry` text NOT NULL,
	`unit` text NOT NULL,
	`trials` integer,
	`trials_why` text,
	`misread` real,
	`post_selection` text,
	`measured_on` text,
	`notes` text,
	`version` integer DEFAULT 1 NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	`deleted_at` integer,
	`deleted_by` text,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`file_id`) REFERENCES `original_file`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`deleted_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `dataset_by_team` ON `dataset` (`team_id`,`deleted_at`,`created_at`);--> statement-breakpoint
CREATE INDEX `dataset_by_device` ON `dataset` (`team_id`,`device`,`firmware`);--> statement-breakpoint
CREATE INDEX `dataset_by_digest` ON `dataset` (`team_id`,`digest`);--> statement-breakpoint
CREATE INDEX `dataset_by_file` ON `dataset` (`file_id`);--> statement-breakpoint
CREATE TABLE `event` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`at` integer NOT NULL,
	`team_id` text,
	`person_id` text,
	`link_id` text,
	`action` text NOT NULL,
	`thing` text,
	`detail` text
);
--> statement-breakpoint
CREATE INDEX `event_by_team` ON `event` (`team_id`,`at`);--> statement-breakpoint
CREATE TABLE `identity` (
	`issuer` text NOT NULL,
	`subject` text NOT NULL,
	`person_id` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`issuer`, `subject`),
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `person` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text,
	`email_verified_at` integer,
	`disabled_at` integer,
	`session_version` integer DEFAULT 0 NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `person_email_unique` ON `person` (`email`);--> statement-breakpoint
CREATE TABLE `team` (
	`id` text PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`name` text NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `team_slug_unique` ON `team` (`slug`);--> statement-breakpoint
CREATE TABLE `membership` (
	`team_id` text NOT NULL,
	`person_id` text NOT NULL,
	`role` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`team_id`, `person_id`),
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `membership_by_person` ON `membership` (`person_id`);--> statement-breakpoint
CREATE TABLE `invitation` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`email` text NOT NULL,
	`role` text NOT NULL,
	`token_hash` text NOT NULL,
	`invited_by` text,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`accepted_at` integer,
	`revoked_at` integer,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`invited_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitation_token_hash_unique` ON `invitation` (`token_hash`);--> statement-breakpoint
CREATE INDEX `invitation_by_team` ON `invitation` (`team_id`);--> statement-breakpoint
CREATE TABLE `mailed_token` (
	`id` text PRIMARY KEY NOT NULL,
	`purpose` text NOT NULL,
	`email` text NOT NULL,
	`token_hash` text NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer
);
--> statement-breakpoint
CREATE UNIQUE INDEX `mailed_token_token_hash_unique` ON `mailed_token` (`token_hash`);--> statement-breakpoint
CREATE TABLE `original_file` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`name` text NOT NULL,
	`sha256` text NOT NULL,
	`size` integer NOT NULL,
	`bytes` blob NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `original_file_once` ON `original_file` (`team_id`,`sha256`);--> statement-breakpoint
CREATE TABLE `report` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`dataset_id` text NOT NULL,
	`number` integer NOT NULL,
	`document` text NOT NULL,
	`sha256` text NOT NULL,
	`options` text NOT NULL,
	`engine_version` text NOT NULL,
	`verdict` text NOT NULL,
	`conditions` text NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`deleted_at` integer,
	`deleted_by` text,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`dataset_id`) REFERENCES `dataset`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`deleted_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `report_by_dataset` ON `report` (`dataset_id`,`number`);--> statement-breakpoint
CREATE INDEX `report_by_team` ON `report` (`team_id`,`deleted_at`,`created_at`);--> statement-breakpoint
CREATE TABLE `link` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`report_id` text NOT NULL,
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
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `link_token_hash_unique` ON `link` (`token_hash`);--> statement-breakpoint
CREATE INDEX `link_by_report` ON `link` (`report_id`);--> statement-breakpoint
CREATE TABLE `link_visit` (
	`id` text PRIMARY KEY NOT NULL,
	`link_id` text NOT NULL,
	`at` integer NOT NULL,
	`person_id` text,
	`outcome` text NOT NULL,
	FOREIGN KEY (`link_id`) REFERENCES `link`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `link_visit_by_link` ON `link_visit` (`link_id`,`at`);--> statement-breakpoint
CREATE TABLE `remark` (
	`id` text PRIMARY KEY NOT NULL,
	`report_id` text NOT NULL,
	`section` text NOT NULL,
	`thread_id` text,
	`body` text NOT NULL,
	`link_id` text,
	`person_id` text,
	`signed_as` text NOT NULL,
	`created_at` integer NOT NULL,
	`settled_at` integer,
	`settled_by` text,
	FOREIGN KEY (`report_id`) REFERENCES `report`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`thread_id`) REFERENCES `remark`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`link_id`) REFERENCES `link`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`settled_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `remark_by_report` ON `remark` (`report_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `job` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`dataset_id` text NOT NULL,
	`options` text NOT NULL,
	`status` text NOT NULL,
	`share` real DEFAULT 0 NOT NULL,
	`step` text,
	`reason` text,
	`report_id` text,
	`attempts` integer DEFAULT 0 NOT NULL,
	`runner` text,
	`heartbeat_at` integer,
	`created_by` text,
	`created_at` integer NOT NULL,
	`started_at` integer,
	`ended_at` integer,
	FOREIGN KEY (`team_id`) REFERENCES `team`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`dataset_id`) REFERENCES `dataset`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`report_id`) REFERENCES `report`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `job_by_status` ON `job` (`status`,`created_at`);--> statement-breakpoint
CREATE INDEX `job_by_team` ON `job` (`team_id`,`created_at`);--> statement-breakpoint
CREATE INDEX `job_by_dataset` ON `job` (`dataset_id`);--> statement-breakpoint
CREATE TABLE `outbox_message` (
	`id` text PRIMARY KEY NOT NULL,
	`to` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`created_at` integer NOT NULL
);