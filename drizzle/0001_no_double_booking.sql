-- No double booking, kept by the database itself: a period a table, and keys that let no two rows overlap in it.
-- A NULL bay (the yard, or a stint taken off the plan) is not constrained.
ALTER TABLE `placements` ADD PERIOD FOR `slot`(`from_at`, `until_at`);
--> statement-breakpoint
ALTER TABLE `placements` ADD UNIQUE KEY `placements_bay_once`(`bay_id`, `slot` WITHOUT OVERLAPS);
--> statement-breakpoint
ALTER TABLE `placements` ADD UNIQUE KEY `placements_build_once`(`build_id`, `slot` WITHOUT OVERLAPS);
--> statement-breakpoint
ALTER TABLE `spells` ADD PERIOD FOR `slot`(`from_at`, `until_at`);
--> statement-breakpoint
ALTER TABLE `spells` ADD UNIQUE KEY `spells_person_once`(`person_id`, `slot` WITHOUT OVERLAPS);
--> statement-breakpoint
ALTER TABLE `stints` ADD PERIOD FOR `slot`(`starts_at`, `ends_at`);
--> statement-breakpoint
ALTER TABLE `stints` ADD UNIQUE KEY `stints_bay_once`(`bay_id`, `slot` WITHOUT OVERLAPS);
--> statement-breakpoint
ALTER TABLE `stint_crew` ADD PERIOD FOR `slot`(`starts_at`, `ends_at`);
--> statement-breakpoint
ALTER TABLE `stint_crew` ADD UNIQUE KEY `stint_crew_person_once`(`person_id`, `slot` WITHOUT OVERLAPS);
