import type { Line } from "#src/components/islands/parts-grid/steps.ts";
import type { PricedPartsList } from "#src/server/present.ts";

/** A resistor line of a list as the browser holds it. */
export function line(
  id: string,
  over: Partial<Omit<Line, "part">> & { part?: Partial<Line["part"]> } = {},
): Line {
  const part: Line["part"] = {
    id: `part-${id}`,
    version: 1,
    class: "resistor",
    name: "10\u00a0kΩ",
    spec: "5 %",
    value: "10000",
    unit: "ohm",
    tolerance: null,
    power: null,
    voltage: null,
    package: "axial, 10 mm",
    holeSpacing: null,
    manufacturer: "",
    manufacturerPartNumber: "",
    datasheet: "",
    drawer: "A1",
    note: "",
    freeStock: 0,
    stockCost: null,
    alsoIn: [],
    ...over.part,
  };
  return {
    id,
    version: 1,
    designators: id.toUpperCase(),
    mark: "in-kit",
    note: "",
    quantities: { full: 1 },
    ...over,
    part,
  };
}

/** A list of these lines, with two editions. */
export function listOf(...lines: Line[]): PricedPartsList {
  const edition = { version: 1, weight: 1, boardsPerKit: 1, price: null };
  return {
    money: true,
    kit: {
      id: "kit",
      version: 1,
      name: "Fen Beacon",
      summary: "",
      revision: "A",
      boardNeeded: true,
      boardShape: "rectangle",
      boardWidth: null,
      boardHeight: null,
      closed: false,
    },
    editions: [
      { ...edition, id: "full", name: "Full kit" },
      { ...edition, id: "bare", name: "Bare board" },
    ],
    lines,
    choices: [],
  };
}
