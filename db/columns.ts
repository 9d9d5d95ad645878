import { type SQL, sql } from "drizzle-orm";
import { type AnySQLiteColumn, check, integer, text } from "drizzle-orm/sqlite-core";

/** Sixteen random letters and digits, made by the server. */
export const id = (name: string) => text(name);

/** Exact decimal text such as "0.062"; its CHECK is `amountRule`. */
export const amount = (name: string) => text(name);

/** Milliseconds since 1970 UTC. */
export const moment = (name: string) => integer(name);

/** Counts the edits of what people change; an update must name the version it has seen. */
export const version = () => integer("version").notNull().default(1);

type Named = AnySQLiteColumn & { name: string };

function rule(column: Named, says: SQL) {
  return check(`${column.name}_rule`, sql`${column} is null or (${says})`);
}

/** SQLite takes any text into an enum column; this refuses what is not in the list. */
export function oneOf(column: Named, list: readonly string[]) {
  return rule(column, sql`${column} in (${sql.raw(list.map((word) => `'${word}'`).join(", "))})`);
}

/** SQLite takes text and fractions into an integer column; this refuses them, and what is below `least`. */
export function wholeNumber(column: Named, least = 0) {
  return rule(column, sql`typeof(${column}) = 'integer' and ${column} >= ${sql.raw(String(least))}`);
}

/** A rate that may have a minus before its digits, such as a discount. */
export function signedRate(column: Named) {
  return rule(
    column,
    sql`typeof(${column}) = 'text' and ltrim(${column}, '-') glob '[0-9]*' and ltrim(${column}, '-') not glob '*[^0-9.]*' and ${column} not glob '*.*.*' and ${column} not glob '*.' and ${column} not glob '--*'`,
  );
}

/** Digits with at most one point: never a floating-point number, a sign or an exponent. */
export function amountText(column: Named) {
  return rule(
    column,
    sql`typeof(${column}) = 'text' and ${column} glob '[0-9]*' and ${column} not glob '*[^0-9.]*' and ${column} not glob '*.*.*' and ${column} not glob '*.'`,
  );
}
