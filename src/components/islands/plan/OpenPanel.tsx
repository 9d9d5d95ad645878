import { useEffect, useMemo } from "react";
import { clockTime } from "#src/components/clock-time.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { WorkingPanel } from "#src/components/islands/parts/WorkingPanel.tsx";
import { priceContext } from "#src/costing/price/price-context.ts";
import { aimWorking } from "#src/costing/price/price-working.ts";
import { working } from "#src/costing/working.ts";
import type { WorkingTree } from "#src/costing/working-tree.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { type OpenWorking, openWorking, WORKING_PANEL } from "./open-working.ts";
import { workingOnPaper } from "./working-on-paper.ts";

function treeOf(plan: Plan, kits: number, { figure, asked }: OpenWorking): WorkingTree | null {
  if (!asked) return working(plan, kits, figure);
  return aimWorking(priceContext(plan, kits), asked.scope, asked.aim, asked.ending);
}

/** The working of a figure on squared paper. Fetched when the first one is opened. */
export function OpenPanel({ address, plan, open }: { address: KitAddress; plan: Plan; open: OpenWorking }) {
  const kits = open.kits ?? plan.run.kits;
  const tree = useMemo(() => treeOf(plan, kits, open), [plan, kits, open]);
  const close = () => openWorking.put(null);
  // A figure that is no more, such as the order to a supplier no longer used, closes its working.
  const gone = tree === null;
  useEffect(() => {
    if (gone) openWorking.put(null);
  }, [gone]);
  const paper =
    tree &&
    workingOnPaper(tree, {
      address,
      currency: plan.currency,
      time: clockTime(Date.now()),
      open: (figure) => openWorking.put({ figure, kits: open.kits }),
    });
  return gone ? null : <WorkingPanel id={WORKING_PANEL} paper={paper} onClose={close} />;
}
