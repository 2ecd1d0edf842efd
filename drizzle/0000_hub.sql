CREATE TABLE `hub` (
	`row` integer PRIMARY KEY NOT NULL,
	`id` text NOT NULL,
	`created_version` text NOT NULL,
	`created_at` text NOT NULL,
	CONSTRAINT "hub_one_row" CHECK("hub"."row" = 1)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `hub_id_unique` ON `hub` (`id`);