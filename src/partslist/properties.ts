import type { PartClass } from "#src/shapes/limits.ts";
import type { PropertyName, RecognisedProperty } from "./draft.ts";
import { divideDecimal, shiftDecimal, tidyDecimal } from "./exact-decimal.ts";

const NUMBER = "(\\d+(?:[.,]\\d+)?|[.,]\\d+)";
const START = "(?<![A-Za-z0-9.,])";

const TOLERANCE = new RegExp(`(?:±|\\+\\/?-)?\\s?${START}${NUMBER}\\s?%`);
const FRACTION_WATT = /(?<![A-Za-z0-9.,])(\d{1,2})\/(\d{1,3})\s?[Ww](?:att)?s?(?![A-Za-z0-9])/;
const WATT = new RegExp(`${START}${NUMBER}\\s?(m?)(?:[Ww](?:atts?)?)(?![A-Za-z0-9])`);
const VOLT = new RegExp(`${START}${NUMBER}\\s?(k?)(?:V|v|volts?|Volts?|VDC|VAC|Vdc|Vac)(?![A-Za-z0-9])`);
const SPACING: readonly RegExp[] = [
  new RegExp(
    `(?:^|[\\s,;(_-])(?:RM|rm|Raster(?:ma(?:ß|ss))?|pitch|Pitch|LS|lead spacing|hole spacing|rozteč|raster|entraxe|pas|passo|paso|steek|шаг)\\s?[:=]?\\s?${NUMBER}\\s?(?:mm)?(?![A-Za-z0-9])`,
  ),
  /_P(\d+(?:\.\d+)?)mm/,
  /(?:^|[\s,;(])(\d+(?:[.,]\d+)?)\s?mm (?:pitch|spacing|raster|lead spacing|hole spacing)/i,
];
const INCH_SPACING = /(?:^|[\s,;(])(\d?[.,]\d+)\s?(?:"|″|''|in(?:ch)?(?:es)?\b)/;
const ROW_SPACING = /_W(\d+(?:\.\d+)?)mm/;
const DIAMETER: readonly RegExp[] = [
  /_D(\d+(?:\.\d+)?)mm/,
  /(?:ø|Ø|⌀|dia\.?|diameter|Durchmesser)\s?(\d+(?:[.,]\d+)?)\s?mm/i,
];
const LED_SIZE = /(?<![A-Za-z0-9.,])(3|5|8|10|1[.,]8)\s?mm(?![A-Za-z0-9])/;
const DIELECTRIC = /(?<![A-Za-z0-9])(X[5678][RSTUV]|Y5V|Z5U|C0G|COG|NP0|NPO|C0K)(?![A-Za-z0-9])/i;
/** One search for all of them: most rows name none, and each search costs. */
const MATERIAL =
  /(?<![\p{L}])(?:(?<electrolytic>electrolytic|elektrolyt\p{L}*|elko|électrolytique|chimique|electrolítico|elettrolitico|elco|elektrolit\p{L}*|eletrolítico|электролит\p{L}*)|(?<tantalum>tantal(?:um|e|io|o)?)|(?<ceramic>ceramic|keramik|keramisch|kerko|céramique|cerámico|ceramico|keramick[áéý]|ceramiczny|cerâmico|керамика)|(?<film>film|folie|folien\p{L}*|polyester|polypropylen\p{L}*|mks|mkt|mkp|polystyrene|styroflex))(?!\p{L})/iu;
/** Usual names of bodies; the last group is the four figures of chips and axial parts, the one before the lead style. */
const PACKAGE =
  /(?<![A-Za-z0-9.])(?:(TO-?(?:92|126|220|247|18|39|3|252|263)(?:-\d)?[A-Z]?|(?:P?DIP|DIL|CDIP|SIP|SOIC|SOP|SSOP|TSSOP|MSOP|SO|TQFP|LQFP|QFN|DFN|PLCC)-?\d{1,3}|SOT-?(?:23|223|89|323|363|353|143)(?:-\d)?|DO-?(?:35|41|15|201|27|34|7|214AC|214AA)|SOD-?\d{2,3}[A-Z]*|SM[ABC](?![A-Za-z])|HC-?49(?:\/?[A-Z]{1,2})?|a[xs]s?ial|radial)(?:e|es|o)?(?![0-9])|(?:[CRLD]_?|SMD ?|LED_?|DIN)?(0201|0402|0603|0805|1206|1210|1812|2010|2512|0204|0207|0309|0411|0414)(?![A-Za-z0-9]))/i;

/** A number of the text as decimal text. */
function decimal(text: string | undefined): string {
  return tidyDecimal((text ?? "0").replace(",", "."));
}

interface Rule {
  name: PropertyName;
  /** A sign without which the property cannot be named; spares most texts the search. */
  sign: RegExp;
  /** `null` where the class has no such property to be read. */
  read: (text: string, partClass: PartClass) => { value: string; from: string } | null;
}

function first(patterns: readonly RegExp[], text: string): RegExpExecArray | null {
  for (const pattern of patterns) {
    const found = pattern.exec(text);
    if (found) return found;
  }
  return null;
}

function power(text: string): { value: string; from: string } | null {
  const fraction = FRACTION_WATT.exec(text);
  if (fraction && fraction[2] !== "0")
    return {
      value: divideDecimal(fraction[1] ?? "0", BigInt(fraction[2] ?? "1"), 4),
      from: fraction[0].trim(),
    };
  const plain = WATT.exec(text);
  return (
    plain && {
      value: plain[2] ? shiftDecimal(decimal(plain[1]), -3) : decimal(plain[1]),
      from: plain[0].trim(),
    }
  );
}

function voltage(text: string): { value: string; from: string } | null {
  const found = VOLT.exec(text);
  return (
    found && {
      value: found[2] ? shiftDecimal(decimal(found[1]), 3) : decimal(found[1]),
      from: found[0].trim(),
    }
  );
}

function spacing(text: string): { value: string; from: string } | null {
  const metric = first(SPACING, text);
  if (metric) return { value: decimal(metric[1]), from: metric[0].replace(/^[\s,;(_]+/, "") };
  const inch = INCH_SPACING.exec(text);
  return inch && { value: tidyDecimal(timesInch(decimal(inch[1]))), from: inch[0].trim() };
}

/** Inches to millimetres: 25.4 mm exactly (International yard and pound agreement, 1959). */
function timesInch(inches: string): string {
  const [whole = "0", fraction = ""] = inches.split(".");
  const product = BigInt(whole + fraction) * 254n;
  return shiftDecimal(product.toString(), -fraction.length - 1);
}

function packageIn(text: string): { value: string; from: string } | null {
  const found = PACKAGE.exec(text);
  if (!found) return null;
  const name = (found[1] ?? found[2] ?? "").toUpperCase();
  return { value: name.replace(/^A[XS]+IAL$/, "axial").replace(/^RADIAL$/, "radial"), from: found[0].trim() };
}

const SPACING_SIGN = /\d\s?(?:mm|in|["″']|$)|rm|_P\d|raster|pitch|spacing|\bls|rozteč|entraxe|pas|steek|шаг/i;

const RULES: readonly Rule[] = [
  { name: "tolerance", sign: /%/, read: (text) => withValue(TOLERANCE.exec(text)) },
  {
    name: "power",
    sign: /w/i,
    read: (text, partClass) =>
      partClass === "resistor" || partClass === "potentiometer" ? power(text) : null,
  },
  {
    name: "voltage",
    sign: /v/i,
    read: (text, partClass) => (partClass === "capacitor" ? voltage(text) : null),
  },
  { name: "hole-spacing", sign: SPACING_SIGN, read: spacing },
  { name: "row-spacing", sign: /_W/, read: (text) => withValue(ROW_SPACING.exec(text)) },
  {
    name: "diameter",
    sign: /mm/,
    read: (text, partClass) =>
      withValue(first(DIAMETER, text) ?? (partClass === "led" ? LED_SIZE.exec(text) : null)),
  },
  { name: "dielectric", sign: /./, read: dielectric },
  { name: "package", sign: /./, read: packageIn },
];

function withValue(found: RegExpExecArray | null): { value: string; from: string } | null {
  return found && { value: decimal(found[1]), from: found[0].trim() };
}

function dielectric(text: string, partClass: PartClass): { value: string; from: string } | null {
  if (partClass !== "capacitor") return null;
  const code = DIELECTRIC.exec(text);
  if (code) return { value: (code[1] ?? "").toUpperCase().replace(/^(COG|NP0|NPO)$/, "C0G"), from: code[0] };
  const material = MATERIAL.exec(text);
  if (!material) return null;
  const name = Object.entries(material.groups ?? {}).find(([, words]) => words !== undefined)?.[0];
  return name === undefined ? null : { value: name, from: material[0] };
}

/**
 * Properties named in the free texts of a row. What a column of its own says is left out: pass the names
 * of those columns as `known`.
 */
export function recogniseProperties(
  texts: readonly (string | null)[],
  partClass: PartClass,
  known: ReadonlySet<PropertyName>,
): RecognisedProperty[] {
  const found: RecognisedProperty[] = [];
  const text = texts.filter((one) => one !== null && one !== "").join(" ; ");
  if (text === "") return found;
  for (const { name, sign, read } of RULES) {
    if (known.has(name) || !sign.test(text)) continue;
    const one = read(text, partClass);
    if (one) found.push({ name, value: one.value, from: one.from });
  }
  return found;
}
