import type { BasketTerms, FreightBand } from "#src/costing/sourcing/basket-terms.ts";
import type { SourcingInput, SourcingSupplier } from "#src/costing/sourcing/sourcing-input.ts";

/**
 * The joint choice stated as a mixed-integer linear program, from the method pages alone: what general solvers are
 * given. Amounts in minor units, the objective in hundredths of the plan's currency. Rates of whole percent: a half is
 * then told from less than a half by a hundredth, which solvers' tolerances allow.
 */
export interface Program {
  objective: Term[];
  rows: Row[];
  /** Whole numbers; of these the ones that are 0 or 1. */
  whole: string[];
  binary: string[];
}

export interface Term {
  name: string;
  by: number;
}

export interface Row {
  terms: Term[];
  relation: ">=" | "<=" | "=";
  value: number;
}

/** Where a half is rounded up: a hundredth of a minor unit below it is not. */
const HALF = 0.5 - 0.005;

export function linearProgram({ suppliers, parts }: SourcingInput): Program {
  const program: Program = { objective: [], rows: [], whole: [], binary: [] };
  const most = mostOf({ suppliers, parts });
  parts.forEach(({ ways, toBuy }, part) => {
    const names = ways.map((_, way) => `x_${part}_${way}`);
    program.binary.push(...names);
    if (toBuy > 0)
      program.rows.push({ terms: names.map((name) => ({ name, by: 1 })), relation: "=", value: 1 });
    ways.forEach(({ orders }, way) => {
      for (const supplier of new Set(orders.map((order) => order.supplier)))
        row(
          program,
          [
            [`y_${supplier}`, 1],
            [`x_${part}_${way}`, -1],
          ],
          ">=",
          0,
        );
    });
  });
  suppliers.forEach((supplier, index) => {
    const sum = (of: (order: SourcingInput["parts"][number]["ways"][number]["orders"][number]) => number) =>
      parts.flatMap(({ ways }, part) =>
        ways.map(
          ({ orders }, way): Term => ({
            name: `x_${part}_${way}`,
            by: orders.reduce((total, order) => total + (order.supplier === index ? of(order) : 0), 0),
          }),
        ),
      );
    basket(
      program,
      supplier,
      index,
      sum(({ cost }) => cost),
      sum(({ weight }) => weight ?? 0),
      most,
    );
  });
  return { ...program, objective: merged(program.objective) };
}

/** No basket's goods, weight or customs value is more. */
function mostOf({ suppliers, parts }: SourcingInput): number {
  const orders = parts.flatMap(({ ways }) => ways.flatMap((way) => way.orders));
  const brought = orders.reduce((sum, { cost, weight }) => sum + cost + (weight ?? 0), 1);
  const freights = suppliers.map(({ terms: { freight } }) =>
    freight.model === "flat"
      ? freight.amount
      : "bands" in freight
        ? Math.max(...freight.bands.map(({ amount }) => amount))
        : 0,
  );
  return brought + Math.max(0, ...freights);
}

/** One term for each name: solvers take the last of several. */
function merged(terms: readonly Term[]): Term[] {
  const sums = new Map<string, number>();
  for (const { name, by } of terms) sums.set(name, (sums.get(name) ?? 0) + by);
  return [...sums].map(([name, by]) => ({ name, by }));
}

function row(program: Program, terms: [string, number][], relation: Row["relation"], value: number): void {
  program.rows.push({ terms: terms.map(([name, by]) => ({ name, by })), relation, value });
}

function basket(
  program: Program,
  { worth, terms }: SourcingSupplier,
  index: number,
  goods: Term[],
  weight: Term[],
  most: number,
): void {
  const rate = Number(worth.grains) / 1e22;
  const [used, amount] = [`y_${index}`, `g_${index}`];
  program.binary.push(used);
  program.rows.push({
    terms: [{ name: amount, by: 1 }, ...goods.map(({ name, by }) => ({ name, by: -by }))],
    relation: "=",
    value: 0,
  });
  program.objective.push({ name: amount, by: rate }, { name: used, by: rate * terms.handling });
  small(program, terms, index, rate);
  freight(program, terms, index, rate, weight, most);
  customs(program, terms, index, rate, most);
}

function small(program: Program, { minimum, belowMinimum }: BasketTerms, index: number, rate: number): void {
  if (belowMinimum.term === "none") return;
  const below = `u_${index}`;
  program.binary.push(below);
  row(
    program,
    [
      [`g_${index}`, 1],
      [`y_${index}`, -minimum],
      [below, minimum],
    ],
    ">=",
    0,
  );
  if (belowMinimum.term === "refused") row(program, [[below, 1]], "=", 0);
  else program.objective.push({ name: below, by: rate * belowMinimum.fee });
}

function freight(
  program: Program,
  terms: BasketTerms,
  index: number,
  rate: number,
  weight: Term[],
  most: number,
): void {
  const [charge, free] = [`f_${index}`, `o_${index}`];
  program.binary.push(free);
  program.objective.push({ name: charge, by: rate });
  row(
    program,
    [
      [`g_${index}`, 1],
      [free, -(terms.freeFrom ?? most)],
    ],
    ">=",
    0,
  );
  if (terms.freeFrom === null) row(program, [[free, 1]], "=", 0);
  if (terms.freight.model === "flat") {
    row(
      program,
      [
        [charge, 1],
        [`y_${index}`, -terms.freight.amount],
        [free, terms.freight.amount],
      ],
      ">=",
      0,
    );
  } else if ("bands" in terms.freight) {
    const measure = terms.freight.model === "by-goods" ? [{ name: `g_${index}`, by: 1 }] : weight;
    banded(program, terms.freight.bands, index, measure, most);
  }
}

function banded(
  program: Program,
  bands: readonly FreightBand[],
  index: number,
  measure: Term[],
  most: number,
): void {
  const names = bands.map((_, band) => `b_${index}_${band}`);
  program.binary.push(...names);
  row(program, [...names.map((name): [string, number] => [name, 1]), [`y_${index}`, -1]], "=", 0);
  const bound = (of: (band: number) => number, relation: Row["relation"]) =>
    program.rows.push({
      terms: [...measure, ...names.map((name, band) => ({ name, by: -of(band) }))],
      relation,
      value: 0,
    });
  bound((band) => (band === 0 ? 0 : (bands[band]?.from ?? 0)), ">=");
  bound((band) => (bands[band + 1] === undefined ? most : (bands[band + 1]?.from ?? 0) - 1), "<=");
  const dearest = Math.max(...bands.map(({ amount }) => amount));
  program.rows.push({
    terms: [
      { name: `f_${index}`, by: 1 },
      ...names.map((name, band) => ({ name, by: -(bands[band]?.amount ?? 0) })),
      { name: `o_${index}`, by: dearest },
    ],
    relation: ">=",
    value: 0,
  });
}

function customs(program: Program, terms: BasketTerms, index: number, rate: number, most: number): void {
  if (terms.customs === null) return;
  const { withFreight, dutyMillionths, dutyOver, taxMillionths, taxReclaimed, broker } = terms.customs;
  const [duty, tax, due, value] = [`d_${index}`, `t_${index}`, `e_${index}`, `v_${index}`];
  program.whole.push(duty, tax);
  program.binary.push(due);
  program.objective.push({ name: duty, by: rate }, { name: `y_${index}`, by: rate * broker });
  if (!taxReclaimed) program.objective.push({ name: tax, by: rate });
  row(
    program,
    [
      [value, 1],
      [`g_${index}`, -1],
      [`f_${index}`, withFreight ? -1 : 0],
    ],
    "=",
    0,
  );
  const top = 2 * most;
  row(
    program,
    [
      [value, 1],
      [due, -top],
    ],
    "<=",
    dutyOver,
  );
  const dutyMost = (top * dutyMillionths) / 1e6;
  row(
    program,
    [
      [duty, 1],
      [value, -dutyMillionths / 1e6],
      [due, -dutyMost],
    ],
    ">=",
    -HALF - dutyMost,
  );
  row(
    program,
    [
      [tax, 1],
      [value, -taxMillionths / 1e6],
      [duty, -taxMillionths / 1e6],
    ],
    ">=",
    -HALF,
  );
}
