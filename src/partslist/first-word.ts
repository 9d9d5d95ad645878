import { looksLikeDesignators } from "./designators.ts";

const MARKED = /^\s*([^:=\t]{1,80}?)\s*(?:[:=]|\s-\s|\s–\s|\t)\s*(\S.*)$/;
const LED_BY_DESIGNATORS =
  /^\s*((?:[A-Za-z]{1,4}\d{1,4}[A-Za-z]?(?:\s*(?:[-–,;&+]|\.\.+)\s*|\s+(?=[A-Za-z]{1,4}\d)))*[A-Za-z]{0,4}\d{1,4}[A-Za-z]?)\s+(\S.*)$/;
const LED_BY_QUANTITY = /^\s*(\d{1,4})\s*(?:x|×|pcs?\.?|off|st(?:k|ück)?\.?|ea\.?)?\s+(\S.*)$/i;

/**
 * A list written out line by line: "R1, R2: 10k", "C1 100n ceramic", "4 x BC547". Split into what leads the
 * line and the rest. `null` unless most lines begin so.
 */
export function firstWordColumns(text: string): string[][] | null {
  const lines = text.split(/\r?\n|\r/);
  const filled = lines.filter((line) => line.trim() !== "");
  if (filled.length < 2) return null;
  for (const split of [byMark, byDesignators, byQuantity]) {
    const taken = filled.filter((line) => split(line) !== null);
    if (taken.length >= Math.max(2, filled.length * 0.6)) return lines.map((line) => split(line) ?? [line]);
  }
  return null;
}

function byMark(line: string): string[] | null {
  const found = MARKED.exec(line);
  return found && looksLikeDesignators(found[1] ?? "") ? [found[1] ?? "", found[2] ?? ""] : null;
}

function byDesignators(line: string): string[] | null {
  const found = LED_BY_DESIGNATORS.exec(line);
  return found && looksLikeDesignators(found[1] ?? "") ? [found[1] ?? "", found[2] ?? ""] : null;
}

function byQuantity(line: string): string[] | null {
  const found = LED_BY_QUANTITY.exec(line);
  return found ? [found[1] ?? "", found[2] ?? ""] : null;
}
