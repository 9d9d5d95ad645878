import { toPercent } from "#src/components/percent.ts";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import { areaText, boardsText, gapWords, railWords } from "./panel-words.ts";

/** How much of a panel is board: the share, a bar, and each part in square centimetres. */
export function PanelUse({ panel }: { panel: Panel }) {
  const { areas, arrangement } = panel;
  const parts = [
    { words: boardsText(arrangement.count), area: areas.boards, look: "bg-mask", fill: "fill-mask" },
    {
      words: railWords(panel) ?? "no rails",
      area: areas.rails,
      look: "bg-tin-metal",
      fill: "fill-tin-metal",
    },
    { words: gapWords(panel), area: areas.gaps, look: "bg-sheet", fill: "fill-sheet" },
  ].filter(({ area }) => /[1-9]/.test(area));
  return (
    <section>
      <p className="type-large-figure">
        {roundedText(toPercent(areas.used), 0)}
        <span className="ml-1 text-[1.75rem] font-normal tracking-normal">%</span>
      </p>
      <p className="type-note mt-2">of the panel is board.</p>
      <Bar parts={parts} whole={Number(areas.panel)} />
      <ul className="type-note mt-1">
        {parts.map(({ words, area, look }) => (
          <li key={words} className="hairline-b flex items-center gap-3 py-2">
            <span className={`size-3.5 shrink-0 border-[1.5px] border-ink ${look}`} aria-hidden="true" />
            {words}
            <b className="ml-auto whitespace-nowrap">{areaText(area)}</b>
          </li>
        ))}
      </ul>
    </section>
  );
}

/** The parts end to end; named by the list below it. */
function Bar({
  parts,
  whole,
}: {
  parts: readonly { words: string; area: string; fill: string }[];
  whole: number;
}) {
  const starts = parts.map((_, place) =>
    parts.slice(0, place).reduce((sum, { area }) => sum + Number(area), 0),
  );
  return (
    <svg
      viewBox={`0 0 ${whole} 18`}
      preserveAspectRatio="none"
      className="frame-drawing mt-3 block h-4.5 w-full"
      aria-hidden="true"
      focusable="false"
    >
      {parts.map(({ words, area, fill }, place) => (
        <rect key={words} x={starts[place]} width={Number(area)} height={18} className={fill} />
      ))}
      {starts.slice(1).map((x) => (
        <path
          key={x}
          d={`M${x} 0V18`}
          strokeWidth={1.5}
          vectorEffect="non-scaling-stroke"
          className="stroke-ink"
        />
      ))}
    </svg>
  );
}
