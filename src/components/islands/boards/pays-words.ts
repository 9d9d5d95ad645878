import { countText } from "#src/components/amount-text.ts";
import type { Cheaper, PanelsPay } from "#src/costing/panels/compare-pieces.ts";

/** "48", "48 to 60". */
function spanWords({ from, to }: { from: number; to: number }): string {
  return from === to ? countText(from) : `${countText(from)} to ${countText(to)}`;
}

/** Every run at which one way is the cheaper: "48, 58 to 60"; null where there is none. */
export function runsWords({ ranges }: PanelsPay, cheaper: Cheaper): string | null {
  const spans = ranges.filter((range) => range.cheaper === cheaper).map(spanWords);
  return spans.length === 0 ? null : spans.join(", ");
}

/** From which run on panels pay, in one sentence or two. */
export function paysSentence({ first, safe }: PanelsPay, to: number): string {
  const end = countText(to);
  if (first === null) return `Single boards cost no more at any run up to ${end}.`;
  if (safe === first && first === 1) return `Panels cost less at every run up to ${end}.`;
  if (safe === first) return `Panels cost less from a run of ${countText(first)} on.`;
  const begins =
    first === 1 ? "Panels cost less at a run of 1" : `Panels first cost less at a run of ${countText(first)}`;
  const later =
    safe === null
      ? `but not at every run after it, as far as ${end}`
      : `and from ${countText(safe)} on at every run up to ${end}`;
  return `${begins}, ${later}.`;
}
