import { shareText } from "#src/components/amount-text.ts";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import { areaText, boardsText, layoutWords, mmText, railWords, sizeText, tabsWords } from "./panel-words.ts";

interface Row {
  name: string;
  value: string;
}

const COLUMNS: Column<Row>[] = [
  { key: "name", head: "Measure", names: true, cell: ({ name }) => name },
  { key: "value", head: "Of this panel", number: true, cell: ({ value }) => value },
];

/** What the drawing of a panel shows, as text. */
export function PanelMeasures({ panel }: { panel: Panel }) {
  return (
    <Table
      caption="The panel in figures"
      columns={COLUMNS}
      rows={rowsOf(panel)}
      keyOf={({ name }) => name}
      height="dense"
    />
  );
}

function rowsOf(panel: Panel): Row[] {
  const { arrangement, outer, measures, areas, scores } = panel;
  const parted = measures.routed
    ? [
        { name: "Routed gap", value: mmText(measures.gap) },
        { name: "Breaking tabs", value: tabsWords(panel) },
      ]
    : [{ name: "V-scores", value: `${scores.x.length} upright, ${scores.y.length} across` }];
  return [
    { name: "Panel", value: sizeText(outer) },
    { name: "Largest panel", value: sizeText(measures.largest) },
    { name: "Board", value: sizeText(measures.board) },
    { name: "Boards to a panel", value: `${boardsText(arrangement.count)}, ${layoutWords(arrangement)}` },
    { name: "Rails", value: railWords(panel) ?? "none" },
    ...parted,
    { name: "Board area", value: `${areaText(areas.boards)}, ${shareText(areas.used)}` },
    { name: "Panel area", value: areaText(areas.panel) },
  ];
}
