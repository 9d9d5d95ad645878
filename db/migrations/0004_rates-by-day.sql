PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE `__new_currency_rates` (
	`workshop_id` text NOT NULL,
	`currency` text NOT NULL,
	`per_foreign_unit` text NOT NULL,
	`dated` text NOT NULL,
	`set_at` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	PRIMARY KEY(`workshop_id`, `currency`, `dated`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "per_foreign_unit_rule" CHECK("__new_currency_rates"."per_foreign_unit" is null or (typeof("__new_currency_rates"."per_foreign_unit") = 'text' and "__new_currency_rates"."per_foreign_unit" glob '[0-9]*' and "__new_currency_rates"."per_foreign_unit" not glob '*[^0-9.]*' and "__new_currency_rates"."per_foreign_unit" not glob '*.*.*' and "__new_currency_rates"."per_foreign_unit" not glob '*.'))
);
--> statement-breakpoint
INSERT INTO `__new_currency_rates`("workshop_id", "currency", "per_foreign_unit", "dated", "set_at", "version") SELECT "workshop_id", "currency", "per_foreign_unit", "dated", "set_at", "version" FROM `currency_rates`;--> statement-breakpoint
DROP TABLE `currency_rates`;--> statement-breakpoint
ALTER TABLE `__new_currency_rates` RENAME TO `currency_rates`;--> statement-breakpoint
PRAGMA foreign_keys=ON;