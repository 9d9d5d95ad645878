import { chooseBoards } from "./board-choice.ts";
import { convertMinor } from "./conversion.ts";
import { kitCosts, takings } from "./kit-costs.ts";
import { needOf, spareOf } from "./need.ts";
import { basketCharges, orderParts } from "./order-parts.ts";
import type { PreparedPart, PreparedPlan } from "./prepared-plan.ts";
import { MISSING, type RunSheet } from "./run-sheet.ts";
import { shelfValues } from "./shelf.ts";
import { splitKits } from "./split-kits.ts";

/**
 * Reckons a run of `kits` (sections 2 to 8): the one statement of how a run's cost comes about. A
 * single run, the sweep and every working read the sheet this fills.
 *
 * Spent is the sum of all heads, own work at its rate included; used is spent less what keeps on the
 * shelf plus stock taken from it (section 8).
 */
export function reckonRun(prepared: PreparedPlan, kits: number, sheet: RunSheet): void {
  const { money } = sheet;
  sheet.kits = kits;
  sheet.kitsOf = splitKits(kits, prepared.weights);
  sheet.missing = prepared.plan.lines === 0 ? MISSING.parts : 0;
  if (prepared.weights.every((weight) => weight === 0)) sheet.missing |= MISSING.mix;
  setNeeds(prepared, sheet);
  orderParts(prepared, sheet);
  reckonBaskets(prepared, sheet);
  reckonBoards(prepared, sheet);
  shelfValues(prepared, sheet);
  kitCosts(prepared, sheet);
  takings(prepared, sheet);
  money.spent =
    money.boards +
    money.parts +
    money.freight +
    money.packing +
    money.work +
    money.oneOff +
    money.replacements;
  money.used = money.spent - money.keptOnShelf + money.stockTaken;
}

/** Need, spare, stock and what is left to buy, part by part (section 2). */
function setNeeds(prepared: PreparedPlan, sheet: RunSheet): void {
  const { parts } = prepared;
  for (let index = 0; index < parts.length; index += 1) {
    const part = parts[index] as PreparedPart;
    const need = needOf(sheet.kitsOf, part.perKit);
    const required = need + spareOf(need, part);
    const fromStock = Math.min(part.stock, required);
    sheet.need[index] = need;
    sheet.required[index] = required;
    sheet.fromStock[index] = fromStock;
    sheet.toBuy[index] = required - fromStock;
  }
}

/** Goods and charges of every basket, converted after their own rounding (sections 1.4 and 4). */
function reckonBaskets(prepared: PreparedPlan, sheet: RunSheet): void {
  const { money } = sheet;
  money.parts = 0n;
  money.freight = 0n;
  sheet.parcels = 0;
  for (const supplier of prepared.suppliers) {
    if (sheet.orders[supplier.index] === 0 || supplier.worth === null) continue;
    const goods = sheet.goods[supplier.index] as number;
    const { freight, fee, handling } = basketCharges(supplier, goods);
    if (freight === null) sheet.missing |= MISSING.freight;
    money.parts += convertMinor(goods, supplier.worth);
    money.freight += convertMinor((freight ?? 0) + fee + handling, supplier.worth);
    sheet.parcels += 1;
  }
}

function reckonBoards(prepared: PreparedPlan, sheet: RunSheet): void {
  const { money } = sheet;
  money.boards = 0n;
  chooseBoards(prepared, sheet);
  const choice = sheet.boards;
  if (choice === null || choice.quote.worth === null) return;
  if (choice.quote.freight === null) sheet.missing |= MISSING.boardFreight;
  money.boards = convertMinor(choice.charged, choice.quote.worth);
  money.freight += convertMinor(choice.quote.freight ?? 0, choice.quote.worth);
  sheet.parcels += 1;
}
