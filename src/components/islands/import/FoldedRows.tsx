import { countText } from "#src/components/amount-text.ts";
import { SKIP_WORDS } from "#src/partslist/questions.ts";
import type { RecognisedView, SkippedView } from "#src/server/bring-in/view.ts";
import { Folded } from "./Folded.tsx";
import { PROPERTY_WORDS } from "./property-words.ts";

/** Every row that is no line, by its reason. Nothing is dropped without being named here. */
export function SkippedRows({ skipped }: { skipped: readonly SkippedView[] }) {
  const count = skipped.reduce((sum, group) => sum + group.count, 0);
  if (count === 0) return null;
  return (
    <Folded summary={count === 1 ? "1 row is skipped" : `${countText(count)} rows are skipped`}>
      <dl className="type-table flex flex-col gap-3">
        {skipped.map((group) => (
          <div key={group.reason}>
            <dt className="font-semibold">
              {countText(group.count)} {group.count === 1 ? "row" : "rows"}: {SKIP_WORDS[group.reason]}
            </dt>
            {group.reason !== "blank" &&
              group.rows.map(({ row, text }) => (
                <dd key={row} className="text-ink-2">
                  Row {row}: {text}
                </dd>
              ))}
            {group.reason !== "blank" && group.count > group.rows.length && (
              <dd className="text-ink-2">and {countText(group.count - group.rows.length)} more</dd>
            )}
          </div>
        ))}
      </dl>
    </Folded>
  );
}

/** What was read out of free text: said to be so, and never put over a column of the list. */
export function RecognisedRows({ recognised }: { recognised: RecognisedView }) {
  if (recognised.count === 0) return null;
  const lines = recognised.count === 1 ? "1 line" : `${countText(recognised.count)} lines`;
  return (
    <Folded summary={`In ${lines} something was recognised in the text`}>
      <ul className="type-table flex flex-col gap-1">
        {recognised.rows.map(({ row, subject, properties }) => (
          <li key={row}>
            <span className="font-semibold">Row {row}</span> <span className="text-ink-2">{subject}:</span>{" "}
            {properties.map(({ name, value, from }, place) => (
              <span key={name}>
                {place > 0 && ", "}
                {PROPERTY_WORDS[name][0]} {value}
                {PROPERTY_WORDS[name][1]} <span className="text-ink-2">from “{from}”</span>
              </span>
            ))}
          </li>
        ))}
      </ul>
      {recognised.count > recognised.rows.length && (
        <p className="mt-1 text-ink-2">and {countText(recognised.count - recognised.rows.length)} more</p>
      )}
    </Folded>
  );
}
