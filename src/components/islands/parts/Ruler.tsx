import { type KeyboardEvent, type PointerEvent, useRef } from "react";
import {
  figureHidden,
  rulerPlace,
  rulerTicks,
  runAfterKey,
  runAtPlace,
} from "#src/components/ruler-scale.ts";
import { RULER_LEAST, RULER_MOST } from "#src/shapes/limits.ts";
import { LogoRings } from "./Logo.tsx";

export type RulerProps = {
  run: number;
  onRun: (kits: number) => void;
  /** Last kits before a step up in cost; Shift and arrow go from one to the next. */
  sweetSpots?: readonly number[];
};

const TICKS = rulerTicks();

function percent(kits: number): string {
  return `${(rulerPlace(kits) * 100).toFixed(4)}%`;
}

/** The run as a place on a logarithmic ruler from 10 to 500: a slider that hangs from the top edge of the tally. */
export function Ruler({ run, onRun, sweetSpots = [] }: RulerProps) {
  const strip = useRef<HTMLDivElement>(null);
  const ring = useRef<HTMLDivElement>(null);

  function follow(press: PointerEvent) {
    const box = strip.current?.getBoundingClientRect();
    if (!box || box.width === 0) return;
    const next = runAtPlace((press.clientX - box.left) / box.width);
    if (next !== run) onRun(next);
  }

  function onKey(press: KeyboardEvent) {
    if (press.altKey || press.ctrlKey || press.metaKey) return;
    const next = runAfterKey(run, press, sweetSpots);
    if (next === undefined) return;
    press.preventDefault();
    if (next !== run) onRun(next);
  }

  return (
    <div
      ref={strip}
      className="relative h-[30px] cursor-ew-resize touch-none select-none"
      onPointerDown={(press) => {
        if (press.button !== 0) return;
        press.currentTarget.setPointerCapture(press.pointerId);
        press.preventDefault();
        ring.current?.focus({ preventScroll: true });
        follow(press);
      }}
      onPointerMove={(press) =>
        press.buttons === 1 && press.currentTarget.hasPointerCapture(press.pointerId) && follow(press)
      }
    >
      <RulerTicks run={run} />
      <div
        ref={ring}
        role="slider"
        tabIndex={0}
        aria-label="Run"
        aria-valuemin={RULER_LEAST}
        aria-valuemax={RULER_MOST}
        aria-valuenow={Math.min(Math.max(run, RULER_LEAST), RULER_MOST)}
        aria-valuetext={`${run} kits`}
        onKeyDown={onKey}
        className="absolute top-0 h-[29px] w-7 -translate-x-1/2 rounded-control"
        style={{ left: percent(run) }}
      >
        <svg width={28} height={29} viewBox="0 0 28 29" aria-hidden="true" focusable="false">
          <path d="M14 0V9" strokeWidth={3} className="stroke-petrol" />
          <g transform="translate(2.8 6.8) scale(0.7)">
            <circle cx={16} cy={16} r={15} className="fill-paper" />
            <LogoRings />
          </g>
        </svg>
      </div>
    </div>
  );
}

/** Ticks 11, 9 and 5 long hanging from the edge; figures at round steps, hidden where the ring is. */
function RulerTicks({ run }: { run: number }) {
  return (
    <svg
      width="100%"
      height={30}
      className="absolute inset-0 overflow-visible"
      aria-hidden="true"
      focusable="false"
    >
      {TICKS.map(({ kits, length }) => (
        <line
          key={kits}
          x1={percent(kits)}
          x2={percent(kits)}
          y1={0}
          y2={length}
          strokeWidth={length === 5 ? 1 : 1.5}
          className={length === 5 ? "stroke-rule-2" : "stroke-ink"}
        />
      ))}
      {TICKS.filter(({ kits, figure }) => figure && !figureHidden(kits, run)).map(({ kits }) => (
        <text
          key={kits}
          x={percent(kits)}
          y={25}
          textAnchor="middle"
          className="fill-ink text-[0.875rem] font-semibold"
        >
          {kits}
        </text>
      ))}
    </svg>
  );
}
