import { readNumber } from "./numbers.ts";
import type { DecimalMark } from "./sheet.ts";

export type ReadQuantity =
  | { kind: "empty" }
  | { kind: "number"; quantity: number }
  /** "2 of 100": so many out of a pack. */
  | { kind: "of-pack"; quantity: number; pack: number }
  /** "7 meters", "0.5": a number that is no count of pieces. */
  | { kind: "measure"; quantity: number; text: string }
  | { kind: "word"; text: string };

const PIECES =
  /^(?:x|×|pcs?\.?|pieces?|pc|ea\.?|each|off|st(?:k|ck|ück|uck)?\.?|pi[eè]ces?|uds?\.?|unidades?|pz\.?|pezzi|szt\.?|ks|kus[ůy]?|шт\.?|個|个|只|units?|nos?\.?|per (?:kit|board|pcb|unit)|\/ ?(?:kit|board|pcb|unit))$/i;

/** A quantity cell: "4", "4.0", "4 pcs", "x4", "2 of 100", "7 meters", "Lots". */
export function readQuantity(cell: string, mark: DecimalMark | null = null): ReadQuantity {
  const text = cell.trim();
  if (text === "") return { kind: "empty" };
  if (/^\d{1,9}$/.test(text)) return { kind: "number", quantity: Number(text) };
  const pack = /^(\d{1,6})\s*(?:of|\/|out of|aus|von|de|di|z|из)\s*(\d{1,6})$/i.exec(text);
  if (pack) return { kind: "of-pack", quantity: Number(pack[1]), pack: Number(pack[2]) };
  const found = /^(?:[x×~≈]|ca\.?|approx\.?)?\s*(\d[\d.,'  ]*)\s*(\S.*)?$/i.exec(text);
  if (!found) return { kind: "word", text };
  const number = readNumber((found[1] ?? "").trim(), mark);
  const rest = (found[2] ?? "").trim();
  if (number === null) return { kind: "word", text };
  const whole = /^\d{1,9}$/.test(number);
  if (whole && (rest === "" || PIECES.test(rest))) return { kind: "number", quantity: Number(number) };
  if (!whole && rest === "") return { kind: "measure", quantity: Math.ceil(Number(number)), text };
  return { kind: "measure", quantity: whole ? Number(number) : Math.ceil(Number(number)), text };
}
