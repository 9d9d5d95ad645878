/** Letters, digits, perhaps a letter: R1, LED12, U3A. What a board drawing prints beside a part. */
const NUMBERED = /^([A-Za-zА-Яа-я][A-Za-zА-Яа-я_]{0,9}?)_?(\d{1,5})([A-Za-z]?)$/;
/** A name used as a designator: BOOT, R_BB, IC2_PINS_1_12, LDO3V3, Rk. */
const NAME = /^(?=.*[A-Za-z])[A-Za-z0-9_+\-*./#]{1,24}$/;
/** An everyday word, which is no designator: Cables, Resistors, LEDs. */
const WORD = /^(?:[A-Z]?[a-z]{3,}|[A-Z]{2,}s)$/;
/** The common case, read without further looking: R1 or R1, R2, R3. */
const PLAIN_LIST = /^[A-Za-z]{1,6}\d{1,5}(?:, ?[A-Za-z]{1,6}\d{1,5})*$/;
const CONJUNCTION = /^(?:[Aa]nd|AND|und|et|y|e|i|och|en|&|\+)$/;
/** Guards against "R1-R99999". */
const RANGE_MOST = 2000;

export interface ReadDesignators {
  designators: string[];
  /** Pieces of the cell that could not be read as designators, as written. */
  unclear: string[];
  /** How many are numbered (R1), as against names (BOOT). */
  numbered: number;
}

const NOTHING: ReadDesignators = { designators: [], unclear: [], numbered: 0 };

function normalise(text: string): string {
  return text
    .replace(/[\u00a0\u2002-\u200a\u202f\u3000]/g, " ")
    .replace(/[‐‑‒–—―−~～÷]/g, "-")
    .replace(/…|\.{2,}/g, "-")
    .replace(/[，、；]/g, ",")
    .replace(/(\d)\s+(?:to|thru|through|bis|à|hasta|till|t\/m|до|až)\s+(?=[A-Za-z]{0,5}\d)/gi, "$1-")
    .replace(/(\d)\s+(?:and|und|et|y|e|i|och|en)\s+(?=[A-Za-z]{0,5}\d)/gi, "$1,")
    .replace(/(\d[A-Za-z]?)\s*-+\s*(?=[A-Za-z]{0,7}\d)/g, "$1-");
}

/** "R1-R4", "R1-4", "R1A-R1D" as their members; `null` for a name that only looks like a range. */
function expandRange(token: string): string[] | null {
  const dash = token.indexOf("-");
  if (dash < 1 || dash !== token.lastIndexOf("-")) return null;
  const from = NUMBERED.exec(token.slice(0, dash));
  if (!from) return null;
  const [, prefix = "", firstText = "", suffix = ""] = from;
  const end = token.slice(dash + 1);
  const to = /^\d{1,5}$/.test(end) ? ["", prefix, end, ""] : NUMBERED.exec(end);
  if (!to || to[1]?.toUpperCase() !== prefix.toUpperCase()) return null;
  const stem = token.slice(0, token.lastIndexOf(firstText, dash));
  return suffix === "" && to[3] === ""
    ? numbersBetween(stem, firstText, to[2] ?? "")
    : lettersBetween(stem, firstText, suffix, to[2] ?? "", to[3] ?? "");
}

function numbersBetween(stem: string, firstText: string, lastText: string): string[] | null {
  const first = Number(firstText);
  const last = Number(lastText);
  if (last <= first || last - first > RANGE_MOST) return null;
  const width = firstText.startsWith("0") ? firstText.length : 0;
  return Array.from({ length: last - first + 1 }, (_, i) => stem + String(first + i).padStart(width, "0"));
}

function lettersBetween(
  stem: string,
  number: string,
  first: string,
  lastNumber: string,
  last: string,
): string[] | null {
  if (number !== lastNumber || first === "" || last === "" || last <= first) return null;
  const start = first.charCodeAt(0);
  return Array.from(
    { length: last.charCodeAt(0) - start + 1 },
    (_, i) => stem + number + String.fromCharCode(start + i),
  );
}

/** Joins "C  2" to C2 and splits at commas, semicolons, blanks, and at slashes and pluses between designators. */
function tokens(text: string): string[] {
  return text
    .replace(/(^|[\s,;])([A-Za-z]{1,4})\s+(?=\d{1,4}(?:$|[\s,;]))/g, "$1$2")
    .replace(/([A-Za-z]\d+[A-Za-z]?)\s*[/&|+]\s*(?=[A-Za-z]{1,5}\d)/g, "$1,")
    .split(/[\s,;]+/)
    .filter((token) => token !== "");
}

interface Reader {
  read: ReadDesignators;
  /** Letters of the last numbered designator, carried over "C1,3,6". */
  prefix: string;
}

/** The names a token stands for, or `null` for a word that is no designator. */
function namesOf(reader: Reader, token: string): { names: string[]; numbered: boolean } | null {
  const numbered = NUMBERED.exec(token);
  if (numbered) {
    reader.prefix = token.slice(0, token.length - (numbered[2] ?? "").length - (numbered[3] ?? "").length);
    return { names: [token], numbered: true };
  }
  const range = expandRange(token);
  if (range) {
    reader.prefix = /^\D+/.exec(token)?.[0] ?? "";
    return { names: range, numbered: true };
  }
  const carried = reader.prefix === "" ? null : carriedNames(reader.prefix, token);
  if (carried) return carried;
  return NAME.test(token) && !WORD.test(token) ? { names: [token], numbered: false } : null;
}

/** Members of "C1,3,6-8" and "LED1,2,pwr" that leave the letters out. */
function carriedNames(prefix: string, token: string): { names: string[]; numbered: boolean } | null {
  if (/^\d{1,5}[A-Za-z]?$/.test(token)) return { names: [prefix + token], numbered: true };
  const range = /^\d{1,5}-\d{1,5}$/.test(token) ? expandRange(prefix + token) : null;
  if (range) return { names: range, numbered: true };
  return /^[a-z]{2,5}$/.test(token) ? { names: [prefix + token], numbered: false } : null;
}

function readToken(reader: Reader, raw: string): void {
  const bare = raw.replace(/^["'([{]+|[\])}"'.:]+$/g, "");
  const token = /^[A-Za-z_]+\d+[A-Za-z]?\*$/.test(bare) ? bare.slice(0, -1) : bare;
  if (CONJUNCTION.test(token)) return;
  const found = namesOf(reader, token);
  if (found) {
    for (const name of found.names) reader.read.designators.push(name);
    if (found.numbered) reader.read.numbered += found.names.length;
  }
  if ((!found && /[\p{L}\d]/u.test(token)) || (reader.prefix !== "" && /^[a-z]{2,5}$/.test(token)))
    reader.read.unclear.push(raw);
}

/** A cell that begins with a word is a text that happens to name something: "Vite M3". */
function isText(cell: string, read: ReadDesignators): boolean {
  const [first = ""] = cell.split(/[\s,;]+/);
  return read.unclear.includes(first) && read.unclear.length >= read.designators.length;
}

/**
 * The designators of one cell, expanded in the order written: `"R1-R3, R7"` is R1, R2, R3, R7;
 * `"C1,3,6"` is C1, C3, C6. A range must rise and keep its letters: `"U1-1"` is a name.
 * Words (`"Cables"`) are handed back as unclear.
 */
export function readDesignators(cell: string): ReadDesignators {
  const trimmed = cell.trim();
  if (trimmed === "") return NOTHING;
  if (PLAIN_LIST.test(trimmed)) {
    const designators = trimmed.split(/, ?/);
    return { designators, unclear: [], numbered: designators.length };
  }
  const reader: Reader = { read: { designators: [], unclear: [], numbered: 0 }, prefix: "" };
  const aside = /^[^(]*\d[^(]*(\(.*\))$/s.exec(trimmed)?.[1] ?? "";
  if (aside !== "") reader.read.unclear.push(aside);
  for (const token of tokens(normalise(trimmed.slice(0, trimmed.length - aside.length))))
    readToken(reader, token);
  return isText(trimmed, reader.read) ? { designators: [], unclear: [trimmed], numbered: 0 } : reader.read;
}

/** True where the whole cell reads as numbered designators; how a column of them is known without a heading. */
export function looksLikeDesignators(cell: string): boolean {
  const read = readDesignators(cell);
  return read.numbered > 0 && read.unclear.length === 0 && read.numbered === read.designators.length;
}

/** The letters before the number: `"LED12"` gives `"LED"`; a name gives itself. */
export function designatorLetters(designator: string): string {
  return (/^[A-Za-zА-Яа-я]+/.exec(designator)?.[0] ?? "").toUpperCase();
}

/** Order of a person's reading: letters, then the number as a number, then the rest. R2 stands before R10. */
export function compareDesignators(a: string, b: string): number {
  const [left, right] = [splitForOrder(a), splitForOrder(b)];
  if (left.letters !== right.letters) return left.letters < right.letters ? -1 : 1;
  if (left.number !== right.number) return left.number - right.number;
  if (left.rest !== right.rest) return left.rest < right.rest ? -1 : 1;
  return a === b ? 0 : a < b ? -1 : 1;
}

function splitForOrder(text: string): { letters: string; number: number; rest: string } {
  const found = /^(\D*)(\d*)(.*)$/s.exec(text);
  return {
    letters: (found?.[1] ?? "").toUpperCase(),
    number: found?.[2] ? Number(found[2]) : -1,
    rest: found?.[3] ?? "",
  };
}

/** For display: sorted, runs of three and more as a range with an en dash: "C1, C2, R4–R9". */
export function compressDesignators(designators: readonly string[]): string {
  const sorted = [...new Set(designators)].sort(compareDesignators);
  const runs: string[][] = [];
  for (const name of sorted) {
    const run = runs.at(-1);
    if (run && follows(run.at(-1) ?? "", name)) run.push(name);
    else runs.push([name]);
  }
  return runs.map((run) => (run.length > 2 ? `${run[0]}–${run.at(-1)}` : run.join(", "))).join(", ");
}

function follows(before: string, after: string): boolean {
  const [left, right] = [/^(\D+)(\d+)$/.exec(before), /^(\D+)(\d+)$/.exec(after)];
  if (!left || !right || left[1] !== right[1]) return false;
  const next = String(Number(left[2]) + 1).padStart(
    (left[2] ?? "").startsWith("0") ? (left[2] ?? "").length : 0,
    "0",
  );
  return next === right[2];
}

/** Designators that stand more than once, each named once, in reading order. */
export function repeatedDesignators(designators: readonly string[]): string[] {
  const seen = new Set<string>();
  const twice = new Set<string>();
  for (const name of designators) (seen.has(name) ? twice : seen).add(name);
  return [...twice].sort(compareDesignators);
}
