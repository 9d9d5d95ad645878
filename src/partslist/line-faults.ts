import { repeatedDesignators } from "./designators.ts";

/** What is to settle about a line itself, whatever it costs. */
export type LineFault =
  /** It is in no edition. */
  | { kind: "no-quantity" }
  /** Another line, or the same one, names this designator too. */
  | { kind: "twice"; designator: string }
  /** The edition that takes most of it takes another number than is named. */
  | { kind: "at-odds"; quantity: number; named: number };

interface CheckedLine {
  id: string;
  /** "R1, R2"; empty for a screw or a box. */
  designators: string;
  mark: string;
  quantities: Readonly<Record<string, number>>;
}

function names(line: CheckedLine): string[] {
  return line.designators === "" ? [] : line.designators.split(", ");
}

function faultOf(line: CheckedLine, repeated: ReadonlySet<string>): LineFault | null {
  const named = names(line);
  const twice = named.find((name) => repeated.has(name));
  if (twice !== undefined) return { kind: "twice", designator: twice };
  if (line.mark === "do-not-place") return null;
  const quantity = Math.max(0, ...Object.values(line.quantities));
  if (quantity === 0) return { kind: "no-quantity" };
  return named.length > 0 && named.length !== quantity
    ? { kind: "at-odds", quantity, named: named.length }
    : null;
}

/** The lines of a list that somebody must see to, by id, each with what is wrong. */
export function lineFaults(lines: readonly CheckedLine[]): Map<string, LineFault> {
  const repeated = new Set(repeatedDesignators(lines.flatMap(names)));
  const faults = new Map<string, LineFault>();
  for (const line of lines) {
    const fault = faultOf(line, repeated);
    if (fault) faults.set(line.id, fault);
  }
  return faults;
}
