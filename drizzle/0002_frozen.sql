CREATE TRIGGER `report_is_frozen` BEFORE UPDATE OF `document`,`sha256`,`options`,`engine_version`,`verdict`,`conditions`,`dataset_id`,`team_id`,`number`,`created_at` ON `report` BEGIN SELECT RAISE(ABORT, 'a report is never changed'); END;
--> statement-breakpoint
CREATE TRIGGER `event_is_kept` BEFORE UPDATE ON `event` BEGIN SELECT RAISE(ABORT, 'events are only added'); END;
--> statement-breakpoint
CREATE TRIGGER `event_is_not_dropped` BEFORE DELETE ON `event` BEGIN SELECT RAISE(ABORT, 'events are only added'); END;
--> statement-breakpoint
CREATE TRIGGER `counts_are_frozen` BEFORE UPDATE OF `counts`,`kind`,`digest`,`shots`,`file_id`,`reading`,`part` ON `dataset` BEGIN SELECT RAISE(ABORT, 'the counts of a dataset are never changed'); END;
