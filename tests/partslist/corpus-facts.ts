import { existsSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";

/** Real lists with facts established by reading them stand beside the project where it is developed; a clone lacks them. */
const FOLDER = fileURLToPath(new URL("../../../shared/corpus/", import.meta.url));

export interface CorpusLine {
  line: number;
  record: number;
  references?: string[];
  quantity: number | null;
  value: { si: number; unit: string } | null;
  dnp?: string;
  dnp_unsure?: string;
  unsure?: string;
  questionable?: boolean;
}

export interface CorpusList {
  id: string;
  file: string;
  encoding: string;
  facts: {
    part_lines: number;
    mismatches: { record: number }[];
    duplicate_designators: string[];
  };
  lines: CorpusLine[];
}

export function corpusLists(): CorpusList[] {
  const facts = `${FOLDER}dev.json`;
  return existsSync(facts) ? (JSON.parse(readFileSync(facts, "utf8")) as CorpusList[]) : [];
}

export function corpusBytes(list: CorpusList): Uint8Array {
  return readFileSync(`${FOLDER}dev/${list.file}`);
}
