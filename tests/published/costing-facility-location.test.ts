import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { chooseSuppliers } from "#src/costing/sourcing/choose-suppliers.ts";
import type { SourcingInput } from "#src/costing/sourcing/sourcing-input.ts";

/**
 * A supplier whose freight is flat and a warehouse with a fixed cost are the same problem: uncapacitated facility
 * location. Optima: OR-Library (J. E. Beasley), file uncapopt.
 */
const OPTIMA: Record<string, string> = {
  cap71: "932615.750",
  cap72: "977799.400",
  cap73: "1010641.450",
  cap74: "1034976.975",
  cap101: "796648.437",
  cap104: "928941.750",
  cap131: "793439.562",
  cap134: "928941.750",
};

/** Costs have up to five decimals: reckoned in hundred-thousandths. */
const UNIT = 100_000;
const WORTH = { currency: "EUR", grains: 10n ** 19n, millionth: 0n, near: 1e19, rate: null };

function supplier(id: string, freight: number): SourcingInput["suppliers"][number] {
  return {
    id,
    worth: WORTH,
    terms: {
      minimum: 0,
      belowMinimum: { term: "none" },
      freight: { model: "flat", amount: freight },
      freeFrom: null,
      handling: 0,
      customs: null,
    },
  };
}

function part(id: string, costs: readonly (number | null)[]): SourcingInput["parts"][number] {
  return {
    id,
    toBuy: 1,
    coverable: 1,
    ways: costs.flatMap((cost, at) =>
      cost === null
        ? []
        : [
            {
              orders: [
                {
                  offer: id,
                  supplier: at,
                  pieces: 1,
                  cost,
                  leftOver: 0,
                  leftWorth: 0n,
                  weight: null,
                  leadDays: null,
                },
              ],
            },
          ],
    ),
  };
}

function read(file: string): SourcingInput {
  const numbers = readFileSync(`tests/published/orlib/${file}.txt`, "utf8")
    .trim()
    .split(/\s+/)
    .map((text) => Math.round(Number(text) * UNIT));
  const [warehouses, customers] = [(numbers[0] ?? 0) / UNIT, (numbers[1] ?? 0) / UNIT];
  const costsFrom = 2 + 2 * warehouses;
  return {
    suppliers: Array.from({ length: warehouses }, (_, at) => supplier(`w${at}`, numbers[3 + 2 * at] ?? 0)),
    parts: Array.from({ length: customers }, (_, at) => {
      const from = costsFrom + at * (warehouses + 1) + 1;
      return part(`c${at}`, numbers.slice(from, from + warehouses));
    }),
  };
}

describe("OR-Library, uncapacitated warehouse location", () => {
  test.each(Object.entries(OPTIMA))("%s: %s", (file, optimum) => {
    const { plan, gap, complete } = chooseSuppliers(read(file));
    expect({ gap, complete }).toEqual({ gap: 0n, complete: true });
    // The list of optima cuts to three decimals.
    expect(Math.trunc(Number((plan?.total ?? 0n) / 10n ** 19n) / 100) / 1000).toBe(Number(optimum));
  });
});

test("five lines, three suppliers: line by line 32.60, together 26.00 at the first (computed by hand)", () => {
  const costs = [
    [4.0, 5.2, 3.9],
    [1.5, 1.2, 1.6],
    [7.0, 9.0, 6.5],
    [2.2, null, 2.1],
    [3.3, 2.9, 3.6],
  ];
  const { plan } = chooseSuppliers({
    suppliers: [8, 6, 10].map((fee, at) => supplier(`s${at}`, fee * UNIT)),
    parts: costs.map((own, at) =>
      part(
        `p${at}`,
        own.map((cost) => (cost === null ? null : Math.round(cost * UNIT))),
      ),
    ),
  });
  // 4.0 + 1.5 + 7.0 + 2.2 + 3.3 = 18.0, and 8 of freight.
  expect(plan?.total).toBe(26n * 10n ** 24n);
  expect(plan?.baskets.map(({ supplier: index }) => index)).toEqual([0]);
});
