import { RULER_LEAST, RULER_MOST } from "#src/shapes/limits.ts";

/** The logarithmic ruler along the tally: equal ratios of run size are equal lengths. */

export type RulerTick = { kits: number; length: 11 | 9 | 5; figure: boolean };

const SPAN = Math.log(RULER_MOST / RULER_LEAST);
const FIGURES = [10, 20, 30, 40, 50, 60, 80, 100, 150, 200, 250, 300, 400, 500];
const HALVES = [70, 90, 350, 450];
/** A figure nearer to the ring than this share of the run would touch it. */
const CLEAR_OF_RING = 0.09;

/**
 * Where a run stands on the ruler, from 0 at its left end to 1; beyond the ends it stays at the end. To six places,
 * because server and browser may differ in the last bit of a logarithm.
 */
export function rulerPlace(kits: number): number {
  const kept = Math.min(Math.max(kits, RULER_LEAST), RULER_MOST);
  return Math.round((Math.log(kept / RULER_LEAST) / SPAN) * 1e6) / 1e6;
}

/** The whole run nearest to a place on the ruler. */
export function runAtPlace(place: number): number {
  const kept = Math.min(Math.max(place, 0), 1);
  return Math.round(RULER_LEAST * Math.exp(kept * SPAN));
}

/** Ticks by 2 to 100 and by 10 from there; long at figures, middling at the halves. */
export function rulerTicks(): RulerTick[] {
  const ticks: RulerTick[] = [];
  for (let kits = RULER_LEAST; kits <= RULER_MOST; kits += kits < 100 ? 2 : 10) {
    const figure = FIGURES.includes(kits);
    ticks.push({ kits, figure, length: figure ? 11 : HALVES.includes(kits) ? 9 : 5 });
  }
  return ticks;
}

/** Whether a figure is hidden because the ring of the run is too near. */
export function figureHidden(kits: number, run: number): boolean {
  return Math.abs(kits - run) < CLEAR_OF_RING * run;
}

/** The next sweet spot up or down from a run; the run itself when there is none further. */
export function nextSweetSpot(run: number, spots: readonly number[], direction: 1 | -1): number {
  const further = spots.filter((spot) => (spot - run) * direction > 0);
  if (further.length === 0) return run;
  return direction === 1 ? Math.min(...further) : Math.max(...further);
}

export type RulerKey = { key: string; shiftKey: boolean };

/**
 * The run a key leads to on the ruler: arrows ±1, Page ±10, Home and End, Shift and arrow to the next sweet spot.
 * Undefined for a key that is none of the ruler's.
 */
export function runAfterKey(run: number, press: RulerKey, spots: readonly number[]): number | undefined {
  const keep = (kits: number) => Math.min(Math.max(kits, RULER_LEAST), RULER_MOST);
  const up = press.key === "ArrowRight" || press.key === "ArrowUp";
  const down = press.key === "ArrowLeft" || press.key === "ArrowDown";
  if (up || down) {
    const direction = up ? 1 : -1;
    return keep(press.shiftKey ? nextSweetSpot(run, spots, direction) : run + direction);
  }
  if (press.key === "PageUp") return keep(run + 10);
  if (press.key === "PageDown") return keep(run - 10);
  if (press.key === "Home") return RULER_LEAST;
  if (press.key === "End") return RULER_MOST;
  return undefined;
}
