PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE `__new_verification_token` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`person_id` text NOT NULL,
	`expires_at_ms` integer NOT NULL,
	`used_at_ms` integer,
	`created_at_ms` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "verification_token_kind" CHECK("__new_verification_token"."kind" in ('password'))
);
--> statement-breakpoint
INSERT INTO `__new_verification_token`("id", "kind", "person_id", "expires_at_ms", "used_at_ms", "created_at_ms") SELECT "id", "kind", "person_id", "expires_at_ms", "used_at_ms", "created_at_ms" FROM `verification_token`;--> statement-breakpoint
-- reviewed: rebuilt above with all rows; nothing wrote one before this migration
DROP TABLE `verification_token`;--> statement-breakpoint
ALTER TABLE `__new_verification_token` RENAME TO `verification_token`;--> statement-breakpoint
PRAGMA foreign_keys=ON;--> statement-breakpoint
CREATE INDEX `verification_token_person` ON `verification_token` (`person_id`);--> statement-breakpoint
DROP INDEX `audit_job_at`;--> statement-breakpoint
CREATE INDEX `audit_job_at` ON `audit` (`company_id`,`job_id`,`at_ms`,`id`);--> statement-breakpoint
ALTER TABLE `session` ADD `is_renewal_due` integer DEFAULT false NOT NULL;--> statement-breakpoint
CREATE INDEX `file_id` ON `file` (`id`);