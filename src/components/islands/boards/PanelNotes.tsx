import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { FittedPanels } from "#src/costing/panels/fit-panels.ts";
import { millimetres } from "#src/costing/panels/micrometres.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { PanelUse } from "./PanelUse.tsx";
import type { PanelView, ShownPanel } from "./panel-view.ts";
import { sizeText } from "./panel-words.ts";

/** How much of the drawn panel is board, whether more would fit, and where a quote speaks of another size. */
export function PanelNotes({ plan, view: { now, fitted } }: { plan: Plan; view: PanelView }) {
  const opens = useOpens();
  const { open, onOpen, controls } = opens(`panel:${now.quote ?? ""}`);
  const other = otherSize(plan, now);
  return (
    <>
      <PanelUse panel={now.panel} />
      <MarginNote title={other ? "Quoted for another size" : "Would more fit?"}>
        {other && <p>{other}</p>}
        <p>{moreWords(now, fitted)}</p>
        {now.quote !== null && (
          <ShowWorking
            of="the panel"
            open={open}
            onClick={onOpen}
            aria-controls={open ? controls : undefined}
          />
        )}
      </MarginNote>
    </>
  );
}

/** What is known of larger counts; only a bound makes a layout the best there is. */
function moreWords({ panel }: ShownPanel, { most, mostByArea, claim, measures }: FittedPanels): string {
  if (panel.arrangement.count < most) return `Up to ${most} fit on the largest panel.`;
  if (!measures.routed)
    return "No: scores run from edge to edge, so only a grid can be made, and no larger one fits.";
  if (claim === "proven") return "No: however they lie, no more than these can fit.";
  if (measures.round)
    return "These are the most in rows and columns. Round boards set in each other's gaps were not tried.";
  return `These are the most of all grids and of two grids side by side; in any other way ${mostByArea} might.`;
}

/** Where the quote names a size that this panel does not have. */
function otherSize(plan: Plan, { panel, quote }: ShownPanel): string | null {
  const stated = plan.boards.quotes.find(({ id }) => id === quote)?.pieceSize;
  if (!stated) return null;
  const sides = [millimetres(panel.outer.width), millimetres(panel.outer.height)].map(Number).sort();
  const quoted = [Number(stated.width), Number(stated.height)].sort();
  return sides.join() === quoted.join()
    ? null
    : `The quote is for ${stated.width} × ${stated.height}\u00a0mm; drawn is the smallest panel that holds them, ${sizeText(panel.outer)}.`;
}
