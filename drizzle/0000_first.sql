CREATE TABLE `boards` (
	`id` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`revision` int NOT NULL,
	`data` json NOT NULL,
	`created_by` varchar(16) CHARACTER SET ascii COLLATE ascii_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `boards_id_revision_pk` PRIMARY KEY(`id`,`revision`)
);
--> statement-breakpoint
CREATE TABLE `cartons` (
	`id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`client_id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin,
	`note` text NOT NULL,
	`brief` json NOT NULL,
	`construction` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`board` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`row_version` int NOT NULL DEFAULT 1,
	`fingerprint` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`core_version` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`created_by` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`updated_by` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`deleted_at` datetime(3),
	CONSTRAINT `cartons_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `clients` (
	`id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`note` text NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`deleted_at` datetime(3),
	CONSTRAINT `clients_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id_hash` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`public_id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`user_id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`data` json NOT NULL,
	`user_agent` varchar(255) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`last_seen` datetime(3) NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	CONSTRAINT `sessions_id_hash` PRIMARY KEY(`id_hash`),
	CONSTRAINT `sessions_public_id_unique` UNIQUE(`public_id`)
);
--> statement-breakpoint
CREATE TABLE `sign_in_attempts` (
	`id` bigint AUTO_INCREMENT NOT NULL,
	`email` varchar(254) NOT NULL,
	`address` varchar(64) NOT NULL,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `sign_in_attempts_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `templates` (
	`id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`note` text NOT NULL,
	`client_id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin,
	`brief` json NOT NULL,
	`construction` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`board` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`construction_version` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`created_by` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`updated_by` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`deleted_at` datetime(3),
	CONSTRAINT `templates_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `users` (
	`id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`role` enum('owner','designer','finisher','client') NOT NULL,
	`client_id` varchar(16) CHARACTER SET ascii COLLATE ascii_bin,
	`name` varchar(120) NOT NULL,
	`email` varchar(254) NOT NULL,
	`password_hash` varchar(255) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`barred_at` datetime(3),
	CONSTRAINT `users_id` PRIMARY KEY(`id`),
	CONSTRAINT `users_by_email` UNIQUE(`email`),
	CONSTRAINT `users_client_by_role` CHECK((`users`.`role` = 'client') = (`users`.`client_id` is not null))
);
--> statement-breakpoint
ALTER TABLE `boards` ADD CONSTRAINT `boards_created_by_users_id_fk` FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `cartons` ADD CONSTRAINT `cartons_client_id_clients_id_fk` FOREIGN KEY (`client_id`) REFERENCES `clients`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `cartons` ADD CONSTRAINT `cartons_created_by_users_id_fk` FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `cartons` ADD CONSTRAINT `cartons_updated_by_users_id_fk` FOREIGN KEY (`updated_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sessions` ADD CONSTRAINT `sessions_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `templates` ADD CONSTRAINT `templates_client_id_clients_id_fk` FOREIGN KEY (`client_id`) REFERENCES `clients`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `templates` ADD CONSTRAINT `templates_created_by_users_id_fk` FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `templates` ADD CONSTRAINT `templates_updated_by_users_id_fk` FOREIGN KEY (`updated_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `users` ADD CONSTRAINT `users_client_id_clients_id_fk` FOREIGN KEY (`client_id`) REFERENCES `clients`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `cartons_by_client` ON `cartons` (`client_id`,`deleted_at`,`updated_at`);--> statement-breakpoint
CREATE INDEX `cartons_by_change` ON `cartons` (`deleted_at`,`updated_at`);--> statement-breakpoint
CREATE INDEX `clients_by_deletion` ON `clients` (`deleted_at`,`name`);--> statement-breakpoint
CREATE INDEX `sessions_by_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE INDEX `sessions_by_expiry` ON `sessions` (`expires_at`);--> statement-breakpoint
CREATE INDEX `attempts_by_email` ON `sign_in_attempts` (`email`,`at`);--> statement-breakpoint
CREATE INDEX `attempts_by_address` ON `sign_in_attempts` (`address`,`at`);--> statement-breakpoint
CREATE INDEX `templates_by_client` ON `templates` (`client_id`,`deleted_at`,`name`);--> statement-breakpoint
CREATE INDEX `users_by_client` ON `users` (`client_id`);