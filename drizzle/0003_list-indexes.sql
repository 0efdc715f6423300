DROP INDEX `dataset_by_team`;--> statement-breakpoint
DROP INDEX `dataset_by_device`;--> statement-breakpoint
CREATE INDEX `dataset_for_list` ON `dataset` (`team_id`,`deleted_at`,`created_at`,`id`,`name`,`device`,`firmware`,`quench_time`,`quench_unit`,`geometry`,`unit`,`trials`,`shots`,`mean`,`largest`,`measured_on`,`created_by`,`notes`);--> statement-breakpoint
CREATE INDEX `dataset_by_device` ON `dataset` (`team_id`,`deleted_at`,`device`,`firmware`);--> statement-breakpoint
CREATE INDEX `report_last` ON `report` (`dataset_id`,`deleted_at`,`number`,`verdict`);