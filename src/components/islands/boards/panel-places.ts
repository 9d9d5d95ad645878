import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import type { Rect } from "#src/costing/panels/micrometres.ts";
import { LEADER_WORDS } from "./panel-words.ts";

/** Where a panel's drawing lies in its picture, in px. */
export interface PanelFrame {
  /** Width of the whole picture. */
  width: number;
  left: number;
  top: number;
  /** Of the panel itself. */
  panelWidth: number;
  panelHeight: number;
  pxPerMm: number;
  /** As on a phone: no leaders, outer measures only. */
  narrow: boolean;
}

/** Narrower pictures leave out what would not be readable. */
const NARROW_BELOW = 560;
const WIDE = { left: 94, right: 30, top: 72 };
const NARROW = { left: 32, right: 4, top: 30 };
/** A panel is never drawn larger than this. */
const PX_PER_MM_MOST = 4;
const HEIGHT_MOST = 720;

/** The largest drawing of a panel that a width in px has room for. */
export function framePanel({ outer }: Panel, width: number): PanelFrame {
  const narrow = width < NARROW_BELOW;
  const { left, right, top } = narrow ? NARROW : WIDE;
  const [wide, high] = [outer.width / 1000, outer.height / 1000];
  const pxPerMm = Math.min(PX_PER_MM_MOST, (width - left - right) / wide, HEIGHT_MOST / high);
  return { width, left, top, panelWidth: wide * pxPerMm, panelHeight: high * pxPerMm, pxPerMm, narrow };
}

/** A name below the drawing and the dot it leads to, in px; deeper levels lie lower. */
export interface Leader {
  words: string;
  x: number;
  y: number;
  level: number;
}

/** A place to name, in micrometres; one that slides may be anywhere along a rail. */
interface Dot {
  words: string;
  x: number;
  y: number;
  slides?: boolean;
}

/** About what a character of 15 px takes. */
const CHARACTER = 7.4;
export const LEADER_FOOT = 14;
const APART = 12;

/**
 * Leaders to a gap or score, a tab and a rail, spread along the foot of the panel so that no line crosses a name;
 * one without room is left out.
 */
export function leadersOf(panel: Panel, frame: PanelFrame): Leader[] {
  const gap = gapDot(panel);
  const beside = (APART / frame.pxPerMm) * 1000;
  const tab = tabDot(panel, (x) => gap === null || Math.abs(x - gap.x) > beside);
  const dots = [gap, tab, railDot(panel)].filter((dot) => dot !== null);
  const placed = dots
    .map((dot) => {
      const last = frame.width - LEADER_FOOT - dot.words.length * CHARACTER;
      const x = frame.left + (dot.x / 1000) * frame.pxPerMm;
      return {
        ...dot,
        last,
        x: dot.slides ? Math.min(x, last) : x,
        y: frame.top + (dot.y / 1000) * frame.pxPerMm,
      };
    })
    .filter(({ x, last }) => x <= last);
  const leaders: Leader[] = [];
  for (const { words, x, y } of placed.sort((a, b) => b.x - a.x)) {
    const next = leaders.at(-1);
    const clear = !next || x + LEADER_FOOT + words.length * CHARACTER + APART < next.x;
    leaders.push({ words, x, y, level: next ? next.level + (clear ? 0 : 1) : 0 });
  }
  return leaders.reverse();
}

/** The one nearest to a share of the panel's width. */
function nearest<Place>(
  places: readonly Place[],
  xOf: (place: Place) => number,
  wanted: number,
): Place | null {
  return places.reduce<Place | null>(
    (best, place) =>
      best === null || Math.abs(xOf(place) - wanted) < Math.abs(xOf(best) - wanted) ? place : best,
    null,
  );
}

/** Upright gaps in the lowest row, else the lowest gap across; for a scored panel its scores. */
function gapDot(panel: Panel): Dot | null {
  const { boards, outer, measures, scores } = panel;
  const low = Math.max(...boards.map(({ y, height }) => y + height));
  const row = boards.filter(({ y, height }) => y + height === low);
  const tall = row[0]?.height ?? 0;
  if (!measures.routed) {
    const words = LEADER_WORDS.score();
    const x = nearest(scores.x, (at) => at, outer.width * 0.25);
    if (x !== null) return { words, x, y: low - tall / 4 };
    const y = scores.y.at(-1);
    return y === undefined ? null : { words, x: outer.width * 0.25, y };
  }
  const words = LEADER_WORDS.gap(panel);
  const upright = row
    .filter((one) => row.some(({ x }) => x === one.x + one.width + measures.gap))
    .map(({ x, width }) => x + width + measures.gap / 2);
  const x = nearest(upright, (at) => at, outer.width * 0.25);
  if (x !== null) return { words, x, y: low - tall / 8 };
  if (measures.railsAlongLong) return { words, x: (row[0]?.x ?? 0) + tall / 12, y: low + measures.gap / 2 };
  const above = row[0];
  return above && above.y > 0
    ? { words, x: above.x + above.width / 12, y: above.y - measures.gap / 2 }
    : null;
}

/** The lowest tabs, but none whose leader would run along that of the gap. */
function tabDot(panel: Panel, free: (x: number) => boolean): Dot | null {
  const { tabs, outer } = panel;
  const middle = ({ y, height }: Rect) => y + height / 2;
  const across = ({ x, width }: Rect) => x + width / 2;
  const possible = tabs.filter((tab) => free(across(tab)));
  const low = Math.max(...possible.map(middle));
  const tab = nearest(
    possible.filter((one) => middle(one) === low),
    across,
    outer.width * 0.56,
  );
  return tab && { words: LEADER_WORDS.tab(tab, panel), x: across(tab), y: middle(tab) };
}

function railDot(panel: Panel): Dot | null {
  const { rails, outer, measures } = panel;
  if (rails.length === 0) return null;
  const words = LEADER_WORDS.rail(panel);
  return measures.railsAlongLong
    ? { words, x: outer.width * 0.89, y: outer.height - measures.rail / 2, slides: true }
    : { words, x: measures.rail / 2, y: outer.height * 0.94 };
}
