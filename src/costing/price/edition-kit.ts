import type { Figure } from "#src/costing/figure.ts";
import { grains } from "#src/costing/grains.ts";
import type { Need } from "#src/costing/problem.ts";
import { need } from "#src/costing/run-needs.ts";
import { type Fraction, fraction } from "./fraction.ts";
import type { PriceContext } from "./price-context.ts";
import type { EditionCost } from "./run-cost.ts";

/** One kit of an edition in the run, exactly: its share of the cost over its kits. */
export interface EditionKit {
  kits: number;
  cost: Fraction;
  withoutWork: Fraction;
  nextKit: Fraction;
  minutes: Fraction;
  needs: { cost: Need[]; withoutWork: Need[]; nextKit: Need[] };
}

/** What one kit of an edition costs in the run; a kit of an edition that is not made costs "not known". */
export function editionKit({ cost }: PriceContext, edition: string): EditionKit {
  const found = cost.editions.find(({ id }) => id === edition);
  const kits = found?.kits ?? 0;
  const absent = kits === 0 ? [need("not-in-run", [{ edition }])] : [];
  const perKit = (value: string) => fraction(grains(value), BigInt(kits === 0 ? 1 : kits));
  const of = (figure: "used" | "withoutWork") => perKit(knownText(found, figure));
  return {
    kits,
    cost: of("used"),
    withoutWork: of("withoutWork"),
    nextKit: fraction(grains(knownText(found, "nextKit"))),
    minutes: perKit(found?.minutes ?? "0"),
    needs: {
      cost: [...absent, ...needsIn(found?.used)],
      withoutWork: [...absent, ...needsIn(found?.withoutWork)],
      nextKit: needsIn(found?.nextKit),
    },
  };
}

function knownText(cost: EditionCost | undefined, figure: "used" | "withoutWork" | "nextKit"): string {
  const known = cost?.[figure];
  return known?.known ? known.value : "0";
}

/** What a figure needs; nothing when it is known. */
export function needsIn(figure: Figure | undefined): Need[] {
  return figure === undefined || figure.known ? [] : figure.needs;
}
