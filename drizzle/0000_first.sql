CREATE TABLE `audit_entries` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`organisation_id` text NOT NULL,
	`user_id` text NOT NULL,
	`at_ms` integer NOT NULL,
	`action` text NOT NULL,
	`thing` text NOT NULL,
	`thing_id` text NOT NULL,
	`details` text,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `audit_by_organisation` ON `audit_entries` (`organisation_id`,`at_ms`);--> statement-breakpoint
CREATE TABLE `memberships` (
	`organisation_id` text NOT NULL,
	`user_id` text NOT NULL,
	`role` text NOT NULL,
	`session_version` integer DEFAULT 1 NOT NULL,
	PRIMARY KEY(`organisation_id`, `user_id`),
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `organisations` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email_unique` ON `users` (`email`);--> statement-breakpoint
CREATE TABLE `floor_plans` (
	`room_id` text PRIMARY KEY NOT NULL,
	`document` text NOT NULL,
	`version` integer NOT NULL,
	`updated_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	FOREIGN KEY (`room_id`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `revisions` (
	`room_id` text NOT NULL,
	`number` integer NOT NULL,
	`document` text NOT NULL,
	`plan_version` integer NOT NULL,
	`note` text NOT NULL,
	`created_by` text NOT NULL,
	`created_at_ms` integer NOT NULL,
	PRIMARY KEY(`room_id`, `number`),
	FOREIGN KEY (`room_id`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `rooms` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`site_id` text NOT NULL,
	`name` text NOT NULL,
	`area` text,
	`created_at_ms` integer NOT NULL,
	`archived_at_ms` integer,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`site_id`) REFERENCES `sites`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `rooms_by_organisation` ON `rooms` (`organisation_id`);--> statement-breakpoint
CREATE TABLE `sites` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`name` text NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sites_organisation_id_name_unique` ON `sites` (`organisation_id`,`name`);--> statement-breakpoint
CREATE TABLE `emitters` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`key` text NOT NULL,
	`document` text NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `emitters_organisation_id_key_unique` ON `emitters` (`organisation_id`,`key`);--> statement-breakpoint
CREATE TABLE `stop_sets` (
	`id` text PRIMARY KEY NOT NULL,
	`room_id` text NOT NULL,
	`document` text NOT NULL,
	`status` text DEFAULT 'draft' NOT NULL,
	`version` integer NOT NULL,
	`position` integer NOT NULL,
	`updated_by` text NOT NULL,
	`updated_at_ms` integer NOT NULL,
	FOREIGN KEY (`room_id`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`updated_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `stop_sets_by_room` ON `stop_sets` (`room_id`);