import type { KnownPart, MatchedBy, PriceDraft } from "./price-draft.ts";
import { recogniseProperties } from "./properties.ts";
import { readValue } from "./values.ts";

/** Parts of the workshop, indexed once for a whole price list. */
export interface PartIndex {
  byId: ReadonlyMap<string, KnownPart>;
  byOrderCode: ReadonlyMap<string, KnownPart[]>;
  byPartNumber: ReadonlyMap<string, KnownPart[]>;
  byValue: ReadonlyMap<string, KnownPart[]>;
}

export type Match =
  | { kind: "one"; part: KnownPart; by: MatchedBy }
  | { kind: "several"; parts: KnownPart[] }
  | { kind: "none"; near: KnownPart[] };

/** Codes are compared by their letters and digits: "EB-1003", "EB 1003" and "eb1003" are one. */
function code(text: string): string {
  return text
    .normalize("NFKC")
    .toUpperCase()
    .replace(/[^\p{L}\p{N}]/gu, "");
}

function add(index: Map<string, KnownPart[]>, key: string, part: KnownPart): void {
  const known = index.get(key);
  if (known === undefined) index.set(key, [part]);
  else if (!known.includes(part)) known.push(part);
}

export function indexParts(parts: readonly KnownPart[]): PartIndex {
  const byOrderCode = new Map<string, KnownPart[]>();
  const byPartNumber = new Map<string, KnownPart[]>();
  const byValue = new Map<string, KnownPart[]>();
  for (const part of parts) {
    for (const one of part.orderCodes) if (code(one) !== "") add(byOrderCode, code(one), part);
    if (part.partNumber !== null && code(part.partNumber) !== "")
      add(byPartNumber, code(part.partNumber), part);
    const value = valueKey(part.value, part.class);
    if (value !== null) add(byValue, value, part);
    else if (part.value !== null && code(part.value).length >= 4) add(byPartNumber, code(part.value), part);
  }
  return { byId: new Map(parts.map((part) => [part.id, part])), byOrderCode, byPartNumber, byValue };
}

function valueKey(text: string | null, partClass: KnownPart["class"]): string | null {
  const reading = text === null ? null : readValue(text, partClass);
  return reading === null ? null : `${partClass} ${reading.si} ${reading.unit}`;
}

/** The part a row of a price list is for: by order code, then part number, then value and package. */
export function matchPart(draft: PriceDraft, index: PartIndex): Match {
  const byCode = draft.orderCode === null ? undefined : index.byOrderCode.get(code(draft.orderCode));
  if (byCode) return settled(byCode, "order-code");
  const byNumber = [draft.partNumber, draft.value, draft.orderCode, draft.description]
    .map((text) => (text === null ? undefined : index.byPartNumber.get(code(text))))
    .find((found) => found);
  if (byNumber) return settled(byNumber, "part-number");
  return matchByValue(draft, index);
}

function settled(parts: KnownPart[], by: MatchedBy): Match {
  const [first] = parts;
  return parts.length === 1 && first ? { kind: "one", part: first, by } : { kind: "several", parts };
}

const VALUED = ["resistor", "capacitor", "inductor", "potentiometer", "crystal"] as const;

function matchByValue(draft: PriceDraft, index: PartIndex): Match {
  const text = [draft.value, draft.description].filter((one) => one !== null).join(" ");
  const near: KnownPart[] = [];
  for (const partClass of VALUED) {
    const key = valueKey(text, partClass);
    const found = key === null ? undefined : index.byValue.get(key);
    if (found) near.push(...found);
  }
  const body = bodyOf([draft.package, text]);
  const fitting = near.filter((part) => body !== null && bodyOf([part.package]) === body);
  if (fitting.length > 0) return settled(fitting, "value-and-package");
  return { kind: "none", near: near.slice(0, 4) };
}

function bodyOf(texts: readonly (string | null)[]): string | null {
  const found = recogniseProperties(texts, "other", new Set()).find((one) => one.name === "package");
  return found === undefined ? null : code(found.value);
}
