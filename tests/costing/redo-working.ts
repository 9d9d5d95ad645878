import { Decimal } from "decimal.js";
import { expect } from "vitest";
import type { WorkingAmount, WorkingTree } from "#src/costing/working-tree.ts";

const D = Decimal.clone({ precision: 80, rounding: Decimal.ROUND_HALF_UP });

function figureIn(amount: WorkingAmount | null): Decimal | null {
  return amount === null || amount.kind === "not-known" || amount.kind === "words"
    ? null
    : new D(amount.value);
}

/** Redoes a working by hand: carries each sum down and demands that every "=" says what comes out. */
export function redo(tree: WorkingTree): number {
  let carried: Decimal | null = null;
  let results = 0;
  for (const line of tree.lines) {
    const figure = figureIn(line.amount);
    if (figure === null) {
      if (line.amount !== null) carried = null;
      continue;
    }
    if (line.sign === null) carried = figure;
    else if (carried === null) continue;
    else if (line.sign === "+") carried = carried.plus(figure);
    else if (line.sign === "−") carried = carried.minus(figure);
    else if (line.sign === "×") carried = carried.times(figure);
    else if (line.sign === "÷") carried = carried.div(figure);
    else {
      const sum: Decimal = line.rounds === null ? carried : carried.toDecimalPlaces(line.rounds);
      const where = `${tree.figure}, line ${line.letter} ${line.label}: ${sum.toFixed()} and ${figure.toFixed()}`;
      expect(sum.minus(figure).abs().lt("1e-19"), where).toBe(true);
      carried = figure;
      results += 1;
    }
  }
  return results;
}
