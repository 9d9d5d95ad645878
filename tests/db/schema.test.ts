import { execFileSync } from "node:child_process";
import { cpSync, mkdtempSync, rmSync } from "node:fs";
import { beforeAll, describe, expect, test } from "vitest";
import { type Db, migrateDb, openDb } from "#db/client.ts";

let db: Db;
beforeAll(() => {
  db = openDb(":memory:");
  migrateDb(db);
  db.$client.exec(`
    insert into workshops (id, name, currency, created_at) values ('w', 'Ferry Yard', 'EUR', 0);
    insert into kits (id, workshop_id, name, summary, created_at) values ('k', 'w', 'Gate Bell', '', 0);
    insert into editions (id, workshop_id, kit_id, position, name, weight, boards_per_kit)
      values ('e', 'w', 'k', 0, 'Kit', 1, 1);
  `);
});

/** Rows that belong to a person, or hold counters: they are nobody's workshop's. */
const PERSONAL = [
  "attempt_counts",
  "identities",
  "one_time_tokens",
  "recovery_codes",
  "sessions",
  "users",
  "workshops",
];

describe("the database itself", () => {
  test("every row belongs to a workshop, but for people and what is theirs", () => {
    const tables = db.$client
      .prepare(
        "select name from sqlite_master where type = 'table' and name not like '\\_\\_%' escape '\\' and name not like 'sqlite%'",
      )
      .all() as { name: string }[];
    const without = tables
      .map(({ name }) => name)
      .filter((name) => {
        const columns = db.$client.pragma(`table_info(${name})`) as { name: string; notnull: number }[];
        return !columns.some((column) => column.name === "workshop_id" && column.notnull === 1);
      });
    expect(without.sort()).toEqual(PERSONAL);
  });

  test.each([
    ["a price in bytes", "update editions set price = x'3132'"],
    ["a price with an exponent", "update editions set price = '1e3'"],
    ["a negative price", "update editions set price = '-1.00'"],
    ["a price with two points", "update editions set price = '1.2.3'"],
    ["a price that ends in a point", "update editions set price = '1.'"],
    ["half a board", "update editions set boards_per_kit = 1.5"],
    ["a weight in words", "update editions set weight = 'two'"],
    ["a weight below nothing", "update editions set weight = -1"],
    ["a shape that is in no list", "update kits set board_shape = 'star'"],
    ["a kit in a workshop that is not there", "update kits set workshop_id = 'nowhere'"],
  ])("refuses %s", (_, statement) => {
    expect(() => db.$client.exec(statement)).toThrow(/constraint failed/i);
  });

  test("takes exact decimal text", () => {
    db.$client.exec("update editions set price = '0.000001'");
    expect(db.$client.prepare("select price from editions").get()).toEqual({ price: "0.000001" });
  });

  test("has a generated migration for all of its schema (if this fails: npm run db:generate -- --name what-it-is)", () => {
    // drizzle-kit takes the folder relative to the project only.
    const copy = mkdtempSync("node_modules/.tinpenny-migrations-");
    cpSync("db/migrations", copy, { recursive: true });
    const words = [
      "drizzle-kit",
      "generate",
      "--dialect=sqlite",
      "--schema=./db/schema/*.ts",
      `--out=${copy}`,
    ];
    const said = execFileSync("npx", words, { encoding: "utf8" });
    rmSync(copy, { recursive: true });
    expect(said).toContain("No schema changes");
  }, 30_000);
});
