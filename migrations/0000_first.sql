CREATE TABLE `attempts` (
	`key` text PRIMARY KEY NOT NULL,
	`points` integer NOT NULL,
	`expires_at` integer
);
--> statement-breakpoint
CREATE INDEX `attempts_expired` ON `attempts` (`expires_at`);--> statement-breakpoint
CREATE TABLE `bays` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`name` text NOT NULL,
	`ordinal` integer NOT NULL,
	`counts` text DEFAULT 'computed' NOT NULL,
	`tolerance` real DEFAULT 0.01 NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "bay_name" CHECK(length("bays"."name") between 1 and 60),
	CONSTRAINT "bay_counts" CHECK("bays"."counts" in ('computed', 'tabulated')),
	CONSTRAINT "bay_tolerance" CHECK("bays"."tolerance" >= 0 and "bays"."tolerance" <= 0.5)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `bays_name` ON `bays` (`organisation_id`,lower("name"));--> statement-breakpoint
CREATE TABLE `comments` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`shape_id` text NOT NULL,
	`ordinal` integer NOT NULL,
	`body` text NOT NULL,
	`author_id` text NOT NULL,
	`created_at` integer NOT NULL,
	`deleted_at` integer,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shape_id`) REFERENCES `shapes`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "comment_body" CHECK(length("comments"."body") between 1 and 4000)
);
--> statement-breakpoint
CREATE INDEX `comments_of_shape` ON `comments` (`shape_id`,`id`);--> statement-breakpoint
CREATE TABLE `deliveries` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`bay_id` text NOT NULL,
	`number` integer NOT NULL,
	`file_name` text NOT NULL,
	`size_bytes` integer DEFAULT 0 NOT NULL,
	`content_hash` text,
	`state` text NOT NULL,
	`reading_id` text,
	`layout` text DEFAULT '{}' NOT NULL,
	`counts` text DEFAULT '{}' NOT NULL,
	`failure` text DEFAULT '' NOT NULL,
	`created_by` text NOT NULL,
	`put_away_by` text,
	`put_away_at` integer,
	`returned_by` text,
	`returned_at` integer,
	`return_reason` text DEFAULT '' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`put_away_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`returned_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "delivery_size" CHECK("deliveries"."size_bytes" between 0 and 26214400)
);
--> statement-breakpoint
CREATE INDEX `deliveries_newest` ON `deliveries` (`organisation_id`,`created_at`);--> statement-breakpoint
CREATE INDEX `deliveries_number` ON `deliveries` (`organisation_id`,`number`);--> statement-breakpoint
CREATE INDEX `deliveries_content` ON `deliveries` (`organisation_id`,`content_hash`);--> statement-breakpoint
CREATE TABLE `delivery_files` (
	`delivery_id` text NOT NULL,
	`ordinal` integer NOT NULL,
	`bytes` blob NOT NULL,
	PRIMARY KEY(`delivery_id`, `ordinal`),
	FOREIGN KEY (`delivery_id`) REFERENCES `deliveries`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `delivery_rows` (
	`delivery_id` text NOT NULL,
	`ordinal` integer NOT NULL,
	`line` integer NOT NULL,
	`verdict` text NOT NULL,
	`cause` text DEFAULT '' NOT NULL,
	`designation` text DEFAULT '' NOT NULL,
	`against` text DEFAULT '' NOT NULL,
	`cells` text NOT NULL,
	`plan` text DEFAULT '{}' NOT NULL,
	`mends` text DEFAULT '[]' NOT NULL,
	`decision` text,
	`decision_reason` text DEFAULT '' NOT NULL,
	`decided_by` text,
	`decided_at` integer,
	`shape_id` text,
	`revision_ordinal` integer,
	`version` integer DEFAULT 1 NOT NULL,
	PRIMARY KEY(`delivery_id`, `ordinal`),
	FOREIGN KEY (`delivery_id`) REFERENCES `deliveries`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`decided_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "delivery_row_verdict" CHECK("delivery_rows"."verdict" in ('accepted', 'queried', 'refused'))
);
--> statement-breakpoint
CREATE INDEX `delivery_rows_verdict` ON `delivery_rows` (`delivery_id`,`verdict`,`cause`,`ordinal`);--> statement-breakpoint
CREATE TABLE `drawing_uses` (
	`organisation_id` text NOT NULL,
	`shape_id` text NOT NULL,
	`ordinal` integer NOT NULL,
	`user_kind` text NOT NULL,
	`user_of` text NOT NULL,
	PRIMARY KEY(`user_of`, `shape_id`, `ordinal`),
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shape_id`) REFERENCES `shapes`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `drawing_uses_of_shape` ON `drawing_uses` (`organisation_id`,`shape_id`);--> statement-breakpoint
CREATE TABLE `drawings` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`owner_id` text NOT NULL,
	`name` text NOT NULL,
	`drawing` text NOT NULL,
	`shape_id` text,
	`shape_ordinal` integer,
	`deleted_at` integer,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`owner_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "drawing_name" CHECK(length("drawings"."name") between 1 and 120)
);
--> statement-breakpoint
CREATE INDEX `drawings_of_owner` ON `drawings` (`organisation_id`,`owner_id`,`updated_at`);--> statement-breakpoint
CREATE TABLE `figures` (
	`revision_id` text NOT NULL,
	`organisation_id` text NOT NULL,
	`source` text NOT NULL,
	`engine_version` text DEFAULT '' NOT NULL,
	`area` real,
	`perimeter_outer` real,
	`perimeter_inner` real,
	`mass` real,
	`surface` real,
	`centroid_x` real,
	`centroid_y` real,
	`extents_xMin` real,
	`extents_xMax` real,
	`extents_yMin` real,
	`extents_yMax` real,
	`Ix` real,
	`Iy` real,
	`Ixy` real,
	`I1` real,
	`I2` real,
	`angle` real,
	`SxTop` real,
	`SxBottom` real,
	`SyLeft` real,
	`SyRight` real,
	`Sx` real,
	`Sy` real,
	`S1` real,
	`S2` real,
	`Zx` real,
	`Zy` real,
	`Z1` real,
	`Z2` real,
	`pna_x` real,
	`pna_y` real,
	`Mp_x` real,
	`Mp_y` real,
	`squash` real,
	`rx` real,
	`ry` real,
	`r1` real,
	`r2` real,
	`J` real,
	`Cw` real,
	`shearCentre_x` real,
	`shearCentre_y` real,
	`Avx` real,
	`Avy` real,
	`betaX` real,
	`betaY` real,
	`r0` real,
	`rest` text DEFAULT '{}' NOT NULL,
	PRIMARY KEY(`revision_id`, `source`),
	FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "figures_source" CHECK("figures"."source" in ('computed', 'tabulated')),
	CONSTRAINT "figures_area" CHECK("figures"."area" is null or ("figures"."area" > 0 and "figures"."area" < 9e999)),
	CONSTRAINT "figures_mass" CHECK("figures"."mass" is null or ("figures"."mass" > 0 and "figures"."mass" < 9e999)),
	CONSTRAINT "figures_Ix" CHECK("figures"."Ix" is null or ("figures"."Ix" > 0 and "figures"."Ix" < 9e999)),
	CONSTRAINT "figures_Iy" CHECK("figures"."Iy" is null or ("figures"."Iy" > 0 and "figures"."Iy" < 9e999)),
	CONSTRAINT "figures_complete" CHECK("figures"."source" = 'tabulated' or ("figures"."area" is not null and "figures"."Ix" is not null))
);
--> statement-breakpoint
CREATE TABLE `finder` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`bay_id` text NOT NULL,
	`shape_id` text NOT NULL,
	`lane` text NOT NULL,
	`state` text NOT NULL,
	`ordinal` integer NOT NULL,
	`family` text NOT NULL,
	`designation` text NOT NULL,
	`title` text DEFAULT '' NOT NULL,
	`folded` text NOT NULL,
	`source` text NOT NULL,
	`mass` real NOT NULL,
	`depth` real NOT NULL,
	`width` real NOT NULL,
	`area` real NOT NULL,
	`Ix` real NOT NULL,
	`Iy` real NOT NULL,
	`I1` real,
	`I2` real,
	`Sx` real NOT NULL,
	`Sy` real NOT NULL,
	`S1` real,
	`S2` real,
	`Zx` real,
	`Zy` real,
	`rx` real NOT NULL,
	`ry` real NOT NULL,
	`r1` real,
	`r2` real,
	`J` real,
	`Cw` real,
	`unsymmetrical` integer DEFAULT false NOT NULL,
	`factorX` real,
	`factorY` real,
	`SxFree` real,
	`SyFree` real,
	`jobs` integer DEFAULT 0 NOT NULL,
	FOREIGN KEY (`id`) REFERENCES `revisions`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shape_id`) REFERENCES `shapes`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "finder_lane_kind" CHECK("finder"."lane" in ('released', 'working')),
	CONSTRAINT "finder_state" CHECK("finder"."state" in ('draft', 'submitted', 'released', 'withdrawn')),
	CONSTRAINT "finder_mass" CHECK("finder"."mass" > 0 and "finder"."mass" < 9e999),
	CONSTRAINT "finder_values" CHECK("finder"."area" > 0 and "finder"."Ix" > 0 and "finder"."Iy" > 0 and "finder"."Sx" > 0 and "finder"."Sy" > 0)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `finder_lane` ON `finder` (`shape_id`,`lane`);--> statement-breakpoint
CREATE INDEX `finder_walk` ON `finder` (`organisation_id`,`state`,`mass`,`id`,`Sx`,`Ix`,`depth`,`family`);--> statement-breakpoint
CREATE INDEX `finder_facets` ON `finder` (`organisation_id`,`state`,`family`,`Sx`,`Ix`,`depth`,`mass`,`bay_id`);--> statement-breakpoint
CREATE INDEX `finder_text` ON `finder` (`organisation_id`,`folded`);--> statement-breakpoint
CREATE TABLE `jobs` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`kind` text NOT NULL,
	`subject_id` text NOT NULL,
	`state` text NOT NULL,
	`lease_until` integer,
	`lease_holder` text,
	`attempts` integer DEFAULT 0 NOT NULL,
	`progress` real DEFAULT 0 NOT NULL,
	`stop_asked` integer DEFAULT false NOT NULL,
	`payload` text DEFAULT '{}' NOT NULL,
	`failure` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `jobs_next` ON `jobs` (`state`,`lease_until`);--> statement-breakpoint
CREATE INDEX `jobs_of_subject` ON `jobs` (`subject_id`);--> statement-breakpoint
CREATE TABLE `log` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`at` integer NOT NULL,
	`actor_id` text NOT NULL,
	`actor_name` text NOT NULL,
	`verb` text NOT NULL,
	`entity` text NOT NULL,
	`entity_id` text NOT NULL,
	`subject` text DEFAULT '' NOT NULL,
	`before` text,
	`after` text,
	`request_id` text NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `log_newest` ON `log` (`organisation_id`,`id`);--> statement-breakpoint
CREATE INDEX `log_of_entity` ON `log` (`organisation_id`,`entity_id`,`id`);--> statement-breakpoint
CREATE TABLE `memberships` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`user_id` text NOT NULL,
	`role` text NOT NULL,
	`suspended_at` integer,
	`last_seen_at` integer,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "membership_role" CHECK("memberships"."role" in ('designer', 'engineer', 'librarian', 'admin'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `memberships_person` ON `memberships` (`user_id`,`organisation_id`);--> statement-breakpoint
CREATE INDEX `memberships_of_organisation` ON `memberships` (`organisation_id`,`role`);--> statement-breakpoint
CREATE TABLE `organisations` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`address` text DEFAULT '' NOT NULL,
	`notation` text DEFAULT 'S-Z-r' NOT NULL,
	`units` text DEFAULT 'mm' NOT NULL,
	`decimal` text DEFAULT 'point' NOT NULL,
	`four_eyes` integer DEFAULT true NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	CONSTRAINT "organisation_name" CHECK(length("organisations"."name") between 1 and 120),
	CONSTRAINT "organisation_notation" CHECK("organisations"."notation" in ('S-Z-r', 'Wel-Wpl-i')),
	CONSTRAINT "organisation_units" CHECK("organisations"."units" in ('mm', 'in')),
	CONSTRAINT "organisation_decimal" CHECK("organisations"."decimal" in ('point', 'comma'))
);
--> statement-breakpoint
CREATE TABLE `readings` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`name` text NOT NULL,
	`layout` text NOT NULL,
	`heading_key` text DEFAULT '' NOT NULL,
	`created_by` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `readings_name` ON `readings` (`organisation_id`,lower("name"));--> statement-breakpoint
CREATE TABLE `revisions` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`shape_id` text NOT NULL,
	`ordinal` integer NOT NULL,
	`state` text NOT NULL,
	`drawing` text NOT NULL,
	`content_hash` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`author_id` text NOT NULL,
	`editors` text NOT NULL,
	`submitted_at` integer,
	`submitted_by` text,
	`checked_at` integer,
	`checked_by` text,
	`checked_how` text,
	`check_note` text DEFAULT '' NOT NULL,
	`sent_back_at` integer,
	`sent_back_by` text,
	`sent_back_reason` text DEFAULT '' NOT NULL,
	`released_at` integer,
	`released_by` text,
	`superseded_at` integer,
	`withdrawn_at` integer,
	`withdrawn_by` text,
	`withdrawn_reason` text DEFAULT '' NOT NULL,
	`replacement_shape_id` text,
	`delivery_id` text,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shape_id`) REFERENCES `shapes`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`submitted_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`checked_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sent_back_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`released_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`withdrawn_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`replacement_shape_id`) REFERENCES `shapes`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "revision_ordinal" CHECK("revisions"."ordinal" >= 1),
	CONSTRAINT "revision_state" CHECK("revisions"."state" in ('draft', 'submitted', 'released', 'superseded', 'withdrawn')),
	CONSTRAINT "revision_released" CHECK("revisions"."state" in ('draft', 'submitted') or "revisions"."released_at" is not null)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `revisions_ordinal` ON `revisions` (`shape_id`,`ordinal`);--> statement-breakpoint
CREATE INDEX `revisions_submitted` ON `revisions` (`organisation_id`,`submitted_at`) WHERE state = 'submitted';--> statement-breakpoint
CREATE INDEX `revisions_of_delivery` ON `revisions` (`delivery_id`) WHERE delivery_id is not null;--> statement-breakpoint
CREATE TABLE `rights` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`membership_id` text NOT NULL,
	`bay_id` text,
	`right` text NOT NULL,
	`until` integer,
	`granted_by` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`membership_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`granted_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "right_kind" CHECK("rights"."right" in ('read', 'draft', 'release'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `rights_one` ON `rights` (`membership_id`,`bay_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `rights_all` ON `rights` (`membership_id`) WHERE bay_id is null;--> statement-breakpoint
CREATE INDEX `rights_of_organisation` ON `rights` (`organisation_id`);--> statement-breakpoint
CREATE TABLE `saved_searches` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`owner_id` text NOT NULL,
	`name` text NOT NULL,
	`query` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`owner_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `saved_searches_name` ON `saved_searches` (`organisation_id`,`owner_id`,lower("name"));--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`user_id` text NOT NULL,
	`organisation_id` text NOT NULL,
	`created_at` integer NOT NULL,
	`last_seen_at` integer NOT NULL,
	`idle_until` integer NOT NULL,
	`absolute_until` integer NOT NULL,
	`user_agent` text DEFAULT '' NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sessions_public` ON `sessions` (`public_id`);--> statement-breakpoint
CREATE INDEX `sessions_of_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE INDEX `sessions_ended` ON `sessions` (`absolute_until`);--> statement-breakpoint
CREATE TABLE `shapes` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`bay_id` text NOT NULL,
	`family` text NOT NULL,
	`designation` text NOT NULL,
	`designation_key` text NOT NULL,
	`title` text DEFAULT '' NOT NULL,
	`series` text DEFAULT '' NOT NULL,
	`released_ordinal` integer,
	`working_ordinal` integer,
	`last_ordinal` integer DEFAULT 1 NOT NULL,
	`created_by` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "shape_designation" CHECK(length("shapes"."designation") between 1 and 120),
	CONSTRAINT "shape_ordinals" CHECK("shapes"."last_ordinal" >= 1)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `shapes_designation` ON `shapes` (`organisation_id`,`designation_key`);--> statement-breakpoint
CREATE INDEX `shapes_of_bay` ON `shapes` (`bay_id`);--> statement-breakpoint
CREATE TABLE `takes` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`shape_id` text NOT NULL,
	`ordinal` integer NOT NULL,
	`job_number` text NOT NULL,
	`job_name` text DEFAULT '' NOT NULL,
	`piece_mark` text DEFAULT '' NOT NULL,
	`quantity` integer NOT NULL,
	`length_mm` real,
	`taken_by` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shape_id`) REFERENCES `shapes`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`taken_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "take_quantity" CHECK("takes"."quantity" between 1 and 100000),
	CONSTRAINT "take_length" CHECK("takes"."length_mm" is null or ("takes"."length_mm" > 0 and "takes"."length_mm" <= 1000000))
);
--> statement-breakpoint
CREATE INDEX `takes_of_shape` ON `takes` (`shape_id`,`id`);--> statement-breakpoint
CREATE INDEX `takes_of_job` ON `takes` (`organisation_id`,`job_number`,`shape_id`);--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text,
	`units` text,
	`decimal` text,
	`theme` text DEFAULT 'system' NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	CONSTRAINT "user_email_lower" CHECK("users"."email" = lower("users"."email") and length("users"."email") between 3 and 254),
	CONSTRAINT "user_units" CHECK("users"."units" is null or "users"."units" in ('mm', 'in')),
	CONSTRAINT "user_decimal" CHECK("users"."decimal" is null or "users"."decimal" in ('point', 'comma')),
	CONSTRAINT "user_theme" CHECK("users"."theme" in ('day', 'night', 'system'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email` ON `users` (`email`);