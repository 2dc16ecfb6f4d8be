CREATE TABLE `aircraft` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`name` varchar(80) NOT NULL,
	`registration` varchar(20) NOT NULL,
	`cable_standard` enum('astm-e230','iec-60584-3') NOT NULL,
	`layout` json NOT NULL,
	`archived_at` datetime(3),
	`version` int unsigned NOT NULL DEFAULT 1,
	`created_by` int unsigned NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `aircraft_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `memberships` (
	`aircraft_id` int unsigned NOT NULL,
	`user_id` int unsigned NOT NULL,
	`role` enum('owner','builder','inspector','mentor') NOT NULL,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `memberships_aircraft_id_user_id_role_pk` PRIMARY KEY(`aircraft_id`,`user_id`,`role`)
);
--> statement-breakpoint
CREATE TABLE `audit_chains` (
	`chain` varchar(40) NOT NULL,
	`sequence` int unsigned NOT NULL,
	`hash` char(64) NOT NULL,
	CONSTRAINT `audit_chains_chain` PRIMARY KEY(`chain`)
);
--> statement-breakpoint
CREATE TABLE `audit_events` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`chain` varchar(40) NOT NULL,
	`sequence` int unsigned NOT NULL,
	`at` datetime(3) NOT NULL,
	`actor_id` int unsigned,
	`action` varchar(60) NOT NULL,
	`entity` varchar(40) NOT NULL,
	`entity_id` int unsigned,
	`before` json,
	`after` json,
	`previous_hash` char(64) NOT NULL,
	`hash` char(64) NOT NULL,
	CONSTRAINT `audit_events_id` PRIMARY KEY(`id`),
	CONSTRAINT `audit_events_chain_sequence` UNIQUE(`chain`,`sequence`)
);
--> statement-breakpoint
CREATE TABLE `channels` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`aircraft_id` int unsigned NOT NULL,
	`tag` varchar(20) NOT NULL,
	`quantity` enum('exhaust-gas-temperature','cylinder-head-temperature','oil-temperature','coolant-temperature','intake-air-temperature','outside-air-temperature','oil-pressure','fuel-pressure','fuel-flow','manifold-pressure','engine-speed','bus-voltage','alternator-current','other-temperature') NOT NULL,
	`cylinder` int unsigned,
	`sensor` enum('thermocouple','platinum-rtd','thermistor','resistive-sender','voltage-transmitter','current-transmitter','pulse','direct') NOT NULL,
	`thermocouple_type` enum('B','E','J','K','N','R','S','T'),
	`tip_zone_id` int unsigned,
	`display_id` int unsigned,
	`input_number` int unsigned,
	`type_setting` enum('B','E','J','K','N','R','S','T'),
	`working_low_celsius` decimal(8,3),
	`working_high_celsius` decimal(8,3),
	`notes` varchar(2000) NOT NULL,
	`position` int unsigned NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `channels_id` PRIMARY KEY(`id`),
	CONSTRAINT `channels_aircraft_tag` UNIQUE(`aircraft_id`,`tag`),
	CONSTRAINT `channels_display_input` UNIQUE(`display_id`,`input_number`),
	CONSTRAINT `channels_type_goes_with_thermocouple` CHECK((`channels`.`sensor` = 'thermocouple') = (`channels`.`thermocouple_type` is not null)),
	CONSTRAINT `channels_setting_goes_with_thermocouple` CHECK(`channels`.`sensor` = 'thermocouple' or `channels`.`type_setting` is null),
	CONSTRAINT `channels_display_goes_with_input` CHECK((`channels`.`display_id` is null) = (`channels`.`input_number` is null)),
	CONSTRAINT `channels_range_ascends` CHECK(`channels`.`working_low_celsius` < `channels`.`working_high_celsius`)
);
--> statement-breakpoint
CREATE TABLE `probes` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`aircraft_id` int unsigned NOT NULL,
	`channel_id` int unsigned NOT NULL,
	`marking` varchar(60) NOT NULL,
	`thermocouple_type` enum('B','E','J','K','N','R','S','T'),
	`tip_style` enum('grounded','ungrounded','exposed') NOT NULL,
	`style` enum('bayonet','gasket-ring','clamp','threaded','immersion','surface','free-air') NOT NULL,
	`lead_length_metres` decimal(8,3),
	`notes` varchar(2000) NOT NULL,
	`logged_at` datetime(3) NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	CONSTRAINT `probes_id` PRIMARY KEY(`id`),
	CONSTRAINT `probes_channel` UNIQUE(`channel_id`)
);
--> statement-breakpoint
CREATE TABLE `displays` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`aircraft_id` int unsigned NOT NULL,
	`name` varchar(80) NOT NULL,
	`inputs` int unsigned NOT NULL,
	`terminal_zone_id` int unsigned NOT NULL,
	`compensation_kind` enum('internal','remote-block','fixed','none','adds-degrees','zeroed') NOT NULL,
	`compensation_celsius` decimal(8,3),
	`sensor_offset_kelvin` decimal(8,3),
	`gain_error_fraction` decimal(9,6) NOT NULL,
	`offset_kelvin` decimal(8,3) NOT NULL,
	`low_celsius` decimal(8,3),
	`high_celsius` decimal(8,3),
	`notes` varchar(2000) NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `displays_id` PRIMARY KEY(`id`),
	CONSTRAINT `displays_aircraft_name` UNIQUE(`aircraft_id`,`name`),
	CONSTRAINT `displays_have_inputs` CHECK(`displays`.`inputs` between 1 and 64),
	CONSTRAINT `displays_compensation_has_its_figure` CHECK((`displays`.`compensation_kind` in ('fixed', 'zeroed')) = (`displays`.`compensation_celsius` is not null)),
	CONSTRAINT `displays_sensor_has_its_offset` CHECK((`displays`.`compensation_kind` in ('internal', 'remote-block', 'adds-degrees')) = (`displays`.`sensor_offset_kelvin` is not null)),
	CONSTRAINT `displays_range_ascends` CHECK(`displays`.`low_celsius` < `displays`.`high_celsius`)
);
--> statement-breakpoint
CREATE TABLE `expected_readings` (
	`channel_id` int unsigned NOT NULL,
	`state_id` int unsigned NOT NULL,
	`aircraft_id` int unsigned NOT NULL,
	`tip_celsius` decimal(8,3) NOT NULL,
	`terminal_millivolts` decimal(12,6),
	`indication` enum('value','off-scale-low','off-scale-high','withheld') NOT NULL,
	`indicated_celsius` decimal(10,4),
	`limit_celsius` decimal(10,4),
	`error_kelvin` decimal(10,4),
	`finding_codes` json NOT NULL,
	`solved_at` datetime(3) NOT NULL,
	CONSTRAINT `expected_readings_channel_id_state_id_pk` PRIMARY KEY(`channel_id`,`state_id`),
	CONSTRAINT `expected_readings_value_has_its_figure` CHECK((`expected_readings`.`indication` = 'value') = (`expected_readings`.`indicated_celsius` is not null)),
	CONSTRAINT `expected_readings_off_scale_has_its_limit` CHECK((`expected_readings`.`indication` in ('off-scale-low', 'off-scale-high')) = (`expected_readings`.`limit_celsius` is not null))
);
--> statement-breakpoint
CREATE TABLE `sign_in_attempts` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`subject_hash` char(64) NOT NULL,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `sign_in_attempts_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `users` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`email` varchar(254) NOT NULL,
	`display_name` varchar(80) NOT NULL,
	`password_hash` varchar(255) NOT NULL,
	`session_version` int unsigned NOT NULL DEFAULT 1,
	`temperature_unit` enum('celsius','fahrenheit') NOT NULL DEFAULT 'celsius',
	`length_unit` enum('metre','foot') NOT NULL DEFAULT 'metre',
	`gauge_unit` enum('awg','square-millimetre') NOT NULL DEFAULT 'awg',
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `users_id` PRIMARY KEY(`id`),
	CONSTRAINT `users_email` UNIQUE(`email`),
	CONSTRAINT `users_email_lower_case` CHECK(`users`.`email` = lower(`users`.`email`) collate utf8mb4_bin)
);
--> statement-breakpoint
CREATE TABLE `operating_states` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`aircraft_id` int unsigned NOT NULL,
	`name` varchar(60) NOT NULL,
	`position` int unsigned NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `operating_states_id` PRIMARY KEY(`id`),
	CONSTRAINT `operating_states_aircraft_name` UNIQUE(`aircraft_id`,`name`)
);
--> statement-breakpoint
CREATE TABLE `zone_temperatures` (
	`state_id` int unsigned NOT NULL,
	`zone_id` int unsigned NOT NULL,
	`aircraft_id` int unsigned NOT NULL,
	`celsius` decimal(8,3) NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `zone_temperatures_state_id_zone_id_pk` PRIMARY KEY(`state_id`,`zone_id`),
	CONSTRAINT `zone_temperatures_above_absolute_zero` CHECK(`zone_temperatures`.`celsius` >= -273.15)
);
--> statement-breakpoint
CREATE TABLE `zones` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`aircraft_id` int unsigned NOT NULL,
	`name` varchar(60) NOT NULL,
	`kind` enum('exhaust','cylinder-head','oil','coolant','intake','engine-bay','firewall','cabin','panel','terminals','outside','other') NOT NULL,
	`position` int unsigned NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `zones_id` PRIMARY KEY(`id`),
	CONSTRAINT `zones_aircraft_name` UNIQUE(`aircraft_id`,`name`)
);
--> statement-breakpoint
CREATE TABLE `run_joints` (
	`run_id` int unsigned NOT NULL,
	`position` int unsigned NOT NULL,
	`part_id` varchar(36) NOT NULL,
	`label` varchar(60) NOT NULL,
	`kind` enum('plug-pair','splice','terminal-block','feed-through','reference-block') NOT NULL,
	`tip_side_zone_id` int unsigned NOT NULL,
	`display_side_zone_id` int unsigned NOT NULL,
	`crossed` boolean NOT NULL,
	`positive_metal` varchar(20),
	`negative_metal` varchar(20),
	`positive_offset_kelvin` decimal(8,3) NOT NULL,
	`negative_offset_kelvin` decimal(8,3) NOT NULL,
	CONSTRAINT `run_joints_run_id_position_pk` PRIMARY KEY(`run_id`,`position`),
	CONSTRAINT `run_joints_run_part` UNIQUE(`run_id`,`part_id`)
);
--> statement-breakpoint
CREATE TABLE `run_sections` (
	`run_id` int unsigned NOT NULL,
	`position` int unsigned NOT NULL,
	`part_id` varchar(36) NOT NULL,
	`label` varchar(60) NOT NULL,
	`positive` varchar(20) NOT NULL,
	`negative` varchar(20) NOT NULL,
	`length_metres` decimal(8,3),
	`gauge_awg` int unsigned,
	CONSTRAINT `run_sections_run_id_position_pk` PRIMARY KEY(`run_id`,`position`),
	CONSTRAINT `run_sections_run_part` UNIQUE(`run_id`,`part_id`)
);
--> statement-breakpoint
CREATE TABLE `wiring_runs` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`aircraft_id` int unsigned NOT NULL,
	`channel_id` int unsigned NOT NULL,
	`terminals_crossed` boolean NOT NULL,
	`terminals_positive_offset_kelvin` decimal(8,3) NOT NULL,
	`terminals_negative_offset_kelvin` decimal(8,3) NOT NULL,
	`saved_at` datetime(3) NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	CONSTRAINT `wiring_runs_id` PRIMARY KEY(`id`),
	CONSTRAINT `wiring_runs_channel` UNIQUE(`channel_id`)
);
--> statement-breakpoint
ALTER TABLE `aircraft` ADD CONSTRAINT `aircraft_created_by_users_id_fk` FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `memberships` ADD CONSTRAINT `memberships_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `memberships` ADD CONSTRAINT `memberships_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `channels` ADD CONSTRAINT `channels_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `channels` ADD CONSTRAINT `channels_tip_zone_id_zones_id_fk` FOREIGN KEY (`tip_zone_id`) REFERENCES `zones`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `channels` ADD CONSTRAINT `channels_display_id_displays_id_fk` FOREIGN KEY (`display_id`) REFERENCES `displays`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `probes` ADD CONSTRAINT `probes_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `probes` ADD CONSTRAINT `probes_channel_id_channels_id_fk` FOREIGN KEY (`channel_id`) REFERENCES `channels`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `displays` ADD CONSTRAINT `displays_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `displays` ADD CONSTRAINT `displays_terminal_zone_id_zones_id_fk` FOREIGN KEY (`terminal_zone_id`) REFERENCES `zones`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `expected_readings` ADD CONSTRAINT `expected_readings_channel_id_channels_id_fk` FOREIGN KEY (`channel_id`) REFERENCES `channels`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `expected_readings` ADD CONSTRAINT `expected_readings_state_id_operating_states_id_fk` FOREIGN KEY (`state_id`) REFERENCES `operating_states`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `expected_readings` ADD CONSTRAINT `expected_readings_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `operating_states` ADD CONSTRAINT `operating_states_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `zone_temperatures` ADD CONSTRAINT `zone_temperatures_state_id_operating_states_id_fk` FOREIGN KEY (`state_id`) REFERENCES `operating_states`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `zone_temperatures` ADD CONSTRAINT `zone_temperatures_zone_id_zones_id_fk` FOREIGN KEY (`zone_id`) REFERENCES `zones`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `zone_temperatures` ADD CONSTRAINT `zone_temperatures_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `zones` ADD CONSTRAINT `zones_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `run_joints` ADD CONSTRAINT `run_joints_run_id_wiring_runs_id_fk` FOREIGN KEY (`run_id`) REFERENCES `wiring_runs`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `run_joints` ADD CONSTRAINT `run_joints_tip_side_zone_id_zones_id_fk` FOREIGN KEY (`tip_side_zone_id`) REFERENCES `zones`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `run_joints` ADD CONSTRAINT `run_joints_display_side_zone_id_zones_id_fk` FOREIGN KEY (`display_side_zone_id`) REFERENCES `zones`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `run_sections` ADD CONSTRAINT `run_sections_run_id_wiring_runs_id_fk` FOREIGN KEY (`run_id`) REFERENCES `wiring_runs`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `wiring_runs` ADD CONSTRAINT `wiring_runs_aircraft_id_aircraft_id_fk` FOREIGN KEY (`aircraft_id`) REFERENCES `aircraft`(`id`) ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `wiring_runs` ADD CONSTRAINT `wiring_runs_channel_id_channels_id_fk` FOREIGN KEY (`channel_id`) REFERENCES `channels`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `audit_events_entity` ON `audit_events` (`entity`,`entity_id`);--> statement-breakpoint
CREATE INDEX `sign_in_attempts_subject_at` ON `sign_in_attempts` (`subject_hash`,`at`);--> statement-breakpoint
CREATE INDEX `sign_in_attempts_at` ON `sign_in_attempts` (`at`);