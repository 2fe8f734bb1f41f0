PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE `__new_job` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`number` text NOT NULL,
	`title` text NOT NULL,
	`time_zone` text NOT NULL,
	`basis` text NOT NULL,
	`settings` text NOT NULL,
	`layout_version` integer DEFAULT 0 NOT NULL,
	`change_count` integer DEFAULT 0 NOT NULL,
	`is_unfiled` integer DEFAULT false NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "job_basis" CHECK("__new_job"."basis" in ('en-1992', 'as-3600')),
	CONSTRAINT "job_settings_json" CHECK(json_valid("__new_job"."settings")),
	CONSTRAINT "job_counts" CHECK("__new_job"."layout_version" between 0 and "__new_job"."change_count")
);
--> statement-breakpoint
INSERT INTO `__new_job`("company_id", "id", "number", "title", "time_zone", "basis", "settings", "layout_version", "change_count", "is_unfiled", "created_at_ms", "created_by", "updated_at_ms", "updated_by") SELECT "company_id", "id", "number", "title", "time_zone", "basis", "settings", "layout_version", "change_count", 0, "created_at_ms", "created_by", "updated_at_ms", "updated_by" FROM `job`;--> statement-breakpoint
-- reviewed: job is rebuilt for a wider list of bases; its rows are copied above, is_unfiled as 0, which no old row has
DROP TABLE `job`;--> statement-breakpoint
ALTER TABLE `__new_job` RENAME TO `job`;--> statement-breakpoint
PRAGMA foreign_keys=ON;--> statement-breakpoint
CREATE UNIQUE INDEX `job_id` ON `job` (`id`);--> statement-breakpoint
ALTER TABLE `pan` ADD `tie_back_force_kn` real;--> statement-breakpoint
ALTER TABLE `pan` ADD `tie_back_reason` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `pour` ADD `mark_prefix` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `pour` ADD `first_mark` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `pour` ADD `deliveries` text DEFAULT '[]' NOT NULL;--> statement-breakpoint
ALTER TABLE `strand_type` ADD `modulus_mpa` real DEFAULT 195000 NOT NULL;