CREATE TABLE `project_limits` (
	`project_id` text PRIMARY KEY NOT NULL,
	`items` text NOT NULL,
	`version` integer NOT NULL,
	`updated_by` text NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`project_id`) REFERENCES `project`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`updated_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `project_limits_author` ON `project_limits` (`updated_by`);--> statement-breakpoint
ALTER TABLE `analysis` ADD `room` text;--> statement-breakpoint
ALTER TABLE `project_case` ADD `basis` text DEFAULT 'extrapolated' NOT NULL CONSTRAINT "project_case_basis" CHECK("basis" in ('measured', 'figures', 'extrapolated'));--> statement-breakpoint
ALTER TABLE `project` ADD `operating_range` text DEFAULT '[]' NOT NULL;--> statement-breakpoint
DROP TRIGGER `analysis_is_immutable`;--> statement-breakpoint
UPDATE `analysis` SET `headline` = json_set(`headline`, '$.target', null, '$.beside', null, '$.edges', json('[]'), '$.capped', json('false'));--> statement-breakpoint
CREATE TRIGGER `analysis_is_immutable` BEFORE UPDATE ON `analysis` BEGIN SELECT RAISE(ABORT, 'analysis is immutable'); END;
