CREATE TABLE `accepted_reading` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`reading_id` text NOT NULL,
	`accepted_by` text NOT NULL,
	`person_id` text NOT NULL,
	`accepted_at_ms` integer NOT NULL,
	`reason` text NOT NULL,
	PRIMARY KEY(`company_id`, `job_id`, `reading_id`),
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE TABLE `anchor` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`tendon_id` text NOT NULL,
	`edge_id` text,
	`pan_id` text,
	`number` integer NOT NULL,
	`end` text NOT NULL,
	`hardware_id` text NOT NULL,
	`cast_with_pour_id` text NOT NULL,
	`stressed_with_pour_id` text NOT NULL,
	`chainage_mm` real NOT NULL,
	`height_mm` real NOT NULL,
	`set_back_mm` real NOT NULL,
	`skew_deg` real NOT NULL,
	`elevation_deg` real NOT NULL,
	`straight_behind_mm` real,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`tendon_id`) REFERENCES `tendon`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`edge_id`) REFERENCES `edge`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pan_id`) REFERENCES `pan`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`cast_with_pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`stressed_with_pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`hardware_id`) REFERENCES `hardware`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "anchor_place" CHECK(("anchor"."edge_id" is null) <> ("anchor"."pan_id" is null)),
	CONSTRAINT "anchor_number" CHECK("anchor"."number" between 1 and 9999),
	CONSTRAINT "anchor_end" CHECK("anchor"."end" in ('live', 'dead')),
	CONSTRAINT "anchor_distances" CHECK("anchor"."set_back_mm" >= 0 and "anchor"."straight_behind_mm" >= 0),
	CONSTRAINT "anchor_angles" CHECK("anchor"."skew_deg" between -60 and 60 and "anchor"."elevation_deg" between -45 and 45)
);
--> statement-breakpoint
CREATE INDEX `anchor_tendon` ON `anchor` (`company_id`,`job_id`,`tendon_id`);--> statement-breakpoint
CREATE INDEX `anchor_edge` ON `anchor` (`company_id`,`job_id`,`edge_id`);--> statement-breakpoint
CREATE INDEX `anchor_pan` ON `anchor` (`company_id`,`job_id`,`pan_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `anchor_of_job` ON `anchor` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `approval_strength` (
	`company_id` text NOT NULL,
	`hardware_id` text NOT NULL,
	`position` integer NOT NULL,
	`share` real NOT NULL,
	`strength_min_mpa` real NOT NULL,
	`spacing_along_min_mm` real NOT NULL,
	`spacing_height_min_mm` real NOT NULL,
	`edge_along_min_mm` real NOT NULL,
	`edge_height_min_mm` real NOT NULL,
	PRIMARY KEY(`company_id`, `hardware_id`, `position`),
	FOREIGN KEY (`company_id`,`hardware_id`) REFERENCES `hardware`(`company_id`,`id`) ON UPDATE no action ON DELETE restrict,
	CONSTRAINT "approval_strength_share" CHECK("approval_strength"."share" > 0 and "approval_strength"."share" <= 1),
	CONSTRAINT "approval_strength_strength" CHECK("approval_strength"."strength_min_mpa" > 0 and "approval_strength"."strength_min_mpa" <= 120),
	CONSTRAINT "approval_strength_distances" CHECK("approval_strength"."spacing_along_min_mm" > 0 and "approval_strength"."spacing_height_min_mm" > 0 and "approval_strength"."edge_along_min_mm" > 0 and "approval_strength"."edge_height_min_mm" > 0)
);
--> statement-breakpoint
CREATE TABLE `audit` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`job_id` text,
	`person_id` text NOT NULL,
	`at_ms` integer NOT NULL,
	`what` text NOT NULL,
	`before` text,
	`after` text,
	`change_number` integer,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE INDEX `audit_job_at` ON `audit` (`company_id`,`job_id`,`at_ms`);--> statement-breakpoint
CREATE INDEX `audit_job_change` ON `audit` (`company_id`,`job_id`,`change_number`);--> statement-breakpoint
CREATE TABLE `bar_mark` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`mark` integer NOT NULL,
	`key` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "bar_mark_range" CHECK("bar_mark"."mark" between 1 and 9999)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `bar_mark_of_job` ON `bar_mark` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `bar_mark_mark` ON `bar_mark` (`company_id`,`pour_id`,`mark`);--> statement-breakpoint
CREATE UNIQUE INDEX `bar_mark_key` ON `bar_mark` (`company_id`,`pour_id`,`key`);--> statement-breakpoint
CREATE TABLE `batch` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`person_id` text NOT NULL,
	`payload_hash` text NOT NULL,
	`versions` text NOT NULL,
	`pour_ids` text NOT NULL,
	`change_number` integer NOT NULL,
	`at_ms` integer NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "batch_versions_json" CHECK(json_valid("batch"."versions")),
	CONSTRAINT "batch_pour_ids_json" CHECK(json_valid("batch"."pour_ids"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `batch_of_job` ON `batch` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `company` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`created_at_ms` integer NOT NULL,
	`updated_at_ms` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `concrete_result` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`age_hours` real NOT NULL,
	`cured` text NOT NULL,
	`certificate` text NOT NULL,
	`specimens_mpa` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "concrete_result_age" CHECK("concrete_result"."age_hours" > 0),
	CONSTRAINT "concrete_result_specimens_json" CHECK(json_valid("concrete_result"."specimens_mpa"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `concrete_result_of_job` ON `concrete_result` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `corner` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`position` integer NOT NULL,
	`x_mm` real NOT NULL,
	`y_mm` real NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `corner_of_job` ON `corner` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `corner_position` ON `corner` (`company_id`,`pour_id`,`position`);--> statement-breakpoint
CREATE TABLE `edge` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`edge_line_id` text NOT NULL,
	`mark` text NOT NULL,
	`corner_id` text NOT NULL,
	`is_chord` integer NOT NULL,
	`version` integer NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`edge_line_id`) REFERENCES `edge_line`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`corner_id`) REFERENCES `corner`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `edge_of_job` ON `edge` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `edge_length` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`edge_id` text NOT NULL,
	`position` integer NOT NULL,
	`from_mm` real NOT NULL,
	`to_mm` real NOT NULL,
	`kind` text NOT NULL,
	`top_mm` real NOT NULL,
	`soffit_mm` real NOT NULL,
	`jack_clear_mm` real,
	`access` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`edge_id`) REFERENCES `edge`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "edge_length_kind" CHECK("edge_length"."kind" in ('free', 'construction-joint', 'movement-joint', 'against-wall')),
	CONSTRAINT "edge_length_jack" CHECK("edge_length"."jack_clear_mm" >= 0)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `edge_length_of_job` ON `edge_length` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `edge_length_position` ON `edge_length` (`company_id`,`edge_id`,`position`);--> statement-breakpoint
CREATE TABLE `edge_line` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`level_id` text NOT NULL,
	`mark` text NOT NULL,
	`x_mm` real NOT NULL,
	`y_mm` real NOT NULL,
	`azimuth_deg` real NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`level_id`) REFERENCES `level`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `edge_line_of_job` ON `edge_line` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `file` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`job_id` text,
	`sha256` text NOT NULL,
	`name` text NOT NULL,
	`type` text NOT NULL,
	`bytes` integer NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE restrict,
	CONSTRAINT "file_sha256" CHECK(length("file"."sha256") = 64),
	CONSTRAINT "file_bytes" CHECK("file"."bytes" >= 0)
);
--> statement-breakpoint
CREATE TABLE `grid_line` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`name` text NOT NULL,
	`x_mm` real NOT NULL,
	`y_mm` real NOT NULL,
	`azimuth_deg` real NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `grid_line_of_job` ON `grid_line` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `hardware` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`name` text NOT NULL,
	`description` text NOT NULL,
	`kind` text NOT NULL,
	`ends` text NOT NULL,
	`strands_max` integer NOT NULL,
	`approval_reference` text,
	`plate_width_mm` real NOT NULL,
	`plate_height_mm` real NOT NULL,
	`hole_width_mm` real,
	`hole_height_mm` real,
	`hole_is_round` integer,
	`duct_width_mm` real NOT NULL,
	`duct_height_mm` real NOT NULL,
	`duct_is_round` integer NOT NULL,
	`pocket_width_mm` real,
	`pocket_height_mm` real,
	`pocket_depth_mm` real,
	`device_length_mm` real NOT NULL,
	`splay_length_mm` real,
	`transmission_length_mm` real,
	`spacing_along_min_mm` real NOT NULL,
	`spacing_height_min_mm` real NOT NULL,
	`edge_along_min_mm` real NOT NULL,
	`edge_height_min_mm` real NOT NULL,
	`straight_behind_min_mm` real NOT NULL,
	`strand_tail_min_mm` real NOT NULL,
	`draw_in_mm` real NOT NULL,
	`local_steel` text,
	`jack_id` text,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`jack_id`) REFERENCES `jack`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "hardware_kind" CHECK("hardware"."kind" in ('plate', 'bonded-splay')),
	CONSTRAINT "hardware_ends" CHECK("hardware"."ends" in ('live', 'dead', 'both')),
	CONSTRAINT "hardware_strands" CHECK("hardware"."strands_max" between 1 and 61),
	CONSTRAINT "hardware_sizes" CHECK("hardware"."plate_width_mm" > 0 and "hardware"."plate_height_mm" > 0 and "hardware"."duct_width_mm" > 0 and "hardware"."duct_height_mm" > 0),
	CONSTRAINT "hardware_hole" CHECK("hardware"."hole_width_mm" > 0 and "hardware"."hole_height_mm" > 0),
	CONSTRAINT "hardware_pocket" CHECK("hardware"."pocket_width_mm" > 0 and "hardware"."pocket_height_mm" > 0 and "hardware"."pocket_depth_mm" > 0),
	CONSTRAINT "hardware_lengths" CHECK("hardware"."splay_length_mm" > 0 and "hardware"."transmission_length_mm" > 0),
	CONSTRAINT "hardware_distances" CHECK("hardware"."spacing_along_min_mm" > 0 and "hardware"."spacing_height_min_mm" > 0 and "hardware"."edge_along_min_mm" > 0 and "hardware"."edge_height_min_mm" > 0),
	CONSTRAINT "hardware_tails" CHECK("hardware"."device_length_mm" >= 0 and "hardware"."straight_behind_min_mm" >= 0 and "hardware"."strand_tail_min_mm" >= 0 and "hardware"."draw_in_mm" >= 0),
	CONSTRAINT "hardware_hole_whole" CHECK(("hardware"."hole_width_mm" is null) = ("hardware"."hole_height_mm" is null) and ("hardware"."hole_width_mm" is null) = ("hardware"."hole_is_round" is null)),
	CONSTRAINT "hardware_pocket_whole" CHECK(("hardware"."pocket_width_mm" is null) = ("hardware"."pocket_height_mm" is null) and ("hardware"."pocket_width_mm" is null) = ("hardware"."pocket_depth_mm" is null)),
	CONSTRAINT "hardware_local_steel_json" CHECK(json_valid("hardware"."local_steel"))
);
--> statement-breakpoint
CREATE TABLE `invitation` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`token_hash` text NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`roles` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text,
	`expires_at_ms` integer NOT NULL,
	`accepted_at_ms` integer,
	`withdrawn_at_ms` integer,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "invitation_roles_json" CHECK(json_valid("invitation"."roles"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitation_token` ON `invitation` (`token_hash`);--> statement-breakpoint
CREATE TABLE `jack` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`name` text NOT NULL,
	`description` text NOT NULL,
	`closed_length_mm` real NOT NULL,
	`stroke_mm` real NOT NULL,
	`strand_tail_mm` real NOT NULL,
	`hand_room_mm` real NOT NULL,
	`body_diameter_mm` real NOT NULL,
	`nose_diameter_mm` real NOT NULL,
	`nose_length_mm` real NOT NULL,
	`bent_nose_max_deg` real NOT NULL,
	`side_room_mm` real NOT NULL,
	`room_above_mm` real NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "jack_sizes" CHECK("jack"."closed_length_mm" > 0 and "jack"."body_diameter_mm" > 0 and "jack"."nose_diameter_mm" > 0),
	CONSTRAINT "jack_rooms" CHECK("jack"."stroke_mm" >= 0 and "jack"."strand_tail_mm" >= 0 and "jack"."hand_room_mm" >= 0 and "jack"."nose_length_mm" >= 0 and "jack"."side_room_mm" >= 0 and "jack"."room_above_mm" >= 0),
	CONSTRAINT "jack_bent_nose" CHECK("jack"."bent_nose_max_deg" between 0 and 45)
);
--> statement-breakpoint
CREATE TABLE `job` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`number` text NOT NULL,
	`title` text NOT NULL,
	`time_zone` text NOT NULL,
	`basis` text NOT NULL,
	`settings` text NOT NULL,
	`layout_version` integer DEFAULT 0 NOT NULL,
	`change_count` integer DEFAULT 0 NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "job_basis" CHECK("job"."basis" in ('en-1992')),
	CONSTRAINT "job_settings_json" CHECK(json_valid("job"."settings")),
	CONSTRAINT "job_counts" CHECK("job"."layout_version" between 0 and "job"."change_count")
);
--> statement-breakpoint
CREATE UNIQUE INDEX `job_id` ON `job` (`id`);--> statement-breakpoint
CREATE TABLE `job_factor` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`value` real NOT NULL,
	`reason` text NOT NULL,
	PRIMARY KEY(`company_id`, `job_id`, `name`),
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "job_factor_value" CHECK("job_factor"."value" > 0)
);
--> statement-breakpoint
CREATE TABLE `job_member` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`person_id` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `job_id`, `person_id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`person_id`) REFERENCES `membership`(`company_id`,`person_id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `job_member_person` ON `job_member` (`company_id`,`person_id`);--> statement-breakpoint
CREATE TABLE `joint` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`edge_line_id` text NOT NULL,
	`kind` text NOT NULL,
	`first_pour_id` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`edge_line_id`) REFERENCES `edge_line`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`first_pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "joint_kind" CHECK("joint"."kind" in ('construction', 'movement'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `joint_of_job` ON `joint` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `level` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`mark` text NOT NULL,
	`title` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `level_of_job` ON `level` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `mat_layer` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`position` integer NOT NULL,
	`face` text NOT NULL,
	`azimuth_deg` real NOT NULL,
	`diameter_mm` real NOT NULL,
	`spacing_mm` real NOT NULL,
	`is_outer` integer NOT NULL,
	`spare_share` real NOT NULL,
	`spare_by` text,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "mat_layer_face" CHECK("mat_layer"."face" in ('top', 'bottom')),
	CONSTRAINT "mat_layer_sizes" CHECK("mat_layer"."diameter_mm" > 0 and "mat_layer"."spacing_mm" > 0),
	CONSTRAINT "mat_layer_spare" CHECK("mat_layer"."spare_share" between 0 and 1)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `mat_layer_of_job` ON `mat_layer` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `mat_layer_position` ON `mat_layer` (`company_id`,`pour_id`,`position`);--> statement-breakpoint
CREATE TABLE `membership` (
	`company_id` text NOT NULL,
	`person_id` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	PRIMARY KEY(`company_id`, `person_id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `membership_person` ON `membership` (`person_id`);--> statement-breakpoint
CREATE TABLE `membership_role` (
	`company_id` text NOT NULL,
	`person_id` text NOT NULL,
	`role` text NOT NULL,
	PRIMARY KEY(`company_id`, `person_id`, `role`),
	FOREIGN KEY (`company_id`,`person_id`) REFERENCES `membership`(`company_id`,`person_id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "membership_role_role" CHECK("membership_role"."role" in ('detailer', 'engineer', 'drafter', 'inspector', 'admin'))
);
--> statement-breakpoint
CREATE TABLE `obstruction` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`level_id` text NOT NULL,
	`kind` text NOT NULL,
	`mark` text NOT NULL,
	`note` text NOT NULL,
	`outline` text NOT NULL,
	`cage_cover_mm` real,
	`cage_bars` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`level_id`) REFERENCES `level`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "obstruction_kind" CHECK("obstruction"."kind" in ('column', 'wall', 'opening', 'sleeve', 'upstand')),
	CONSTRAINT "obstruction_outline_json" CHECK(json_valid("obstruction"."outline")),
	CONSTRAINT "obstruction_cage_cover" CHECK("obstruction"."cage_cover_mm" >= 0)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `obstruction_of_job` ON `obstruction` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `pan` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`mark` text NOT NULL,
	`x_mm` real NOT NULL,
	`y_mm` real NOT NULL,
	`azimuth_deg` real NOT NULL,
	`along_mm` real NOT NULL,
	`across_mm` real NOT NULL,
	`depth_mm` real NOT NULL,
	`jack_id` text,
	`jack_tilt_deg` real NOT NULL,
	`bent_nose_deg` real NOT NULL,
	`headroom_mm` real,
	`version` integer NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`jack_id`) REFERENCES `jack`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "pan_sizes" CHECK("pan"."along_mm" > 0 and "pan"."across_mm" > 0 and "pan"."depth_mm" > 0),
	CONSTRAINT "pan_headroom" CHECK("pan"."headroom_mm" >= 0),
	CONSTRAINT "pan_angles" CHECK("pan"."jack_tilt_deg" between 0 and 45 and "pan"."bent_nose_deg" between 0 and 45)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `pan_of_job` ON `pan` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `person` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	`updated_at_ms` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `person_email_unique` ON `person` (`email`);--> statement-breakpoint
CREATE TABLE `pour` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`level_id` text NOT NULL,
	`mark` text NOT NULL,
	`title` text NOT NULL,
	`thickness_mm` real NOT NULL,
	`concrete` text NOT NULL,
	`fck_mpa` real NOT NULL,
	`aggregate_mm` real NOT NULL,
	`cover_top_mm` real NOT NULL,
	`cover_soffit_mm` real NOT NULL,
	`cover_edge_mm` real NOT NULL,
	`version` integer NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`level_id`) REFERENCES `level`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "pour_sizes" CHECK("pour"."thickness_mm" > 0 and "pour"."fck_mpa" > 0 and "pour"."aggregate_mm" > 0),
	CONSTRAINT "pour_fck" CHECK("pour"."fck_mpa" <= 120),
	CONSTRAINT "pour_covers" CHECK("pour"."cover_top_mm" >= 0 and "pour"."cover_soffit_mm" >= 0 and "pour"."cover_edge_mm" >= 0)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `pour_of_job` ON `pour` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `pour_result` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`pour_id` text NOT NULL,
	`results` text NOT NULL,
	`counts` text NOT NULL,
	`reading_ids` text NOT NULL,
	`engine_version` text NOT NULL,
	`change_number` integer NOT NULL,
	`at_ms` integer NOT NULL,
	PRIMARY KEY(`company_id`, `job_id`, `pour_id`),
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "pour_result_results_json" CHECK(json_valid("pour_result"."results")),
	CONSTRAINT "pour_result_counts_json" CHECK(json_valid("pour_result"."counts")),
	CONSTRAINT "pour_result_reading_ids_json" CHECK(json_valid("pour_result"."reading_ids"))
);
--> statement-breakpoint
CREATE TABLE `rate_limit` (
	`key` text PRIMARY KEY NOT NULL,
	`count` integer NOT NULL,
	`window_end_at_ms` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `region` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`position` integer NOT NULL,
	`mark` text NOT NULL,
	`kind` text NOT NULL,
	`outline` text NOT NULL,
	`top_mm` real NOT NULL,
	`soffit_mm` real NOT NULL,
	`cover_mm` real NOT NULL,
	`link_diameter_mm` real NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "region_kind" CHECK("region"."kind" in ('edge-beam', 'band', 'drop', 'fold')),
	CONSTRAINT "region_outline_json" CHECK(json_valid("region"."outline")),
	CONSTRAINT "region_sizes" CHECK("region"."cover_mm" >= 0 and "region"."link_diameter_mm" >= 0)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `region_of_job` ON `region` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `region_position` ON `region` (`company_id`,`pour_id`,`position`);--> statement-breakpoint
CREATE TABLE `session` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`expires_at_s` integer NOT NULL,
	`absolute_end_at_ms` integer NOT NULL,
	`created_at_ms` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `session_person` ON `session` (`person_id`);--> statement-breakpoint
CREATE TABLE `stage` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`share` real NOT NULL,
	`strength_mpa` real NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "stage_share" CHECK("stage"."share" > 0 and "stage"."share" <= 1),
	CONSTRAINT "stage_strength" CHECK("stage"."strength_mpa" > 0 and "stage"."strength_mpa" <= 120)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `stage_of_job` ON `stage` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `stage_position` ON `stage` (`company_id`,`pour_id`,`position`);--> statement-breakpoint
CREATE TABLE `steel` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`zone_kind` text NOT NULL,
	`anchor_id` text,
	`edge_id` text,
	`after_anchor_id` text,
	`before_anchor_id` text,
	`pan_id` text,
	`joint_id` text,
	`shape` text NOT NULL,
	`source` text NOT NULL,
	`is_locked` integer NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`anchor_id`) REFERENCES `anchor`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`edge_id`) REFERENCES `edge`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`after_anchor_id`) REFERENCES `anchor`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`before_anchor_id`) REFERENCES `anchor`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pan_id`) REFERENCES `pan`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`joint_id`) REFERENCES `joint`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "steel_zone_kind" CHECK("steel"."zone_kind" in ('anchor', 'gap', 'edge', 'pan', 'joint')),
	CONSTRAINT "steel_zone_anchor" CHECK(("steel"."anchor_id" is not null) = ("steel"."zone_kind" = 'anchor')),
	CONSTRAINT "steel_zone_edge" CHECK(("steel"."edge_id" is not null) = ("steel"."zone_kind" in ('gap', 'edge'))),
	CONSTRAINT "steel_zone_gap" CHECK("steel"."zone_kind" = 'gap' or ("steel"."after_anchor_id" is null and "steel"."before_anchor_id" is null)),
	CONSTRAINT "steel_zone_pan" CHECK(("steel"."pan_id" is not null) = ("steel"."zone_kind" = 'pan')),
	CONSTRAINT "steel_zone_joint" CHECK(("steel"."joint_id" is not null) = ("steel"."zone_kind" = 'joint')),
	CONSTRAINT "steel_shape_json" CHECK(json_valid("steel"."shape")),
	CONSTRAINT "steel_source" CHECK("steel"."source" in ('by-hand', 'proposed', 'hardware'))
);
--> statement-breakpoint
CREATE INDEX `steel_anchor` ON `steel` (`company_id`,`job_id`,`anchor_id`);--> statement-breakpoint
CREATE INDEX `steel_edge` ON `steel` (`company_id`,`job_id`,`edge_id`);--> statement-breakpoint
CREATE INDEX `steel_after_anchor` ON `steel` (`company_id`,`job_id`,`after_anchor_id`);--> statement-breakpoint
CREATE INDEX `steel_before_anchor` ON `steel` (`company_id`,`job_id`,`before_anchor_id`);--> statement-breakpoint
CREATE INDEX `steel_pan` ON `steel` (`company_id`,`job_id`,`pan_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `steel_of_job` ON `steel` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `strand_type` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`name` text NOT NULL,
	`diameter_mm` real NOT NULL,
	`area_mm2` real NOT NULL,
	`breaking_load_kn` real NOT NULL,
	`proof_load_kn` real NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "strand_type_sizes" CHECK("strand_type"."diameter_mm" > 0 and "strand_type"."area_mm2" > 0 and "strand_type"."breaking_load_kn" > 0 and "strand_type"."proof_load_kn" > 0)
);
--> statement-breakpoint
CREATE TABLE `task` (
	`company_id` text NOT NULL,
	`id` text NOT NULL,
	`job_id` text,
	`kind` text NOT NULL,
	`state` text NOT NULL,
	`input` text NOT NULL,
	`answer` text,
	`attempts` integer DEFAULT 0 NOT NULL,
	`lease_end_at_ms` integer,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`company_id`) REFERENCES `company`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "task_state" CHECK("task"."state" in ('waiting', 'running', 'done', 'failed')),
	CONSTRAINT "task_lease" CHECK(("task"."state" = 'running') = ("task"."lease_end_at_ms" is not null))
);
--> statement-breakpoint
CREATE INDEX `task_state_lease` ON `task` (`state`,`lease_end_at_ms`);--> statement-breakpoint
CREATE TABLE `tendon` (
	`company_id` text NOT NULL,
	`job_id` text NOT NULL,
	`id` text NOT NULL,
	`pour_id` text NOT NULL,
	`mark` text NOT NULL,
	`strand_type_id` text NOT NULL,
	`strands` integer NOT NULL,
	`jacking_ratio` real NOT NULL,
	`stressed_from` text NOT NULL,
	`path` text NOT NULL,
	`length_mm` real,
	`drape_deg` real,
	`version` integer NOT NULL,
	`created_at_ms` integer NOT NULL,
	`created_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	`updated_by` text NOT NULL,
	PRIMARY KEY(`company_id`, `id`),
	FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`) REFERENCES `job`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`job_id`,`pour_id`) REFERENCES `pour`(`company_id`,`job_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`company_id`,`strand_type_id`) REFERENCES `strand_type`(`company_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "tendon_strands" CHECK("tendon"."strands" between 1 and 61),
	CONSTRAINT "tendon_ratio" CHECK("tendon"."jacking_ratio" > 0 and "tendon"."jacking_ratio" <= 0.95),
	CONSTRAINT "tendon_stressed_from" CHECK("tendon"."stressed_from" in ('one-end', 'both-ends')),
	CONSTRAINT "tendon_path_json" CHECK(json_valid("tendon"."path")),
	CONSTRAINT "tendon_length" CHECK("tendon"."length_mm" > 0),
	CONSTRAINT "tendon_drape" CHECK("tendon"."drape_deg" >= 0)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `tendon_of_job` ON `tendon` (`company_id`,`job_id`,`id`);--> statement-breakpoint
CREATE TABLE `verification_token` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`person_id` text,
	`email` text,
	`expires_at_ms` integer NOT NULL,
	`used_at_ms` integer,
	`created_at_ms` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "verification_token_kind" CHECK("verification_token"."kind" in ('first-person', 'password'))
);
