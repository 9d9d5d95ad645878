import type { BoardPicture } from "#src/components/board-picture.ts";
import { PanelDrawing } from "#src/components/islands/boards/PanelDrawing.tsx";
import { PanelMeasures } from "#src/components/islands/boards/PanelMeasures.tsx";
import { PanelUse } from "#src/components/islands/boards/PanelUse.tsx";
import { Pair } from "#src/components/islands/parts/Pair.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { PAIRS } from "#src/components/page-look.ts";
import { fitPanels } from "#src/costing/panels/fit-panels.ts";
import { layOutPanel } from "#src/costing/panels/lay-out-panel.ts";
import { panelSentence } from "#src/costing/panels/panel-problem-words.ts";
import type { PanelTerms } from "#src/costing/panels/panel-terms.ts";
import { CRICKET_BOX } from "#src/drawings/cricket-box.ts";
import { DEW_LANTERN } from "#src/drawings/dew-lantern.ts";

const LANTERN: BoardPicture = { shape: "rectangle", widthMm: 58, heightMm: 42, marks: DEW_LANTERN };
const CRICKET: BoardPicture = { shape: "round", widthMm: 50, heightMm: 50, marks: CRICKET_BOX };
const ROUTED: PanelTerms = {
  largest: { width: "250", height: "200" },
  least: { width: "70", height: "50" },
  separation: "routed",
  gap: "2",
  rails: { sides: "long", width: "5" },
};
const SCORED: PanelTerms = { ...ROUTED, separation: "v-score", gap: "0" };

const SHOWN = [
  {
    name: "Routed, a grid",
    picture: LANTERN,
    terms: { ...ROUTED, largest: { width: "240", height: "145" } },
  },
  { name: "Routed, two blocks", picture: LANTERN, terms: ROUTED },
  { name: "V-scored, a grid", picture: LANTERN, terms: { ...SCORED, rails: { sides: "all", width: "7" } } },
  { name: "Round boards, routed", picture: CRICKET, terms: ROUTED },
  { name: "Round boards cannot be scored", picture: CRICKET, terms: SCORED },
] as const satisfies { name: string; picture: BoardPicture; terms: PanelTerms }[];

/** Panels in every manner, for the development page only. */
export default function PanelSheet() {
  return (
    <div className={PAIRS}>
      {SHOWN.map((shown) => (
        <PanelState key={shown.name} {...shown} />
      ))}
    </div>
  );
}

function PanelState({ name, picture, terms }: { name: string; picture: BoardPicture; terms: PanelTerms }) {
  const { shape, widthMm, heightMm } = picture;
  const result = fitPanels({ shape, width: String(widthMm), height: String(heightMm) }, terms);
  const largest = result.ok ? result.arrangements.at(-1) : undefined;
  if (!result.ok || !largest)
    return (
      <Pair>
        <Section title={name}>
          <p>{result.ok ? "" : result.problems.map(panelSentence).join(" ")}</p>
        </Section>
      </Pair>
    );
  const panel = layOutPanel(largest, result.measures);
  return (
    <Pair note={<PanelUse panel={panel} />}>
      <Section title={name} aside={`largest panel ${terms.largest.width} × ${terms.largest.height} mm`}>
        <PanelDrawing panel={panel} picture={picture} />
        <div className="mt-6 max-w-[560px]">
          <PanelMeasures panel={panel} />
        </div>
      </Section>
    </Pair>
  );
}
