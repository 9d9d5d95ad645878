import { tidyDecimal } from "./exact-decimal.ts";
import type { DecimalMark } from "./sheet.ts";

/**
 * A number as people write it, as decimal text: "1.234,56", "1,234.56", "1 234,5", ",5". `mark` settles
 * what "1,234" means; without it, a comma or point before exactly three digits groups thousands unless
 * the number begins with 0. `null` if the text is no number.
 */
export function readNumber(text: string, mark: DecimalMark | null): string | null {
  const plain = text.replace(/[\s\u00a0\u202f\u2009'’]/g, "");
  if (!/^\d*(?:[.,]\d+)*[.,]?$/.test(plain) || !/\d/.test(plain)) return null;
  const commas = plain.split(",").length - 1;
  const points = plain.split(".").length - 1;
  if (commas === 0 && points === 0) return tidyDecimal(plain);
  if (commas > 0 && points > 0) return mixed(plain, commas, points);
  const sign = commas > 0 ? "," : ".";
  const count = commas + points;
  const grouped = /^\d{1,3}(?:[.,]\d{3})+$/.test(plain);
  if (count > 1) return grouped ? tidyDecimal(plain.split(sign).join("")) : null;
  const asDecimal = tidyDecimal(plain.replace(sign, ".").replace(/\.$/, ""));
  const signIsMark =
    mark === null ? sign === "." || !grouped || plain.startsWith("0") : (mark === "comma") === (sign === ",");
  if (signIsMark) return asDecimal;
  return grouped && !plain.startsWith("0") ? tidyDecimal(plain.replace(sign, "")) : asDecimal;
}

function mixed(plain: string, commas: number, points: number): string | null {
  const decimal = plain.lastIndexOf(",") > plain.lastIndexOf(".") ? "," : ".";
  if ((decimal === "," ? commas : points) > 1) return null;
  const thousands = decimal === "," ? "." : ",";
  const [whole = "", fraction = ""] = plain.split(decimal);
  if (!/^\d{1,3}(?:[.,]\d{3})+$/.test(whole)) return null;
  return tidyDecimal(`${whole.split(thousands).join("")}.${fraction}`);
}

/** The decimal mark most cells use; `null` where no cell tells, as with whole numbers. */
export function decimalMarkOf(cells: readonly string[]): DecimalMark | null {
  let comma = 0;
  let point = 0;
  for (const cell of cells) {
    for (const found of cell.matchAll(/(?<![\d.,])(\d+)([.,])(\d+)(?![\d.,])/g)) {
      const sure = found[3]?.length !== 3 || found[1] === "0";
      if (found[2] === ",") comma += sure ? 1 : 0;
      else point += sure ? 1 : 0;
    }
    if (/\d\.\d{3},\d/.test(cell)) comma += 1;
    if (/\d,\d{3}\.\d/.test(cell)) point += 1;
  }
  if (comma === 0 && point === 0) return null;
  return comma > point ? "comma" : "point";
}
