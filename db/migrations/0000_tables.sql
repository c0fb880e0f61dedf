CREATE TABLE `audit` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`bench_id` char(26) character set ascii collate ascii_bin,
	`circuit_id` char(26) character set ascii collate ascii_bin,
	`actor_id` char(26) character set ascii collate ascii_bin,
	`action` varchar(60) NOT NULL,
	`detail` json NOT NULL,
	`request_id` varchar(40) NOT NULL,
	`at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `audit_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `idempotency` (
	`person_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`key` varchar(100) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`request_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`done` boolean NOT NULL DEFAULT false,
	`status` int,
	`answer` json,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `idempotency_person_id_key_pk` PRIMARY KEY(`person_id`,`key`)
);
--> statement-breakpoint
CREATE TABLE `circuit_checks` (
	`circuit_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`seq` bigint unsigned NOT NULL,
	`stops` int unsigned NOT NULL,
	`cautions` int unsigned NOT NULL,
	`advices` int unsigned NOT NULL,
	`blocked_at` double,
	`content_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`checked_at` datetime(3) NOT NULL,
	CONSTRAINT `circuit_checks_circuit_id` PRIMARY KEY(`circuit_id`)
);
--> statement-breakpoint
CREATE TABLE `circuit_makers` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`circuit_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`person_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`standing` tinyint,
	`since` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	`ended_at` datetime(3),
	CONSTRAINT `circuit_makers_id` PRIMARY KEY(`id`),
	CONSTRAINT `circuit_makers_standing` UNIQUE(`circuit_id`,`person_id`,`standing`)
);
--> statement-breakpoint
CREATE TABLE `circuits` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`bench_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`title` varchar(120) NOT NULL,
	`posted_by` char(26) character set ascii collate ascii_bin NOT NULL,
	`archived_at` datetime(3),
	`changed_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `circuits_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `guest_links` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`circuit_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`token_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`made_by` char(26) character set ascii collate ascii_bin NOT NULL,
	`demo` tinyint NOT NULL DEFAULT 0,
	`expires_at` datetime(3) NOT NULL,
	`ended_at` datetime(3),
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `guest_links_id` PRIMARY KEY(`id`),
	CONSTRAINT `guest_links_token_hash_unique` UNIQUE(`token_hash`)
);
--> statement-breakpoint
CREATE TABLE `benches` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`slug` varchar(60) NOT NULL,
	`name` varchar(120) NOT NULL,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `benches_id` PRIMARY KEY(`id`),
	CONSTRAINT `benches_slug_unique` UNIQUE(`slug`)
);
--> statement-breakpoint
CREATE TABLE `memberships` (
	`bench_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`person_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`role` enum('member','mentor','steward') NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `memberships_bench_id_person_id_pk` PRIMARY KEY(`bench_id`,`person_id`)
);
--> statement-breakpoint
CREATE TABLE `people` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`email` varchar(254) NOT NULL,
	`name` varchar(120) NOT NULL,
	`password_hash` varchar(255) NOT NULL,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `people_id` PRIMARY KEY(`id`),
	CONSTRAINT `people_email_unique` UNIQUE(`email`)
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` char(64) character set ascii collate ascii_bin NOT NULL,
	`user_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`signed_in_at` datetime(3) NOT NULL,
	`ends_at` datetime(3) NOT NULL,
	`last_used_at` datetime(3) NOT NULL,
	`user_agent` varchar(200) NOT NULL DEFAULT '',
	CONSTRAINT `sessions_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `sign_in_delays` (
	`id` char(64) character set ascii collate ascii_bin NOT NULL,
	`failures` int unsigned NOT NULL,
	`wait_until` datetime(3) NOT NULL,
	`last_at` datetime(3) NOT NULL,
	CONSTRAINT `sign_in_delays_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `objections` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`circuit_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`by_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`at` datetime(3) NOT NULL,
	`reason` text NOT NULL,
	`standing` tinyint,
	`lifted_at` datetime(3),
	`lifted_by` char(26) character set ascii collate ascii_bin,
	`override_reason` text,
	CONSTRAINT `objections_id` PRIMARY KEY(`id`),
	CONSTRAINT `objections_standing` UNIQUE(`revision_id`,`by_id`,`standing`)
);
--> statement-breakpoint
CREATE TABLE `sign_offs` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`hold_point` varchar(120) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`content_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`by_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`at` datetime(3) NOT NULL,
	`until` datetime(3) NOT NULL,
	`conditions` text,
	`undetermined` json NOT NULL,
	`standing` tinyint,
	`withdrawn_at` datetime(3),
	`withdrawn_by` char(26) character set ascii collate ascii_bin,
	`withdraw_reason` text,
	CONSTRAINT `sign_offs_id` PRIMARY KEY(`id`),
	CONSTRAINT `sign_offs_standing` UNIQUE(`revision_id`,`hold_point`,`standing`)
);
--> statement-breakpoint
CREATE TABLE `findings` (
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`position` int unsigned NOT NULL,
	`fingerprint` varchar(128) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`rule` varchar(60) NOT NULL,
	`outcome` varchar(20) NOT NULL,
	`severity` varchar(10) NOT NULL,
	`refs` json NOT NULL,
	`from_volts` double,
	`finding` json NOT NULL,
	CONSTRAINT `findings_revision_id_position_pk` PRIMARY KEY(`revision_id`,`position`)
);
--> statement-breakpoint
CREATE TABLE `revision_contributors` (
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`person_id` char(26) character set ascii collate ascii_bin NOT NULL,
	CONSTRAINT `revision_contributors_revision_id_person_id_pk` PRIMARY KEY(`revision_id`,`person_id`)
);
--> statement-breakpoint
CREATE TABLE `revision_hold_points` (
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`position` int unsigned NOT NULL,
	`name` varchar(120) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`scenario` varchar(120) character set utf8mb4 collate utf8mb4_bin,
	`source` varchar(40) character set utf8mb4 collate utf8mb4_bin,
	`volts` double NOT NULL,
	`amps` double NOT NULL,
	`source_known` boolean NOT NULL,
	CONSTRAINT `revision_hold_points_revision_id_position_pk` PRIMARY KEY(`revision_id`,`position`),
	CONSTRAINT `revision_hold_points_name` UNIQUE(`revision_id`,`name`)
);
--> statement-breakpoint
CREATE TABLE `revision_nets` (
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`name` varchar(120) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`given_names` json NOT NULL,
	`facts` json NOT NULL,
	CONSTRAINT `revision_nets_revision_id_name_pk` PRIMARY KEY(`revision_id`,`name`)
);
--> statement-breakpoint
CREATE TABLE `revision_parts` (
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`part_id` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`ref` varchar(40) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`kind` varchar(40) NOT NULL,
	`facts` json NOT NULL,
	CONSTRAINT `revision_parts_revision_id_part_id_pk` PRIMARY KEY(`revision_id`,`part_id`)
);
--> statement-breakpoint
CREATE TABLE `revision_pins` (
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`part_id` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`pin` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`net` varchar(120) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	CONSTRAINT `revision_pins_revision_id_part_id_pin_pk` PRIMARY KEY(`revision_id`,`part_id`,`pin`)
);
--> statement-breakpoint
CREATE TABLE `revision_reviewers` (
	`revision_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`person_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`asked_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `revision_reviewers_revision_id_person_id_pk` PRIMARY KEY(`revision_id`,`person_id`)
);
--> statement-breakpoint
CREATE TABLE `revisions` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`circuit_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`number` int unsigned NOT NULL,
	`letter` char(4) NOT NULL,
	`seq` bigint unsigned NOT NULL,
	`content_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`presentation_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`netlist` json NOT NULL,
	`sheet` longblob NOT NULL,
	`note` text NOT NULL,
	`cut_by` char(26) character set ascii collate ascii_bin NOT NULL,
	`cut_at` datetime(3) NOT NULL,
	`rules` json NOT NULL,
	`asked_at` datetime(3),
	`asked_by` char(26) character set ascii collate ascii_bin,
	CONSTRAINT `revisions_id` PRIMARY KEY(`id`),
	CONSTRAINT `revisions_letter` UNIQUE(`circuit_id`,`letter`),
	CONSTRAINT `revisions_seq` UNIQUE(`circuit_id`,`seq`)
);
--> statement-breakpoint
CREATE TABLE `rt_client` (
	`room_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`client_id` bigint unsigned NOT NULL,
	`person_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `rt_client_room_id_client_id_pk` PRIMARY KEY(`room_id`,`client_id`)
);
--> statement-breakpoint
CREATE TABLE `rt_contributor` (
	`room_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`person_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`first_seq` bigint unsigned NOT NULL,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `rt_contributor_room_id_person_id_pk` PRIMARY KEY(`room_id`,`person_id`)
);
--> statement-breakpoint
CREATE TABLE `rt_instance` (
	`room_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`instance_id` varchar(80) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`person_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`last_client_seq` bigint unsigned NOT NULL DEFAULT 0,
	`last_seq` bigint unsigned NOT NULL DEFAULT 0,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `rt_instance_room_id_instance_id_pk` PRIMARY KEY(`room_id`,`instance_id`)
);
--> statement-breakpoint
CREATE TABLE `rt_room` (
	`room_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`head_seq` bigint unsigned NOT NULL DEFAULT 0,
	`schema_version` int unsigned NOT NULL DEFAULT 1,
	`quarantined_at` datetime(3),
	`quarantine_reason` varchar(500),
	`tombstoned_at` datetime(3),
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `rt_room_room_id` PRIMARY KEY(`room_id`)
);
--> statement-breakpoint
CREATE TABLE `rt_snapshot` (
	`room_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`upto_seq` bigint unsigned NOT NULL,
	`part` smallint unsigned NOT NULL,
	`parts` smallint unsigned NOT NULL,
	`bytes` mediumblob NOT NULL,
	`sha256` char(64) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `rt_snapshot_room_id_upto_seq_part_pk` PRIMARY KEY(`room_id`,`upto_seq`,`part`)
);
--> statement-breakpoint
CREATE TABLE `rt_ticket` (
	`token_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`room_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`person_id` char(26) character set ascii collate ascii_bin,
	`session_id` varchar(64) character set utf8mb4 collate utf8mb4_bin,
	`guest_link_id` char(26) character set ascii collate ascii_bin,
	`grant_version` varchar(80) NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`used_at` datetime(3),
	CONSTRAINT `rt_ticket_token_hash` PRIMARY KEY(`token_hash`)
);
--> statement-breakpoint
CREATE TABLE `rt_update` (
	`room_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`seq` bigint unsigned NOT NULL,
	`instance_id` varchar(80) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`client_seq` bigint unsigned NOT NULL,
	`actor_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`session_id` varchar(64) character set utf8mb4 collate utf8mb4_bin,
	`electrical` boolean NOT NULL,
	`bytes` mediumblob NOT NULL,
	`sha256` char(64) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL DEFAULT current_timestamp(3),
	CONSTRAINT `rt_update_room_id_seq_pk` PRIMARY KEY(`room_id`,`seq`),
	CONSTRAINT `rt_update_client` UNIQUE(`room_id`,`instance_id`,`client_seq`)
);
--> statement-breakpoint
CREATE TABLE `messages` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`thread_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`by_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`at` datetime(3) NOT NULL,
	`body` text NOT NULL,
	`edited_at` datetime(3),
	CONSTRAINT `messages_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `threads` (
	`id` char(26) character set ascii collate ascii_bin NOT NULL,
	`circuit_id` char(26) character set ascii collate ascii_bin NOT NULL,
	`anchor` json NOT NULL,
	`must_answer` boolean NOT NULL,
	`status` enum('open','answered','resolved') NOT NULL,
	`opened_by` char(26) character set ascii collate ascii_bin NOT NULL,
	`opened_at` datetime(3) NOT NULL,
	`revision_id` char(26) character set ascii collate ascii_bin,
	`resolved_by` char(26) character set ascii collate ascii_bin,
	`resolved_at` datetime(3),
	CONSTRAINT `threads_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
ALTER TABLE `audit` ADD CONSTRAINT `audit_bench_id_benches_id_fk` FOREIGN KEY (`bench_id`) REFERENCES `benches`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `audit` ADD CONSTRAINT `audit_actor_id_people_id_fk` FOREIGN KEY (`actor_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `idempotency` ADD CONSTRAINT `idempotency_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `circuit_checks` ADD CONSTRAINT `circuit_checks_circuit_id_circuits_id_fk` FOREIGN KEY (`circuit_id`) REFERENCES `circuits`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `circuit_makers` ADD CONSTRAINT `circuit_makers_circuit_id_circuits_id_fk` FOREIGN KEY (`circuit_id`) REFERENCES `circuits`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `circuit_makers` ADD CONSTRAINT `circuit_makers_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `circuits` ADD CONSTRAINT `circuits_bench_id_benches_id_fk` FOREIGN KEY (`bench_id`) REFERENCES `benches`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `circuits` ADD CONSTRAINT `circuits_posted_by_people_id_fk` FOREIGN KEY (`posted_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `guest_links` ADD CONSTRAINT `guest_links_circuit_id_circuits_id_fk` FOREIGN KEY (`circuit_id`) REFERENCES `circuits`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `guest_links` ADD CONSTRAINT `guest_links_made_by_people_id_fk` FOREIGN KEY (`made_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `memberships` ADD CONSTRAINT `memberships_bench_id_benches_id_fk` FOREIGN KEY (`bench_id`) REFERENCES `benches`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `memberships` ADD CONSTRAINT `memberships_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sessions` ADD CONSTRAINT `sessions_user_id_people_id_fk` FOREIGN KEY (`user_id`) REFERENCES `people`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `objections` ADD CONSTRAINT `objections_circuit_id_circuits_id_fk` FOREIGN KEY (`circuit_id`) REFERENCES `circuits`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `objections` ADD CONSTRAINT `objections_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `objections` ADD CONSTRAINT `objections_by_id_people_id_fk` FOREIGN KEY (`by_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `objections` ADD CONSTRAINT `objections_lifted_by_people_id_fk` FOREIGN KEY (`lifted_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sign_offs` ADD CONSTRAINT `sign_offs_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sign_offs` ADD CONSTRAINT `sign_offs_by_id_people_id_fk` FOREIGN KEY (`by_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sign_offs` ADD CONSTRAINT `sign_offs_withdrawn_by_people_id_fk` FOREIGN KEY (`withdrawn_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `findings` ADD CONSTRAINT `findings_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revision_contributors` ADD CONSTRAINT `revision_contributors_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revision_contributors` ADD CONSTRAINT `revision_contributors_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revision_hold_points` ADD CONSTRAINT `revision_hold_points_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revision_nets` ADD CONSTRAINT `revision_nets_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revision_parts` ADD CONSTRAINT `revision_parts_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revision_pins` ADD CONSTRAINT `revision_pins_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revision_reviewers` ADD CONSTRAINT `revision_reviewers_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revision_reviewers` ADD CONSTRAINT `revision_reviewers_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revisions` ADD CONSTRAINT `revisions_circuit_id_circuits_id_fk` FOREIGN KEY (`circuit_id`) REFERENCES `circuits`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revisions` ADD CONSTRAINT `revisions_cut_by_people_id_fk` FOREIGN KEY (`cut_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `revisions` ADD CONSTRAINT `revisions_asked_by_people_id_fk` FOREIGN KEY (`asked_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `messages` ADD CONSTRAINT `messages_thread_id_threads_id_fk` FOREIGN KEY (`thread_id`) REFERENCES `threads`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `messages` ADD CONSTRAINT `messages_by_id_people_id_fk` FOREIGN KEY (`by_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `threads` ADD CONSTRAINT `threads_circuit_id_circuits_id_fk` FOREIGN KEY (`circuit_id`) REFERENCES `circuits`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `threads` ADD CONSTRAINT `threads_opened_by_people_id_fk` FOREIGN KEY (`opened_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `threads` ADD CONSTRAINT `threads_revision_id_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `revisions`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `threads` ADD CONSTRAINT `threads_resolved_by_people_id_fk` FOREIGN KEY (`resolved_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `audit_bench` ON `audit` (`bench_id`,`id`);--> statement-breakpoint
CREATE INDEX `audit_circuit` ON `audit` (`circuit_id`,`id`);--> statement-breakpoint
CREATE INDEX `idempotency_created` ON `idempotency` (`created_at`);--> statement-breakpoint
CREATE INDEX `circuit_makers_person` ON `circuit_makers` (`person_id`);--> statement-breakpoint
CREATE INDEX `circuits_bench` ON `circuits` (`bench_id`,`changed_at`);--> statement-breakpoint
CREATE INDEX `memberships_person` ON `memberships` (`person_id`);--> statement-breakpoint
CREATE INDEX `sessions_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE INDEX `sign_in_delays_last` ON `sign_in_delays` (`last_at`);--> statement-breakpoint
CREATE INDEX `objections_circuit` ON `objections` (`circuit_id`,`standing`);--> statement-breakpoint
CREATE INDEX `findings_outcome` ON `findings` (`revision_id`,`outcome`,`severity`);--> statement-breakpoint
CREATE INDEX `revision_parts_ref` ON `revision_parts` (`revision_id`,`ref`);--> statement-breakpoint
CREATE INDEX `revision_pins_net` ON `revision_pins` (`revision_id`,`net`);--> statement-breakpoint
CREATE INDEX `rt_ticket_expiry` ON `rt_ticket` (`expires_at`);--> statement-breakpoint
CREATE INDEX `messages_thread` ON `messages` (`thread_id`);--> statement-breakpoint
CREATE INDEX `threads_circuit` ON `threads` (`circuit_id`,`status`);