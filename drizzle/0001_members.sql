CREATE TABLE `project_invitation` (
	`id` text PRIMARY KEY NOT NULL,
	`project_id` text NOT NULL,
	`email` text NOT NULL,
	`role` text NOT NULL,
	`token_hash` text NOT NULL,
	`invited_by` text NOT NULL,
	`created_at` integer NOT NULL,
	`sent_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`project_id`) REFERENCES `project`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`invited_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "project_invitation_role" CHECK("project_invitation"."role" in ('editor', 'reviewer', 'viewer'))
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `project_invitation_token` ON `project_invitation` (`token_hash`);--> statement-breakpoint
CREATE INDEX `project_invitation_email` ON `project_invitation` (`email`);--> statement-breakpoint
CREATE INDEX `project_invitation_inviter` ON `project_invitation` (`invited_by`);--> statement-breakpoint
CREATE UNIQUE INDEX `project_invitation_address` ON `project_invitation` (`project_id`,`email`);--> statement-breakpoint
ALTER TABLE `project_member` ADD `version` integer DEFAULT 1 NOT NULL;