import { useId } from "react";
import { countText } from "#src/components/amount-text.ts";
import { toPercent } from "#src/components/percent.ts";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import { panelsNeeded } from "#src/costing/panels/panels-needed.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import { boardsText } from "./panel-words.ts";

export interface PanelChoicesProps {
  /** Ascending by count. */
  panels: readonly Panel[];
  count: number;
  /** Boards to order. */
  toOrder: number;
  onChoose: (count: number) => void;
}

const CHOICE =
  "relative flex gap-3 px-3 py-2 has-checked:bg-petrol has-checked:text-on-petrol has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-petrol has-focus-visible:z-1 hover:not-has-checked:bg-petrol-wash";

/** A few sizes of panel side by side, one of them drawn below. Arrow keys go from one to the next. */
export function PanelChoices({ panels, count, toOrder, onChoose }: PanelChoicesProps) {
  const name = useId();
  return (
    <fieldset
      data-screen-only
      className="mb-6 grid grid-cols-2 rounded-control border-[1.5px] border-ink bg-sheet tablet:grid-cols-4"
    >
      <legend className="heard-only">Boards to a panel</legend>
      {panels.map((panel, place) => (
        <label
          key={panel.arrangement.count}
          htmlFor={`${name}-${panel.arrangement.count}`}
          className={`${CHOICE} ${place % 2 === 1 ? "border-l-[1.5px]" : "tablet:not-first-of-type:border-l-[1.5px]"} ${place > 1 ? "border-ink max-tablet:border-t-[1.5px]" : "border-ink"}`}
        >
          <input
            type="radio"
            id={`${name}-${panel.arrangement.count}`}
            name={name}
            checked={panel.arrangement.count === count}
            onChange={() => onChoose(panel.arrangement.count)}
            className="heard-only"
          />
          <PanelIcon panel={panel} />
          <span className="min-w-0">
            <b className="type-h3 block">{boardsText(panel.arrangement.count)}</b>
            <span className="type-label block">{`${roundedText(toPercent(panel.areas.used), 0)}\u00a0% used`}</span>
            {toOrder > 0 && <span className="type-label block">{panelsWords(toOrder, panel)}</span>}
          </span>
        </label>
      ))}
    </fieldset>
  );
}

/** "10 panels, 120". */
function panelsWords(toOrder: number, { arrangement }: Panel): string {
  const { panels, boards } = panelsNeeded(toOrder, arrangement.count);
  return `${countText(panels)} ${panels === 1 ? "panel" : "panels"}, ${countText(boards)}`;
}

/** All choices at one scale: so many millimetres are a pixel. */
const MM_PER_PX = 8;
const LEAST_PX = 12;

function PanelIcon({ panel: { outer, boards } }: { panel: Panel }) {
  const [width, height] = [outer.width / 1000, outer.height / 1000];
  const px = Math.max(1 / MM_PER_PX, LEAST_PX / Math.max(width, height));
  const d = boards
    .map(({ x, y, width: w, height: h }) => `M${x / 1000} ${y / 1000}h${w / 1000}v${h / 1000}h${-w / 1000}Z`)
    .join("");
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width={width * px}
      height={height * px}
      className="mt-1.5 shrink-0 overflow-visible"
      aria-hidden="true"
      focusable="false"
    >
      <rect {...{ width, height }} fill="none" stroke="currentColor" strokeWidth={1 / px} />
      <path d={d} fill="currentColor" fillOpacity={0.35} stroke="currentColor" strokeWidth={0.75 / px} />
    </svg>
  );
}
