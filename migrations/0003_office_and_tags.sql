CREATE TABLE `invitations` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`role` text NOT NULL,
	`hash` text NOT NULL,
	`expires_at` integer NOT NULL,
	`invited_by` text NOT NULL,
	`accepted_at` integer,
	`revoked_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`invited_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "invitation_role" CHECK("invitations"."role" in ('designer', 'engineer', 'librarian', 'admin')),
	CONSTRAINT "invitation_email" CHECK("invitations"."email" = lower("invitations"."email"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_hash` ON `invitations` (`hash`);--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_open` ON `invitations` (`organisation_id`,`email`) WHERE accepted_at is null and revoked_at is null;--> statement-breakpoint
CREATE INDEX `invitations_of_organisation` ON `invitations` (`organisation_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text,
	`to` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`state` text DEFAULT 'waiting' NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_at` integer NOT NULL,
	`sent_at` integer,
	`failure` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "outbox_state" CHECK("outbox"."state" in ('waiting', 'sent', 'failed'))
);
--> statement-breakpoint
CREATE INDEX `outbox_next` ON `outbox` (`state`,`next_at`);--> statement-breakpoint
CREATE INDEX `outbox_of_organisation` ON `outbox` (`organisation_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `password_resets` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`hash` text NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `password_resets_hash` ON `password_resets` (`hash`);--> statement-breakpoint
CREATE INDEX `password_resets_of_user` ON `password_resets` (`user_id`);--> statement-breakpoint
CREATE TABLE `right_requests` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`membership_id` text NOT NULL,
	`bay_id` text,
	`right` text NOT NULL,
	`reason` text NOT NULL,
	`state` text DEFAULT 'open' NOT NULL,
	`answer` text DEFAULT '' NOT NULL,
	`decided_by` text,
	`decided_at` integer,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`membership_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`decided_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "right_request_right" CHECK("right_requests"."right" in ('draft', 'release')),
	CONSTRAINT "right_request_state" CHECK("right_requests"."state" in ('open', 'granted', 'refused'))
);
--> statement-breakpoint
CREATE INDEX `right_requests_list` ON `right_requests` (`organisation_id`,`state`,`created_at`);--> statement-breakpoint
CREATE TABLE `tags` (
	`organisation_id` text NOT NULL,
	`shape_id` text NOT NULL,
	`tag` text NOT NULL,
	`tag_key` text NOT NULL,
	PRIMARY KEY(`shape_id`, `tag_key`),
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shape_id`) REFERENCES `shapes`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "tag_length" CHECK(length("tags"."tag") between 1 and 40)
);
--> statement-breakpoint
CREATE INDEX `tags_of_organisation` ON `tags` (`organisation_id`,`tag_key`,`shape_id`);--> statement-breakpoint
CREATE TABLE `tokens` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`membership_id` text NOT NULL,
	`name` text NOT NULL,
	`hash` text NOT NULL,
	`may` text NOT NULL,
	`expires_at` integer NOT NULL,
	`last_used_at` integer,
	`revoked_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`membership_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "token_may" CHECK("tokens"."may" in ('read', 'change'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `tokens_hash` ON `tokens` (`hash`);--> statement-breakpoint
CREATE INDEX `tokens_of_member` ON `tokens` (`membership_id`);