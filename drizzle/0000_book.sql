CREATE TABLE `audit` (
	`number` integer PRIMARY KEY NOT NULL,
	`at` text NOT NULL,
	`actor_id` text,
	`action` text NOT NULL,
	`subject` text NOT NULL,
	`details` text NOT NULL,
	`previous_hash` text NOT NULL,
	`hash` text NOT NULL,
	FOREIGN KEY (`actor_id`) REFERENCES `members`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `members` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`role` text NOT NULL,
	`password_hash` text NOT NULL,
	`suspended_at` text,
	`created_at` text NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `members_email_unique` ON `members` (`email`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`data` text NOT NULL,
	`member_id` text,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`member_id`) REFERENCES `members`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sessions_by_expiry` ON `sessions` (`expires_at`);--> statement-breakpoint
CREATE INDEX `sessions_by_member` ON `sessions` (`member_id`);--> statement-breakpoint
CREATE TABLE `overrides` (
	`id` text PRIMARY KEY NOT NULL,
	`revision_id` text NOT NULL,
	`code` text NOT NULL,
	`address` text,
	`reason` text NOT NULL,
	`member_id` text NOT NULL,
	`created_at` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`member_id`) REFERENCES `members`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `overrides_of_revision` ON `overrides` (`revision_id`);--> statement-breakpoint
CREATE TABLE `page_digests` (
	`page_id` text PRIMARY KEY NOT NULL,
	`dialect_version` integer NOT NULL,
	`lines` integer NOT NULL,
	`cited` integer NOT NULL,
	`digest` text NOT NULL,
	FOREIGN KEY (`page_id`) REFERENCES `pages`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `pages` (
	`id` text PRIMARY KEY NOT NULL,
	`subject_id` text NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`kind` text NOT NULL,
	`summary` text NOT NULL,
	`published_revision` integer NOT NULL,
	`published_at` text NOT NULL,
	`retired_at` text,
	`created_at` text NOT NULL,
	FOREIGN KEY (`subject_id`) REFERENCES `subjects`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `pages_by_publication` ON `pages` (`published_at`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `pages_address` ON `pages` (`subject_id`,`slug`);--> statement-breakpoint
CREATE TABLE `renditions` (
	`revision_id` text NOT NULL,
	`dialect_version` integer NOT NULL,
	`text` text NOT NULL,
	PRIMARY KEY(`revision_id`, `dialect_version`),
	FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `revision_bodies` (
	`revision_id` text PRIMARY KEY NOT NULL,
	`markdown` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `revisions` (
	`id` text PRIMARY KEY NOT NULL,
	`page_id` text NOT NULL,
	`number` integer NOT NULL,
	`title` text NOT NULL,
	`summary` text NOT NULL,
	`author_id` text NOT NULL,
	`published_by` text,
	`published_at` text NOT NULL,
	`proposal_id` text,
	`body_hash` text NOT NULL,
	FOREIGN KEY (`page_id`) REFERENCES `pages`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `members`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`published_by`) REFERENCES `members`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `revisions_of_page` ON `revisions` (`page_id`,`number`);--> statement-breakpoint
CREATE TABLE `search_documents` (
	`page_id` text PRIMARY KEY NOT NULL,
	`dialect_version` integer NOT NULL,
	`document` text NOT NULL,
	FOREIGN KEY (`page_id`) REFERENCES `pages`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `subjects` (
	`id` text PRIMARY KEY NOT NULL,
	`shelf` text NOT NULL,
	`slug` text NOT NULL,
	`title` text NOT NULL,
	`version` integer NOT NULL,
	`created_at` text NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `subjects_address` ON `subjects` (`shelf`,`slug`);--> statement-breakpoint
CREATE TABLE `proposal_drafts` (
	`proposal_id` text PRIMARY KEY NOT NULL,
	`markdown` text NOT NULL,
	`summary` text NOT NULL,
	`base_revision` integer,
	`created_at` text NOT NULL,
	FOREIGN KEY (`proposal_id`) REFERENCES `proposals`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `proposal_notes` (
	`id` text PRIMARY KEY NOT NULL,
	`proposal_id` text NOT NULL,
	`number` integer NOT NULL,
	`author_id` text NOT NULL,
	`kind` text NOT NULL,
	`text` text NOT NULL,
	`address` text,
	`line` integer,
	`created_at` text NOT NULL,
	FOREIGN KEY (`proposal_id`) REFERENCES `proposals`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `members`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `proposal_notes_in_order` ON `proposal_notes` (`proposal_id`,`number`);--> statement-breakpoint
CREATE TABLE `proposal_versions` (
	`proposal_id` text NOT NULL,
	`number` integer NOT NULL,
	`markdown` text NOT NULL,
	`summary` text NOT NULL,
	`base_revision` integer,
	`created_at` text NOT NULL,
	`sent_at` text NOT NULL,
	PRIMARY KEY(`proposal_id`, `number`),
	FOREIGN KEY (`proposal_id`) REFERENCES `proposals`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `proposals` (
	`id` text PRIMARY KEY NOT NULL,
	`shelf` text NOT NULL,
	`subject` text NOT NULL,
	`page` text NOT NULL,
	`author_id` text NOT NULL,
	`state` text NOT NULL,
	`title` text NOT NULL,
	`summary` text NOT NULL,
	`base_revision` integer,
	`stops` integer NOT NULL,
	`versions` integer NOT NULL,
	`created_at` text NOT NULL,
	`updated_at` text NOT NULL,
	`sent_at` text,
	`decided_by` text,
	`published_revision_id` text,
	FOREIGN KEY (`author_id`) REFERENCES `members`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`decided_by`) REFERENCES `members`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`published_revision_id`) REFERENCES `revisions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `proposals_by_state` ON `proposals` (`state`,`updated_at`,`id`);--> statement-breakpoint
CREATE INDEX `proposals_by_author` ON `proposals` (`author_id`,`updated_at`,`id`);--> statement-breakpoint
CREATE INDEX `proposals_by_page` ON `proposals` (`shelf`,`subject`,`page`);