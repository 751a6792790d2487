CREATE TABLE `fleet_row` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`no` integer,
	`store_id` text NOT NULL,
	`district_id` text NOT NULL,
	`account_id` text NOT NULL,
	`likely` integer NOT NULL,
	`risk_at` integer,
	`truck_from` integer,
	`truck_to` integer,
	`heard_at` integer,
	`warm_since` integer,
	`fitted` integer NOT NULL,
	`words` text NOT NULL,
	`body` text NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`id`) REFERENCES `freezer`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`store_id`) REFERENCES `store`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`district_id`) REFERENCES `district`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`account_id`) REFERENCES `account`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `fleet_row_no_unique` ON `fleet_row` (`no`);--> statement-breakpoint
CREATE INDEX `fleet_row_likely` ON `fleet_row` (`producer_id`,`likely`,`id`);--> statement-breakpoint
CREATE INDEX `fleet_row_district` ON `fleet_row` (`producer_id`,`district_id`,`likely`,`id`);--> statement-breakpoint
CREATE INDEX `fleet_row_account` ON `fleet_row` (`producer_id`,`account_id`,`likely`,`id`);--> statement-breakpoint
CREATE INDEX `fleet_row_store` ON `fleet_row` (`producer_id`,`store_id`,`likely`,`id`);--> statement-breakpoint
CREATE INDEX `fleet_row_standing` ON `fleet_row` (`producer_id`,`district_id`,`account_id`,`store_id`,`risk_at`,`likely`,`truck_from`,`truck_to`,`heard_at`,`warm_since`,`fitted`);--> statement-breakpoint
CREATE TABLE `freezer_day` (
	`id` text NOT NULL,
	`producer_id` text NOT NULL,
	`freezer_id` text NOT NULL,
	`store_id` text NOT NULL,
	`day` text NOT NULL,
	`out_minutes` real NOT NULL,
	`warm_minutes` real NOT NULL,
	`known_minutes` real NOT NULL,
	PRIMARY KEY(`producer_id`, `id`),
	FOREIGN KEY (`producer_id`) REFERENCES `producer`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`freezer_id`) REFERENCES `freezer`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`producer_id`,`store_id`) REFERENCES `store`(`producer_id`,`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `freezer_day_freezer` ON `freezer_day` (`producer_id`,`freezer_id`,`day`);--> statement-breakpoint
CREATE INDEX `freezer_day_store` ON `freezer_day` (`producer_id`,`store_id`,`day`,`out_minutes`,`warm_minutes`,`known_minutes`);--> statement-breakpoint
ALTER TABLE `freezer` ADD `version` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
CREATE INDEX `freezer_model` ON `freezer` (`producer_id`,`model_id`);--> statement-breakpoint
ALTER TABLE `model` ADD `version` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `model` ADD `retired_at` integer;--> statement-breakpoint
ALTER TABLE `product` ADD `version` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `producer` ADD `logo` text;--> statement-breakpoint
ALTER TABLE `producer` ADD `service_hours` text DEFAULT '[]' NOT NULL;--> statement-breakpoint
ALTER TABLE `producer` ADD `holidays` text DEFAULT '[]' NOT NULL;--> statement-breakpoint
ALTER TABLE `producer` ADD `risk_limit` real DEFAULT 0.1 NOT NULL;--> statement-breakpoint
ALTER TABLE `producer` ADD `sender_name` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `producer` ADD `reply_to` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `producer` ADD `version` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `account` ADD `contacts` text DEFAULT '[]' NOT NULL;--> statement-breakpoint
ALTER TABLE `account` ADD `version` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
CREATE INDEX `account_name` ON `account` (`producer_id`,`name`,`id`);--> statement-breakpoint
ALTER TABLE `district` ADD `version` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `store` ADD `urgent_phone` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `store` ADD `version` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
CREATE INDEX `delivery_line_freezer` ON `delivery_line` (`producer_id`,`freezer_id`);--> statement-breakpoint
CREATE INDEX `delivery_line_product` ON `delivery_line` (`producer_id`,`product_id`);--> statement-breakpoint
CREATE INDEX `lane_product` ON `lane` (`producer_id`,`product_id`);--> statement-breakpoint
CREATE INDEX `request_freezer` ON `request` (`producer_id`,`freezer_id`,`opened_at`,`id`);