import type { ColumnCells } from "./column-cells.ts";
import type { Meaning } from "./meanings.ts";

/** How cells speak for a meaning: `fit` is added to the heading's weight; `alone` is the score without a heading. */
export interface Fit {
  fit: number;
  alone: number;
}

const NONE: Fit = { fit: 0, alone: 0 };
const numeric = (cells: ColumnCells) => cells.integers + cells.decimals + cells.money;

/**
 * How well the cells of a column suit a meaning. `agreement` is the share of rows in which the cell counts
 * the designators of its row. An empty column speaks neither for nor against its heading.
 */
export function suits(meaning: Meaning, cells: ColumnCells, agreement: number): Fit {
  if (cells.filled === 0) return NONE;
  const against = cells.flags >= 0.7 && cells.integers < 0.7 && !FLAGGED.includes(meaning) ? -5 : 0;
  const { fit, alone } = RULES[meaning]?.(cells, agreement) ?? NONE;
  return { fit: fit + against, alone: against < 0 ? 0 : alone };
}

const FLAGGED: readonly Meaning[] = ["do-not-place", "place", "leave-out", "note"];

function designators(cells: ColumnCells): Fit {
  const named = cells.designators + cells.names * 0.6;
  if (cells.designators >= 0.75) return { fit: 5, alone: 6 };
  if (cells.designators >= 0.5) return { fit: 4, alone: cells.distinct > 0.8 ? 4 : 0 };
  if (cells.integers > 0.6 || cells.decimals > 0.6 || cells.urls > 0.5) return { fit: -7, alone: 0 };
  if (named >= 0.5 && cells.sentences < 0.5) return { fit: cells.designators > 0.15 ? 1 : -0.5, alone: 0 };
  if (cells.designators >= 0.2) return { fit: -1, alone: 0 };
  return { fit: -4, alone: 0 };
}

function quantity(cells: ColumnCells, agreement: number): Fit {
  if (agreement >= 0.7) return { fit: 6, alone: 6 };
  if (cells.sequence && cells.distinct > 0.9) return { fit: -3, alone: 0 };
  if (cells.integers >= 0.8) {
    const plausible = !cells.sequence && (cells.distinct < 0.6 || !cells.headed);
    return { fit: 4, alone: plausible && cells.examples.every((cell) => cell.length < 5) ? 2.6 : 0 };
  }
  if (cells.integers >= 0.5) return { fit: 2, alone: 0 };
  if (cells.integers + cells.decimals + cells.codes >= 0.3) return { fit: 0, alone: 0 };
  return { fit: cells.designators + cells.values + cells.urls > 0.5 ? -5 : -3, alone: 0 };
}

function lineNumber(cells: ColumnCells): Fit {
  if (cells.sequence) return { fit: 5, alone: 3 };
  if (cells.integers >= 0.9) return { fit: cells.distinct > 0.95 ? 2 : -3, alone: 0 };
  return { fit: cells.codes > 0.7 ? -3 : -7, alone: 0 };
}

function value(cells: ColumnCells): Fit {
  if (cells.urls > 0.5 || cells.money > 0.5 || cells.designators > 0.7) return { fit: -6, alone: 0 };
  if (cells.long > 0.5) return { fit: -1, alone: 0 };
  if (cells.values >= 0.25 && cells.packages < 0.7) return { fit: 3, alone: 3.5 };
  if (cells.sequence) return { fit: -3, alone: 0 };
  if (cells.values === 0 && cells.words > 0.5) return { fit: -0.5, alone: 0 };
  return { fit: cells.sentences > 0.8 ? 0 : 0.5, alone: 0 };
}

function description(cells: ColumnCells): Fit {
  if (numeric(cells) > 0.6 || cells.urls > 0.5) return { fit: -5, alone: 0 };
  if (cells.designators > 0.6) return { fit: -5, alone: 0 };
  const long = cells.sentences >= 0.5 ? 2 : 0;
  return { fit: long, alone: long > 0 && cells.distinct > 0.4 ? 2.6 : 0 };
}

function packages(cells: ColumnCells): Fit {
  if (cells.packages >= 0.4) return { fit: 3, alone: 3 };
  if (cells.urls > 0.5 || cells.money > 0.3) return { fit: -5, alone: 0 };
  return { fit: cells.codes > 0.5 ? 0.5 : 0, alone: 0 };
}

function words(cells: ColumnCells): Fit {
  if (numeric(cells) > 0.5 || cells.urls > 0.5 || cells.designators > 0.6) return { fit: -5, alone: 0 };
  return { fit: cells.words > 0.5 ? 1.5 : -0.5, alone: 0 };
}

function partNumber(cells: ColumnCells): Fit {
  if (cells.urls > 0.6 || cells.money > 0.5) return { fit: -4, alone: 0 };
  if (cells.designators > 0.7) return { fit: -4, alone: 0 };
  if (cells.codes >= 0.4) return { fit: 2, alone: 0 };
  return { fit: cells.words > 0.8 ? -1.5 : 0, alone: 0 };
}

function orderCode(cells: ColumnCells): Fit {
  if (cells.urls > 0.5 || cells.money > 0.5) return { fit: -6, alone: 0 };
  if (cells.codes + cells.integers >= 0.4) return { fit: 2, alone: 0 };
  return { fit: cells.words > 0.7 ? -2.5 : 0, alone: 0 };
}

function price(cells: ColumnCells): Fit {
  if (cells.money >= 0.5) return { fit: 3, alone: 3 };
  if (numeric(cells) >= 0.4) return { fit: 2.5, alone: 0 };
  return { fit: cells.words + cells.codes > 0.7 ? -5 : 0, alone: 0 };
}

function wholeNumber(cells: ColumnCells): Fit {
  if (cells.integers >= 0.6) return { fit: 2, alone: 0 };
  return { fit: numeric(cells) + cells.codes + cells.sentences > 0.3 ? 0 : -3, alone: 0 };
}

function mark(cells: ColumnCells): Fit {
  if (cells.flags >= 0.6) return { fit: 2, alone: cells.marks >= 0.9 && cells.fill < 0.6 ? 2.6 : 0 };
  return { fit: cells.fill < 0.3 ? 0 : -3, alone: 0 };
}

function property(cells: ColumnCells): Fit {
  return { fit: cells.urls + cells.designators > 0.5 ? -5 : 1, alone: 0 };
}

const RULES: Readonly<Partial<Record<Meaning, (cells: ColumnCells, agreement: number) => Fit>>> = {
  designators,
  quantity,
  "line-number": lineNumber,
  value,
  description,
  package: packages,
  manufacturer: words,
  supplier: words,
  "part-number": partNumber,
  "order-code": orderCode,
  "price-each": price,
  "price-break": price,
  "line-total": price,
  "minimum-order": wholeNumber,
  "order-multiple": wholeNumber,
  stock: wholeNumber,
  "break-quantity": wholeNumber,
  "do-not-place": mark,
  place: mark,
  tolerance: property,
  power: property,
  voltage: property,
  "hole-spacing": property,
  currency: words,
  class: words,
  note: (cells) => ({ fit: cells.urls > 0.5 || cells.designators > 0.6 ? -5 : 0, alone: 0 }),
  datasheet: (cells) => ({
    fit: cells.urls > 0.3 ? 3 : cells.codes > 0.5 ? 0 : -2,
    alone: cells.urls >= 0.6 ? 3 : 0,
  }),
};
