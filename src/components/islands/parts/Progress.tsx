import { BusyIcon } from "./Icons.tsx";
import { Pad } from "./Pad.tsx";

export type ProgressProps = { done: number; of: number /** "rows read". */; what: string };

/** A trace laid from a soldered pad to an open one, with its count in words. */
export function Progress({ done, of, what }: ProgressProps) {
  const share = of === 0 ? 1 : Math.min(done / of, 1);
  const words = `${done} of ${of} ${what}`;
  return (
    <div className="max-w-[416px]">
      <div
        role="progressbar"
        aria-label={what}
        aria-valuemin={0}
        aria-valuemax={of}
        aria-valuenow={done}
        aria-valuetext={words}
        className="flex items-center"
      >
        <Pad state="done" className="-mr-0.5 size-7 shrink-0" />
        <span className="relative h-1 grow">
          <span className="absolute inset-x-0 top-1/2 border-t-[1.5px] border-dashed border-rule-2" />
          <span
            className="absolute inset-y-0 left-0 bg-copper-metal forced-colors:bg-[CanvasText] transition-[width] duration-400 ease-linear"
            style={{ width: `${share * 100}%` }}
          />
        </span>
        <Pad state={share === 1 ? "done" : "not-started"} className="size-7 shrink-0" />
      </div>
      <p className="type-note mt-1">{words}</p>
    </div>
  );
}

/** Length not known: a ring with a gap and a verb. */
export function Busy({ verb }: { verb: string }) {
  return (
    <p role="status" className="flex items-center gap-2 type-note">
      <BusyIcon /> {verb}
    </p>
  );
}
