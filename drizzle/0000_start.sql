CREATE TABLE `delivery` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`store_id` text NOT NULL,
	`at` integer NOT NULL,
	`told_from` integer,
	`told_to` integer,
	`recorded_by` text,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`store_id`) REFERENCES `store`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`recorded_by`) REFERENCES `membership`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `delivery_store` ON `delivery` (`producer_id`,`store_id`,`at`,`id`);--> statement-breakpoint
CREATE TABLE `delivery_line` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`delivery_id` text NOT NULL,
	`freezer_id` text,
	`product_id` text NOT NULL,
	`bags` integer NOT NULL,
	`taken_back` integer DEFAULT 0 NOT NULL,
	`lot` text DEFAULT '' NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`delivery_id`) REFERENCES `delivery`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`freezer_id`) REFERENCES `freezer`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`product_id`) REFERENCES `product`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `delivery_line_delivery` ON `delivery_line` (`producer_id`,`delivery_id`);--> statement-breakpoint
CREATE INDEX `delivery_line_lot` ON `delivery_line` (`producer_id`,`lot`);--> statement-breakpoint
CREATE TABLE `next_truck_load` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`next_truck_id` text NOT NULL,
	`product_id` text NOT NULL,
	`bags` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`next_truck_id`) REFERENCES `next_truck`(`producer_id`,`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`producer_id`,`product_id`) REFERENCES `product`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `next_truck_load_product` ON `next_truck_load` (`producer_id`,`next_truck_id`,`product_id`);--> statement-breakpoint
CREATE TABLE `next_truck` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`store_id` text NOT NULL,
	`day` text NOT NULL,
	`from` integer NOT NULL,
	`to` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`updated_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`store_id`) REFERENCES `store`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `next_truck_store` ON `next_truck` (`producer_id`,`store_id`);--> statement-breakpoint
CREATE INDEX `next_truck_from` ON `next_truck` (`producer_id`,`from`);--> statement-breakpoint
CREATE TABLE `freezer` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`store_id` text NOT NULL,
	`model_id` text NOT NULL,
	`asset_number` text NOT NULL,
	`name` text NOT NULL,
	`placement` text NOT NULL,
	`condition` text DEFAULT '' NOT NULL,
	`channel_drop_in` real NOT NULL,
	`rack_in` real NOT NULL,
	`headroom_in` real NOT NULL,
	`position` integer DEFAULT 0 NOT NULL,
	`retired_at` integer,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`store_id`) REFERENCES `store`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`model_id`) REFERENCES `model`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `freezer_asset` ON `freezer` (`producer_id`,`asset_number`);--> statement-breakpoint
CREATE INDEX `freezer_store` ON `freezer` (`producer_id`,`store_id`,`position`);--> statement-breakpoint
CREATE TABLE `lane` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`freezer_id` text NOT NULL,
	`position` integer NOT NULL,
	`product_id` text NOT NULL,
	`width_share` real NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`freezer_id`) REFERENCES `freezer`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`product_id`) REFERENCES `product`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `lane_position` ON `lane` (`producer_id`,`freezer_id`,`position`);--> statement-breakpoint
CREATE TABLE `model` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`name` text NOT NULL,
	`inside_width_in` real NOT NULL,
	`inside_depth_in` real NOT NULL,
	`inside_height_in` real NOT NULL,
	`doors` integer NOT NULL,
	`rated_pounds` real NOT NULL,
	`defrost` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `model_name` ON `model` (`producer_id`,`name`);--> statement-breakpoint
CREATE TABLE `product` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`name` text NOT NULL,
	`bag_pounds` real NOT NULL,
	`gtin` text,
	`retired_at` integer,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `product_name` ON `product` (`producer_id`,`name`);--> statement-breakpoint
CREATE TABLE `membership_scope` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`membership_id` text NOT NULL,
	`store_id` text,
	`district_id` text,
	`account_id` text,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`membership_id`) REFERENCES `membership`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`store_id`) REFERENCES `store`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`district_id`) REFERENCES `district`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`account_id`) REFERENCES `account`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `membership_scope_membership` ON `membership_scope` (`producer_id`,`membership_id`);--> statement-breakpoint
CREATE INDEX `membership_scope_store` ON `membership_scope` (`producer_id`,`store_id`);--> statement-breakpoint
CREATE TABLE `membership` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`person_id` text NOT NULL,
	`role` text NOT NULL,
	`side` text NOT NULL,
	`grants` text DEFAULT '[]' NOT NULL,
	`deactivated_at` integer,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `membership_person` ON `membership` (`person_id`,`producer_id`);--> statement-breakpoint
CREATE TABLE `person` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`language` text NOT NULL,
	`deactivated_at` integer,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `person_email_unique` ON `person` (`email`);--> statement-breakpoint
CREATE TABLE `session` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text,
	`handle` text NOT NULL,
	`data` text NOT NULL,
	`device` text NOT NULL,
	`created_at` integer NOT NULL,
	`seen_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `session_handle_unique` ON `session` (`handle`);--> statement-breakpoint
CREATE INDEX `session_person` ON `session` (`person_id`);--> statement-breakpoint
CREATE INDEX `session_expires` ON `session` (`expires_at`);--> statement-breakpoint
CREATE TABLE `sign_in_link` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text,
	`token_hash` text NOT NULL,
	`code_hash` text NOT NULL,
	`asker_hash` text NOT NULL,
	`next` text NOT NULL,
	`tries` integer DEFAULT 0 NOT NULL,
	`used_at` integer,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sign_in_link_tokenHash_unique` ON `sign_in_link` (`token_hash`);--> statement-breakpoint
CREATE INDEX `sign_in_link_asker` ON `sign_in_link` (`asker_hash`);--> statement-breakpoint
CREATE INDEX `sign_in_link_expires` ON `sign_in_link` (`expires_at`);--> statement-breakpoint
CREATE TABLE `producer` (
	`id` text PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`name` text NOT NULL,
	`time_zone` text NOT NULL,
	`language` text NOT NULL,
	`urgent_phone` text NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `producer_slug_unique` ON `producer` (`slug`);--> statement-breakpoint
CREATE TABLE `audit_entry` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`seq` integer NOT NULL,
	`at` integer NOT NULL,
	`actor` text NOT NULL,
	`act` text NOT NULL,
	`subject` text NOT NULL,
	`subject_id` text NOT NULL,
	`changes` text NOT NULL,
	`previous_hash` text NOT NULL,
	`hash` text NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `audit_entry_seq` ON `audit_entry` (`producer_id`,`seq`);--> statement-breakpoint
CREATE INDEX `audit_entry_subject` ON `audit_entry` (`producer_id`,`subject`,`subject_id`);--> statement-breakpoint
CREATE TABLE `counter` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`value` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `local_mail` (
	`id` text PRIMARY KEY NOT NULL,
	`to` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`html` text NOT NULL,
	`at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `local_mail_at` ON `local_mail` (`at`);--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`payload` text NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`due_at` integer NOT NULL,
	`done_at` integer,
	`last_error` text,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `outbox_due` ON `outbox` (`done_at`,`due_at`);--> statement-breakpoint
CREATE TABLE `photo` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`request_id` text NOT NULL,
	`file` text NOT NULL,
	`width` integer NOT NULL,
	`height` integer NOT NULL,
	`added_by` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`request_id`) REFERENCES `request`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`added_by`) REFERENCES `membership`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `photo_request` ON `photo` (`producer_id`,`request_id`);--> statement-breakpoint
CREATE TABLE `request_entry` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`request_id` text NOT NULL,
	`at` integer NOT NULL,
	`kind` text NOT NULL,
	`author_id` text,
	`words` text DEFAULT '' NOT NULL,
	`state` text,
	`day` text,
	`assignee_id` text,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`request_id`) REFERENCES `request`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`author_id`) REFERENCES `membership`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`assignee_id`) REFERENCES `membership`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `request_entry_request` ON `request_entry` (`producer_id`,`request_id`,`at`,`id`);--> statement-breakpoint
CREATE TABLE `request` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`number` integer NOT NULL,
	`store_id` text NOT NULL,
	`freezer_id` text,
	`kind` text NOT NULL,
	`words` text NOT NULL,
	`language` text NOT NULL,
	`state` text NOT NULL,
	`assignee_id` text,
	`scheduled_day` text,
	`opened_by` text,
	`version` integer DEFAULT 1 NOT NULL,
	`opened_at` integer NOT NULL,
	`changed_at` integer NOT NULL,
	`ended_at` integer,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`store_id`) REFERENCES `store`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`freezer_id`) REFERENCES `freezer`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`assignee_id`) REFERENCES `membership`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`opened_by`) REFERENCES `membership`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `request_number` ON `request` (`producer_id`,`number`);--> statement-breakpoint
CREATE INDEX `request_opened` ON `request` (`producer_id`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `request_state` ON `request` (`producer_id`,`state`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `request_store` ON `request` (`producer_id`,`store_id`,`opened_at`,`id`);--> statement-breakpoint
CREATE INDEX `request_assignee` ON `request` (`producer_id`,`assignee_id`,`opened_at`,`id`);--> statement-breakpoint
CREATE TABLE `freezer_state` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`at` integer NOT NULL,
	`pounds` real NOT NULL,
	`capacity_pounds` real NOT NULL,
	`share` real NOT NULL,
	`air_f` real,
	`warm_since` integer,
	`run_out_early` integer,
	`run_out_likely` integer,
	`run_out_late` integer,
	`state` text NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`id`) REFERENCES `freezer`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `freezer_state_likely` ON `freezer_state` (`producer_id`,`run_out_likely`,`id`);--> statement-breakpoint
CREATE TABLE `install` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`sensor_id` text NOT NULL,
	`freezer_id` text NOT NULL,
	`probes_in` text NOT NULL,
	`from` integer NOT NULL,
	`to` integer,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`sensor_id`) REFERENCES `sensor`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`freezer_id`) REFERENCES `freezer`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `install_sensor` ON `install` (`producer_id`,`sensor_id`,`from`);--> statement-breakpoint
CREATE INDEX `install_freezer` ON `install` (`producer_id`,`freezer_id`,`from`);--> statement-breakpoint
CREATE TABLE `quarantined_reading` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`serial` text NOT NULL,
	`at` integer,
	`reason` text NOT NULL,
	`body` text NOT NULL,
	`received_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `quarantined_reading_received` ON `quarantined_reading` (`producer_id`,`received_at`);--> statement-breakpoint
CREATE TABLE `reading` (
	`sensor_no` integer NOT NULL,
	`at` integer NOT NULL,
	`probes` text NOT NULL,
	`air_c` real,
	`supply_v` real,
	`conflict` integer DEFAULT false NOT NULL,
	PRIMARY KEY(`sensor_no`, `at`),
	FOREIGN KEY (`sensor_no`) REFERENCES `sensor`(`no`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `sensor` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`no` integer NOT NULL,
	`serial` text NOT NULL,
	`first_heard_at` integer,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sensor_no_unique` ON `sensor` (`no`);--> statement-breakpoint
CREATE UNIQUE INDEX `sensor_serial` ON `sensor` (`producer_id`,`serial`);--> statement-breakpoint
CREATE TABLE `telemetry_key` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`name` text NOT NULL,
	`key_hash` text NOT NULL,
	`last_used_at` integer,
	`revoked_at` integer,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `telemetry_key_keyHash_unique` ON `telemetry_key` (`key_hash`);--> statement-breakpoint
CREATE TABLE `account` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`number` text NOT NULL,
	`name` text NOT NULL,
	`terms` text DEFAULT '' NOT NULL,
	`language` text NOT NULL,
	`retired_at` integer,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `account_number` ON `account` (`producer_id`,`number`);--> statement-breakpoint
CREATE TABLE `district` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`name` text NOT NULL,
	`retired_at` integer,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `district_name` ON `district` (`producer_id`,`name`);--> statement-breakpoint
CREATE TABLE `store` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`account_id` text NOT NULL,
	`district_id` text NOT NULL,
	`name` text NOT NULL,
	`kind` text NOT NULL,
	`street` text NOT NULL,
	`city` text NOT NULL,
	`region` text NOT NULL,
	`postal_code` text NOT NULL,
	`latitude` real NOT NULL,
	`longitude` real NOT NULL,
	`time_zone` text NOT NULL,
	`language` text NOT NULL,
	`phone` text NOT NULL,
	`open_hours` text NOT NULL,
	`receiving_hours` text NOT NULL,
	`delivery_days` text NOT NULL,
	`driver_notes` text DEFAULT '' NOT NULL,
	`retired_at` integer,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`account_id`) REFERENCES `account`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`district_id`) REFERENCES `district`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `store_name` ON `store` (`producer_id`,`name`,`id`);--> statement-breakpoint
CREATE INDEX `store_account` ON `store` (`producer_id`,`account_id`);--> statement-breakpoint
CREATE INDEX `store_district` ON `store` (`producer_id`,`district_id`);