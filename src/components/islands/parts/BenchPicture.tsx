import { DEW_LANTERN } from "#src/drawings/dew-lantern.ts";
import type { BandColour } from "#src/partslist/run-bands.ts";
import { BoardShape } from "./Board.tsx";
import {
  BatteryHolder,
  Booklet,
  Capacitor,
  Diode,
  DipChip,
  Disc,
  Electrolytic,
  Led,
  LightSensor,
  Resistor,
  ScrewTerminal,
  SlideSwitch,
  Socket,
  Transistor,
  Trimmer,
} from "./PartDrawings.tsx";

const TEN_K: BandColour[] = ["brown", "black", "orange", "gold"];
const HUNDRED_TWENTY: BandColour[] = ["brown", "red", "brown", "gold"];
const LEFT: BandColour[][] = [
  TEN_K,
  TEN_K,
  HUNDRED_TWENTY,
  HUNDRED_TWENTY,
  HUNDRED_TWENTY,
  ["yellow", "violet", "red", "gold"],
];
const RIGHT: BandColour[][] = [
  ["brown", "black", "green", "gold"],
  HUNDRED_TWENTY,
  HUNDRED_TWENTY,
  HUNDRED_TWENTY,
  ["brown", "black", "yellow", "gold"],
  ["yellow", "violet", "yellow", "gold"],
];
const ROWS = [64, 71, 78, 85, 92, 99];

const CENTIMETRES = Array.from({ length: 27 }, (_, cm) => cm);

/** Moves a drawing to its place on the bench, in millimetres. */
function at(x: number, y: number): string {
  return `translate(${x} ${y})`;
}

/** Everything that goes into one kit, laid out over a rule in centimetres, at one scale. */
export function BenchPicture({ className }: { className?: string }) {
  return (
    <svg
      role="img"
      aria-label="The parts of a kit laid out over a rule: booklet, frosted disc, board, battery holder, and 35 small parts."
      data-real-object
      viewBox="-1 -1 283 168"
      className={`block w-full ${className ?? ""}`}
    >
      <Booklet />
      <g transform={at(118.4, 32)}>
        <Disc />
      </g>
      <g transform={at(86.2, 76)}>
        <BoardShape board={{ shape: "rectangle", widthMm: 58, heightMm: 42, marks: DEW_LANTERN }} />
      </g>
      <g transform={at(87.4, 128)}>
        <DipChip marking="4093" />
      </g>
      <g transform={at(122.6, 126)}>
        <Socket />
      </g>
      <g transform={at(164.2, 0)}>
        <BatteryHolder />
      </g>
      <g transform={at(260.3, 8)}>
        <LightSensor />
      </g>
      <g transform={at(274.3, 8.9)}>
        <Trimmer />
      </g>
      <g transform={at(262.2, 30)}>
        <SlideSwitch />
      </g>
      <g transform={at(275.4, 30)}>
        <ScrewTerminal />
      </g>
      {ROWS.map((y, row) => (
        <g key={y}>
          <g transform={at(179.2, y)}>
            <Resistor colours={LEFT[row] ?? []} />
          </g>
          <g transform={at(216.2, y)}>
            <Resistor colours={RIGHT[row] ?? []} />
          </g>
        </g>
      ))}
      <SmallParts />
      <g transform={at(0, 152)}>
        <Rule />
      </g>
    </svg>
  );
}

function SmallParts() {
  return (
    <>
      <g transform={at(258.2, 64)}>
        <Diode />
      </g>
      <g transform={at(258.2, 71)}>
        <Diode power />
      </g>
      <g transform={at(250.4, 83)}>
        <Transistor />
      </g>
      <g transform={at(262.2, 83)}>
        <Transistor />
      </g>
      <g transform={at(275.4, 82.6)}>
        <Capacitor marking="10n" film />
      </g>
      {[0, 1, 2, 3, 4, 5].map((led) => (
        <g key={led} transform={at(167.2 + led * 9.45, 114)}>
          <Led />
        </g>
      ))}
      <g transform={at(230.4, 114)}>
        <Electrolytic />
      </g>
      <g transform={at(242.6, 114)}>
        <Electrolytic across={5} />
      </g>
      <g transform={at(256, 116)}>
        <Capacitor marking="104" />
      </g>
      <g transform={at(271.2, 116)}>
        <Capacitor marking="104" />
      </g>
    </>
  );
}

/** A rule in centimetres, its zero 6 mm from its end. */
function Rule() {
  const ticks = Array.from({ length: 269 }, (_, mm) => mm);
  return (
    <g>
      <rect width={280} height={13} strokeWidth={0.35} className="fill-tin stroke-edge" />
      <path
        d={ticks.map((mm) => `M${6 + mm} 0v${mm % 10 === 0 ? 5 : mm % 5 === 0 ? 3.2 : 2}`).join("")}
        strokeWidth={0.2}
        className="stroke-ink"
      />
      {CENTIMETRES.map((cm) => (
        <text
          key={cm}
          x={6 + cm * 10}
          y={8.6}
          textAnchor="middle"
          className="fill-ink text-[2.6px] font-semibold"
        >
          {cm}
        </text>
      ))}
      <text x={6} y={11.6} textAnchor="middle" className="fill-ink text-[2px]">
        cm
      </text>
    </g>
  );
}
