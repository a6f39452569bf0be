CREATE TABLE `audit_entries` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer,
	`at` integer NOT NULL,
	`actor_kind` text NOT NULL,
	`actor_id` integer,
	`actor_name` text NOT NULL,
	`action` text NOT NULL,
	`subject_kind` text NOT NULL,
	`subject_id` text NOT NULL,
	`summary` text NOT NULL,
	`details` text DEFAULT '{}' NOT NULL
);
--> statement-breakpoint
CREATE INDEX `audit_entries_team` ON `audit_entries` (`team_id`,`at`);--> statement-breakpoint
CREATE TABLE `benches` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`key` text NOT NULL,
	`name` text NOT NULL,
	`location` text DEFAULT '' NOT NULL,
	`lisn` text DEFAULT '' NOT NULL,
	`receiver` text DEFAULT '' NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	`archived_at` integer,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `benches_key` ON `benches` (`team_id`,`key`);--> statement-breakpoint
CREATE TABLE `build_cells` (
	`build_id` integer PRIMARY KEY NOT NULL,
	`series` text NOT NULL,
	`cells` blob NOT NULL,
	`tile` blob NOT NULL,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `builds` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`product_id` integer NOT NULL,
	`hardware_id` integer NOT NULL,
	`firmware_id` integer NOT NULL,
	`position` integer NOT NULL,
	`built_at` integer NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`switching` text DEFAULT '[]' NOT NULL,
	`parameters` text DEFAULT '[]' NOT NULL,
	`created_at` integer NOT NULL,
	`sweep_count` integer DEFAULT 0 NOT NULL,
	`worst_margin_db` real,
	`worst_frequency_hz` real,
	`worst_sweep_id` integer,
	`data_version` integer DEFAULT 0 NOT NULL,
	`judged_version` integer DEFAULT 0 NOT NULL,
	`verdict` text,
	`judged_at` integer,
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`hardware_id`) REFERENCES `hardware_revisions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`firmware_id`) REFERENCES `firmware_revisions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `builds_revisions` ON `builds` (`product_id`,`hardware_id`,`firmware_id`);--> statement-breakpoint
CREATE INDEX `builds_position` ON `builds` (`product_id`,`position`);--> statement-breakpoint
CREATE TABLE `digest_recipients` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`person_id` integer,
	`email` text NOT NULL,
	`name` text DEFAULT '' NOT NULL,
	`unsubscribe_secret` text NOT NULL,
	`created_at` integer NOT NULL,
	`unsubscribed_at` integer,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `digest_recipients_email` ON `digest_recipients` (`team_id`,`email`);--> statement-breakpoint
CREATE UNIQUE INDEX `digest_recipients_secret` ON `digest_recipients` (`unsubscribe_secret`);--> statement-breakpoint
CREATE TABLE `digest_settings` (
	`team_id` integer PRIMARY KEY NOT NULL,
	`is_on` integer DEFAULT true NOT NULL,
	`weekday` integer DEFAULT 1 NOT NULL,
	`hour` integer DEFAULT 7 NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `digests` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`period` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`html` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `digests_period` ON `digests` (`team_id`,`period`);--> statement-breakpoint
CREATE INDEX `digests_team` ON `digests` (`team_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `drop_events` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`drop_id` integer NOT NULL,
	`at` integer NOT NULL,
	`actor_kind` text NOT NULL,
	`actor_name` text NOT NULL,
	`kind` text NOT NULL,
	`text` text NOT NULL,
	FOREIGN KEY (`drop_id`) REFERENCES `drops`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `drop_events_drop` ON `drop_events` (`drop_id`,`at`);--> statement-breakpoint
CREATE TABLE `drop_sightings` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`drop_id` integer NOT NULL,
	`build_id` integer NOT NULL,
	`loss` text,
	FOREIGN KEY (`drop_id`) REFERENCES `drops`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `drop_sightings_place` ON `drop_sightings` (`drop_id`,`build_id`);--> statement-breakpoint
CREATE INDEX `drop_sightings_build` ON `drop_sightings` (`build_id`);--> statement-breakpoint
CREATE TABLE `drops` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`product_id` integer NOT NULL,
	`build_id` integer NOT NULL,
	`state_id` integer NOT NULL,
	`band` text NOT NULL,
	`state` text NOT NULL,
	`is_supported` integer DEFAULT true NOT NULL,
	`owner_id` integer,
	`difference_db` real NOT NULL,
	`margin_db` real NOT NULL,
	`frequency_hz` real NOT NULL,
	`is_over_limit` integer NOT NULL,
	`sentence` text NOT NULL,
	`evidence` text NOT NULL,
	`fixed_by_build_id` integer,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`state_id`) REFERENCES `operating_states`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`owner_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`fixed_by_build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `drops_place` ON `drops` (`build_id`,`state_id`,`band`);--> statement-breakpoint
CREATE INDEX `drops_team_state` ON `drops` (`team_id`,`state`);--> statement-breakpoint
CREATE INDEX `drops_product` ON `drops` (`product_id`);--> statement-breakpoint
CREATE TABLE `firmware_revisions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`product_id` integer NOT NULL,
	`name` text NOT NULL,
	`position` integer NOT NULL,
	`commit` text DEFAULT '' NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `firmware_revisions_name` ON `firmware_revisions` (`product_id`,`name`);--> statement-breakpoint
CREATE TABLE `frequency_grids` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`hash` text NOT NULL,
	`point_count` integer NOT NULL,
	`start_hz` real NOT NULL,
	`stop_hz` real NOT NULL,
	`median_step_hz` real NOT NULL,
	`frequencies` blob NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `frequency_grids_hash` ON `frequency_grids` (`hash`);--> statement-breakpoint
CREATE TABLE `hardware_revisions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`product_id` integer NOT NULL,
	`name` text NOT NULL,
	`position` integer NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `hardware_revisions_name` ON `hardware_revisions` (`product_id`,`name`);--> statement-breakpoint
CREATE TABLE `import_batches` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`created_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	`tags` text NOT NULL,
	`finished_at` integer,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `import_batches_team` ON `import_batches` (`team_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `import_items` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`batch_id` integer NOT NULL,
	`file_name` text NOT NULL,
	`original_sha256` text NOT NULL,
	`tags` text NOT NULL,
	`status` text DEFAULT 'waiting' NOT NULL,
	`sweep_id` integer,
	`problem` text,
	FOREIGN KEY (`batch_id`) REFERENCES `import_batches`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sweep_id`) REFERENCES `sweeps`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `import_items_batch` ON `import_items` (`batch_id`,`status`);--> statement-breakpoint
CREATE TABLE `invitations` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`email` text NOT NULL,
	`role` text NOT NULL,
	`token_hash` text NOT NULL,
	`invited_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`accepted_at` integer,
	`revoked_at` integer,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`invited_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_token` ON `invitations` (`token_hash`);--> statement-breakpoint
CREATE INDEX `invitations_team` ON `invitations` (`team_id`);--> statement-breakpoint
CREATE TABLE `job_runs` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`job` text NOT NULL,
	`team_id` integer,
	`payload` text DEFAULT '{}' NOT NULL,
	`lock_key` text NOT NULL,
	`once_key` text,
	`trigger` text NOT NULL,
	`requested_by` text NOT NULL,
	`status` text DEFAULT 'waiting' NOT NULL,
	`queued_at` integer NOT NULL,
	`started_at` integer,
	`finished_at` integer,
	`claimed_by` text,
	`lease_until` integer,
	`attempts` integer DEFAULT 0 NOT NULL,
	`total` integer DEFAULT 0 NOT NULL,
	`done` integer DEFAULT 0 NOT NULL,
	`counts` text DEFAULT '{}' NOT NULL,
	`errors` text DEFAULT '[]' NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `job_runs_waiting` ON `job_runs` (`lock_key`) WHERE status = 'waiting';--> statement-breakpoint
CREATE UNIQUE INDEX `job_runs_running` ON `job_runs` (`lock_key`) WHERE status = 'running';--> statement-breakpoint
CREATE UNIQUE INDEX `job_runs_once` ON `job_runs` (`once_key`);--> statement-breakpoint
CREATE INDEX `job_runs_status` ON `job_runs` (`status`,`queued_at`);--> statement-breakpoint
CREATE INDEX `job_runs_team` ON `job_runs` (`team_id`,`queued_at`);--> statement-breakpoint
CREATE TABLE `mailbox_messages` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`received_at` integer NOT NULL,
	`from_address` text NOT NULL,
	`to_address` text NOT NULL,
	`subject` text NOT NULL,
	`raw` blob NOT NULL
);
--> statement-breakpoint
CREATE TABLE `memberships` (
	`team_id` integer NOT NULL,
	`person_id` integer NOT NULL,
	`role` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`team_id`, `person_id`),
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `memberships_person` ON `memberships` (`person_id`);--> statement-breakpoint
CREATE TABLE `operating_states` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`product_id` integer NOT NULL,
	`name` text NOT NULL,
	`supply_voltage_v` real,
	`supply_frequency_hz` real,
	`load` text DEFAULT '' NOT NULL,
	`mode` text DEFAULT '' NOT NULL,
	`is_required` integer DEFAULT true NOT NULL,
	`position` integer NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `operating_states_name` ON `operating_states` (`product_id`,`name`);--> statement-breakpoint
CREATE TABLE `outbox_attachments` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`mail_id` integer NOT NULL,
	`file_name` text NOT NULL,
	`content_id` text NOT NULL,
	`content_type` text NOT NULL,
	`content` blob NOT NULL,
	FOREIGN KEY (`mail_id`) REFERENCES `outbox_mails`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `outbox_attachments_mail` ON `outbox_attachments` (`mail_id`);--> statement-breakpoint
CREATE TABLE `outbox_mails` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer,
	`kind` text NOT NULL,
	`once_key` text NOT NULL,
	`to_email` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`html` text NOT NULL,
	`headers` text DEFAULT '{}' NOT NULL,
	`status` text DEFAULT 'waiting' NOT NULL,
	`created_at` integer NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_attempt_at` integer NOT NULL,
	`sent_at` integer,
	`last_error` text
);
--> statement-breakpoint
CREATE UNIQUE INDEX `outbox_mails_once` ON `outbox_mails` (`once_key`);--> statement-breakpoint
CREATE INDEX `outbox_mails_due` ON `outbox_mails` (`status`,`next_attempt_at`);--> statement-breakpoint
CREATE TABLE `password_resets` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`person_id` integer NOT NULL,
	`token_hash` text NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `password_resets_token` ON `password_resets` (`token_hash`);--> statement-breakpoint
CREATE INDEX `password_resets_person` ON `password_resets` (`person_id`);--> statement-breakpoint
CREATE TABLE `people` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`is_administrator` integer DEFAULT false NOT NULL,
	`created_at` integer NOT NULL,
	`disabled_at` integer
);
--> statement-breakpoint
CREATE UNIQUE INDEX `people_email` ON `people` (`email`);--> statement-breakpoint
CREATE TABLE `product_shares` (
	`product_id` integer NOT NULL,
	`team_id` integer NOT NULL,
	`shared_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`product_id`, `team_id`),
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shared_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `product_shares_team` ON `product_shares` (`team_id`);--> statement-breakpoint
CREATE TABLE `products` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`key` text NOT NULL,
	`name` text NOT NULL,
	`description` text DEFAULT '' NOT NULL,
	`limit_set_key` text NOT NULL,
	`target_margin_db` real,
	`latest_build_id` integer,
	`reference_build_id` integer,
	`created_at` integer NOT NULL,
	`archived_at` integer,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `products_key` ON `products` (`team_id`,`key`);--> statement-breakpoint
CREATE INDEX `products_team` ON `products` (`team_id`);--> statement-breakpoint
CREATE TABLE `reference_choices` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`product_id` integer NOT NULL,
	`build_id` integer,
	`chosen_by` integer NOT NULL,
	`chosen_at` integer NOT NULL,
	`reason` text NOT NULL,
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`chosen_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `reference_choices_product` ON `reference_choices` (`product_id`,`chosen_at`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`sid` text PRIMARY KEY NOT NULL,
	`person_id` integer,
	`data` text NOT NULL,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sessions_person` ON `sessions` (`person_id`);--> statement-breakpoint
CREATE INDEX `sessions_expiry` ON `sessions` (`expires_at`);--> statement-breakpoint
CREATE TABLE `sweep_traces` (
	`sweep_id` integer PRIMARY KEY NOT NULL,
	`encoding` text NOT NULL,
	`levels` blob NOT NULL,
	FOREIGN KEY (`sweep_id`) REFERENCES `sweeps`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `sweeps` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`product_id` integer NOT NULL,
	`build_id` integer NOT NULL,
	`state_id` integer NOT NULL,
	`unit_id` integer,
	`bench_id` integer NOT NULL,
	`line` text NOT NULL,
	`detector` text NOT NULL,
	`kind` text NOT NULL,
	`taken_at` integer NOT NULL,
	`run` text NOT NULL,
	`rbw_hz` real,
	`attenuation_db` real,
	`correction` text NOT NULL,
	`grid_id` integer NOT NULL,
	`original_sha256` text NOT NULL,
	`file_name` text NOT NULL,
	`trace_number` integer NOT NULL,
	`frequency_unit` text NOT NULL,
	`level_unit` text NOT NULL,
	`identity` text NOT NULL,
	`reading_hash` text NOT NULL,
	`remarks` text DEFAULT '[]' NOT NULL,
	`limit_set_key` text NOT NULL,
	`limit_set_version` integer NOT NULL,
	`worst_margin_db` real,
	`worst_frequency_hz` real,
	`worst_level_dbuv` real,
	`worst_limit_dbuv` real,
	`is_superseded` integer DEFAULT false NOT NULL,
	`bands` text NOT NULL,
	`cells` blob NOT NULL,
	`imported_at` integer NOT NULL,
	`imported_by_kind` text NOT NULL,
	`imported_by_id` integer,
	`imported_by_name` text NOT NULL,
	`batch_id` integer,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`state_id`) REFERENCES `operating_states`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`unit_id`) REFERENCES `units`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`bench_id`) REFERENCES `benches`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`grid_id`) REFERENCES `frequency_grids`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sweeps_identity` ON `sweeps` (`product_id`,`identity`);--> statement-breakpoint
CREATE INDEX `sweeps_build` ON `sweeps` (`build_id`,`kind`);--> statement-breakpoint
CREATE INDEX `sweeps_trend` ON `sweeps` (`product_id`,`kind`,`build_id`,`is_superseded`,`state_id`,`line`,`detector`,`run`,`bench_id`,`unit_id`,`worst_margin_db`,`worst_frequency_hz`);--> statement-breakpoint
CREATE INDEX `sweeps_product_taken` ON `sweeps` (`product_id`,`taken_at`);--> statement-breakpoint
CREATE INDEX `sweeps_bench_taken` ON `sweeps` (`bench_id`,`taken_at`);--> statement-breakpoint
CREATE INDEX `sweeps_team_imported` ON `sweeps` (`team_id`,`imported_at`);--> statement-breakpoint
CREATE INDEX `sweeps_reading` ON `sweeps` (`product_id`,`reading_hash`);--> statement-breakpoint
CREATE INDEX `sweeps_original` ON `sweeps` (`original_sha256`);--> statement-breakpoint
CREATE TABLE `team_tokens` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` integer NOT NULL,
	`name` text NOT NULL,
	`secret_hash` text NOT NULL,
	`scopes` text NOT NULL,
	`created_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	`last_used_at` integer,
	`revoked_at` integer,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `team_tokens_team` ON `team_tokens` (`team_id`);--> statement-breakpoint
CREATE TABLE `teams` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`key` text NOT NULL,
	`name` text NOT NULL,
	`time_zone` text NOT NULL,
	`target_margin_db` real DEFAULT 6 NOT NULL,
	`threshold_db` real DEFAULT 2 NOT NULL,
	`bands` text DEFAULT '[]' NOT NULL,
	`created_at` integer NOT NULL,
	`is_archived` integer DEFAULT false NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `teams_key` ON `teams` (`key`);--> statement-breakpoint
CREATE TABLE `units` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`product_id` integer NOT NULL,
	`serial` text NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`product_id`) REFERENCES `products`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `units_serial` ON `units` (`product_id`,`serial`);--> statement-breakpoint
CREATE TABLE `verdicts` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`build_id` integer NOT NULL,
	`state_id` integer NOT NULL,
	`line` text NOT NULL,
	`detector` text NOT NULL,
	`band` text NOT NULL,
	`verdict` text NOT NULL,
	`is_over_limit` integer NOT NULL,
	`difference_db` real,
	`worst_margin_db` real,
	`worst_frequency_hz` real,
	`judgement` text NOT NULL,
	`method_version` integer NOT NULL,
	`judged_at` integer NOT NULL,
	FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`state_id`) REFERENCES `operating_states`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `verdicts_series` ON `verdicts` (`build_id`,`state_id`,`line`,`detector`,`band`);--> statement-breakpoint
CREATE INDEX `verdicts_verdict` ON `verdicts` (`build_id`,`verdict`);--> statement-breakpoint
CREATE TABLE `worker_beats` (
	`worker` text PRIMARY KEY NOT NULL,
	`started_at` integer NOT NULL,
	`seen_at` integer NOT NULL
);
