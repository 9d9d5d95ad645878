import { useState } from "react";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Later } from "#src/components/islands/parts/Later.tsx";
import { laterPart } from "#src/components/islands/parts/later-part.ts";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import { millimetres } from "#src/costing/panels/micrometres.ts";
import { PanelChoices } from "./PanelChoices.tsx";
import { PanelDrawing } from "./PanelDrawing.tsx";
import type { PanelSectionProps } from "./PanelSection.tsx";
import { PrintPanel } from "./PrintPanel.tsx";
import { countOf, type PanelView } from "./panel-view.ts";
import { boardsText } from "./panel-words.ts";

const PanelMeasures = laterPart<{ panel: Panel }>(
  async () => (await import("./PanelMeasures.tsx")).PanelMeasures,
);

interface ShownPanelsProps extends PanelSectionProps {
  view: PanelView;
  onCount: (count: number) => void;
}

/** The sizes to choose from, the drawing of one, its measures, and what can be done with it. */
export function ShownPanels(props: ShownPanelsProps) {
  const { run, view, onCount, picture } = props;
  const { shown, now } = view;
  const { toOrder, required } = run.boards;
  return (
    <>
      <PanelChoices
        panels={shown.map(({ panel }) => panel)}
        count={countOf(now)}
        toOrder={toOrder ?? required}
        onChoose={onCount}
      />
      {picture && <PanelDrawing panel={now.panel} picture={picture} />}
      <Ways {...props} />
      <InFigures panel={now.panel} />
    </>
  );
}

/** What the drawing shows, as text; fetched when it is opened. */
function InFigures({ panel }: { panel: Panel }) {
  const [opened, setOpened] = useState(false);
  return (
    <details className="mt-4" onToggle={() => setOpened(true)}>
      <summary className="type-table cursor-pointer font-semibold">The panel in figures</summary>
      <div className="mt-2 max-w-[560px]">
        {opened && <Later part={PanelMeasures} give={{ panel }} what="The panel in figures" rows={8} />}
      </div>
    </details>
  );
}

function Ways({ plan, view: { house, now }, picture, canChange, onQuote }: ShownPanelsProps) {
  const { panel, quote } = now;
  const title = [plan.kit, plan.revision && `revision ${plan.revision}`, `panel at ${house}`];
  return (
    <div data-screen-only className="mt-4 flex flex-wrap items-start gap-4">
      {canChange && quote === null && countOf(now) > 1 && (
        <Button
          size="small"
          onClick={() =>
            onQuote({
              boardHouse: house,
              boardsPerPanel: countOf(now),
              panelWidth: millimetres(panel.outer.width),
              panelHeight: millimetres(panel.outer.height),
            })
          }
        >
          {`Write down a quote for panels of ${countOf(now)}`}
        </Button>
      )}
      {picture && <PrintPanel {...{ panel, picture }} title={title.filter(Boolean).join(", ")} />}
      <span className="heard-only" role="status">
        {`${boardsText(countOf(now))} to a panel`}
      </span>
    </div>
  );
}
