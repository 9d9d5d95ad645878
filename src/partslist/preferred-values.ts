import { compareDecimals, scientific, shiftDecimal } from "./exact-decimal.ts";

/** IEC 60063:2015, tables 1 and 2. E24 and below are the historic roundings, kept as they stand in the standard. */
const E24 = "10 11 12 13 15 16 18 20 22 24 27 30 33 36 39 43 47 51 56 62 68 75 82 91".split(" ");
const E96 =
  "100 102 105 107 110 113 115 118 121 124 127 130 133 137 140 143 147 150 154 158 162 165 169 174 178 182 187 191 196 200 205 210 215 221 226 232 237 243 249 255 261 267 274 280 287 294 301 309 316 324 332 340 348 357 365 374 383 392 402 412 422 432 442 453 464 475 487 499 511 523 536 549 562 576 590 604 619 634 649 665 681 698 715 732 750 768 787 806 825 845 866 887 909 931 953 976".split(
    " ",
  );
const E192_MORE =
  "101 104 106 109 111 114 117 120 123 126 129 132 135 138 142 145 149 152 156 160 164 167 172 176 180 184 189 193 198 203 208 213 218 223 229 234 240 246 252 258 264 271 277 284 291 298 305 312 320 328 336 344 352 361 370 379 388 397 407 417 427 437 448 459 470 481 493 505 517 530 542 556 569 583 597 612 626 642 657 673 690 706 723 741 759 777 796 816 835 856 876 898 920 942 965 988".split(
    " ",
  );

const every = (values: readonly string[], step: number) => values.filter((_, at) => at % step === 0);

/** Significant figures of one decade per series. */
export const SERIES: Readonly<
  Record<"E3" | "E6" | "E12" | "E24" | "E48" | "E96" | "E192", readonly string[]>
> = {
  E3: every(E24, 8),
  E6: every(E24, 4),
  E12: every(E24, 2),
  E24,
  E48: every(E96, 2),
  E96,
  E192: [...E96, ...E192_MORE].sort(),
};
export type SeriesName = keyof typeof SERIES;

const PREFERRED: ReadonlySet<string> = new Set(
  [...E24, ...SERIES.E192].map((text) => text.replace(/0+$/, "")),
);

/** True for a value of E24 or E192 in any decade, and for zero (a link). */
export function isPreferred(si: string): boolean {
  const { digits } = scientific(si);
  return digits === "0" || PREFERRED.has(digits);
}

/** The value of a series nearest to this one by difference, in SI units; the lower of two equally near. */
export function nearestPreferred(si: string, series: SeriesName): string {
  const { digits, exponent } = scientific(si);
  if (digits === "0") return "0";
  const figures = SERIES[series];
  const width = figures[0]?.length ?? 2;
  const scale = exponent + digits.length - width;
  const candidates = [...figures, `${figures[0]}0`].map((text) => shiftDecimal(text, scale));
  let best = candidates[0] ?? si;
  for (const candidate of candidates) if (closer(candidate, best, si)) best = candidate;
  return best;
}

function closer(a: string, b: string, to: string): boolean {
  return compareDecimals(distance(a, to), distance(b, to)) < 0;
}

function distance(a: string, b: string): string {
  const places = Math.max(...[a, b].map((text) => text.split(".")[1]?.length ?? 0));
  const [x, y] = [a, b].map((text) => BigInt(shiftDecimal(text, places)));
  if (x === undefined || y === undefined) return "0";
  return shiftDecimal((x > y ? x - y : y - x).toString(), -places);
}

/** For a value in no series: the nearest value of E24, which is what a shop is likely to have. `null` for a preferred one. */
export function preferredHint(si: string): string | null {
  return isPreferred(si) ? null : nearestPreferred(si, "E24");
}
