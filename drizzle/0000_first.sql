CREATE TABLE `accounts` (
	`id` text PRIMARY KEY NOT NULL,
	`account_id` text NOT NULL,
	`provider_id` text NOT NULL,
	`user_id` text NOT NULL,
	`access_token` text,
	`refresh_token` text,
	`id_token` text,
	`access_token_expires_at` integer,
	`refresh_token_expires_at` integer,
	`scope` text,
	`password` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `accounts_by_user` ON `accounts` (`user_id`);--> statement-breakpoint
CREATE TABLE `rate_limits` (
	`id` text PRIMARY KEY NOT NULL,
	`key` text NOT NULL,
	`count` integer NOT NULL,
	`last_request` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `rate_limits_key_unique` ON `rate_limits` (`key`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`token` text NOT NULL,
	`user_id` text NOT NULL,
	`expires_at` integer NOT NULL,
	`ip_address` text,
	`user_agent` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sessions_token_unique` ON `sessions` (`token`);--> statement-breakpoint
CREATE INDEX `sessions_by_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`email` text NOT NULL,
	`email_verified` integer DEFAULT false NOT NULL,
	`image` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	`handle` text NOT NULL,
	`bio` text DEFAULT '' NOT NULL,
	`units` text DEFAULT 'mm' NOT NULL,
	`role` text DEFAULT 'reader' NOT NULL,
	`avatar_photo_id` text,
	CONSTRAINT "users_role" CHECK("users"."role" in ('reader', 'moderator', 'administrator')),
	CONSTRAINT "users_units" CHECK("users"."units" in ('mm', 'inch'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email_unique` ON `users` (`email`);--> statement-breakpoint
CREATE UNIQUE INDEX `users_handle_unique` ON `users` (`handle`);--> statement-breakpoint
CREATE TABLE `verifications` (
	`id` text PRIMARY KEY NOT NULL,
	`identifier` text NOT NULL,
	`value` text NOT NULL,
	`expires_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `verifications_by_identifier` ON `verifications` (`identifier`);--> statement-breakpoint
CREATE TABLE `audit_lines` (
	`id` text PRIMARY KEY NOT NULL,
	`at` integer NOT NULL,
	`actor_id` text,
	`action` text NOT NULL,
	`subject_kind` text NOT NULL,
	`subject_id` text NOT NULL,
	`detail` text DEFAULT '{}' NOT NULL
);
--> statement-breakpoint
CREATE INDEX `audit_lines_by_subject` ON `audit_lines` (`subject_kind`,`subject_id`,`at`);--> statement-breakpoint
CREATE TABLE `site_version` (
	`id` integer PRIMARY KEY NOT NULL,
	`value` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `builds` (
	`id` text PRIMARY KEY NOT NULL,
	`owner_id` text NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`purpose` text NOT NULL,
	`status` text NOT NULL,
	`cover_photo_id` text,
	`cover_alt` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	`published_at` integer,
	`last_entry_at` integer,
	`last_working_number` integer DEFAULT 0 NOT NULL,
	FOREIGN KEY (`owner_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "builds_status" CHECK("builds"."status" in ('planning', 'under_way', 'paused', 'finished', 'abandoned'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `builds_slug_unique` ON `builds` (`slug`);--> statement-breakpoint
CREATE INDEX `builds_by_last_entry` ON `builds` (`last_entry_at`,`id`);--> statement-breakpoint
CREATE INDEX `builds_by_owner` ON `builds` (`owner_id`,`updated_at`);--> statement-breakpoint
CREATE TABLE `entries` (
	`id` text PRIMARY KEY NOT NULL,
	`build_id` text NOT NULL,
	`stage_id` text NOT NULL,
	`author_id` text NOT NULL,
	`number` integer,
	`slug` text NOT NULL,
	`state` text NOT NULL,
	`title` text NOT NULL,
	`summary` text NOT NULL,
	`document` text NOT NULL,
	`version` integer NOT NULL,
	`published_title` text,
	`published_summary` text,
	`published_document` text,
	`published_stage_id` text,
	`published_version` integer,
	`published_photo_id` text,
	`published_photo_alt` text DEFAULT '' NOT NULL,
	`published_at` integer,
	`published_updated_at` integer,
	`scheduled_at` integer,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	`deleted_at` integer,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`stage_id`) REFERENCES `stages`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`published_stage_id`) REFERENCES `stages`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "entries_state" CHECK("entries"."state" in ('draft', 'scheduled', 'public', 'withdrawn'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `entries_slug` ON `entries` (`build_id`,`slug`);--> statement-breakpoint
CREATE UNIQUE INDEX `entries_number` ON `entries` (`build_id`,`number`);--> statement-breakpoint
CREATE INDEX `entries_by_build` ON `entries` (`build_id`,`state`,`number`);--> statement-breakpoint
CREATE INDEX `entries_by_published` ON `entries` (`state`,`published_at`,`id`);--> statement-breakpoint
CREATE INDEX `entries_by_stage` ON `entries` (`stage_id`);--> statement-breakpoint
CREATE TABLE `entry_photos` (
	`entry_id` text NOT NULL,
	`photo_id` text NOT NULL,
	PRIMARY KEY(`entry_id`, `photo_id`),
	FOREIGN KEY (`entry_id`) REFERENCES `entries`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `entry_photos_by_photo` ON `entry_photos` (`photo_id`);--> statement-breakpoint
CREATE TABLE `entry_revisions` (
	`id` text PRIMARY KEY NOT NULL,
	`entry_id` text NOT NULL,
	`number` integer NOT NULL,
	`author_id` text NOT NULL,
	`title` text NOT NULL,
	`summary` text NOT NULL,
	`document` text NOT NULL,
	`words` integer NOT NULL,
	`reason` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`entry_id`) REFERENCES `entries`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `entry_revisions_number` ON `entry_revisions` (`entry_id`,`number`);--> statement-breakpoint
CREATE TABLE `slug_redirects` (
	`kind` text NOT NULL,
	`scope` text NOT NULL,
	`slug` text NOT NULL,
	`target_id` text NOT NULL,
	PRIMARY KEY(`kind`, `scope`, `slug`)
);
--> statement-breakpoint
CREATE TABLE `stages` (
	`id` text PRIMARY KEY NOT NULL,
	`build_id` text NOT NULL,
	`title` text NOT NULL,
	`state` text NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "stages_state" CHECK("stages"."state" in ('planned', 'under_way', 'done', 'being_redone'))
);
--> statement-breakpoint
CREATE INDEX `stages_by_build` ON `stages` (`build_id`,`position`);--> statement-breakpoint
CREATE TABLE `jobs` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`payload` text NOT NULL,
	`state` text NOT NULL,
	`unique_key` text,
	`run_at` integer NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`leased_until` integer,
	`last_error` text,
	`created_at` integer NOT NULL,
	`finished_at` integer,
	CONSTRAINT "jobs_state" CHECK("jobs"."state" in ('queued', 'running', 'done', 'failed'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `jobs_unique_key_unique` ON `jobs` (`unique_key`);--> statement-breakpoint
CREATE INDEX `jobs_due` ON `jobs` (`state`,`run_at`);--> statement-breakpoint
CREATE TABLE `photos` (
	`id` text PRIMARY KEY NOT NULL,
	`owner_id` text NOT NULL,
	`build_id` text,
	`purpose` text NOT NULL,
	`state` text NOT NULL,
	`failure` text,
	`width` integer NOT NULL,
	`height` integer NOT NULL,
	`rotation` integer DEFAULT 0 NOT NULL,
	`thumbhash` text,
	`webp_widths` text DEFAULT '[]' NOT NULL,
	`avif_widths` text DEFAULT '[]' NOT NULL,
	`bytes` integer NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`owner_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "photos_rotation" CHECK("photos"."rotation" in (0, 90, 180, 270))
);
--> statement-breakpoint
CREATE INDEX `photos_by_owner` ON `photos` (`owner_id`,`created_at`);--> statement-breakpoint
CREATE INDEX `photos_by_build` ON `photos` (`build_id`);--> statement-breakpoint
CREATE TABLE `workings` (
	`id` text PRIMARY KEY NOT NULL,
	`build_id` text NOT NULL,
	`entry_id` text,
	`number` integer NOT NULL,
	`author_id` text NOT NULL,
	`calculator` text NOT NULL,
	`title` text NOT NULL,
	`version` integer NOT NULL,
	`inputs` text NOT NULL,
	`results` text NOT NULL,
	`published` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`entry_id`) REFERENCES `entries`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `workings_number` ON `workings` (`build_id`,`number`);--> statement-breakpoint
CREATE INDEX `workings_by_entry` ON `workings` (`entry_id`);