import {
  BANDS_BOX,
  type BandsWidth,
  BODY_PATH,
  bandsInWords,
  drawnBands,
  edgeStripes,
} from "#src/components/bands-picture.ts";
import { type BandColour, runBands } from "#src/partslist/run-bands.ts";

export type BandsProps = {
  colours: readonly BandColour[];
  /** The last colour is a tolerance and lies on the right cap: true for resistors, never for runs. */
  tolerance?: boolean;
  width?: BandsWidth;
  className?: string;
};

/** An axial body with its colour bands. The figure always stands beside it in words. */
export function Bands({ colours, tolerance, width = 92, className }: BandsProps) {
  return (
    <svg
      role="img"
      aria-label={bandsInWords(colours)}
      data-real-object
      viewBox={`0 0 ${BANDS_BOX.width} ${BANDS_BOX.height}`}
      width={width}
      height={Math.round((width * BANDS_BOX.height) / BANDS_BOX.width)}
      className={`inline-block shrink-0 ${className ?? ""}`}
    >
      <path d="M0 27H206" strokeWidth={5} className="stroke-tin-metal" />
      <path d={BODY_PATH} className="fill-band-body" />
      {drawnBands(colours, tolerance).map((band) => (
        <rect
          key={band.x}
          x={band.x}
          y={band.y}
          width={band.width}
          height={band.height}
          fill={`var(--color-band-${band.colour})`}
          stroke="#1b1b1b"
          strokeOpacity={0.3}
          strokeWidth={0.75}
          vectorEffect="non-scaling-stroke"
        />
      ))}
      <path
        d="M26.5 37H179.5V42Q179.5 53 169 53H147C142 53 141 46 136 46H70C65 46 64 53 59 53H37Q26.5 53 26.5 42Z"
        fill="#1b2322"
        fillOpacity={0.1}
      />
      <path
        d={BODY_PATH}
        fill="none"
        strokeWidth={1.2}
        vectorEffect="non-scaling-stroke"
        className="stroke-outline"
      />
    </svg>
  );
}

/** The bands that stand for a run of kits. */
export function RunBands({ kits, ...rest }: { kits: number } & Omit<BandsProps, "colours" | "tolerance">) {
  return <Bands {...rest} colours={runBands(kits)} />;
}

/** The left edge of a kit label: the same bands as full-height stripes; no run, no stripes. */
export function BandEdge({ kits, className }: { kits: number | null; className?: string }) {
  const colours = kits === null ? [] : runBands(kits);
  const lefts = edgeStripes(colours.length);
  return (
    <svg
      role={colours.length > 0 ? "img" : undefined}
      aria-label={colours.length > 0 ? bandsInWords(colours) : undefined}
      aria-hidden={colours.length === 0 || undefined}
      data-real-object
      width={38}
      height="100%"
      className={`border-r-[1.5px] border-rule-2 ${className ?? ""}`}
    >
      <rect width="100%" height="100%" className="fill-band-body" />
      {colours.map((colour, place) => (
        <rect
          // biome-ignore lint/suspicious/noArrayIndexKey: a band is its place.
          key={place}
          x={lefts[place]}
          y={-1}
          width={8}
          height="102%"
          fill={`var(--color-band-${colour})`}
          stroke="#1b1b1b"
          strokeOpacity={0.3}
        />
      ))}
    </svg>
  );
}
