CREATE TABLE `audit_events` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`team_id` text,
	`user_id` text,
	`at_utc` integer NOT NULL,
	`action` text NOT NULL,
	`subject_id` text NOT NULL,
	`detail` text NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `audit_events_at` ON `audit_events` (`organisation_id`,`at_utc`);--> statement-breakpoint
CREATE TABLE `memberships` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`role` text NOT NULL,
	`team_id` text,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "memberships_role" CHECK("memberships"."role" in ('owner', 'supervisor', 'staff', 'hr')),
	CONSTRAINT "memberships_team" CHECK(("memberships"."role" in ('owner', 'hr')) = ("memberships"."team_id" is null))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `memberships_once` ON `memberships` (`user_id`,`role`,`team_id`);--> statement-breakpoint
CREATE TABLE `organisations` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`currency` text NOT NULL,
	`locale` text NOT NULL,
	`night_start_minute` integer NOT NULL,
	`night_end_minute` integer NOT NULL,
	`night_percent` integer NOT NULL,
	`weekend_percent` integer NOT NULL,
	`holiday_percent` integer NOT NULL,
	`overtime_percent` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`created_at_utc` integer NOT NULL,
	`last_seen_at_utc` integer NOT NULL,
	`ended_at_utc` integer,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sessions_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE TABLE `teams` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`name` text NOT NULL,
	`zone` text NOT NULL,
	`day_starts_at_minute` integer NOT NULL,
	`period_days` integer NOT NULL,
	`notice_days` integer NOT NULL,
	`rest_minutes` integer NOT NULL,
	`longest_run_days` integer,
	`longest_run_nights` integer,
	`nights_per_period` integer,
	`weekends_per_period` integer,
	`weekend_counts_friday_night` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "teams_period_days" CHECK("teams"."period_days" between 1 and 366),
	CONSTRAINT "teams_rest" CHECK("teams"."rest_minutes" between 0 and 2880)
);
--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`disabled_at_utc` integer,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisations`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email_unique` ON `users` (`email`);--> statement-breakpoint
CREATE TABLE `floor_dates` (
	`floor_id` text NOT NULL,
	`date` text NOT NULL,
	`people` integer NOT NULL,
	`reason` text NOT NULL,
	PRIMARY KEY(`floor_id`, `date`),
	FOREIGN KEY (`floor_id`) REFERENCES `floors`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "floor_dates_people" CHECK("floor_dates"."people" between 0 and 999)
);
--> statement-breakpoint
CREATE TABLE `floor_needs` (
	`floor_id` text NOT NULL,
	`day` integer NOT NULL,
	`people` integer NOT NULL,
	PRIMARY KEY(`floor_id`, `day`),
	FOREIGN KEY (`floor_id`) REFERENCES `floors`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "floor_needs_day" CHECK("floor_needs"."day" between 0 and 7),
	CONSTRAINT "floor_needs_people" CHECK("floor_needs"."people" between 0 and 999)
);
--> statement-breakpoint
CREATE TABLE `floors` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`skill_id` text,
	`start_minute` integer NOT NULL,
	`end_minute` integer NOT NULL,
	`counting` text NOT NULL,
	`price_cents_per_hour` integer,
	`effective_from` text NOT NULL,
	`effective_to` text,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`skill_id`) REFERENCES `skills`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "floors_window" CHECK("floors"."start_minute" between 0 and 1439 and "floors"."end_minute" > "floors"."start_minute" and "floors"."end_minute" - "floors"."start_minute" <= 1440),
	CONSTRAINT "floors_counting" CHECK("floors"."counting" in ('seated', 'shared')),
	CONSTRAINT "floors_price" CHECK("floors"."price_cents_per_hour" is null or "floors"."price_cents_per_hour" >= 0),
	CONSTRAINT "floors_effective" CHECK("floors"."effective_to" is null or "floors"."effective_from" <= "floors"."effective_to")
);
--> statement-breakpoint
CREATE INDEX `floors_team` ON `floors` (`team_id`);--> statement-breakpoint
CREATE TABLE `holidays` (
	`team_id` text NOT NULL,
	`date` text NOT NULL,
	`name` text NOT NULL,
	PRIMARY KEY(`team_id`, `date`),
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `shift_kind_skills` (
	`shift_kind_id` text NOT NULL,
	`skill_id` text NOT NULL,
	PRIMARY KEY(`shift_kind_id`, `skill_id`),
	FOREIGN KEY (`shift_kind_id`) REFERENCES `shift_kinds`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`skill_id`) REFERENCES `skills`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `shift_kinds` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`name` text NOT NULL,
	`letter` text NOT NULL,
	`start_minute` integer NOT NULL,
	`end_minute` integer NOT NULL,
	`unpaid_break_minutes` integer NOT NULL,
	`is_night` integer NOT NULL,
	`is_retired` integer DEFAULT false NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "shift_kinds_window" CHECK("shift_kinds"."start_minute" between 0 and 1439 and "shift_kinds"."end_minute" > "shift_kinds"."start_minute" and "shift_kinds"."end_minute" - "shift_kinds"."start_minute" <= 1440),
	CONSTRAINT "shift_kinds_break" CHECK("shift_kinds"."unpaid_break_minutes" >= 0 and "shift_kinds"."unpaid_break_minutes" < "shift_kinds"."end_minute" - "shift_kinds"."start_minute")
);
--> statement-breakpoint
CREATE UNIQUE INDEX `shift_kinds_name` ON `shift_kinds` (`team_id`,`name`) WHERE "shift_kinds"."is_retired" = 0;--> statement-breakpoint
CREATE UNIQUE INDEX `shift_kinds_letter` ON `shift_kinds` (`team_id`,`letter`) WHERE "shift_kinds"."is_retired" = 0;--> statement-breakpoint
CREATE TABLE `worked_shifts` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`date` text NOT NULL,
	`starts_at_utc` integer NOT NULL,
	`ends_at_utc` integer NOT NULL,
	`paid_minutes` integer NOT NULL,
	`recorded_by` text,
	`reason` text NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`recorded_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "worked_shifts_times" CHECK("worked_shifts"."ends_at_utc" >= "worked_shifts"."starts_at_utc"),
	CONSTRAINT "worked_shifts_paid" CHECK("worked_shifts"."paid_minutes" >= 0)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `worked_shifts_start` ON `worked_shifts` (`person_id`,`starts_at_utc`);--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`person_id` text NOT NULL,
	`version_id` text,
	`recipient` text NOT NULL,
	`subject` text NOT NULL,
	`html` text NOT NULL,
	`plain_text` text NOT NULL,
	`calendar` text,
	`state` text NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_try_at_utc` integer NOT NULL,
	`sent_at_utc` integer,
	`last_error` text,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`version_id`) REFERENCES `roster_versions`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "outbox_state" CHECK("outbox"."state" in ('waiting', 'sent', 'failed')),
	CONSTRAINT "outbox_sent" CHECK(("outbox"."state" = 'sent') = ("outbox"."sent_at_utc" is not null))
);
--> statement-breakpoint
CREATE INDEX `outbox_waiting` ON `outbox` (`state`,`next_try_at_utc`);--> statement-breakpoint
CREATE UNIQUE INDEX `outbox_once` ON `outbox` (`version_id`,`person_id`);--> statement-breakpoint
CREATE TABLE `contracts` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`starts_on` text NOT NULL,
	`ends_on` text,
	`weekly_minutes` integer NOT NULL,
	`under_minutes` integer NOT NULL,
	`overtime_minutes` integer NOT NULL,
	`pay_cents_per_hour` integer NOT NULL,
	`paid_by` text NOT NULL,
	`may_work_nights` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "contracts_dates" CHECK("contracts"."ends_on" is null or "contracts"."starts_on" <= "contracts"."ends_on"),
	CONSTRAINT "contracts_minutes" CHECK("contracts"."weekly_minutes" between 0 and 10080),
	CONSTRAINT "contracts_range" CHECK("contracts"."under_minutes" >= 0 and "contracts"."overtime_minutes" >= 0 and "contracts"."pay_cents_per_hour" >= 0),
	CONSTRAINT "contracts_paid_by" CHECK("contracts"."paid_by" in ('contract', 'hours'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `contracts_start` ON `contracts` (`person_id`,`starts_on`);--> statement-breakpoint
CREATE TABLE `leave` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`starts_on` text NOT NULL,
	`ends_on` text NOT NULL,
	`credit_minutes` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "leave_dates" CHECK("leave"."starts_on" <= "leave"."ends_on"),
	CONSTRAINT "leave_credit" CHECK("leave"."credit_minutes" >= 0)
);
--> statement-breakpoint
CREATE INDEX `leave_person` ON `leave` (`person_id`,`starts_on`);--> statement-breakpoint
CREATE TABLE `people` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`user_id` text,
	`name` text NOT NULL,
	`email` text NOT NULL,
	`staff_number` text NOT NULL,
	`is_active` integer NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `people_userId_unique` ON `people` (`user_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `people_staff_number` ON `people` (`team_id`,`staff_number`);--> statement-breakpoint
CREATE TABLE `person_skills` (
	`person_id` text NOT NULL,
	`skill_id` text NOT NULL,
	`position` integer NOT NULL,
	`expires_on` text,
	PRIMARY KEY(`person_id`, `skill_id`),
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`skill_id`) REFERENCES `skills`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `skills` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`name` text NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `skills_name` ON `skills` (`team_id`,`name`);--> statement-breakpoint
CREATE TABLE `assignments` (
	`id` text PRIMARY KEY NOT NULL,
	`version_id` text NOT NULL,
	`person_id` text NOT NULL,
	`date` text NOT NULL,
	`shift_kind_id` text NOT NULL,
	`skill_id` text NOT NULL,
	`starts_at_utc` integer NOT NULL,
	`ends_at_utc` integer NOT NULL,
	`paid_minutes` integer NOT NULL,
	`is_pinned` integer DEFAULT false NOT NULL,
	FOREIGN KEY (`version_id`) REFERENCES `roster_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`shift_kind_id`) REFERENCES `shift_kinds`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`skill_id`) REFERENCES `skills`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "assignments_times" CHECK("assignments"."ends_at_utc" > "assignments"."starts_at_utc")
);
--> statement-breakpoint
CREATE UNIQUE INDEX `assignments_one_a_day` ON `assignments` (`version_id`,`person_id`,`date`);--> statement-breakpoint
CREATE INDEX `assignments_person` ON `assignments` (`person_id`,`date`);--> statement-breakpoint
CREATE TABLE `confirmations` (
	`version_id` text NOT NULL,
	`person_id` text NOT NULL,
	`confirmed_at_utc` integer NOT NULL,
	PRIMARY KEY(`version_id`, `person_id`),
	FOREIGN KEY (`version_id`) REFERENCES `roster_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `roster_versions` (
	`id` text PRIMARY KEY NOT NULL,
	`roster_id` text NOT NULL,
	`number` integer NOT NULL,
	`published_at_utc` integer,
	`published_by` text,
	`confirm_by` text,
	`run_id` text,
	`proof` text,
	FOREIGN KEY (`roster_id`) REFERENCES `rosters`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`published_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "roster_versions_published" CHECK(("roster_versions"."published_at_utc" is null) = ("roster_versions"."published_by" is null))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `roster_versions_number` ON `roster_versions` (`roster_id`,`number`);--> statement-breakpoint
CREATE UNIQUE INDEX `roster_versions_one_draft` ON `roster_versions` (`roster_id`) WHERE "roster_versions"."published_at_utc" is null;--> statement-breakpoint
CREATE TABLE `rosters` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`starts_on` text NOT NULL,
	`ends_on` text NOT NULL,
	`closed_at_utc` integer,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "rosters_dates" CHECK("rosters"."starts_on" <= "rosters"."ends_on")
);
--> statement-breakpoint
CREATE UNIQUE INDEX `rosters_start` ON `rosters` (`team_id`,`starts_on`);--> statement-breakpoint
CREATE TABLE `run_events` (
	`run_id` text NOT NULL,
	`sequence` integer NOT NULL,
	`elapsed_ms` integer NOT NULL,
	`stage` integer NOT NULL,
	`shortage_minutes` integer,
	`shortage_bound_minutes` integer,
	`best_cost_cents` integer,
	`bound_cents` integer,
	PRIMARY KEY(`run_id`, `sequence`),
	FOREIGN KEY (`run_id`) REFERENCES `runs`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `runs` (
	`id` text PRIMARY KEY NOT NULL,
	`roster_id` text NOT NULL,
	`number` integer NOT NULL,
	`state` text NOT NULL,
	`limit_seconds` integer NOT NULL,
	`started_at_utc` integer NOT NULL,
	`ended_at_utc` integer,
	`started_by` text NOT NULL,
	`problem` text NOT NULL,
	`roster` text,
	`proof` text,
	`bound_cents` integer,
	`shortage_bound_minutes` integer,
	`is_proven_optimal` integer DEFAULT false NOT NULL,
	`failure` text,
	FOREIGN KEY (`roster_id`) REFERENCES `rosters`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`started_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "runs_state" CHECK("runs"."state" in ('running', 'done', 'stopped', 'failed', 'interrupted')),
	CONSTRAINT "runs_ended" CHECK(("runs"."state" = 'running') = ("runs"."ended_at_utc" is null))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `runs_number` ON `runs` (`roster_id`,`number`);--> statement-breakpoint
CREATE TABLE `sizings` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`asked_by` text NOT NULL,
	`asked_at_utc` integer NOT NULL,
	`input` text NOT NULL,
	`problem` text NOT NULL,
	`answer` text NOT NULL,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`asked_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sizings_team` ON `sizings` (`team_id`,`asked_at_utc`);