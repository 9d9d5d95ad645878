import { joined, stopWords, type TrailStop } from "#src/components/trail-states.ts";
import { StateIcon } from "./Chip.tsx";
import { Pad } from "./Pad.tsx";

export type TrailProps = {
  stops: readonly TrailStop[];
  /** "The steps of Dew Lantern". */
  label: string;
};

/**
 * The steps of a kit as pads on a trace. On a phone the pads stay, and name and state of the step in view stand
 * below them. Steps are never locked: each is a link.
 */
export function Trail({ stops, label }: TrailProps) {
  const here = stops.find((stop) => stop.here);
  return (
    <nav
      aria-label={label}
      data-screen-only
      className="gutters hairline-b max-tablet:h-[81px] tablet:min-h-[106px]"
    >
      <ol className="flex pt-2 tablet:pt-4">
        {stops.map((stop, place) => (
          <TrailPad key={stop.name} stop={stop} place={place} stops={stops} />
        ))}
      </ol>
      {here && <HereLine stop={here} place={stops.indexOf(here)} />}
    </nav>
  );
}

function TrailPad({ stop, place, stops }: { stop: TrailStop; place: number; stops: readonly TrailStop[] }) {
  const last = place === stops.length - 1;
  return (
    <li className={`relative tablet:min-w-min tablet:flex-1 tablet:pr-3 ${last ? "" : "max-tablet:grow"}`}>
      {!last && <Trace laid={joined(stops, place)} />}
      <a
        href={stop.href}
        aria-current={stop.here ? "step" : undefined}
        className="group relative block min-h-11 text-ink no-underline max-tablet:flex max-tablet:min-h-10 max-tablet:w-[min(28px,7.4vw)] max-tablet:items-center"
      >
        <Pad
          state={stop.state.kind}
          here={stop.here}
          number={place + 1}
          className="size-[min(28px,7.4vw)] tablet:size-[30px]"
        />
        <span
          className={`max-tablet:heard-only mt-1.5 block text-[1.0625rem] leading-[1.3125rem] group-hover:underline max-desktop:text-[0.9375rem] ${stop.here ? "font-bold text-petrol" : "font-semibold"}`}
        >
          {stop.name}
        </span>
        <StopLine stop={stop} className="max-tablet:heard-only" />
      </a>
    </li>
  );
}

function StopLine({ stop, className }: { stop: TrailStop; className?: string }) {
  return (
    <span className={`type-label flex items-center gap-1.5 text-ink-2 ${className ?? ""}`}>
      {stop.state.kind === "done" && <StateIcon kind="good" className="size-3.5" />}
      {stop.state.kind === "to-settle" && <StateIcon kind="caution" className="size-3.5" />}
      {stopWords(stop)}
    </span>
  );
}

/** Copper between two begun steps, else a dashed line; it lies behind the pads. */
function Trace({ laid }: { laid: boolean }) {
  return (
    <span
      aria-hidden="true"
      className={`absolute top-5 right-0 left-[min(28px,7.4vw)] -translate-y-1/2 tablet:top-[15px] tablet:left-[30px] ${laid ? "h-[3px] bg-copper-metal tablet:h-1 forced-colors:bg-[CanvasText]" : "border-t-[1.5px] border-dashed border-rule-2"}`}
    />
  );
}

function HereLine({ stop, place }: { stop: TrailStop; place: number }) {
  return (
    <p aria-hidden="true" className="type-label flex justify-between pb-2 tablet:hidden">
      <span className="font-bold text-petrol">
        {place + 1} {stop.name}
      </span>
      <StopLine stop={stop} />
    </p>
  );
}

/** The trail of a kit label: the same pads at 12 px, without words; the chip beside it says them. */
export function SmallTrail({ states }: { states: readonly TrailStop["state"][] }) {
  const done = states.filter((state) => state.kind === "done").length;
  return (
    <svg
      role="img"
      aria-label={`${done} of ${states.length} steps done`}
      width={states.length * 19}
      height={14}
      className="block overflow-visible"
    >
      {states.map((state, place) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: a stop is its place on the trail.
        <g key={place} transform={`translate(${place * 19})`}>
          {place < states.length - 1 &&
            state.kind !== "not-started" &&
            states[place + 1]?.kind !== "not-started" && (
              <path d="M12 7H20" strokeWidth={3} className="stroke-copper-metal" />
            )}
          <SmallPad kind={state.kind} />
        </g>
      ))}
    </svg>
  );
}

function SmallPad({ kind }: { kind: TrailStop["state"]["kind"] }) {
  if (kind === "not-started") return <circle cx={7} cy={7} r={6} className="fill-none stroke-rule-2" />;
  return (
    <circle
      cx={7}
      cy={7}
      r={5.3}
      strokeWidth={2.6}
      className={`stroke-copper-metal ${kind === "done" ? "fill-solder" : "fill-paper"}`}
    />
  );
}
