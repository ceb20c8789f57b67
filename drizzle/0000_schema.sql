CREATE TABLE `bays` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`number` smallint unsigned NOT NULL,
	`kind` enum('level-pad','lift','weld','general','apron') NOT NULL,
	`x_mm` decimal(14,6) NOT NULL,
	`y_mm` decimal(14,6) NOT NULL,
	`length_mm` decimal(14,6) NOT NULL,
	`width_mm` decimal(14,6) NOT NULL,
	`mouth` enum('east','west','north','south') NOT NULL,
	`rated_for_layout` boolean NOT NULL DEFAULT false,
	`outside` boolean NOT NULL DEFAULT false,
	CONSTRAINT `bays_id` PRIMARY KEY(`id`),
	CONSTRAINT `bays_number` UNIQUE(`shop_id`,`number`)
);
--> statement-breakpoint
CREATE TABLE `buildings` (
	`shop_id` bigint unsigned NOT NULL,
	`length_mm` decimal(14,6) NOT NULL,
	`width_mm` decimal(14,6) NOT NULL,
	CONSTRAINT `buildings_shop_id` PRIMARY KEY(`shop_id`)
);
--> statement-breakpoint
CREATE TABLE `control_marks` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`bay_id` bigint unsigned NOT NULL,
	`label` varchar(2) NOT NULL,
	`x_mm` decimal(14,6) NOT NULL,
	`y_mm` decimal(14,6) NOT NULL,
	CONSTRAINT `control_marks_id` PRIMARY KEY(`id`),
	CONSTRAINT `control_marks_label` UNIQUE(`bay_id`,`label`)
);
--> statement-breakpoint
CREATE TABLE `builds` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`vehicle_id` bigint unsigned NOT NULL,
	`state` enum('here','gone') NOT NULL DEFAULT 'here',
	`wanted` text NOT NULL,
	`tyre_typed` varchar(40),
	`loaded_radius_mm` decimal(14,6),
	`loaded_radius_typed` varchar(40),
	`tyre_radius_mm` decimal(14,6),
	`tyre_radius_typed` varchar(40),
	`tyre_width_mm` decimal(14,6),
	`tyre_width_typed` varchar(40),
	`wheelbase_mm` decimal(14,6),
	`wheelbase_typed` varchar(40),
	`approach_asked_deg` smallint unsigned,
	`promised_at` datetime(3),
	`estimate_cents` int unsigned,
	`booked_in_by` bigint unsigned NOT NULL,
	`booked_in_at` datetime(3) NOT NULL,
	`left_at` datetime(3),
	CONSTRAINT `builds_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `customers` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`name` varchar(80) NOT NULL,
	`phone` varchar(40) NOT NULL DEFAULT '',
	`email` varchar(190) NOT NULL DEFAULT '',
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `customers_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `holds` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`build_id` bigint unsigned NOT NULL,
	`kind` enum('parts','customer','level-void','safety') NOT NULL,
	`words` varchar(160) NOT NULL,
	`due_at` datetime(3),
	`placed_by` bigint unsigned NOT NULL,
	`placed_at` datetime(3) NOT NULL,
	`lifted_at` datetime(3),
	`lifted_by` bigint unsigned,
	CONSTRAINT `holds_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `stage_bay_kinds` (
	`shop_id` bigint unsigned NOT NULL,
	`stage_id` bigint unsigned NOT NULL,
	`kind` enum('level-pad','lift','weld','general','apron') NOT NULL,
	CONSTRAINT `stage_bay_kinds_once` UNIQUE(`stage_id`,`kind`)
);
--> statement-breakpoint
CREATE TABLE `stages` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`build_id` bigint unsigned NOT NULL,
	`position` smallint unsigned NOT NULL,
	`kind` enum('strip','level','layout','approval','mock-up','tack','weld','fit','torque','road-test','hand-over') NOT NULL,
	`hours` decimal(6,2) NOT NULL,
	`skill` enum('strip','level','layout','fabricate','weld','torque','brakes'),
	`heads` smallint unsigned NOT NULL DEFAULT 1,
	`stay` varchar(1),
	`state` enum('open','under-way','done') NOT NULL DEFAULT 'open',
	`pieces_done` smallint unsigned,
	`pieces_of` smallint unsigned,
	`pieces_word` varchar(20),
	`started_at` datetime(3),
	`finished_at` datetime(3),
	CONSTRAINT `stages_id` PRIMARY KEY(`id`),
	CONSTRAINT `stages_position` UNIQUE(`build_id`,`position`)
);
--> statement-breakpoint
CREATE TABLE `tags` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`vehicle_id` bigint unsigned NOT NULL,
	`code` varchar(8) NOT NULL,
	`issued_at` datetime(3) NOT NULL,
	`replaced_at` datetime(3),
	CONSTRAINT `tags_id` PRIMARY KEY(`id`),
	CONSTRAINT `tags_code` UNIQUE(`shop_id`,`code`)
);
--> statement-breakpoint
CREATE TABLE `vehicles` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`customer_id` bigint unsigned NOT NULL,
	`kind` enum('short-bed-pickup','long-bed-pickup','crew-pickup','flatbed','two-door-utility','wagon','open-top','buggy','bare-chassis') NOT NULL,
	`nickname` varchar(24) NOT NULL,
	`length_mm` decimal(14,6) NOT NULL,
	`length_typed` varchar(40) NOT NULL,
	`width_mm` decimal(14,6) NOT NULL,
	`width_typed` varchar(40) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `vehicles_id` PRIMARY KEY(`id`),
	CONSTRAINT `vehicles_length` CHECK(`vehicles`.`length_mm` between 500 and 30000),
	CONSTRAINT `vehicles_width` CHECK(`vehicles`.`width_mm` between 300 and 5000)
);
--> statement-breakpoint
CREATE TABLE `placements` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`build_id` bigint unsigned NOT NULL,
	`bay_id` bigint unsigned,
	`from_at` datetime(3) NOT NULL,
	`until_at` datetime(3) NOT NULL,
	`moved_by` bigint unsigned NOT NULL,
	CONSTRAINT `placements_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `spells` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`person_id` bigint unsigned NOT NULL,
	`build_id` bigint unsigned NOT NULL,
	`from_at` datetime(3) NOT NULL,
	`until_at` datetime(3) NOT NULL,
	CONSTRAINT `spells_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `stint_crew` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`stint_id` bigint unsigned NOT NULL,
	`person_id` bigint unsigned NOT NULL,
	`starts_at` datetime(3) NOT NULL,
	`ends_at` datetime(3) NOT NULL,
	CONSTRAINT `stint_crew_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `stints` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`stage_id` bigint unsigned NOT NULL,
	`bay_id` bigint unsigned,
	`starts_at` datetime(3) NOT NULL,
	`ends_at` datetime(3) NOT NULL,
	`state` enum('planned','cancelled') NOT NULL DEFAULT 'planned',
	CONSTRAINT `stints_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `journal` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`revision` bigint unsigned NOT NULL,
	`at` datetime(3) NOT NULL,
	`person_id` bigint unsigned,
	`device_id` bigint unsigned,
	`verb` varchar(40) NOT NULL,
	`subject_kind` varchar(24) NOT NULL,
	`subject_id` bigint unsigned NOT NULL,
	`words` varchar(240) NOT NULL,
	`before` json,
	`after` json,
	`touches` json NOT NULL,
	CONSTRAINT `journal_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `approvals` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`choice_id` bigint unsigned NOT NULL,
	`sheet_revision` int unsigned NOT NULL,
	`approved_by` bigint unsigned NOT NULL,
	`approved_at` datetime(3) NOT NULL,
	`voided_at` datetime(3),
	`void_reason` varchar(160),
	CONSTRAINT `approvals_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `choices` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`spring_id` bigint unsigned NOT NULL,
	`hole_id` bigint unsigned NOT NULL,
	`turned` boolean NOT NULL,
	`level_check_id` bigint unsigned NOT NULL,
	`axle_station_mm` decimal(14,6) NOT NULL,
	`figures` json NOT NULL,
	`chosen_by` bigint unsigned NOT NULL,
	`chosen_at` datetime(3) NOT NULL,
	`dropped_at` datetime(3),
	CONSTRAINT `choices_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `drop_readings` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`drop_id` bigint unsigned NOT NULL,
	`level_check_id` bigint unsigned NOT NULL,
	`client_key` char(36) NOT NULL,
	`method` enum('offset','ties') NOT NULL,
	`station_typed` varchar(40),
	`offset_typed` varchar(40),
	`x_mm` decimal(14,6) NOT NULL,
	`y_mm` decimal(14,6) NOT NULL,
	`height_mm` decimal(14,6),
	`height_typed` varchar(40),
	`suspect` boolean NOT NULL DEFAULT false,
	`checked` boolean NOT NULL DEFAULT true,
	`reason` varchar(160),
	`taken_by` bigint unsigned NOT NULL,
	`device_id` bigint unsigned,
	`taken_at` datetime(3) NOT NULL,
	`superseded_at` datetime(3),
	CONSTRAINT `drop_readings_id` PRIMARY KEY(`id`),
	CONSTRAINT `drop_readings_once` UNIQUE(`shop_id`,`client_key`)
);
--> statement-breakpoint
CREATE TABLE `drops` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`point` varchar(24) NOT NULL,
	`side` enum('left','right','centre') NOT NULL,
	CONSTRAINT `drops_id` PRIMARY KEY(`id`),
	CONSTRAINT `drops_point` UNIQUE(`layout_id`,`point`,`side`)
);
--> statement-breakpoint
CREATE TABLE `layouts` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`build_id` bigint unsigned NOT NULL,
	`kind` enum('front-leaf') NOT NULL,
	`fixed_eye` enum('ahead','behind') NOT NULL,
	`bay_id` bigint unsigned NOT NULL,
	`hanger_id` bigint unsigned NOT NULL,
	`started_by` bigint unsigned NOT NULL,
	`started_at` datetime(3) NOT NULL,
	`stands_at` datetime(3),
	`stands_by` bigint unsigned,
	`marks_at` datetime(3),
	`marks_by` bigint unsigned,
	`marks_taped_mm` decimal(14,6),
	`marks_taped_typed` varchar(40),
	`axle_method` enum('square','through-centres','asked'),
	`axle_asked_mm` decimal(14,6),
	`axle_asked_typed` varchar(40),
	`axle_at` datetime(3),
	`axle_by` bigint unsigned,
	`sheet_revision` int unsigned NOT NULL DEFAULT 0,
	CONSTRAINT `layouts_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `level_checks` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`layout_id` bigint unsigned NOT NULL,
	`bay_id` bigint unsigned NOT NULL,
	`method` enum('heights','gauge') NOT NULL,
	`nose_high_deg` decimal(10,6) NOT NULL,
	`right_high_deg` decimal(10,6) NOT NULL,
	`twist_mm` decimal(14,6),
	`twist_deg` decimal(10,6),
	`allowed_deg` decimal(10,6) NOT NULL,
	`is_true` boolean NOT NULL,
	`made_by` bigint unsigned NOT NULL,
	`made_at` datetime(3) NOT NULL,
	`voided_at` datetime(3),
	`voided_by` bigint unsigned,
	`void_reason` varchar(160),
	`carries_id` bigint unsigned,
	`carry_off_mm` decimal(14,6),
	CONSTRAINT `level_checks_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `level_readings` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`level_check_id` bigint unsigned NOT NULL,
	`place` varchar(20) NOT NULL,
	`x_mm` decimal(14,6),
	`y_mm` decimal(14,6),
	`x_typed` varchar(40),
	`y_typed` varchar(40),
	`height_mm` decimal(14,6),
	`height_typed` varchar(40),
	`first_deg` decimal(10,6),
	`turned_deg` decimal(10,6),
	CONSTRAINT `level_readings_id` PRIMARY KEY(`id`),
	CONSTRAINT `level_readings_place` UNIQUE(`level_check_id`,`place`)
);
--> statement-breakpoint
CREATE TABLE `tie_readings` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`reading_id` bigint unsigned NOT NULL,
	`mark` varchar(2) NOT NULL,
	`distance_mm` decimal(14,6) NOT NULL,
	`distance_typed` varchar(40) NOT NULL,
	CONSTRAINT `tie_readings_id` PRIMARY KEY(`id`),
	CONSTRAINT `tie_readings_mark` UNIQUE(`reading_id`,`mark`)
);
--> statement-breakpoint
CREATE TABLE `device_pairings` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned,
	`code_hash` char(64) NOT NULL,
	`claim_hash` char(64) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`device_id` bigint unsigned,
	`collected_at` datetime(3),
	CONSTRAINT `device_pairings_id` PRIMARY KEY(`id`),
	CONSTRAINT `pairings_code` UNIQUE(`code_hash`),
	CONSTRAINT `pairings_claim` UNIQUE(`claim_hash`)
);
--> statement-breakpoint
CREATE TABLE `devices` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`kind` enum('wall','post') NOT NULL,
	`name` varchar(60) NOT NULL,
	`paired_by` bigint unsigned NOT NULL,
	`paired_at` datetime(3) NOT NULL,
	`revoked_at` datetime(3),
	CONSTRAINT `devices_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `people` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`name` varchar(80) NOT NULL,
	`initials` varchar(3) NOT NULL,
	`role` enum('owner','foreman','tech','counter') NOT NULL,
	`email` varchar(190),
	`password_hash` varchar(100),
	`away_until` datetime(3),
	`left_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `people_id` PRIMARY KEY(`id`),
	CONSTRAINT `people_email` UNIQUE(`email`)
);
--> statement-breakpoint
CREATE TABLE `person_skills` (
	`shop_id` bigint unsigned NOT NULL,
	`person_id` bigint unsigned NOT NULL,
	`skill` enum('strip','level','layout','fabricate','weld','torque','brakes') NOT NULL,
	`expires_at` datetime(3),
	CONSTRAINT `person_skills_person_id_skill_pk` PRIMARY KEY(`person_id`,`skill`)
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id_hash` char(64) NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`person_id` bigint unsigned,
	`device_id` bigint unsigned,
	`created_at` datetime(3) NOT NULL,
	`last_seen_at` datetime(3) NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`ended_at` datetime(3),
	`user_agent` varchar(200) NOT NULL DEFAULT '',
	`remember` boolean NOT NULL DEFAULT false,
	CONSTRAINT `sessions_id_hash` PRIMARY KEY(`id_hash`)
);
--> statement-breakpoint
CREATE TABLE `sign_in_failures` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`account_hash` char(64) NOT NULL,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `sign_in_failures_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `shop_revisions` (
	`shop_id` bigint unsigned NOT NULL,
	`revision` bigint unsigned NOT NULL DEFAULT 0,
	CONSTRAINT `shop_revisions_shop_id` PRIMARY KEY(`shop_id`)
);
--> statement-breakpoint
CREATE TABLE `shop_settings` (
	`shop_id` bigint unsigned NOT NULL,
	`time_zone` varchar(64) NOT NULL,
	`unit` enum('in','mm') NOT NULL DEFAULT 'in',
	`allowed_slope_deg` decimal(10,6) NOT NULL,
	`shim_mm` decimal(14,6) NOT NULL,
	`redrop_tolerance_mm` decimal(14,6) NOT NULL,
	`mark_tolerance_mm` decimal(14,6) NOT NULL,
	`tape_sigma_mm` decimal(14,6) NOT NULL,
	`drop_sigma_mm` decimal(14,6) NOT NULL,
	`spring_sigma_mm` decimal(14,6) NOT NULL,
	CONSTRAINT `shop_settings_shop_id` PRIMARY KEY(`shop_id`)
);
--> statement-breakpoint
CREATE TABLE `shops` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`name` varchar(80) NOT NULL,
	`is_demo` boolean NOT NULL DEFAULT false,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `shops_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `hanger_holes` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`hanger_id` bigint unsigned NOT NULL,
	`number` smallint unsigned NOT NULL,
	`ahead_mm` decimal(14,6) NOT NULL,
	`ahead_typed` varchar(40) NOT NULL,
	CONSTRAINT `hanger_holes_id` PRIMARY KEY(`id`),
	CONSTRAINT `hanger_holes_number` UNIQUE(`hanger_id`,`number`)
);
--> statement-breakpoint
CREATE TABLE `hangers` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`name` varchar(60) NOT NULL,
	CONSTRAINT `hangers_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `springs` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`shop_id` bigint unsigned NOT NULL,
	`rack_number` smallint unsigned NOT NULL,
	`length_mm` decimal(14,6) NOT NULL,
	`length_typed` varchar(40) NOT NULL,
	`front_half_mm` decimal(14,6) NOT NULL,
	`front_half_typed` varchar(40) NOT NULL,
	`leaves` smallint unsigned NOT NULL,
	`leaf_width_mm` decimal(14,6) NOT NULL,
	`leaf_width_typed` varchar(40) NOT NULL,
	`note` varchar(120) NOT NULL DEFAULT '',
	`added_at` datetime(3) NOT NULL,
	`taken_out_at` datetime(3),
	CONSTRAINT `springs_id` PRIMARY KEY(`id`),
	CONSTRAINT `springs_rack_number` UNIQUE(`shop_id`,`rack_number`),
	CONSTRAINT `springs_half` CHECK(`springs`.`front_half_mm` > 0 and `springs`.`front_half_mm` < `springs`.`length_mm`)
);
--> statement-breakpoint
ALTER TABLE `bays` ADD CONSTRAINT `bays_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `buildings` ADD CONSTRAINT `buildings_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `control_marks` ADD CONSTRAINT `control_marks_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `control_marks` ADD CONSTRAINT `control_marks_bay_id_bays_id_fk` FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `builds` ADD CONSTRAINT `builds_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `builds` ADD CONSTRAINT `builds_vehicle_id_vehicles_id_fk` FOREIGN KEY (`vehicle_id`) REFERENCES `vehicles`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `builds` ADD CONSTRAINT `builds_booked_in_by_people_id_fk` FOREIGN KEY (`booked_in_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `customers` ADD CONSTRAINT `customers_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `holds` ADD CONSTRAINT `holds_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `holds` ADD CONSTRAINT `holds_build_id_builds_id_fk` FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `holds` ADD CONSTRAINT `holds_placed_by_people_id_fk` FOREIGN KEY (`placed_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `holds` ADD CONSTRAINT `holds_lifted_by_people_id_fk` FOREIGN KEY (`lifted_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stage_bay_kinds` ADD CONSTRAINT `stage_bay_kinds_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stage_bay_kinds` ADD CONSTRAINT `stage_bay_kinds_stage_id_stages_id_fk` FOREIGN KEY (`stage_id`) REFERENCES `stages`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stages` ADD CONSTRAINT `stages_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stages` ADD CONSTRAINT `stages_build_id_builds_id_fk` FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tags` ADD CONSTRAINT `tags_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tags` ADD CONSTRAINT `tags_vehicle_id_vehicles_id_fk` FOREIGN KEY (`vehicle_id`) REFERENCES `vehicles`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `vehicles` ADD CONSTRAINT `vehicles_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `vehicles` ADD CONSTRAINT `vehicles_customer_id_customers_id_fk` FOREIGN KEY (`customer_id`) REFERENCES `customers`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `placements` ADD CONSTRAINT `placements_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `placements` ADD CONSTRAINT `placements_build_id_builds_id_fk` FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `placements` ADD CONSTRAINT `placements_bay_id_bays_id_fk` FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `placements` ADD CONSTRAINT `placements_moved_by_people_id_fk` FOREIGN KEY (`moved_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `spells` ADD CONSTRAINT `spells_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `spells` ADD CONSTRAINT `spells_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `spells` ADD CONSTRAINT `spells_build_id_builds_id_fk` FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stint_crew` ADD CONSTRAINT `stint_crew_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stint_crew` ADD CONSTRAINT `stint_crew_stint_id_stints_id_fk` FOREIGN KEY (`stint_id`) REFERENCES `stints`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stint_crew` ADD CONSTRAINT `stint_crew_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stints` ADD CONSTRAINT `stints_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stints` ADD CONSTRAINT `stints_stage_id_stages_id_fk` FOREIGN KEY (`stage_id`) REFERENCES `stages`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stints` ADD CONSTRAINT `stints_bay_id_bays_id_fk` FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `journal` ADD CONSTRAINT `journal_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `journal` ADD CONSTRAINT `journal_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `journal` ADD CONSTRAINT `journal_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `approvals` ADD CONSTRAINT `approvals_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `approvals` ADD CONSTRAINT `approvals_choice_id_choices_id_fk` FOREIGN KEY (`choice_id`) REFERENCES `choices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `approvals` ADD CONSTRAINT `approvals_approved_by_people_id_fk` FOREIGN KEY (`approved_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `choices` ADD CONSTRAINT `choices_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `choices` ADD CONSTRAINT `choices_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `choices` ADD CONSTRAINT `choices_spring_id_springs_id_fk` FOREIGN KEY (`spring_id`) REFERENCES `springs`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `choices` ADD CONSTRAINT `choices_hole_id_hanger_holes_id_fk` FOREIGN KEY (`hole_id`) REFERENCES `hanger_holes`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `choices` ADD CONSTRAINT `choices_level_check_id_level_checks_id_fk` FOREIGN KEY (`level_check_id`) REFERENCES `level_checks`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `choices` ADD CONSTRAINT `choices_chosen_by_people_id_fk` FOREIGN KEY (`chosen_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `drop_readings` ADD CONSTRAINT `drop_readings_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `drop_readings` ADD CONSTRAINT `drop_readings_drop_id_drops_id_fk` FOREIGN KEY (`drop_id`) REFERENCES `drops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `drop_readings` ADD CONSTRAINT `drop_readings_level_check_id_level_checks_id_fk` FOREIGN KEY (`level_check_id`) REFERENCES `level_checks`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `drop_readings` ADD CONSTRAINT `drop_readings_taken_by_people_id_fk` FOREIGN KEY (`taken_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `drop_readings` ADD CONSTRAINT `drop_readings_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `drops` ADD CONSTRAINT `drops_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `drops` ADD CONSTRAINT `drops_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layouts` ADD CONSTRAINT `layouts_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layouts` ADD CONSTRAINT `layouts_build_id_builds_id_fk` FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layouts` ADD CONSTRAINT `layouts_bay_id_bays_id_fk` FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layouts` ADD CONSTRAINT `layouts_hanger_id_hangers_id_fk` FOREIGN KEY (`hanger_id`) REFERENCES `hangers`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layouts` ADD CONSTRAINT `layouts_started_by_people_id_fk` FOREIGN KEY (`started_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layouts` ADD CONSTRAINT `layouts_stands_by_people_id_fk` FOREIGN KEY (`stands_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layouts` ADD CONSTRAINT `layouts_marks_by_people_id_fk` FOREIGN KEY (`marks_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `layouts` ADD CONSTRAINT `layouts_axle_by_people_id_fk` FOREIGN KEY (`axle_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `level_checks` ADD CONSTRAINT `level_checks_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `level_checks` ADD CONSTRAINT `level_checks_layout_id_layouts_id_fk` FOREIGN KEY (`layout_id`) REFERENCES `layouts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `level_checks` ADD CONSTRAINT `level_checks_bay_id_bays_id_fk` FOREIGN KEY (`bay_id`) REFERENCES `bays`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `level_checks` ADD CONSTRAINT `level_checks_made_by_people_id_fk` FOREIGN KEY (`made_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `level_checks` ADD CONSTRAINT `level_checks_voided_by_people_id_fk` FOREIGN KEY (`voided_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `level_readings` ADD CONSTRAINT `level_readings_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `level_readings` ADD CONSTRAINT `level_readings_level_check_id_level_checks_id_fk` FOREIGN KEY (`level_check_id`) REFERENCES `level_checks`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tie_readings` ADD CONSTRAINT `tie_readings_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tie_readings` ADD CONSTRAINT `tie_readings_reading_id_drop_readings_id_fk` FOREIGN KEY (`reading_id`) REFERENCES `drop_readings`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `device_pairings` ADD CONSTRAINT `device_pairings_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `device_pairings` ADD CONSTRAINT `device_pairings_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `devices` ADD CONSTRAINT `devices_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `devices` ADD CONSTRAINT `devices_paired_by_people_id_fk` FOREIGN KEY (`paired_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `people` ADD CONSTRAINT `people_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `person_skills` ADD CONSTRAINT `person_skills_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `person_skills` ADD CONSTRAINT `person_skills_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sessions` ADD CONSTRAINT `sessions_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sessions` ADD CONSTRAINT `sessions_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sessions` ADD CONSTRAINT `sessions_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shop_revisions` ADD CONSTRAINT `shop_revisions_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shop_settings` ADD CONSTRAINT `shop_settings_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `hanger_holes` ADD CONSTRAINT `hanger_holes_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `hanger_holes` ADD CONSTRAINT `hanger_holes_hanger_id_hangers_id_fk` FOREIGN KEY (`hanger_id`) REFERENCES `hangers`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `hangers` ADD CONSTRAINT `hangers_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `springs` ADD CONSTRAINT `springs_shop_id_shops_id_fk` FOREIGN KEY (`shop_id`) REFERENCES `shops`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `builds_here` ON `builds` (`shop_id`,`state`);--> statement-breakpoint
CREATE INDEX `builds_vehicle` ON `builds` (`vehicle_id`);--> statement-breakpoint
CREATE INDEX `customers_name` ON `customers` (`shop_id`,`name`);--> statement-breakpoint
CREATE INDEX `holds_build` ON `holds` (`build_id`,`lifted_at`);--> statement-breakpoint
CREATE INDEX `placements_now` ON `placements` (`shop_id`,`until_at`);--> statement-breakpoint
CREATE INDEX `spells_now` ON `spells` (`shop_id`,`until_at`);--> statement-breakpoint
CREATE INDEX `stint_crew_stint` ON `stint_crew` (`stint_id`);--> statement-breakpoint
CREATE INDEX `stints_next` ON `stints` (`shop_id`,`starts_at`);--> statement-breakpoint
CREATE INDEX `journal_revision` ON `journal` (`shop_id`,`revision`);--> statement-breakpoint
CREATE INDEX `journal_subject` ON `journal` (`shop_id`,`subject_kind`,`subject_id`);--> statement-breakpoint
CREATE INDEX `approvals_choice` ON `approvals` (`choice_id`);--> statement-breakpoint
CREATE INDEX `choices_layout` ON `choices` (`layout_id`);--> statement-breakpoint
CREATE INDEX `drop_readings_drop` ON `drop_readings` (`drop_id`,`superseded_at`);--> statement-breakpoint
CREATE INDEX `layouts_build` ON `layouts` (`build_id`);--> statement-breakpoint
CREATE INDEX `level_checks_layout` ON `level_checks` (`layout_id`);--> statement-breakpoint
CREATE INDEX `people_shop` ON `people` (`shop_id`);--> statement-breakpoint
CREATE INDEX `sessions_person` ON `sessions` (`person_id`);--> statement-breakpoint
CREATE INDEX `failures_account` ON `sign_in_failures` (`account_hash`,`at`);