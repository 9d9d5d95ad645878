import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import Database from "better-sqlite3";
import Papa from "papaparse";
import { readCells } from "#src/partslist/cells.ts";
import { guessColumns, mappingOf } from "#src/partslist/columns.ts";
import { readList } from "#src/partslist/read-list.ts";
import { decodeUpload } from "#src/server/decode-upload.ts";
import type { BenchRow } from "./bench-row.ts";

const ROWS = 10_000;
const RUNS = 9;

/** A list of ten thousand rows and eight columns, made the same on every machine; every description differs. */
function bigList(): string {
  const kinds = [
    ["R", "10k", "Carbon film resistor 1/4W 5%", "0207"],
    ["C", "100nF", "Ceramic capacitor 50V X7R", "RM 5"],
    ["D", "1N4148", "Signal diode", "DO-35"],
    ["U", "4093", "Four gates with hysteresis", "DIP-14"],
    ["J", "", "Header 1x4", "RM 2.54"],
  ] as const;
  const rows = ["Reference,Quantity,Value,Description,Package,Manufacturer,Part number,Order code"];
  for (let at = 0; at < ROWS; at++) {
    const [letter, value, description, body] = kinds[at % kinds.length] ?? kinds[0];
    rows.push(
      `"${letter}${2 * at + 1},${letter}${2 * at + 2}",2,${value},${description} no. ${at},${body},Maker ${at % 17},PN-${at},OC-${at}`,
    );
  }
  return `${rows.join("\r\n")}\r\n`;
}

function median(work: () => void): number {
  const times: number[] = [];
  for (let run = 0; run < RUNS; run++) {
    const begin = performance.now();
    work();
    times.push(performance.now() - begin);
  }
  return times.sort((a, b) => a - b)[Math.floor(RUNS / 2)] ?? 0;
}

function insertAll(rows: readonly string[][]): number {
  const folder = mkdtempSync(join(tmpdir(), "tinpenny-bench-"));
  const db = new Database(join(folder, "rows.db"));
  db.pragma("journal_mode = WAL");
  db.pragma("synchronous = NORMAL");
  db.exec("CREATE TABLE line (a TEXT, b TEXT, c TEXT, d TEXT, e TEXT, f TEXT, g TEXT, h TEXT)");
  const insert = db.prepare("INSERT INTO line VALUES (?, ?, ?, ?, ?, ?, ?, ?)");
  const time = median(() => db.transaction(() => rows.forEach((row) => void insert.run(row)))());
  db.close();
  rmSync(folder, { recursive: true });
  return time;
}

function readAll(bytes: Uint8Array): void {
  const decoded = decodeUpload(bytes);
  if (!decoded.ok) throw new Error(decoded.code);
  const { records } = readCells(decoded.text);
  const { counts } = readList({ records, mapping: mappingOf(guessColumns(records)), answers: [] });
  if (counts.linesWithSuggestions !== ROWS)
    throw new Error(`${counts.linesWithSuggestions} lines instead of ${ROWS}`);
}

const AIM = 3;

/** Reading a list of ten thousand rows, from bytes to lines with their questions, against the bare grammar and bare inserts. */
export async function run(): Promise<BenchRow[]> {
  const text = bigList();
  const bytes = new TextEncoder().encode(text);
  const ours = median(() => readAll(bytes));
  const parsing = median(() => void Papa.parse<string[]>(text));
  const inserting = insertAll(Papa.parse<string[]>(text.trimEnd()).data);
  const times = ours / (parsing + inserting);
  const split = `${ours.toFixed(0)} ms; PapaParse alone ${parsing.toFixed(0)} ms, inserts into SQLite ${inserting.toFixed(0)} ms`;
  return [
    {
      what: "Import of 10,000 rows, bytes to lines, against PapaParse and raw inserts together",
      value: Number(times.toFixed(2)),
      unit: "times",
      aim: `at most ${AIM} times`,
      met: times <= AIM,
      note: `${split}. Medians of ${RUNS}; every row has a description of its own.`,
    },
  ];
}
