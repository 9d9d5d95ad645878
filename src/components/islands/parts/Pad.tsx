import type { StopState } from "#src/components/trail-states.ts";

export type PadProps = { state: StopState["kind"]; here?: boolean; number?: number; className?: string };

/**
 * A pad of the trail. Copper ring with solder: done. Copper ring, empty: to settle. Thin ring: not started. A square
 * pad with a hole: you are here.
 */
export function Pad({ state, here, number, className = "size-[30px]" }: PadProps) {
  return (
    <svg viewBox="0 0 30 30" className={`block ${className}`} aria-hidden="true" focusable="false">
      <PadShape state={state} here={here} />
      {number !== undefined && (
        <text
          x={15}
          y={20.2}
          textAnchor="middle"
          className={`text-[15px] font-bold ${state === "done" && !here ? "fill-on-solder" : "fill-ink"}`}
        >
          {number}
        </text>
      )}
    </svg>
  );
}

function PadShape({ state, here }: { state: PadProps["state"]; here?: boolean }) {
  if (here)
    return (
      <>
        <rect x={1} y={1} width={28} height={28} className="fill-petrol" />
        <circle cx={15} cy={15} r={10} className="fill-paper" />
      </>
    );
  if (state === "not-started")
    return <circle cx={15} cy={15} r={12} strokeWidth={2} className="fill-paper stroke-rule-2" />;
  return (
    <circle
      cx={15}
      cy={15}
      r={12.4}
      strokeWidth={4.5}
      className={`stroke-copper-metal ${state === "done" ? "fill-solder" : "fill-paper"}`}
    />
  );
}
