import type { PartClass } from "#src/shapes/limits.ts";
import type { ValueReading, ValueUnit } from "./draft.ts";
import { shiftDecimal, tidyDecimal } from "./exact-decimal.ts";
import { readNumber } from "./numbers.ts";
import type { DecimalMark } from "./sheet.ts";

/** The quantity a class of parts is named by. */
type Kind = "resistance" | "capacitance" | "inductance" | "frequency";

const UNIT_OF: Readonly<Record<Kind, ValueUnit>> = {
  resistance: "ohm",
  capacitance: "F",
  inductance: "H",
  frequency: "Hz",
};

/** Powers of ten of the prefixes, IEC 80000-1 and the habits of parts lists. */
const POWERS: Readonly<Record<string, number>> = { p: -12, n: -9, u: -6, m: -3, "": 0, k: 3, M: 6, G: 9 };

export function valueKind(partClass: PartClass): Kind | null {
  if (partClass === "resistor" || partClass === "potentiometer") return "resistance";
  if (partClass === "capacitor") return "capacitance";
  if (partClass === "inductor") return "inductance";
  if (partClass === "crystal") return "frequency";
  return null;
}

/**
 * One spelling for all: µ (U+00B5), μ (U+03BC) as u; Ω (U+03A9), Ω (U+2126), "ohm", "Ohms", "ом" as Ω;
 * full-width letters as plain ones; "Meg" as M; Cyrillic units as Latin ones.
 */
export function plainUnits(text: string): string {
  // biome-ignore lint/suspicious/noControlCharactersInRegex: asks whether the text is plain ASCII
  const plain = /^[\x00-\x7f]*$/.test(text) ? text : foldLetters(text);
  return plain
    .replace(/ohms?(?![a-z])/gi, "Ω")
    .replace(/(\d\s*)meg(?:a(?=\s*Ω))?(?![a-z])/gi, "$1M")
    .replace(/(\d\s*)([mµunp])fd(?![a-z])/gi, "$1$2F");
}

function foldLetters(text: string): string {
  return text
    .normalize("NFKC")
    .replace(/[μµ]/g, "u")
    .replace(/мк/g, "u")
    .replace(/п(?=Ф)/g, "p")
    .replace(/н(?=Ф|Гн)/g, "n")
    .replace(/(\d\s*)к(?![а-я])/g, "$1k")
    .replace(/кОм/gi, "kΩ")
    .replace(/МОм/g, "MΩ")
    .replace(/Ом/gi, "Ω")
    .replace(/Ф/g, "F")
    .replace(/Гн/g, "H")
    .replace(/欧姆|欧/g, "Ω");
}

interface Grammar {
  /** Digits round a letter that stands for the point, IEC 60062: 4k7, R47, 0u22. */
  letterCode: RegExp;
  /** A number with prefix and unit: 4.7 kΩ, .1UF. */
  withUnit: RegExp;
  /** A number with a prefix and no unit: 10k, 100n. */
  withPrefix: RegExp;
}

const BEFORE = "(?<![A-Za-z0-9.,/+*])";
const NUMBER = "(\\d{1,3}(?:[,.]\\d{3})+(?:[.,]\\d+)?|\\d+(?:[.,]\\d+)?|[.,]\\d+)";
const AFTER = "(?![A-Za-z0-9Ω%])";

function grammar(codeLetters: string, prefixes: string, unit: string, bare: string): Grammar {
  return {
    letterCode: new RegExp(
      `${BEFORE}(\\d{0,4})(${codeLetters})(\\d{1,4})(?:\\s?(${unit}))?(?:[BCDFGJKM])?${AFTER}`,
    ),
    withUnit: new RegExp(`${BEFORE}${NUMBER}[\\s-]?(${prefixes})?\\s?(?:${unit})${AFTER}`),
    withPrefix: new RegExp(`${BEFORE}${NUMBER}\\s?(${bare})${AFTER}`),
  };
}

/** A taper letter may stand before or after a potentiometer's value: B10k, 10kA. */
const GRAMMARS: Readonly<Record<Kind, Grammar>> = {
  resistance: grammar("[RrKkMGEΩ]", "[mkKMG]", "Ω|[Rr](?!\\w)|E", "[kKMG](?:\\s?[ABCWX])?"),
  capacitance: grammar("[pnuPNUm]", "[pnumPNUM]", "[Ff](?:d|D)?", "[pnuPNU]"),
  inductance: grammar("[nuUNmRr]", "[pnumPNUM]", "[Hh]", "[pnumU]"),
  frequency: grammar("[kKMG]", "[kKMG]", "[Hh][Zz]", "[kKMG]"),
};

/** What a prefix letter means for a kind of value; parts lists write UF, NF and K as well as uF, nF and k. */
function power(kind: Kind, letter: string): number | null {
  if (letter === "" || /^[REΩr]$/.test(letter)) return kind === "inductance" && /[Rr]/.test(letter) ? -6 : 0;
  const known =
    kind === "resistance" || kind === "frequency" ? letter.replace("K", "k") : letter.toLowerCase();
  // "MF" and "MFD" on a capacitor are microfarads, a spelling older than the prefix µ.
  if (kind === "capacitance" && letter === "M") return POWERS.u ?? null;
  return POWERS[known] ?? null;
}

function reading(kind: Kind, digits: string, letter: string, unitWritten: boolean): ValueReading | null {
  const places = power(kind, letter);
  if (places === null) return null;
  return { si: shiftDecimal(digits, places), unit: UNIT_OF[kind], unitWritten };
}

interface Found {
  reading: ValueReading;
  from: string;
  at: number;
}

function findLetterCode(kind: Kind, text: string): Found | null {
  const found = GRAMMARS[kind].letterCode.exec(text);
  if (!found) return null;
  const [from, whole = "", letter = "", fraction = "", unit] = found;
  const alone = from === text.trim();
  // "R10" in a sentence is a designator, "E" and a lone "m" part of a name.
  if ((whole === "" || /^[Em]$/.test(letter)) && !alone) return null;
  if (whole === "" && letter === "E") return null;
  const digits = tidyDecimal(`${whole || "0"}.${fraction}`);
  const read = reading(kind, digits, letter, unit !== undefined);
  return read && { reading: { ...read, unitWritten: true }, from, at: found.index };
}

/** L for milliohm, IEC 60062:2016: "470L"; only where nothing else stands in the cell. */
function milliohms(text: string): Found | null {
  const found = /^(\d{0,3})L(\d{0,3})$/.exec(text);
  if (!found || found[0].length < 2) return null;
  const si = shiftDecimal(tidyDecimal(`${found[1] || "0"}.${found[2]}`), -3);
  return { reading: { si, unit: "ohm", unitWritten: true }, from: found[0], at: 0 };
}

function findNumber(
  kind: Kind,
  pattern: RegExp,
  unit: boolean,
  text: string,
  mark: DecimalMark | null,
): Found | null {
  const found = pattern.exec(text);
  if (!found) return null;
  const [from, number = "", letters = ""] = found;
  const digits = readNumber(number, mark);
  if (digits === null) return null;
  const read = reading(kind, digits, letters.slice(0, 1), unit);
  return read && { reading: read, from, at: found.index };
}

/** A range ("10-30M") or a choice ("10k/22k") is no single value. */
function isRange(text: string, found: Found): boolean {
  return (
    /\d[A-Za-zΩ]{0,3}\s?(?:-|\.\.|–|\bto\b)\s?$/.test(text.slice(0, found.at)) ||
    /^\s?(?:-|–|\.\.)\s?\d+[\d.,]*\s?[kKMGunp]/.test(text.slice(found.at + found.from.length))
  );
}

function firstOf(candidates: (Found | null)[]): Found | null {
  let first: Found | null = null;
  for (const one of candidates) if (one && (first === null || one.at < first.at)) first = one;
  return first;
}

/**
 * The value of a part of this class in a text, which may say more: "CAP CER .1UF 50V X7R", "B10k",
 * "470n ceramic". Kinds without a value of this sort (LEDs, chips) give `null`. A number alone is read
 * only for resistors ("470"), and only where the whole text is the number.
 *
 * Letter for the point after IEC 60062:2016, 5.1. Exact: no binary fraction is involved.
 */
export function readValue(
  text: string,
  partClass: PartClass,
  mark: DecimalMark | null = null,
): ValueReading | null {
  return findValue(text, partClass, mark)?.reading ?? null;
}

/** As `readValue`, with the words the value was read from. */
export function findValue(text: string, partClass: PartClass, mark: DecimalMark | null = null): Found | null {
  const kind = valueKind(partClass);
  if (kind === null || !/\p{Nd}/u.test(text)) return null;
  const plain = plainUnits(text)
    .replace(/_/g, " ")
    .replace(/(?<=[A-Za-z%]),(?=\d)/g, ", ")
    .replace(/^[~≈]\s*/, "")
    .replace(/^(\d{1,3}) (\d{3})(?=\s?[A-Za-zΩ]{0,3}$)/, "$1$2")
    .trim();
  const tidy = kind === "resistance" ? resistanceSpelling(plain) : plain;
  const rules = GRAMMARS[kind];
  const found =
    firstOf([findLetterCode(kind, tidy), findNumber(kind, rules.withUnit, true, tidy, mark)]) ??
    findNumber(kind, rules.withPrefix, false, tidy, mark) ??
    (kind === "resistance" ? (bareNumber(tidy, mark) ?? milliohms(tidy)) : null);
  return found && !isRange(tidy, found) ? found : null;
}

/** "2kR" is 2 kΩ, "B10k" a potentiometer's 10k, "680,1W" a value and a power. */
function resistanceSpelling(text: string): string {
  return text
    .replace(/(\d\s?[kKM])[\s-]?(?:lin|log)\b/gi, "$1 ")
    .replace(/(\d\s?[kKM])R\b/g, "$1Ω")
    .replace(/(\d\s?m)R\b/g, "$1Ω")
    .replace(/(^|[\s(])[ABCabc](\d+(?:[.,]\d+)?\s?[kKM])/g, "$1$2")
    .replace(/^(?!1\/)(\d+(?:\.\d+)?)\s*[,;/]\s*(?=\d[\d.,/]*\s?(?:W|%|V)\b)/i, "$1Ω, ")
    .replace(/^(\d+(?:[.,]\d+)?)\s+(?=(?:±\s?)?\d[\d.,/]*\s?(?:W|%))/i, "$1Ω ");
}

function bareNumber(text: string, mark: DecimalMark | null): Found | null {
  if (!/^\d{1,3}(?: \d{3})+$|^\d{1,7}(?:[.,]\d+)?$/.test(text)) return null;
  const digits = readNumber(text, mark);
  return digits === null
    ? null
    : { reading: { si: digits, unit: "ohm", unitWritten: false }, from: text, at: 0 };
}

/** True where a text names two different values of the class, so that neither can be taken: "5K 10K". */
export function namesTwoValues(text: string, partClass: PartClass): boolean {
  const first = findValue(text, partClass);
  if (first === null) return false;
  const rest = `; ${plainUnits(text).slice(first.at + first.from.length)}`;
  const second = findValue(rest, partClass);
  return (
    second !== null &&
    second.reading.si !== first.reading.si &&
    second.reading.unitWritten === first.reading.unitWritten
  );
}

/**
 * A value with letters that belong to no unit, as a slip of the keyboard leaves them: "0,1uk" for 0,1 µF.
 * Only as a suggestion.
 */
export function guessSlippedValue(
  text: string,
  partClass: PartClass,
  mark: DecimalMark | null,
): ValueReading | null {
  const found = /^\s*(\d*[.,]?\d+)\s?([pnuµμkKM])\s?\p{L}{1,2}\s*$/u.exec(text);
  return found ? readValue(`${found[1]}${found[2]}`, partClass, mark) : null;
}

/**
 * What a number without any letter may mean on a capacitor: three figures as the marking of
 * IEC 60062:2016 (two digits and a power of ten in pF: 104 is 100 nF), a fraction as µF, else pF.
 * Always a suggestion to be confirmed, never taken silently.
 */
export function guessBareCapacitance(text: string): ValueReading | null {
  const plain = text.trim().replace(",", ".");
  const code = /^(\d\d)([0-79])([BCDFGJKMZ]?)$/.exec(plain);
  if (code) {
    const power = code[2] === "9" ? -1 : Number(code[2]);
    return { si: shiftDecimal(code[1] ?? "0", power - 12), unit: "F", unitWritten: false };
  }
  if (/^0?\.\d+$/.test(plain))
    return { si: shiftDecimal(tidyDecimal(plain), -6), unit: "F", unitWritten: false };
  if (/^\d{1,5}(?:\.\d+)?$/.test(plain))
    return { si: shiftDecimal(plain, -12), unit: "F", unitWritten: false };
  return null;
}
