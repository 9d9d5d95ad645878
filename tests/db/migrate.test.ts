import { cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { migrateDb, openDb } from "#db/client.ts";

let folder: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "tinpenny-migrate-"));
});
afterEach(() => {
  rmSync(folder, { recursive: true, force: true });
});

/** A folder of migrations as drizzle-kit writes it. */
function migrations(...statements: string[]): string {
  const path = join(folder, "migrations");
  mkdirSync(join(path, "meta"), { recursive: true });
  const entries = statements.map((sql, index) => {
    writeFileSync(join(path, `000${index}_step.sql`), sql);
    return { idx: index, version: "6", when: index + 1, tag: `000${index}_step`, breakpoints: true };
  });
  writeFileSync(
    join(path, "meta/_journal.json"),
    JSON.stringify({ version: "7", dialect: "sqlite", entries }),
  );
  return path;
}

const TABLES = `create table kits (id text primary key, name text);
--> statement-breakpoint
create table lines (id text primary key, kit_id text not null references kits(id) on delete cascade);`;

// What drizzle-kit writes when SQLite has to rebuild a table: the pragma in it does nothing in a transaction.
const REBUILD = `PRAGMA foreign_keys=OFF;
--> statement-breakpoint
create table __new_kits (id text primary key, name text not null default '');
--> statement-breakpoint
insert into __new_kits select id, name from kits;
--> statement-breakpoint
drop table kits;
--> statement-breakpoint
alter table __new_kits rename to kits;
--> statement-breakpoint
PRAGMA foreign_keys=ON;`;

test("a migration that rebuilds a parent table keeps its children", () => {
  const db = openDb(join(folder, "x.db"));
  migrateDb(db, migrations(TABLES));
  db.$client.exec(
    "insert into kits values ('k', 'Gate Bell'); insert into lines values ('1', 'k'), ('2', 'k')",
  );
  migrateDb(db, migrations(TABLES, REBUILD));
  expect(db.$client.prepare("select count(*) as n from lines").get()).toEqual({ n: 2 });
  expect(db.$client.pragma("foreign_keys", { simple: true })).toBe(1);
});

test("a migration that leaves a row pointing at nothing stops the start", () => {
  const db = openDb(join(folder, "x.db"));
  const path = migrations(TABLES, "insert into lines values ('1', 'no such kit');");
  expect(() => migrateDb(db, path)).toThrow("point at nothing");
});

test("migrating twice changes nothing the second time", () => {
  const db = openDb(join(folder, "x.db"));
  migrateDb(db);
  const before = db.$client.prepare("select name, sql from sqlite_master order by name").all();
  migrateDb(db);
  expect(db.$client.prepare("select name, sql from sqlite_master order by name").all()).toEqual(before);
});

test("what was confirmed is there after the connection is lost: a committed row survives reopening", () => {
  const path = join(folder, "x.db");
  const db = openDb(path);
  migrateDb(db, migrations(TABLES));
  db.$client.exec("insert into kits values ('k', 'Gate Bell')");
  // No close: as after a crash, the second connection finds what the write-ahead log holds.
  expect(openDb(path).$client.prepare("select name from kits").get()).toEqual({ name: "Gate Bell" });
});

/** The real migrations up to one of them. */
function upTo(tag: string): string {
  const path = join(folder, "up-to");
  cpSync("db/migrations", path, { recursive: true });
  const journal = join(path, "meta/_journal.json");
  const read = JSON.parse(readFileSync(journal, "utf8")) as { entries: { tag: string }[] };
  const last = read.entries.findIndex((entry) => entry.tag === tag);
  writeFileSync(journal, JSON.stringify({ ...read, entries: read.entries.slice(0, last + 1) }));
  return path;
}

test("board quotes from before panels are for single boards, with their lots", () => {
  const db = openDb(join(folder, "x.db"));
  migrateDb(db, upTo("0004_rates-by-day"));
  db.$client.exec(`
    insert into workshops (id, name, currency, created_at) values ('w', 'Marsh Lane', 'EUR', 1);
    insert into kits (id, workshop_id, name, summary, created_at) values ('k', 'w', 'Gate Bell', '', 1);
    insert into board_quotes (id, workshop_id, kit_id, board_house, currency, width, finish, colour, price_model,
      engineering_charge, stencil_charge, note)
      values ('q', 'w', 'k', 'Kilnside', 'EUR', '58', '', '', 'lots', '25', '0', '');
    insert into board_quote_breaks (workshop_id, quote_id, quantity, price) values ('w', 'q', 50, '90');`);
  migrateDb(db);
  const quote = db.$client.prepare("select * from board_quotes").get();
  expect(quote).toMatchObject({ width: "58", engineering_charge: "25", depanelling: "0", version: 1 });
  for (const column of [
    "boards_per_panel",
    "panel_width",
    "panel_height",
    "set_up",
    "area_rate",
    "area_unit",
  ])
    expect(quote).toHaveProperty(column, null);
  expect(db.$client.prepare("select quantity from board_quote_breaks").all()).toEqual([{ quantity: 50 }]);
});
