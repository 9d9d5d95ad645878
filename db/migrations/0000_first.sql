CREATE TABLE `board_quote_breaks` (
	`workshop_id` text NOT NULL,
	`quote_id` text NOT NULL,
	`quantity` integer NOT NULL,
	`price` text NOT NULL,
	PRIMARY KEY(`quote_id`, `quantity`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`quote_id`) REFERENCES `board_quotes`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "quantity_rule" CHECK("board_quote_breaks"."quantity" is null or (typeof("board_quote_breaks"."quantity") = 'integer' and "board_quote_breaks"."quantity" >= 1)),
	CONSTRAINT "price_rule" CHECK("board_quote_breaks"."price" is null or (typeof("board_quote_breaks"."price") = 'text' and "board_quote_breaks"."price" glob '[0-9]*' and "board_quote_breaks"."price" not glob '*[^0-9.]*' and "board_quote_breaks"."price" not glob '*.*.*' and "board_quote_breaks"."price" not glob '*.'))
);
--> statement-breakpoint
CREATE TABLE `board_quotes` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`board_house` text NOT NULL,
	`currency` text NOT NULL,
	`width` text,
	`height` text,
	`layers` integer,
	`finish` text NOT NULL,
	`colour` text NOT NULL,
	`price_model` text NOT NULL,
	`engineering_charge` text NOT NULL,
	`stencil_charge` text NOT NULL,
	`freight` text,
	`lead_time_days` integer,
	`priced_on` text,
	`valid_until` text,
	`note` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "price_model_rule" CHECK("board_quotes"."price_model" is null or ("board_quotes"."price_model" in ('lots', 'whole-order'))),
	CONSTRAINT "width_rule" CHECK("board_quotes"."width" is null or (typeof("board_quotes"."width") = 'text' and "board_quotes"."width" glob '[0-9]*' and "board_quotes"."width" not glob '*[^0-9.]*' and "board_quotes"."width" not glob '*.*.*' and "board_quotes"."width" not glob '*.')),
	CONSTRAINT "height_rule" CHECK("board_quotes"."height" is null or (typeof("board_quotes"."height") = 'text' and "board_quotes"."height" glob '[0-9]*' and "board_quotes"."height" not glob '*[^0-9.]*' and "board_quotes"."height" not glob '*.*.*' and "board_quotes"."height" not glob '*.')),
	CONSTRAINT "engineering_charge_rule" CHECK("board_quotes"."engineering_charge" is null or (typeof("board_quotes"."engineering_charge") = 'text' and "board_quotes"."engineering_charge" glob '[0-9]*' and "board_quotes"."engineering_charge" not glob '*[^0-9.]*' and "board_quotes"."engineering_charge" not glob '*.*.*' and "board_quotes"."engineering_charge" not glob '*.')),
	CONSTRAINT "stencil_charge_rule" CHECK("board_quotes"."stencil_charge" is null or (typeof("board_quotes"."stencil_charge") = 'text' and "board_quotes"."stencil_charge" glob '[0-9]*' and "board_quotes"."stencil_charge" not glob '*[^0-9.]*' and "board_quotes"."stencil_charge" not glob '*.*.*' and "board_quotes"."stencil_charge" not glob '*.')),
	CONSTRAINT "freight_rule" CHECK("board_quotes"."freight" is null or (typeof("board_quotes"."freight") = 'text' and "board_quotes"."freight" glob '[0-9]*' and "board_quotes"."freight" not glob '*[^0-9.]*' and "board_quotes"."freight" not glob '*.*.*' and "board_quotes"."freight" not glob '*.')),
	CONSTRAINT "layers_rule" CHECK("board_quotes"."layers" is null or (typeof("board_quotes"."layers") = 'integer' and "board_quotes"."layers" >= 1)),
	CONSTRAINT "lead_time_days_rule" CHECK("board_quotes"."lead_time_days" is null or (typeof("board_quotes"."lead_time_days") = 'integer' and "board_quotes"."lead_time_days" >= 0))
);
--> statement-breakpoint
CREATE INDEX `board_quotes_kit` ON `board_quotes` (`kit_id`);--> statement-breakpoint
CREATE TABLE `column_memories` (
	`workshop_id` text NOT NULL,
	`kind` text NOT NULL,
	`fingerprint` text NOT NULL,
	`mapping` text NOT NULL,
	`used_at` integer NOT NULL,
	PRIMARY KEY(`workshop_id`, `kind`, `fingerprint`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "kind_rule" CHECK("column_memories"."kind" is null or ("column_memories"."kind" in ('parts-list', 'price-list')))
);
--> statement-breakpoint
CREATE TABLE `imports` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text,
	`kind` text NOT NULL,
	`state` text NOT NULL,
	`file_name` text NOT NULL,
	`byte_length` integer NOT NULL,
	`encoding` text NOT NULL,
	`content_hash` text NOT NULL,
	`content` text NOT NULL,
	`supplier_id` text,
	`mapping` text,
	`answers` text NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`taken_at` integer,
	`before` text,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "kind_rule" CHECK("imports"."kind" is null or ("imports"."kind" in ('parts-list', 'price-list'))),
	CONSTRAINT "state_rule" CHECK("imports"."state" is null or ("imports"."state" in ('draft', 'taken', 'taken-back', 'dropped'))),
	CONSTRAINT "byte_length_rule" CHECK("imports"."byte_length" is null or (typeof("imports"."byte_length") = 'integer' and "imports"."byte_length" >= 0))
);
--> statement-breakpoint
CREATE INDEX `imports_workshop` ON `imports` (`workshop_id`,`created_at`);--> statement-breakpoint
CREATE INDEX `imports_kit` ON `imports` (`kit_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `editions` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`weight` integer NOT NULL,
	`boards_per_kit` integer NOT NULL,
	`price` text,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "position_rule" CHECK("editions"."position" is null or (typeof("editions"."position") = 'integer' and "editions"."position" >= 0)),
	CONSTRAINT "weight_rule" CHECK("editions"."weight" is null or (typeof("editions"."weight") = 'integer' and "editions"."weight" >= 0)),
	CONSTRAINT "boards_per_kit_rule" CHECK("editions"."boards_per_kit" is null or (typeof("editions"."boards_per_kit") = 'integer' and "editions"."boards_per_kit" >= 0)),
	CONSTRAINT "price_rule" CHECK("editions"."price" is null or (typeof("editions"."price") = 'text' and "editions"."price" glob '[0-9]*' and "editions"."price" not glob '*[^0-9.]*' and "editions"."price" not glob '*.*.*' and "editions"."price" not glob '*.'))
);
--> statement-breakpoint
CREATE INDEX `editions_kit` ON `editions` (`kit_id`,`position`);--> statement-breakpoint
CREATE UNIQUE INDEX `editions_name` ON `editions` (`kit_id`,`name`);--> statement-breakpoint
CREATE TABLE `kits` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`name` text NOT NULL,
	`summary` text NOT NULL,
	`revision` integer DEFAULT 1 NOT NULL,
	`board_needed` integer DEFAULT true NOT NULL,
	`board_shape` text DEFAULT 'rectangle' NOT NULL,
	`board_width` text,
	`board_height` text,
	`created_at` integer NOT NULL,
	`closed_at` integer,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "board_shape_rule" CHECK("kits"."board_shape" is null or ("kits"."board_shape" in ('rectangle', 'round'))),
	CONSTRAINT "revision_rule" CHECK("kits"."revision" is null or (typeof("kits"."revision") = 'integer' and "kits"."revision" >= 1)),
	CONSTRAINT "board_width_rule" CHECK("kits"."board_width" is null or (typeof("kits"."board_width") = 'text' and "kits"."board_width" glob '[0-9]*' and "kits"."board_width" not glob '*[^0-9.]*' and "kits"."board_width" not glob '*.*.*' and "kits"."board_width" not glob '*.')),
	CONSTRAINT "board_height_rule" CHECK("kits"."board_height" is null or (typeof("kits"."board_height") = 'text' and "kits"."board_height" glob '[0-9]*' and "kits"."board_height" not glob '*[^0-9.]*' and "kits"."board_height" not glob '*.*.*' and "kits"."board_height" not glob '*.'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `kits_name` ON `kits` (`workshop_id`,`name`);--> statement-breakpoint
CREATE TABLE `revisions` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`number` integer NOT NULL,
	`ended_at` integer NOT NULL,
	`ended_by` text,
	`snapshot` text NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "number_rule" CHECK("revisions"."number" is null or (typeof("revisions"."number") = 'integer' and "revisions"."number" >= 1))
);
--> statement-breakpoint
CREATE INDEX `revisions_kit` ON `revisions` (`kit_id`,`number`);--> statement-breakpoint
CREATE TABLE `line_quantities` (
	`workshop_id` text NOT NULL,
	`line_id` text NOT NULL,
	`edition_id` text NOT NULL,
	`per_kit` integer NOT NULL,
	PRIMARY KEY(`line_id`, `edition_id`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`line_id`) REFERENCES `lines`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`edition_id`) REFERENCES `editions`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "per_kit_rule" CHECK("line_quantities"."per_kit" is null or (typeof("line_quantities"."per_kit") = 'integer' and "line_quantities"."per_kit" >= 0))
);
--> statement-breakpoint
CREATE INDEX `line_quantities_edition` ON `line_quantities` (`edition_id`);--> statement-breakpoint
CREATE TABLE `lines` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`part_id` text NOT NULL,
	`position` integer NOT NULL,
	`designators` text NOT NULL,
	`mark` text NOT NULL,
	`note` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`part_id`) REFERENCES `parts`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "mark_rule" CHECK("lines"."mark" is null or ("lines"."mark" in ('in-kit', 'option', 'builders-own', 'do-not-place'))),
	CONSTRAINT "position_rule" CHECK("lines"."position" is null or (typeof("lines"."position") = 'integer' and "lines"."position" >= 0))
);
--> statement-breakpoint
CREATE INDEX `lines_kit` ON `lines` (`kit_id`,`position`);--> statement-breakpoint
CREATE INDEX `lines_part` ON `lines` (`part_id`);--> statement-breakpoint
CREATE TABLE `part_choices` (
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`part_id` text NOT NULL,
	`pinned_offer_id` text,
	`only_from_stock` integer DEFAULT false NOT NULL,
	`spare_rate` text,
	`least_spare` integer DEFAULT 0 NOT NULL,
	`keep_share` text,
	`version` integer DEFAULT 1 NOT NULL,
	PRIMARY KEY(`kit_id`, `part_id`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`part_id`) REFERENCES `parts`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "least_spare_rule" CHECK("part_choices"."least_spare" is null or (typeof("part_choices"."least_spare") = 'integer' and "part_choices"."least_spare" >= 0)),
	CONSTRAINT "spare_rate_rule" CHECK("part_choices"."spare_rate" is null or (typeof("part_choices"."spare_rate") = 'text' and "part_choices"."spare_rate" glob '[0-9]*' and "part_choices"."spare_rate" not glob '*[^0-9.]*' and "part_choices"."spare_rate" not glob '*.*.*' and "part_choices"."spare_rate" not glob '*.')),
	CONSTRAINT "keep_share_rule" CHECK("part_choices"."keep_share" is null or (typeof("part_choices"."keep_share") = 'text' and "part_choices"."keep_share" glob '[0-9]*' and "part_choices"."keep_share" not glob '*[^0-9.]*' and "part_choices"."keep_share" not glob '*.*.*' and "part_choices"."keep_share" not glob '*.'))
);
--> statement-breakpoint
CREATE INDEX `part_choices_part` ON `part_choices` (`part_id`);--> statement-breakpoint
CREATE TABLE `parts` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`class` text NOT NULL,
	`name` text NOT NULL,
	`spec` text NOT NULL,
	`value` text,
	`unit` text,
	`tolerance` text,
	`power` text,
	`voltage` text,
	`package` text NOT NULL,
	`hole_spacing` text,
	`manufacturer` text NOT NULL,
	`manufacturer_part_number` text NOT NULL,
	`datasheet` text NOT NULL,
	`drawer` text NOT NULL,
	`note` text NOT NULL,
	`free_stock` integer DEFAULT 0 NOT NULL,
	`stock_cost` text,
	`created_at` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "class_rule" CHECK("parts"."class" is null or ("parts"."class" in ('resistor', 'capacitor', 'inductor', 'led', 'diode', 'transistor', 'integrated-circuit', 'crystal', 'switch', 'connector', 'potentiometer', 'battery-holder', 'mechanical', 'board', 'other'))),
	CONSTRAINT "unit_rule" CHECK("parts"."unit" is null or ("parts"."unit" in ('ohm', 'F', 'H', 'Hz', 'V', 'A', 'm'))),
	CONSTRAINT "free_stock_rule" CHECK("parts"."free_stock" is null or (typeof("parts"."free_stock") = 'integer' and "parts"."free_stock" >= 0)),
	CONSTRAINT "stock_cost_rule" CHECK("parts"."stock_cost" is null or (typeof("parts"."stock_cost") = 'text' and "parts"."stock_cost" glob '[0-9]*' and "parts"."stock_cost" not glob '*[^0-9.]*' and "parts"."stock_cost" not glob '*.*.*' and "parts"."stock_cost" not glob '*.')),
	CONSTRAINT "hole_spacing_rule" CHECK("parts"."hole_spacing" is null or (typeof("parts"."hole_spacing") = 'text' and "parts"."hole_spacing" glob '[0-9]*' and "parts"."hole_spacing" not glob '*[^0-9.]*' and "parts"."hole_spacing" not glob '*.*.*' and "parts"."hole_spacing" not glob '*.'))
);
--> statement-breakpoint
CREATE INDEX `parts_workshop` ON `parts` (`workshop_id`,`class`);--> statement-breakpoint
CREATE INDEX `parts_number` ON `parts` (`workshop_id`,`manufacturer_part_number`);--> statement-breakpoint
CREATE TABLE `attempt_counts` (
	`key` text PRIMARY KEY NOT NULL,
	`count` integer NOT NULL,
	`window_ends_at` integer NOT NULL,
	CONSTRAINT "count_rule" CHECK("attempt_counts"."count" is null or (typeof("attempt_counts"."count") = 'integer' and "attempt_counts"."count" >= 0))
);
--> statement-breakpoint
CREATE TABLE `identities` (
	`issuer` text NOT NULL,
	`subject` text NOT NULL,
	`user_id` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`issuer`, `subject`),
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `identities_user` ON `identities` (`user_id`);--> statement-breakpoint
CREATE TABLE `one_time_tokens` (
	`token_hash` text PRIMARY KEY NOT NULL,
	`purpose` text NOT NULL,
	`user_id` text NOT NULL,
	`email` text NOT NULL,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "purpose_rule" CHECK("one_time_tokens"."purpose" is null or ("one_time_tokens"."purpose" in ('confirm-email', 'reset-password', 'sign-in')))
);
--> statement-breakpoint
CREATE INDEX `one_time_tokens_user` ON `one_time_tokens` (`user_id`);--> statement-breakpoint
CREATE TABLE `recovery_codes` (
	`user_id` text NOT NULL,
	`code_hash` text NOT NULL,
	`used_at` integer,
	PRIMARY KEY(`user_id`, `code_hash`),
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`token_hash` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`last_seen_at` integer NOT NULL,
	`complete` integer NOT NULL,
	`browser` text NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `sessions_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE INDEX `sessions_expiry` ON `sessions` (`expires_at`);--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text,
	`email_confirmed_at` integer,
	`totp_secret` text,
	`totp_confirmed_at` integer,
	`totp_last_step` integer,
	`single_keys` integer DEFAULT true NOT NULL,
	`created_at` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email` ON `users` (`email`);--> statement-breakpoint
CREATE TABLE `charges` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`amount` text NOT NULL,
	`spread_over` integer,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "amount_rule" CHECK("charges"."amount" is null or (typeof("charges"."amount") = 'text' and "charges"."amount" glob '[0-9]*' and "charges"."amount" not glob '*[^0-9.]*' and "charges"."amount" not glob '*.*.*' and "charges"."amount" not glob '*.')),
	CONSTRAINT "spread_over_rule" CHECK("charges"."spread_over" is null or (typeof("charges"."spread_over") = 'integer' and "charges"."spread_over" >= 1))
);
--> statement-breakpoint
CREATE INDEX `charges_kit` ON `charges` (`kit_id`,`position`);--> statement-breakpoint
CREATE TABLE `packing_items` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`editions` text,
	`cost_per_kit` text,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "cost_per_kit_rule" CHECK("packing_items"."cost_per_kit" is null or (typeof("packing_items"."cost_per_kit") = 'text' and "packing_items"."cost_per_kit" glob '[0-9]*' and "packing_items"."cost_per_kit" not glob '*[^0-9.]*' and "packing_items"."cost_per_kit" not glob '*.*.*' and "packing_items"."cost_per_kit" not glob '*.'))
);
--> statement-breakpoint
CREATE INDEX `packing_items_kit` ON `packing_items` (`kit_id`,`position`);--> statement-breakpoint
CREATE TABLE `run_plans` (
	`kit_id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kits` integer NOT NULL,
	`sweep_to` integer NOT NULL,
	`spare_rate` text NOT NULL,
	`board_yield` text NOT NULL,
	`board_confidence` text NOT NULL,
	`chosen_quote_id` text,
	`learning_slope` text NOT NULL,
	`kits_made_before` integer NOT NULL,
	`replacement_share` text NOT NULL,
	`replacement_cost` text,
	`tax_rate` text,
	`fee_rate` text,
	`fee_fixed` text,
	`postage_charged` text,
	`postage_paid` text,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "kits_rule" CHECK("run_plans"."kits" is null or (typeof("run_plans"."kits") = 'integer' and "run_plans"."kits" >= 1)),
	CONSTRAINT "sweep_to_rule" CHECK("run_plans"."sweep_to" is null or (typeof("run_plans"."sweep_to") = 'integer' and "run_plans"."sweep_to" >= 1)),
	CONSTRAINT "kits_made_before_rule" CHECK("run_plans"."kits_made_before" is null or (typeof("run_plans"."kits_made_before") = 'integer' and "run_plans"."kits_made_before" >= 0)),
	CONSTRAINT "spare_rate_rule" CHECK("run_plans"."spare_rate" is null or (typeof("run_plans"."spare_rate") = 'text' and "run_plans"."spare_rate" glob '[0-9]*' and "run_plans"."spare_rate" not glob '*[^0-9.]*' and "run_plans"."spare_rate" not glob '*.*.*' and "run_plans"."spare_rate" not glob '*.')),
	CONSTRAINT "board_yield_rule" CHECK("run_plans"."board_yield" is null or (typeof("run_plans"."board_yield") = 'text' and "run_plans"."board_yield" glob '[0-9]*' and "run_plans"."board_yield" not glob '*[^0-9.]*' and "run_plans"."board_yield" not glob '*.*.*' and "run_plans"."board_yield" not glob '*.')),
	CONSTRAINT "board_confidence_rule" CHECK("run_plans"."board_confidence" is null or (typeof("run_plans"."board_confidence") = 'text' and "run_plans"."board_confidence" glob '[0-9]*' and "run_plans"."board_confidence" not glob '*[^0-9.]*' and "run_plans"."board_confidence" not glob '*.*.*' and "run_plans"."board_confidence" not glob '*.')),
	CONSTRAINT "learning_slope_rule" CHECK("run_plans"."learning_slope" is null or (typeof("run_plans"."learning_slope") = 'text' and "run_plans"."learning_slope" glob '[0-9]*' and "run_plans"."learning_slope" not glob '*[^0-9.]*' and "run_plans"."learning_slope" not glob '*.*.*' and "run_plans"."learning_slope" not glob '*.')),
	CONSTRAINT "replacement_share_rule" CHECK("run_plans"."replacement_share" is null or (typeof("run_plans"."replacement_share") = 'text' and "run_plans"."replacement_share" glob '[0-9]*' and "run_plans"."replacement_share" not glob '*[^0-9.]*' and "run_plans"."replacement_share" not glob '*.*.*' and "run_plans"."replacement_share" not glob '*.')),
	CONSTRAINT "replacement_cost_rule" CHECK("run_plans"."replacement_cost" is null or (typeof("run_plans"."replacement_cost") = 'text' and "run_plans"."replacement_cost" glob '[0-9]*' and "run_plans"."replacement_cost" not glob '*[^0-9.]*' and "run_plans"."replacement_cost" not glob '*.*.*' and "run_plans"."replacement_cost" not glob '*.')),
	CONSTRAINT "tax_rate_rule" CHECK("run_plans"."tax_rate" is null or (typeof("run_plans"."tax_rate") = 'text' and "run_plans"."tax_rate" glob '[0-9]*' and "run_plans"."tax_rate" not glob '*[^0-9.]*' and "run_plans"."tax_rate" not glob '*.*.*' and "run_plans"."tax_rate" not glob '*.')),
	CONSTRAINT "fee_rate_rule" CHECK("run_plans"."fee_rate" is null or (typeof("run_plans"."fee_rate") = 'text' and "run_plans"."fee_rate" glob '[0-9]*' and "run_plans"."fee_rate" not glob '*[^0-9.]*' and "run_plans"."fee_rate" not glob '*.*.*' and "run_plans"."fee_rate" not glob '*.')),
	CONSTRAINT "fee_fixed_rule" CHECK("run_plans"."fee_fixed" is null or (typeof("run_plans"."fee_fixed") = 'text' and "run_plans"."fee_fixed" glob '[0-9]*' and "run_plans"."fee_fixed" not glob '*[^0-9.]*' and "run_plans"."fee_fixed" not glob '*.*.*' and "run_plans"."fee_fixed" not glob '*.')),
	CONSTRAINT "postage_charged_rule" CHECK("run_plans"."postage_charged" is null or (typeof("run_plans"."postage_charged") = 'text' and "run_plans"."postage_charged" glob '[0-9]*' and "run_plans"."postage_charged" not glob '*[^0-9.]*' and "run_plans"."postage_charged" not glob '*.*.*' and "run_plans"."postage_charged" not glob '*.')),
	CONSTRAINT "postage_paid_rule" CHECK("run_plans"."postage_paid" is null or (typeof("run_plans"."postage_paid") = 'text' and "run_plans"."postage_paid" glob '[0-9]*' and "run_plans"."postage_paid" not glob '*[^0-9.]*' and "run_plans"."postage_paid" not glob '*.*.*' and "run_plans"."postage_paid" not glob '*.'))
);
--> statement-breakpoint
CREATE INDEX `run_plans_workshop` ON `run_plans` (`workshop_id`);--> statement-breakpoint
CREATE TABLE `tasks` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`editions` text,
	`minutes_per_kit` text NOT NULL,
	`set_up_minutes` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "minutes_per_kit_rule" CHECK("tasks"."minutes_per_kit" is null or (typeof("tasks"."minutes_per_kit") = 'text' and "tasks"."minutes_per_kit" glob '[0-9]*' and "tasks"."minutes_per_kit" not glob '*[^0-9.]*' and "tasks"."minutes_per_kit" not glob '*.*.*' and "tasks"."minutes_per_kit" not glob '*.')),
	CONSTRAINT "set_up_minutes_rule" CHECK("tasks"."set_up_minutes" is null or (typeof("tasks"."set_up_minutes") = 'text' and "tasks"."set_up_minutes" glob '[0-9]*' and "tasks"."set_up_minutes" not glob '*[^0-9.]*' and "tasks"."set_up_minutes" not glob '*.*.*' and "tasks"."set_up_minutes" not glob '*.'))
);
--> statement-breakpoint
CREATE INDEX `tasks_kit` ON `tasks` (`kit_id`,`position`);--> statement-breakpoint
CREATE TABLE `currency_rates` (
	`workshop_id` text NOT NULL,
	`currency` text NOT NULL,
	`per_foreign_unit` text NOT NULL,
	`dated` text NOT NULL,
	`set_at` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	PRIMARY KEY(`workshop_id`, `currency`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "per_foreign_unit_rule" CHECK("currency_rates"."per_foreign_unit" is null or (typeof("currency_rates"."per_foreign_unit") = 'text' and "currency_rates"."per_foreign_unit" glob '[0-9]*' and "currency_rates"."per_foreign_unit" not glob '*[^0-9.]*' and "currency_rates"."per_foreign_unit" not glob '*.*.*' and "currency_rates"."per_foreign_unit" not glob '*.'))
);
--> statement-breakpoint
CREATE TABLE `offer_breaks` (
	`workshop_id` text NOT NULL,
	`offer_id` text NOT NULL,
	`quantity` integer NOT NULL,
	`price` text NOT NULL,
	PRIMARY KEY(`offer_id`, `quantity`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`offer_id`) REFERENCES `offers`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "quantity_rule" CHECK("offer_breaks"."quantity" is null or (typeof("offer_breaks"."quantity") = 'integer' and "offer_breaks"."quantity" >= 1)),
	CONSTRAINT "price_rule" CHECK("offer_breaks"."price" is null or (typeof("offer_breaks"."price") = 'text' and "offer_breaks"."price" glob '[0-9]*' and "offer_breaks"."price" not glob '*[^0-9.]*' and "offer_breaks"."price" not glob '*.*.*' and "offer_breaks"."price" not glob '*.'))
);
--> statement-breakpoint
CREATE TABLE `offers` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`part_id` text NOT NULL,
	`supplier_id` text NOT NULL,
	`order_code` text NOT NULL,
	`currency` text NOT NULL,
	`price_model` text NOT NULL,
	`minimum_order` integer NOT NULL,
	`order_multiple` integer NOT NULL,
	`stock_shown` integer,
	`lead_time_days` integer,
	`priced_on` text,
	`valid_until` text,
	`note` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`part_id`) REFERENCES `parts`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`supplier_id`) REFERENCES `suppliers`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "price_model_rule" CHECK("offers"."price_model" is null or ("offers"."price_model" in ('whole-order', 'by-slice', 'lots'))),
	CONSTRAINT "minimum_order_rule" CHECK("offers"."minimum_order" is null or (typeof("offers"."minimum_order") = 'integer' and "offers"."minimum_order" >= 1)),
	CONSTRAINT "order_multiple_rule" CHECK("offers"."order_multiple" is null or (typeof("offers"."order_multiple") = 'integer' and "offers"."order_multiple" >= 1)),
	CONSTRAINT "stock_shown_rule" CHECK("offers"."stock_shown" is null or (typeof("offers"."stock_shown") = 'integer' and "offers"."stock_shown" >= 0)),
	CONSTRAINT "lead_time_days_rule" CHECK("offers"."lead_time_days" is null or (typeof("offers"."lead_time_days") = 'integer' and "offers"."lead_time_days" >= 0))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `offers_code` ON `offers` (`part_id`,`supplier_id`,`order_code`);--> statement-breakpoint
CREATE INDEX `offers_supplier` ON `offers` (`supplier_id`);--> statement-breakpoint
CREATE TABLE `shut_out_suppliers` (
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`supplier_id` text NOT NULL,
	PRIMARY KEY(`kit_id`, `supplier_id`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`supplier_id`) REFERENCES `suppliers`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `suppliers` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`name` text NOT NULL,
	`currency` text NOT NULL,
	`freight_term` text NOT NULL,
	`freight_amount` text,
	`free_freight_from` text,
	`handling_fee` text NOT NULL,
	`minimum_order_value` text,
	`small_order_term` text NOT NULL,
	`small_order_fee` text,
	`lead_time_days` integer,
	`note` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "freight_term_rule" CHECK("suppliers"."freight_term" is null or ("suppliers"."freight_term" in ('none', 'flat', 'not-known'))),
	CONSTRAINT "small_order_term_rule" CHECK("suppliers"."small_order_term" is null or ("suppliers"."small_order_term" in ('none', 'fee', 'refused'))),
	CONSTRAINT "freight_amount_rule" CHECK("suppliers"."freight_amount" is null or (typeof("suppliers"."freight_amount") = 'text' and "suppliers"."freight_amount" glob '[0-9]*' and "suppliers"."freight_amount" not glob '*[^0-9.]*' and "suppliers"."freight_amount" not glob '*.*.*' and "suppliers"."freight_amount" not glob '*.')),
	CONSTRAINT "free_freight_from_rule" CHECK("suppliers"."free_freight_from" is null or (typeof("suppliers"."free_freight_from") = 'text' and "suppliers"."free_freight_from" glob '[0-9]*' and "suppliers"."free_freight_from" not glob '*[^0-9.]*' and "suppliers"."free_freight_from" not glob '*.*.*' and "suppliers"."free_freight_from" not glob '*.')),
	CONSTRAINT "handling_fee_rule" CHECK("suppliers"."handling_fee" is null or (typeof("suppliers"."handling_fee") = 'text' and "suppliers"."handling_fee" glob '[0-9]*' and "suppliers"."handling_fee" not glob '*[^0-9.]*' and "suppliers"."handling_fee" not glob '*.*.*' and "suppliers"."handling_fee" not glob '*.')),
	CONSTRAINT "minimum_order_value_rule" CHECK("suppliers"."minimum_order_value" is null or (typeof("suppliers"."minimum_order_value") = 'text' and "suppliers"."minimum_order_value" glob '[0-9]*' and "suppliers"."minimum_order_value" not glob '*[^0-9.]*' and "suppliers"."minimum_order_value" not glob '*.*.*' and "suppliers"."minimum_order_value" not glob '*.')),
	CONSTRAINT "small_order_fee_rule" CHECK("suppliers"."small_order_fee" is null or (typeof("suppliers"."small_order_fee") = 'text' and "suppliers"."small_order_fee" glob '[0-9]*' and "suppliers"."small_order_fee" not glob '*[^0-9.]*' and "suppliers"."small_order_fee" not glob '*.*.*' and "suppliers"."small_order_fee" not glob '*.')),
	CONSTRAINT "lead_time_days_rule" CHECK("suppliers"."lead_time_days" is null or (typeof("suppliers"."lead_time_days") = 'integer' and "suppliers"."lead_time_days" >= 0))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `suppliers_name` ON `suppliers` (`workshop_id`,`name`);--> statement-breakpoint
CREATE TABLE `access_tokens` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`user_id` text NOT NULL,
	`name` text NOT NULL,
	`token_hash` text NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`last_used_at` integer,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `access_tokens_hash` ON `access_tokens` (`token_hash`);--> statement-breakpoint
CREATE INDEX `access_tokens_user` ON `access_tokens` (`user_id`);--> statement-breakpoint
CREATE TABLE `activity` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text,
	`user_id` text,
	`at` integer NOT NULL,
	`action` text NOT NULL,
	`subject_id` text NOT NULL,
	`subject_name` text NOT NULL,
	`detail` text NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `activity_workshop` ON `activity` (`workshop_id`,`at`);--> statement-breakpoint
CREATE INDEX `activity_kit` ON `activity` (`kit_id`,`at`);--> statement-breakpoint
CREATE TABLE `invitations` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`email` text NOT NULL,
	`role` text NOT NULL,
	`kit_id` text,
	`token_hash` text NOT NULL,
	`invited_by` text,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`accepted_at` integer,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`invited_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "role_rule" CHECK("invitations"."role" is null or ("invitations"."role" in ('owner', 'designer', 'seller', 'co-builder')))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_token` ON `invitations` (`token_hash`);--> statement-breakpoint
CREATE INDEX `invitations_workshop` ON `invitations` (`workshop_id`);--> statement-breakpoint
CREATE TABLE `kit_guests` (
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`user_id` text NOT NULL,
	PRIMARY KEY(`kit_id`, `user_id`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `kit_guests_user` ON `kit_guests` (`user_id`);--> statement-breakpoint
CREATE TABLE `memberships` (
	`workshop_id` text NOT NULL,
	`user_id` text NOT NULL,
	`role` text NOT NULL,
	`created_at` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	PRIMARY KEY(`workshop_id`, `user_id`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "role_rule" CHECK("memberships"."role" is null or ("memberships"."role" in ('owner', 'designer', 'seller', 'co-builder')))
);
--> statement-breakpoint
CREATE INDEX `memberships_user` ON `memberships` (`user_id`);--> statement-breakpoint
CREATE TABLE `workshops` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`currency` text NOT NULL,
	`rate_per_hour` text,
	`created_at` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	CONSTRAINT "rate_per_hour_rule" CHECK("workshops"."rate_per_hour" is null or (typeof("workshops"."rate_per_hour") = 'text' and "workshops"."rate_per_hour" glob '[0-9]*' and "workshops"."rate_per_hour" not glob '*[^0-9.]*' and "workshops"."rate_per_hour" not glob '*.*.*' and "workshops"."rate_per_hour" not glob '*.'))
);
