ALTER TABLE `webhook` ADD `awake_since` integer;--> statement-breakpoint
ALTER TABLE `webhook_delivery` ADD `by_hand` integer DEFAULT false NOT NULL;