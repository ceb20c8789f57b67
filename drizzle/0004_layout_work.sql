CREATE TABLE `layout_photos` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`step` varchar(16) NOT NULL,
	`file` char(36) NOT NULL,
	`width_px` int unsigned NOT NULL,
	`height_px` int unsigned NOT NULL,
	`bytes` int unsigned NOT NULL,
	`words` varchar(160) NOT NULL DEFAULT '',
	`taken_by` bigint unsigned NOT NULL,
	`device_id` bigint unsigned,
	`taken_at` datetime(3) NOT NULL,
	`client_key` char(36) NOT NULL,
	`removed_at` datetime(3),
	`removed_by` bigint unsigned,
	CONSTRAINT `layout_photos_id` PRIMARY KEY(`id`),
	CONSTRAINT `layout_photos_file` UNIQUE(`file`),
	CONSTRAINT `layout_photos_once` UNIQUE(`shop_id`,`client_key`)
);
--> statement-breakpoint
CREATE TABLE `second_look_waivers` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`choice_id` bigint unsigned NOT NULL,
	`reason` varchar(160) NOT NULL,
	`waived_by` bigint unsigned NOT NULL,
	`waived_at` datetime(3) NOT NULL,
	CONSTRAINT `second_look_waivers_id` PRIMARY KEY(`id`),
	CONSTRAINT `second_look_waivers_choice` UNIQUE(`choice_id`)
);
--> statement-breakpoint
CREATE TABLE `second_looks` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`choice_id` bigint unsigned NOT NULL,
	`drop_id` bigint unsigned NOT NULL,
	`against_id` bigint unsigned NOT NULL,
	`level_check_id` bigint unsigned NOT NULL,
	`client_key` char(36) NOT NULL,
	`station_typed` varchar(40) NOT NULL,
	`offset_typed` varchar(40) NOT NULL,
	`x_mm` decimal(14,6) NOT NULL,
	`y_mm` decimal(14,6) NOT NULL,
	`apart_mm` decimal(14,6) NOT NULL,
	`within_mm` decimal(14,6) NOT NULL,
	`agrees` boolean NOT NULL,
	`taken_by` bigint unsigned NOT NULL,
	`device_id` bigint unsigned,
	`taken_at` datetime(3) NOT NULL,
	`superseded_at` datetime(3),
	`superseded_reason` varchar(160),
	CONSTRAINT `second_looks_id` PRIMARY KEY(`id`),
	CONSTRAINT `second_looks_once` UNIQUE(`shop_id`,`client_key`)
);
--> statement-breakpoint
CREATE TABLE `step_notes` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`step` varchar(16) NOT NULL,
	`words` varchar(400) NOT NULL,
	`written_by` bigint unsigned NOT NULL,
	`written_at` datetime(3) NOT NULL,
	CONSTRAINT `step_notes_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `tack_checks` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`approval_id` bigint unsigned NOT NULL,
	`left_station_typed` varchar(40) NOT NULL,
	`left_offset_typed` varchar(40) NOT NULL,
	`right_station_typed` varchar(40) NOT NULL,
	`right_offset_typed` varchar(40) NOT NULL,
	`left_x_mm` decimal(14,6) NOT NULL,
	`left_y_mm` decimal(14,6) NOT NULL,
	`right_x_mm` decimal(14,6) NOT NULL,
	`right_y_mm` decimal(14,6) NOT NULL,
	`within_mm` decimal(14,6) NOT NULL,
	`passes` boolean NOT NULL,
	`figures` json NOT NULL,
	`made_by` bigint unsigned NOT NULL,
	`device_id` bigint unsigned,
	`made_at` datetime(3) NOT NULL,
	`client_key` char(36) NOT NULL,
	CONSTRAINT `tack_checks_id` PRIMARY KEY(`id`),
	CONSTRAINT `tack_checks_once` UNIQUE(`shop_id`,`client_key`)
);
--> statement-breakpoint
CREATE TABLE `work_items` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`step` enum('weld','finish') NOT NULL,
	`item` varchar(40) NOT NULL,
	`state` enum('pass','fail') NOT NULL,
	`wanted_typed` varchar(40) NOT NULL DEFAULT '',
	`read_typed` varchar(40) NOT NULL DEFAULT '',
	`tool` varchar(80) NOT NULL DEFAULT '',
	`words` varchar(160) NOT NULL DEFAULT '',
	`due_at` datetime(3),
	`signed_by` bigint unsigned NOT NULL,
	`device_id` bigint unsigned,
	`signed_at` datetime(3) NOT NULL,
	`position` smallint unsigned NOT NULL DEFAULT 0,
	CONSTRAINT `work_items_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
ALTER TABLE `springs` ADD `leaf_thickness_mm` decimal(14,6);--> statement-breakpoint
ALTER TABLE `springs` ADD `leaf_thickness_typed` varchar(40);--> statement-breakpoint
ALTER TABLE `springs` ADD `arch_mm` decimal(14,6);--> statement-breakpoint
ALTER TABLE `springs` ADD `arch_typed` varchar(40);--> statement-breakpoint
ALTER TABLE `springs` ADD `rate_n_per_mm` decimal(12,6);--> statement-breakpoint
ALTER TABLE `springs` ADD `bushings` varchar(60) DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `springs` ADD `place` varchar(40) DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `springs` ADD `in_stock` smallint unsigned DEFAULT 2 NOT NULL;--> statement-breakpoint
ALTER TABLE `layout_photos` ADD CONSTRAINT `layout_photos_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layout_photos` ADD CONSTRAINT `layout_photos_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layout_photos` ADD CONSTRAINT `layout_photos_taken_by_people_id_fk` FOREIGN KEY (`taken_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layout_photos` ADD CONSTRAINT `layout_photos_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layout_photos` ADD CONSTRAINT `layout_photos_removed_by_people_id_fk` FOREIGN KEY (`removed_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_look_waivers` ADD CONSTRAINT `second_look_waivers_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_look_waivers` ADD CONSTRAINT `second_look_waivers_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_look_waivers` ADD CONSTRAINT `second_look_waivers_choice_id_choices_id_fk` FOREIGN KEY (`choice_id`) REFERENCES `choices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_look_waivers` ADD CONSTRAINT `second_look_waivers_waived_by_people_id_fk` FOREIGN KEY (`waived_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_looks` ADD CONSTRAINT `second_looks_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_looks` ADD CONSTRAINT `second_looks_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_looks` ADD CONSTRAINT `second_looks_choice_id_choices_id_fk` FOREIGN KEY (`choice_id`) REFERENCES `choices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_looks` ADD CONSTRAINT `second_looks_drop_id_drops_id_fk` FOREIGN KEY (`drop_id`) REFERENCES `drops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_looks` ADD CONSTRAINT `second_looks_against_id_drop_readings_id_fk` FOREIGN KEY (`against_id`) REFERENCES `drop_readings`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_looks` ADD CONSTRAINT `second_looks_level_check_id_level_checks_id_fk` FOREIGN KEY (`level_check_id`) REFERENCES `level_checks`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_looks` ADD CONSTRAINT `second_looks_taken_by_people_id_fk` FOREIGN KEY (`taken_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `second_looks` ADD CONSTRAINT `second_looks_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `step_notes` ADD CONSTRAINT `step_notes_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `step_notes` ADD CONSTRAINT `step_notes_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `step_notes` ADD CONSTRAINT `step_notes_written_by_people_id_fk` FOREIGN KEY (`written_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tack_checks` ADD CONSTRAINT `tack_checks_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tack_checks` ADD CONSTRAINT `tack_checks_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tack_checks` ADD CONSTRAINT `tack_checks_approval_id_approvals_id_fk` FOREIGN KEY (`approval_id`) REFERENCES `approvals`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tack_checks` ADD CONSTRAINT `tack_checks_made_by_people_id_fk` FOREIGN KEY (`made_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tack_checks` ADD CONSTRAINT `tack_checks_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `work_items` ADD CONSTRAINT `work_items_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `work_items` ADD CONSTRAINT `work_items_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `work_items` ADD CONSTRAINT `work_items_signed_by_people_id_fk` FOREIGN KEY (`signed_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `work_items` ADD CONSTRAINT `work_items_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `layout_photos_step` ON `layout_photos` (`layout_id`,`step`);--> statement-breakpoint
CREATE INDEX `second_looks_choice` ON `second_looks` (`choice_id`,`superseded_at`);--> statement-breakpoint
CREATE INDEX `step_notes_layout` ON `step_notes` (`layout_id`,`step`);--> statement-breakpoint
CREATE INDEX `tack_checks_layout` ON `tack_checks` (`layout_id`);--> statement-breakpoint
CREATE INDEX `work_items_layout` ON `work_items` (`layout_id`,`step`,`item`);