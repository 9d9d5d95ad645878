/**
 * Parts drawn flat in millimetres: outline 0.3, leads 0.55, a few object colours, from above or the side, whichever
 * shows the holes. Each is a `<g>` round its own origin (named per part), for a drawing with a scale.
 */
import { drawnBands } from "#src/components/bands-picture.ts";
import type { BandColour } from "#src/partslist/run-bands.ts";

const line = { strokeWidth: 0.3, className: "stroke-outline" } as const;
const lead = { fill: "none", strokeWidth: 0.55, className: "stroke-tin-metal" } as const;

/** Origin: the middle of the body. Leads of 30 mm from end to end. */
export function Resistor({ colours, length = 30 }: { colours: readonly BandColour[]; length?: number }) {
  const scale = 6.5 / 153;
  return (
    <g>
      <path d={`M${-length / 2} 0H${length / 2}`} {...lead} />
      <path
        d="M-3.2-.9V.9C-3.2 1.3-1.9 1.2-1.7.9H1.7C1.9 1.2 3.2 1.3 3.2.9V-.9C3.2-1.3 1.9-1.2 1.7-.9H-1.7C-1.9-1.2-3.2-1.3-3.2-.9Z"
        strokeWidth={0.3}
        className="fill-band-body stroke-outline"
      />
      {drawnBands(colours, true).map((band) => (
        <rect
          key={band.x}
          x={(band.x - 103) * scale}
          y={band.height > 40 ? -1 : -0.78}
          width={band.width * scale * 1.1}
          height={band.height > 40 ? 2 : 1.56}
          fill={`var(--color-band-${band.colour})`}
        />
      ))}
    </g>
  );
}

/** Origin: the middle of the body. A small glass diode, or a black one with `power`. */
export function Diode({ power, length = 30 }: { power?: boolean; length?: number }) {
  return (
    <g>
      <path d={`M${-length / 2} 0H${length / 2}`} {...lead} />
      {power ? (
        <rect
          x={-2.6}
          y={-1.35}
          width={5.2}
          height={2.7}
          rx={0.3}
          {...line}
          className="fill-chip-body stroke-edge"
        />
      ) : (
        <rect
          x={-2}
          y={-0.9}
          width={4}
          height={1.8}
          rx={0.8}
          {...line}
          className="fill-band-orange stroke-outline"
        />
      )}
      <rect
        x={power ? 1.2 : 0.8}
        y={power ? -1.35 : -0.9}
        width={0.7}
        height={power ? 2.7 : 1.8}
        className={power ? "fill-band-silver" : "fill-band-black"}
      />
    </g>
  );
}

/** Origin: top of the dome, in its middle. 5 mm. */
export function Led({ short }: { short?: boolean }) {
  return (
    <g>
      <path d={`M-1.27 7.4V${short ? 14 : 22.4}M1.27 7.4V${short ? 12.5 : 19.4}`} {...lead} />
      <path
        d="M-2.5 7.7V2.5A2.5 2.5 0 0 1 2.5 2.5V7H2.9V7.7Z"
        {...line}
        className="fill-lens stroke-outline"
      />
      <path
        d="M-1.4 7V3.7M-1.4 3.7H-.6M.5 3.9H1.4V7"
        fill="none"
        strokeWidth={0.25}
        className="stroke-outline opacity-50"
      />
    </g>
  );
}

/** Origin: top of the can, in its middle. Standing, seen from the side. */
export function Electrolytic({
  across = 6.3,
  height = 11,
  short,
}: {
  across?: number;
  height?: number;
  short?: boolean;
}) {
  const half = across / 2;
  return (
    <g>
      <path
        d={`M-1.25 ${height}V${height + (short ? 5 : 15)}M1.25 ${height}V${height + (short ? 4 : 12)}`}
        {...lead}
      />
      <rect
        x={-half}
        width={across}
        height={height}
        rx={0.5}
        {...line}
        className="fill-sleeve stroke-outline"
      />
      <path
        d={`M${half - 1.6} .15H${half - 0.5}Q${half - 0.15} .15 ${half - 0.15} .5V${height - 0.5}Q${half - 0.15} ${height - 0.15} ${half - 0.5} ${height - 0.15}H${half - 1.6}Z`}
        className="fill-sheet"
      />
      <path
        d={`M${half - 1.2} ${height * 0.3}h.8M${half - 1.2} ${height * 0.62}h.8`}
        strokeWidth={0.3}
        className="stroke-outline"
      />
    </g>
  );
}

/** Origin: top of the body, in its middle. A ceramic disc, or a film block with `film`. */
export function Capacitor({ marking, film, short }: { marking: string; film?: boolean; short?: boolean }) {
  const foot = film ? 6.4 : 5;
  return (
    <g>
      <path d={`M-2.5 ${foot}V${foot + (short ? 6 : 13)}M2.5 ${foot}V${foot + (short ? 6 : 13)}`} {...lead} />
      {film ? (
        <rect x={-3.6} width={7.2} height={6.6} rx={0.5} {...line} className="fill-copper-wash stroke-edge" />
      ) : (
        <circle cy={3} r={3} fill="#e0b56c" strokeWidth={0.3} className="stroke-outline" />
      )}
      <text
        y={film ? 4 : 3.6}
        textAnchor="middle"
        className={`text-[1.7px] font-semibold ${film ? "fill-ink" : "fill-outline"}`}
      >
        {marking}
      </text>
    </g>
  );
}

/** Origin: top of the case, in its middle. TO-92. */
export function Transistor({ short }: { short?: boolean }) {
  const foot = short ? 11 : 18.4;
  return (
    <g>
      <path d={`M-1.27 4.6V${foot}M0 4.6V${foot}M1.27 4.6V${foot}`} {...lead} strokeWidth={0.45} />
      <rect x={-2.4} width={4.8} height={4.9} rx={0.4} {...line} className="fill-chip-body stroke-edge" />
    </g>
  );
}

/** Origin: upper left corner of the body. Fourteen pins unless told. */
export function DipChip({ marking, pins = 14 }: { marking: string; pins?: number }) {
  const across = (pins / 2) * 2.54 + 1.5;
  const feet = Array.from({ length: pins / 2 }, (_, place) => 2.02 + place * 2.54);
  return (
    <g>
      {feet.map((x) => (
        <path key={x} d={`M${x}-1.4V7.8`} fill="none" strokeWidth={0.9} className="stroke-tin-metal" />
      ))}
      <path
        d={`M.3 0H${across - 0.3}Q${across} 0 ${across} .3V6.1Q${across} 6.4 ${across - 0.3} 6.4H.3Q0 6.4 0 6.1V4.2A1 1 0 0 0 0 2.2V.3Q0 0 .3 0Z`}
        {...line}
        className="fill-chip-body stroke-edge"
      />
      <circle cx={2} cy={5.1} r={0.4} className="fill-silk" />
      <text x={across / 2} y={3.9} textAnchor="middle" className="fill-silk text-[2px] font-semibold">
        {marking}
      </text>
    </g>
  );
}

/** Origin: upper left corner. */
export function Socket({ pins = 14 }: { pins?: number }) {
  const across = (pins / 2) * 2.54 + 1.5;
  const feet = Array.from({ length: pins / 2 }, (_, place) => 2.02 + place * 2.54);
  return (
    <g>
      <rect width={across} height={10.2} {...line} className="fill-tin stroke-edge" />
      <rect x={3} y={3.2} width={across - 6} height={3.8} {...line} className="fill-sheet stroke-edge" />
      {feet.flatMap((x) => [
        <circle
          key={`${x}a`}
          cx={x}
          cy={1.5}
          r={0.8}
          strokeWidth={0.25}
          className="fill-tin-metal stroke-outline"
        />,
        <circle
          key={`${x}b`}
          cx={x}
          cy={8.7}
          r={0.8}
          strokeWidth={0.25}
          className="fill-tin-metal stroke-outline"
        />,
      ])}
    </g>
  );
}

/** Origin: the middle of its face. */
export function LightSensor({ short }: { short?: boolean }) {
  return (
    <g>
      <path d={`M-1.7 2V${short ? 10 : 14.8}M1.7 2V${short ? 10 : 14.8}`} {...lead} strokeWidth={0.4} />
      <circle r={2.55} {...line} className="fill-copper-wash stroke-edge" />
      <path
        d="M-1.6-1.1H1.5V-.2H-1.5V.7H1.6"
        fill="none"
        strokeWidth={0.35}
        className="stroke-copper-metal"
      />
    </g>
  );
}

/** Origin: the middle. */
export function Trimmer() {
  return (
    <g>
      <rect
        x={-3.1}
        y={-3.1}
        width={6.2}
        height={6.2}
        rx={0.3}
        {...line}
        className="fill-frosted stroke-edge"
      />
      <circle r={2} {...line} className="fill-sheet stroke-edge" />
      <path d="M-1.2-1.2L1.2 1.2" strokeWidth={0.6} className="stroke-edge" />
    </g>
  );
}

/** Origin: the middle of the case. */
export function SlideSwitch() {
  return (
    <g>
      <path d="M-2.54 2.2V4.9M0 2.2V4.9M2.54 2.2V4.9" {...lead} />
      <rect x={-1.1} y={-4.3} width={2.3} height={2.6} {...line} className="fill-chip-body stroke-edge" />
      <rect x={-4.3} y={-2.2} width={8.6} height={4.4} {...line} className="fill-tin-metal stroke-outline" />
    </g>
  );
}

/** Origin: the middle, seen from above. */
export function ScrewTerminal() {
  return (
    <g>
      <rect x={-5.1} y={-4} width={10.2} height={8} rx={0.3} {...line} className="fill-mask stroke-edge" />
      {[-2.54, 2.54].map((x) => (
        <g key={x}>
          <circle cx={x} r={1.8} {...line} className="fill-tin-metal stroke-outline" />
          <path d={`M${x - 1}-1l2 2`} strokeWidth={0.5} className="stroke-outline" />
        </g>
      ))}
    </g>
  );
}

/** Origin: upper left corner. Three cells of 14.5 × 50 mm, and two wires. */
export function BatteryHolder() {
  return (
    <g>
      <path
        d="M58 40.5C63 41.5 65 37 70 37.2S77 42.5 86 41.3"
        fill="none"
        strokeWidth={0.8}
        className="stroke-band-red"
      />
      <path
        d="M58 43C63 45.5 66 42 71 42.2S79 48 86 47.3"
        fill="none"
        strokeWidth={0.8}
        className="stroke-edge"
      />
      <rect width={58.2} height={48} rx={1.5} {...line} className="fill-tin stroke-edge" />
      {[2.4, 17, 31.7].map((y, place) => (
        <g key={y}>
          <rect
            x={2.5}
            y={y}
            width={53}
            height={13.9}
            rx={6.9}
            {...line}
            className="fill-sheet stroke-edge"
          />
          <path
            d={place === 1 ? "M3.6 20.5Q5.4 24 3.6 27.4" : `M54.4 ${y + 3.5}Q52.6 ${y + 7} 54.4 ${y + 10.4}`}
            fill="none"
            strokeWidth={0.5}
            className="stroke-tin-metal"
          />
          <path
            d={`M${place === 1 ? 48.5 : 5} ${y + 7}h3M${place === 1 ? 50 : 6.5} ${y + 5.5}v3M${place === 1 ? 5 : 47} ${y + 7}h3`}
            fill="none"
            strokeWidth={0.3}
            className="stroke-edge"
          />
        </g>
      ))}
    </g>
  );
}

/** Origin: the middle. A frosted disc. */
export function Disc({ across = 64 }: { across?: number }) {
  const r = across / 2;
  return (
    <g>
      <circle r={r} {...line} className="fill-frosted stroke-edge" />
      <circle r={r - 1.6} fill="none" strokeWidth={0.2} className="stroke-tin-metal" />
      <path
        d={`M${-r * 0.62}-${r * 0.45}A${r * 0.78} ${r * 0.78} 0 0 1-${r * 0.1}-${r * 0.77}`}
        fill="none"
        strokeWidth={1.6}
        strokeLinecap="round"
        className="stroke-sheet"
      />
    </g>
  );
}

/** Origin: upper left corner. A6, with a drop and a light on its cover. */
export function Booklet() {
  return (
    <g>
      <rect width={74} height={105} {...line} className="fill-sheet stroke-edge" />
      <path d="M2.4 0V105" strokeWidth={0.4} className="stroke-tin-metal" />
      <path d="M9 13H49V15.2H9ZM9 20.1H35V22.3H9Z" className="fill-ink" />
      <path
        d="M37 34C42 44 51 51 51 60A14 14 0 0 1 23 60C23 51 32 44 37 34Z"
        {...line}
        className="fill-petrol-wash stroke-edge"
      />
      <circle cx={37} cy={61} r={5.4} {...line} className="fill-lens stroke-outline" />
      <path d="M9 88H59M9 92H53M9 96H37" strokeWidth={0.5} className="stroke-rule-2" />
    </g>
  );
}
