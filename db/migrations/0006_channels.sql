CREATE TABLE `channel_prices` (
	`workshop_id` text NOT NULL,
	`channel_id` text NOT NULL,
	`edition_id` text NOT NULL,
	`price` text NOT NULL,
	PRIMARY KEY(`channel_id`, `edition_id`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`channel_id`) REFERENCES `channels`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`edition_id`) REFERENCES `editions`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "price_rule" CHECK("channel_prices"."price" is null or (typeof("channel_prices"."price") = 'text' and "channel_prices"."price" glob '[0-9]*' and "channel_prices"."price" not glob '*[^0-9.]*' and "channel_prices"."price" not glob '*.*.*' and "channel_prices"."price" not glob '*.'))
);
--> statement-breakpoint
CREATE TABLE `channels` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`weight` integer NOT NULL,
	`editions` text,
	`discount` text NOT NULL,
	`tax_rate` text,
	`tax_stated` text NOT NULL,
	`fee_rate` text,
	`fee_fixed` text,
	`fee_on_postage` integer NOT NULL,
	`fee_on_tax` integer NOT NULL,
	`postage_charged` text,
	`postage_paid` text,
	`packing_cost` text,
	`other_name` text NOT NULL,
	`other_amount` text,
	`other_shared_over` integer NOT NULL,
	`minutes_per_order` text,
	`kits_per_order` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "weight_rule" CHECK("channels"."weight" is null or (typeof("channels"."weight") = 'integer' and "channels"."weight" >= 0)),
	CONSTRAINT "discount_rule" CHECK("channels"."discount" is null or (typeof("channels"."discount") = 'text' and ltrim("channels"."discount", '-') glob '[0-9]*' and ltrim("channels"."discount", '-') not glob '*[^0-9.]*' and "channels"."discount" not glob '*.*.*' and "channels"."discount" not glob '*.' and "channels"."discount" not glob '--*')),
	CONSTRAINT "tax_stated_rule" CHECK("channels"."tax_stated" is null or ("channels"."tax_stated" in ('inside', 'on-top'))),
	CONSTRAINT "other_shared_over_rule" CHECK("channels"."other_shared_over" is null or (typeof("channels"."other_shared_over") = 'integer' and "channels"."other_shared_over" >= 1)),
	CONSTRAINT "tax_rate_rule" CHECK("channels"."tax_rate" is null or (typeof("channels"."tax_rate") = 'text' and "channels"."tax_rate" glob '[0-9]*' and "channels"."tax_rate" not glob '*[^0-9.]*' and "channels"."tax_rate" not glob '*.*.*' and "channels"."tax_rate" not glob '*.')),
	CONSTRAINT "fee_rate_rule" CHECK("channels"."fee_rate" is null or (typeof("channels"."fee_rate") = 'text' and "channels"."fee_rate" glob '[0-9]*' and "channels"."fee_rate" not glob '*[^0-9.]*' and "channels"."fee_rate" not glob '*.*.*' and "channels"."fee_rate" not glob '*.')),
	CONSTRAINT "fee_fixed_rule" CHECK("channels"."fee_fixed" is null or (typeof("channels"."fee_fixed") = 'text' and "channels"."fee_fixed" glob '[0-9]*' and "channels"."fee_fixed" not glob '*[^0-9.]*' and "channels"."fee_fixed" not glob '*.*.*' and "channels"."fee_fixed" not glob '*.')),
	CONSTRAINT "postage_charged_rule" CHECK("channels"."postage_charged" is null or (typeof("channels"."postage_charged") = 'text' and "channels"."postage_charged" glob '[0-9]*' and "channels"."postage_charged" not glob '*[^0-9.]*' and "channels"."postage_charged" not glob '*.*.*' and "channels"."postage_charged" not glob '*.')),
	CONSTRAINT "postage_paid_rule" CHECK("channels"."postage_paid" is null or (typeof("channels"."postage_paid") = 'text' and "channels"."postage_paid" glob '[0-9]*' and "channels"."postage_paid" not glob '*[^0-9.]*' and "channels"."postage_paid" not glob '*.*.*' and "channels"."postage_paid" not glob '*.')),
	CONSTRAINT "packing_cost_rule" CHECK("channels"."packing_cost" is null or (typeof("channels"."packing_cost") = 'text' and "channels"."packing_cost" glob '[0-9]*' and "channels"."packing_cost" not glob '*[^0-9.]*' and "channels"."packing_cost" not glob '*.*.*' and "channels"."packing_cost" not glob '*.')),
	CONSTRAINT "other_amount_rule" CHECK("channels"."other_amount" is null or (typeof("channels"."other_amount") = 'text' and "channels"."other_amount" glob '[0-9]*' and "channels"."other_amount" not glob '*[^0-9.]*' and "channels"."other_amount" not glob '*.*.*' and "channels"."other_amount" not glob '*.')),
	CONSTRAINT "minutes_per_order_rule" CHECK("channels"."minutes_per_order" is null or (typeof("channels"."minutes_per_order") = 'text' and "channels"."minutes_per_order" glob '[0-9]*' and "channels"."minutes_per_order" not glob '*[^0-9.]*' and "channels"."minutes_per_order" not glob '*.*.*' and "channels"."minutes_per_order" not glob '*.')),
	CONSTRAINT "kits_per_order_rule" CHECK("channels"."kits_per_order" is null or (typeof("channels"."kits_per_order") = 'text' and "channels"."kits_per_order" glob '[0-9]*' and "channels"."kits_per_order" not glob '*[^0-9.]*' and "channels"."kits_per_order" not glob '*.*.*' and "channels"."kits_per_order" not glob '*.'))
);
--> statement-breakpoint
CREATE INDEX `channels_kit` ON `channels` (`kit_id`,`position`);--> statement-breakpoint
INSERT INTO `channels` (
	`id`, `workshop_id`, `kit_id`, `position`, `name`, `weight`, `editions`, `discount`, `tax_rate`, `tax_stated`,
	`fee_rate`, `fee_fixed`, `fee_on_postage`, `fee_on_tax`, `postage_charged`, `postage_paid`, `packing_cost`,
	`other_name`, `other_amount`, `other_shared_over`, `minutes_per_order`, `kits_per_order`
)
SELECT
	lower(hex(randomblob(8))), `workshop_id`, `kit_id`, 0, 'Own site', 1, NULL, '0', `tax_rate`, 'inside',
	`fee_rate`, `fee_fixed`, 1, 1, `postage_charged`, `postage_paid`, '0',
	'', '0', 1, '0', '1'
FROM `run_plans`;--> statement-breakpoint
PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE `__new_run_plans` (
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
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "kits_rule" CHECK("__new_run_plans"."kits" is null or (typeof("__new_run_plans"."kits") = 'integer' and "__new_run_plans"."kits" >= 1)),
	CONSTRAINT "sweep_to_rule" CHECK("__new_run_plans"."sweep_to" is null or (typeof("__new_run_plans"."sweep_to") = 'integer' and "__new_run_plans"."sweep_to" >= 1)),
	CONSTRAINT "kits_made_before_rule" CHECK("__new_run_plans"."kits_made_before" is null or (typeof("__new_run_plans"."kits_made_before") = 'integer' and "__new_run_plans"."kits_made_before" >= 0)),
	CONSTRAINT "spare_rate_rule" CHECK("__new_run_plans"."spare_rate" is null or (typeof("__new_run_plans"."spare_rate") = 'text' and "__new_run_plans"."spare_rate" glob '[0-9]*' and "__new_run_plans"."spare_rate" not glob '*[^0-9.]*' and "__new_run_plans"."spare_rate" not glob '*.*.*' and "__new_run_plans"."spare_rate" not glob '*.')),
	CONSTRAINT "board_yield_rule" CHECK("__new_run_plans"."board_yield" is null or (typeof("__new_run_plans"."board_yield") = 'text' and "__new_run_plans"."board_yield" glob '[0-9]*' and "__new_run_plans"."board_yield" not glob '*[^0-9.]*' and "__new_run_plans"."board_yield" not glob '*.*.*' and "__new_run_plans"."board_yield" not glob '*.')),
	CONSTRAINT "board_confidence_rule" CHECK("__new_run_plans"."board_confidence" is null or (typeof("__new_run_plans"."board_confidence") = 'text' and "__new_run_plans"."board_confidence" glob '[0-9]*' and "__new_run_plans"."board_confidence" not glob '*[^0-9.]*' and "__new_run_plans"."board_confidence" not glob '*.*.*' and "__new_run_plans"."board_confidence" not glob '*.')),
	CONSTRAINT "learning_slope_rule" CHECK("__new_run_plans"."learning_slope" is null or (typeof("__new_run_plans"."learning_slope") = 'text' and "__new_run_plans"."learning_slope" glob '[0-9]*' and "__new_run_plans"."learning_slope" not glob '*[^0-9.]*' and "__new_run_plans"."learning_slope" not glob '*.*.*' and "__new_run_plans"."learning_slope" not glob '*.')),
	CONSTRAINT "replacement_share_rule" CHECK("__new_run_plans"."replacement_share" is null or (typeof("__new_run_plans"."replacement_share") = 'text' and "__new_run_plans"."replacement_share" glob '[0-9]*' and "__new_run_plans"."replacement_share" not glob '*[^0-9.]*' and "__new_run_plans"."replacement_share" not glob '*.*.*' and "__new_run_plans"."replacement_share" not glob '*.')),
	CONSTRAINT "replacement_cost_rule" CHECK("__new_run_plans"."replacement_cost" is null or (typeof("__new_run_plans"."replacement_cost") = 'text' and "__new_run_plans"."replacement_cost" glob '[0-9]*' and "__new_run_plans"."replacement_cost" not glob '*[^0-9.]*' and "__new_run_plans"."replacement_cost" not glob '*.*.*' and "__new_run_plans"."replacement_cost" not glob '*.'))
);
--> statement-breakpoint
INSERT INTO `__new_run_plans`("kit_id", "workshop_id", "kits", "sweep_to", "spare_rate", "board_yield", "board_confidence", "chosen_quote_id", "learning_slope", "kits_made_before", "replacement_share", "replacement_cost", "version") SELECT "kit_id", "workshop_id", "kits", "sweep_to", "spare_rate", "board_yield", "board_confidence", "chosen_quote_id", "learning_slope", "kits_made_before", "replacement_share", "replacement_cost", "version" FROM `run_plans`;--> statement-breakpoint
DROP TABLE `run_plans`;--> statement-breakpoint
ALTER TABLE `__new_run_plans` RENAME TO `run_plans`;--> statement-breakpoint
PRAGMA foreign_keys=ON;--> statement-breakpoint
CREATE INDEX `run_plans_workshop` ON `run_plans` (`workshop_id`);