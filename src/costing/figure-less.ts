import type { Figure } from "./figure.ts";
import { grains, grainText } from "./grains.ts";

/**
 * One figure less another, exact: what an edition earns, what a head would save. Not known while either is
 * not, with the needs of both.
 *
 * @example figureLess({ known: true, value: "25.19" }, { known: true, value: "14.95" }).value === "10.24"
 */
export function figureLess(from: Figure, less: Figure): Figure {
  if (from.known && less.known)
    return { known: true, value: grainText(grains(from.value) - grains(less.value)) };
  const needs = [from, less].flatMap((figure) => (figure.known ? [] : figure.needs));
  return { known: false, needs, without: null };
}
