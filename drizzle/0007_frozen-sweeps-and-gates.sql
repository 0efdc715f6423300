CREATE TRIGGER `sweep_is_frozen` BEFORE UPDATE OF `document`,`sha256`,`options`,`engine_version`,`datasets`,`team_id`,`created_at` ON `sweep` BEGIN SELECT RAISE(ABORT, 'a sweep is never changed'); END;
--> statement-breakpoint
CREATE TRIGGER `site_map_is_frozen` BEFORE UPDATE OF `document`,`sha256`,`engine_version`,`geometry`,`sites`,`shots`,`alpha`,`file_id`,`team_id`,`created_at` ON `site_map` BEGIN SELECT RAISE(ABORT, 'a map of sites is never changed'); END;
--> statement-breakpoint
CREATE TRIGGER `gate_result_is_frozen` BEFORE UPDATE ON `gate_result` BEGIN SELECT RAISE(ABORT, 'a gate that was decided is never changed'); END;
