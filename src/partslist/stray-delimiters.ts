import { looksLikeDesignators } from "./designators.ts";

/** What the well-formed rows hold in a column. */
interface Profile {
  designators: number;
  numbers: number;
  /** Numbers without a fraction. */
  whole: number;
  empty: number;
  filled: number;
  length: number;
}

const LOOKED_AT = 500;

/**
 * Joins cells again that an unquoted delimiter tore apart ("R1,R2,R3,10k,3" under three headings), in
 * place. Only rows with more cells than the table is wide are touched, and only where one way of joining
 * fits the other rows clearly better than any other. True if anything was joined.
 */
export function joinStrayCells(rows: string[][], sign: string): boolean {
  const width = usualWidth(rows);
  if (width < 2) return false;
  const wide = rows.filter((row) => tooWide(row, width));
  if (wide.length === 0 || wide.length > rows.length * 0.7) return false;
  const profiles = profile(rows, width);
  let joined = false;
  for (const row of wide) {
    const start = bestStart(row, width, profiles, sign);
    if (start === null) continue;
    const many = row.length - width + 1;
    row.splice(start, many, row.slice(start, start + many).join(sign));
    joined = true;
  }
  return joined;
}

function tooWide(row: readonly string[], width: number): boolean {
  return row.length > width && row.slice(width).some((cell) => cell.trim() !== "");
}

function usualWidth(rows: readonly string[][]): number {
  const counts = new Map<number, number>();
  for (const row of rows.slice(0, LOOKED_AT))
    if (row.some((cell) => cell.trim() !== "")) counts.set(row.length, (counts.get(row.length) ?? 0) + 1);
  let best = 0;
  for (const [width, count] of counts) if (count > (counts.get(best) ?? 0)) best = width;
  return best;
}

function profile(rows: readonly string[][], width: number): Profile[] {
  const profiles = Array.from({ length: width }, () => ({
    designators: 0,
    numbers: 0,
    whole: 0,
    empty: 0,
    filled: 0,
    length: 0,
  }));
  let looked = 0;
  for (const row of rows) {
    // The first row is mostly a heading and says nothing of the cells under it.
    if (row.length !== width || looked++ === 0 || looked > LOOKED_AT) continue;
    row.forEach((cell, column) => {
      const kind = profiles[column];
      if (kind) note(kind, cell);
    });
  }
  return profiles;
}

function note(kind: Profile, cell: string): void {
  const text = cell.trim();
  if (text === "") kind.empty++;
  else {
    kind.filled++;
    kind.length += text.length;
    if (isNumber(text)) {
      kind.numbers++;
      if (/^\d+$/.test(text)) kind.whole++;
    } else if (looksLikeDesignators(text)) kind.designators++;
  }
}

function isNumber(text: string): boolean {
  return /^[€$£¥]?\s*\d+(?:[.,]\d+)*\s*[€$£¥]?$/.test(text);
}

/** How well a cell suits a column: 1 where nearly all others are of its kind, -1 where hardly any is. */
function suits(cell: string, kind: Profile): number {
  const text = cell.trim();
  const all = kind.filled + kind.empty || 1;
  if (text === "") return kind.empty / all - 0.3;
  const filled = kind.filled || 1;
  if (isNumber(text)) {
    const alike = /^\d+$/.test(text) ? kind.whole : kind.numbers - kind.whole;
    return (kind.numbers + alike) / filled - 1 - kind.empty / all / 2;
  }
  if (looksLikeDesignators(text)) return 2 * (kind.designators / filled) - 1;
  return 1 - 2 * ((kind.numbers + kind.designators) / filled) - kind.empty / all / 2;
}

function bestStart(
  row: readonly string[],
  width: number,
  profiles: readonly Profile[],
  sign: string,
): number | null {
  const many = row.length - width + 1;
  let best: { start: number; score: number } | null = null;
  let second = Number.NEGATIVE_INFINITY;
  for (let start = 0; start < width; start++) {
    const joined = row.slice(start, start + many);
    if (joined.some((cell) => cell.trim() === "")) continue;
    const cells = [...row.slice(0, start), joined.join(sign), ...row.slice(start + many)];
    const fit = cells.reduce((sum, cell, column) => sum + suits(cell, profiles[column] ?? EMPTY), 0);
    const score = joined.every(looksLikeDesignators) && mostlyDesignators(profiles[start]) ? fit + 1 : fit;
    if (best === null || score > best.score) {
      second = best?.score ?? second;
      best = { start, score };
    } else second = Math.max(second, score);
  }
  return best && best.score > 0 && best.score - second >= 0.8 ? best.start : null;
}

/** Designators torn apart belong together rather than the first of them to the words before it. */
function mostlyDesignators(kind: Profile | undefined): boolean {
  return kind !== undefined && kind.designators > kind.filled * 0.5;
}

const EMPTY: Profile = { designators: 0, numbers: 0, whole: 0, empty: 1, filled: 0, length: 0 };
