import { grainText } from "./grains.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import { BRINGS_NEEDS, MISSING, SPENT_NEEDS, USED_NEEDS } from "./run-sheet.ts";
import { soldToPayFor } from "./sold-to-pay.ts";
import type { SweepColumns } from "./sweep-result.ts";
import { perKitOf, type Swept } from "./swept.ts";

/** Columns as text: where `known` only what is known at that size, else everything that can be reckoned. */
export function columnsOf(prepared: PreparedPlan, swept: Swept, known: boolean): SweepColumns {
  const { spent, used, brings, leftOver, missing, to } = swept;
  const column = (bits: number, value: (kits: number) => bigint) => {
    const texts: (string | null)[] = [];
    for (let kits = 1; kits <= to; kits += 1) {
      const hidden = ((missing[kits] as number) & (known ? bits : bits & NEVER_PARTIAL)) !== 0;
      texts.push(hidden ? null : grainText(value(kits)));
    }
    return texts;
  };
  const at = (of: readonly bigint[], kits: number) => of[kits] as bigint;
  return {
    spent: column(SPENT_NEEDS, (kits) => at(spent, kits)),
    used: column(USED_NEEDS, (kits) => at(used, kits)),
    perKitSpent: column(SPENT_NEEDS, (kits) => perKitOf(at(spent, kits), kits)),
    perKitUsed: column(USED_NEEDS, (kits) => perKitOf(at(used, kits), kits)),
    brings: column(BRINGS_NEEDS, (kits) => at(brings, kits)),
    profit: column(USED_NEEDS | BRINGS_NEEDS, (kits) => at(brings, kits) - at(used, kits)),
    leftOver: column(MISSING.mix | MISSING.goods, (kits) => at(leftOver, kits)),
    nextKitSpent: column(SPENT_NEEDS, (kits) => at(spent, kits + 1) - at(spent, kits)),
    nextKitUsed: column(USED_NEEDS, (kits) => at(used, kits + 1) - at(used, kits)),
    parcels: swept.parcels.slice(1, to + 1),
    soldToPay: soldToPayFor(prepared, swept, known),
  };
}

/** Without parts there are no costs, and without a mix or a price no takings, not even partial ones. */
const NEVER_PARTIAL = MISSING.parts | MISSING.mix | MISSING.sale;
