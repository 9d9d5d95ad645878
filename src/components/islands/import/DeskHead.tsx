import { Question } from "../parts/Question.tsx";
import { counted, numberWord, upperFirst } from "./count-words.ts";
import type { ImportView } from "./use-import.ts";

function countsWords(view: ImportView): string {
  const { counts } = view;
  const settle = counts.questions > 0 ? [`${counts.questions} to settle`] : [];
  const body =
    view.kind === "parts-list"
      ? [
          counted(view.counts.lines, "line", "lines"),
          `${counts.skipped} skipped`,
          ...(view.counts.joined > 0 ? [`${view.counts.joined} joined`] : []),
        ]
      : [
          counted(view.counts.offers, "offer", "offers"),
          ...(view.counts.breaks > 0 ? [counted(view.counts.breaks, "further price", "further prices")] : []),
          `${counts.skipped} skipped`,
        ];
  return `${counted(counts.rows, "row", "rows")}: ${[...body, ...settle].join(", ")}.`;
}

/** The answer above: how many rows are ready, how many need a decision; counts that add up. */
export function DeskHead({ view }: { view: ImportView }) {
  const { counts, questions } = view;
  const open = questions.must + questions.look;
  const ready = counts.rows - counts.questions;
  const what = view.kind === "parts-list" ? "Bring in a list" : "Bring in a price list";
  return (
    <Question question={what}>
      <b>
        {ready === counts.rows
          ? `All ${counts.rows} rows are ready.`
          : `${ready} of ${counts.rows} rows are ready.`}
      </b>{" "}
      {open > 0 && (
        <>
          {upperFirst(numberWord(open))} {open === 1 ? "needs" : "need"} a decision. A suggestion stands
          beside {open === 1 ? "it" : "each one"};{" "}
        </>
      )}
      {open > 0 ? "nothing" : "Nothing"} is changed until you bring the list in.{" "}
      <span className="text-ink-2">{countsWords(view)}</span>
    </Question>
  );
}
