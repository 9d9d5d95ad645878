import type { FieldChange } from "#src/partslist/difference.ts";
import type { DifferenceLine, DifferenceView } from "#src/server/bring-in/difference-view.ts";
import { Section } from "../parts/Section.tsx";
import { CostLine } from "./CostLine.tsx";
import type { ImportPlace } from "./import-place.ts";

interface Props {
  place: ImportPlace;
  /** The import and its version, for asking what it would cost. */
  id: string;
  version: number;
  difference: DifferenceView;
  /** Letter of the list that stands: "B". */
  revision: string;
  money: boolean;
}

const FIELD_WORDS: Readonly<Record<FieldChange["field"], string>> = {
  designators: "designators",
  quantity: "quantity",
  value: "value",
  class: "kind",
  package: "body and holes",
  description: "description",
  manufacturer: "manufacturer",
  partNumber: "part number",
  mark: "mark",
  note: "note",
  drawer: "drawer",
};

function against(revision: string, unchanged: number): string {
  const stay = unchanged === 1 ? "1 line stays as it is" : `${unchanged} lines stay as they are`;
  return unchanged === 0 ? `against rev ${revision}` : `against rev ${revision}; ${stay}`;
}

/** What the list would change of the one that stands: nothing of it is done before it is brought in. */
export function DifferenceSection({ place, id, version, difference, revision, money }: Props) {
  const { counts } = difference;
  const first = counts.unchanged + counts.removed + counts.changed + counts.revalued === 0;
  const changes = counts.added + counts.removed + counts.changed + counts.revalued;
  return (
    <Section
      id="difference"
      title="What changes"
      aside={first ? "the list is empty until now" : against(revision, counts.unchanged)}
    >
      {money && changes > 0 && <CostLine place={place} id={id} version={version} />}
      {changes === 0 && <p>Nothing: every line stands so already.</p>}
      <Group title="Another value" count={counts.revalued} lines={difference.revalued} />
      <Group title="Changed" count={counts.changed} lines={difference.changed} />
      <Group title="New" count={counts.added} lines={difference.added} />
      <Group title="Leave the list" count={counts.removed} lines={difference.removed} />
    </Section>
  );
}

function Group({ title, count, lines }: { title: string; count: number; lines: readonly DifferenceLine[] }) {
  if (count === 0) return null;
  return (
    <details open={count <= 12} className="hairline-b py-2">
      <summary className="type-h3 min-h-8 py-1">
        {title} <span className="font-normal text-ink-2">{count}</span>
      </summary>
      <ul className="type-table pb-2">
        {lines.map((line) => (
          <Line key={`${line.row} ${line.line}`} line={line} />
        ))}
        {count > lines.length && <li className="text-ink-2">and {count - lines.length} more</li>}
      </ul>
    </details>
  );
}

function Line({ line }: { line: DifferenceLine }) {
  const { subject, part, quantity, changes } = line;
  return (
    <li className="grid gap-x-4 py-1 tablet:grid-cols-[minmax(140px,220px)_1fr]">
      <span className="font-semibold">{subject}</span>
      {changes.length === 0 ? (
        <span className="text-ink-2">
          {part !== subject && part}
          {quantity !== null && `${part !== "" && part !== subject ? ", " : ""}${quantity} in a kit`}
        </span>
      ) : (
        <span>
          {changes.map((change, place) => (
            <span key={change.field}>
              {place > 0 && "; "}
              <span className="text-ink-2">{FIELD_WORDS[change.field]}</span> {change.from ?? "not set"}
              <span className="heard-only"> becomes </span>
              <span aria-hidden="true" className="text-ink-2">
                {" "}
                to{" "}
              </span>
              <b>{change.to ?? "not set"}</b>
            </span>
          ))}
        </span>
      )}
    </li>
  );
}
