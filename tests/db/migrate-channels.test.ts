import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { migrateDb, openDb } from "#db/client.ts";
import { channelsOf } from "#src/server/store/channel.ts";
import { runPlanOf } from "#src/server/store/run-plan.ts";

let folder: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "tinpenny-migrate-"));
});
afterEach(() => {
  rmSync(folder, { recursive: true, force: true });
});

/** The migrations as they were before kits had channels. */
function before(): string {
  const path = join(folder, "migrations");
  cpSync("db/migrations", path, { recursive: true });
  const journal = join(path, "meta/_journal.json");
  const { entries, ...rest } = JSON.parse(readFileSync(journal, "utf8"));
  const end = entries.findIndex(({ tag }: { tag: string }) => tag.endsWith("_channels"));
  expect(end).toBeGreaterThan(0);
  writeFileSync(journal, JSON.stringify({ ...rest, entries: entries.slice(0, end) }));
  return path;
}

const ROWS = `
  insert into workshops (id, name, currency, created_at) values ('w', 'Ferry Yard', 'EUR', 0);
  insert into kits (id, workshop_id, name, summary, created_at) values
    ('bell', 'w', 'Gate Bell', '', 0), ('post', 'w', 'Rain Post', '', 0);
  insert into run_plans (
    kit_id, workshop_id, kits, sweep_to, spare_rate, board_yield, board_confidence, learning_slope,
    kits_made_before, replacement_share, tax_rate, fee_rate, fee_fixed, postage_charged, postage_paid, version
  ) values
    ('bell', 'w', 40, 200, '0', '1', '0.95', '1', 0, '0', '0.19', '0.05', '0.30', '4.90', '4.20', 7),
    ('post', 'w', 60, 300, '0.02', '1', '0.95', '1', 0, '0', null, null, null, null, null, 1);
`;

test("one rule for every sale becomes the one channel of each kit, and nothing of the run is lost", () => {
  const db = openDb(join(folder, "x.db"));
  migrateDb(db, before());
  db.$client.exec(ROWS);
  migrateDb(db);
  const [bell, ...more] = channelsOf(db, "bell");
  expect(more).toEqual([]);
  expect(bell).toEqual({
    channel: {
      id: expect.stringMatching(/^[0-9a-f]{16}$/),
      workshopId: "w",
      kitId: "bell",
      position: 0,
      name: "Own site",
      weight: 1,
      editions: null,
      discount: "0",
      taxRate: "0.19",
      taxStated: "inside",
      feeRate: "0.05",
      feeFixed: "0.30",
      feeOnPostage: true,
      feeOnTax: true,
      postageCharged: "4.90",
      postagePaid: "4.20",
      packingCost: "0",
      otherName: "",
      otherAmount: "0",
      otherSharedOver: 1,
      minutesPerOrder: "0",
      kitsPerOrder: "1",
      version: 1,
    },
    ownPrices: [],
  });
  expect(channelsOf(db, "post").map(({ channel }) => [channel.taxRate, channel.postagePaid])).toEqual([
    [null, null],
  ]);
  expect(runPlanOf(db, "bell")).toMatchObject({ kits: 40, version: 7, spareRate: "0" });
  const columns = (db.$client.pragma("table_info(run_plans)") as { name: string }[]).map(({ name }) => name);
  expect(columns.filter((name) => /tax|fee|postage/.test(name))).toEqual([]);
});
