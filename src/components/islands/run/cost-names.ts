import { type NameBox, nameWidth, overlaps } from "#src/components/islands/charts/label-room.ts";
import type { Pixels } from "#src/components/islands/charts/pixels.ts";

/** A ring whose run and cost want to stand beside it. */
export interface NamedRing extends Pixels {
  kits: number;
  /** What stands below the run: "€14.95". */
  figure: string;
  /** The smaller, the sooner it gets its place. */
  rank: number;
}

/** Where a name of two lines stands. */
export interface PlacedName extends NamedRing {
  box: NameBox;
  anchor: "start" | "end";
}

const HEIGHT = 38;

/** Below left of a ring, where a falling line leaves room; else above right. */
function places(ring: NamedRing): { box: NameBox; anchor: "start" | "end" }[] {
  const width = nameWidth(ring.rank === 0 ? `${ring.kits} kits` : String(ring.kits), ring.figure);
  const below = {
    left: ring.x - 8 - width,
    right: ring.x - 8,
    top: ring.y + 10,
    bottom: ring.y + 10 + HEIGHT,
  };
  const above = {
    left: ring.x + 8,
    right: ring.x + 8 + width,
    top: ring.y - 24 - HEIGHT,
    bottom: ring.y - 24,
  };
  return [
    { box: below, anchor: "end" },
    { box: above, anchor: "start" },
  ];
}

const ringBox = ({ x, y }: NamedRing): NameBox => ({ left: x - 9, right: x + 9, top: y - 9, bottom: y + 9 });

/** Names of rings inside the plot that touch no other name or ring and nothing that is taken; the rest are left out. */
export function ringNames(
  rings: readonly NamedRing[],
  plot: NameBox,
  taken: readonly NameBox[],
): PlacedName[] {
  const named: PlacedName[] = [];
  for (const ring of [...rings].sort((one, other) => one.rank - other.rank || one.x - other.x)) {
    const others = rings.filter((other) => other !== ring).map(ringBox);
    const place = places(ring).find(
      ({ box }) =>
        box.left >= plot.left &&
        box.right <= plot.right &&
        box.top >= plot.top &&
        box.bottom <= plot.bottom &&
        [...taken, ...others, ...named.map((other) => other.box)].every((other) => !overlaps(box, other)),
    );
    if (place) named.push({ ...ring, ...place });
  }
  return named;
}
