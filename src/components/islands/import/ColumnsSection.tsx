import { currencySign } from "#src/components/amount-text.ts";
import { MEANING_LABELS, MEANINGS, type Meaning } from "#src/partslist/meanings.ts";
import type { ColumnsView, ColumnView, SampleRow } from "#src/server/bring-in/view.ts";
import { ChoiceField } from "../parts/ChoiceField.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { Section } from "../parts/Section.tsx";
import { BreakQuantityField } from "./BreakQuantityField.tsx";
import type { Edit } from "./use-import.ts";

interface Props {
  columns: ColumnsView;
  edit: (edit: Edit) => void;
}

const LEAVE_OUT: Meaning = "leave-out";
const CHOICES = MEANINGS.map((meaning) => ({ value: meaning, label: MEANING_LABELS[meaning] }));

function aside({ columns }: ColumnsView): string {
  if (columns.some(({ reason }) => reason === "remembered"))
    return "remembered from the last list of this shape; change any that is wrong";
  return "guessed from the heading and the cells; change any that is wrong";
}

/** What each column means, over the first rows and those in question. */
export function ColumnsSection({ columns, edit }: Props) {
  const said = columns.columns.some((column) => column.said);
  return (
    <Section
      id="columns"
      title="What each column means"
      aside={aside(columns)}
      actions={said && <QuietButton onClick={() => edit({ guessAgain: true })}>Guess again</QuietButton>}
    >
      <div className="mb-4 flex flex-wrap gap-x-6 gap-y-3">
        <HeadingChoice columns={columns} edit={edit} />
        <CurrencyNote columns={columns} />
      </div>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable by keyboard. */}
      <section tabIndex={0} aria-label="Columns and first rows" className="relative -m-1 overflow-x-auto p-1">
        <table className="type-table w-full border-collapse">
          <caption className="heard-only">The first rows of the list, and what each column means</caption>
          <thead>
            <tr className="rule-head">
              <th scope="col" className="heard-only">
                Row
              </th>
              {columns.columns.map((column) => (
                <ColumnHead key={column.column} column={column} edit={edit} />
              ))}
            </tr>
          </thead>
          <tbody>
            {columns.sample.map((row) => (
              <SampleLine key={row.row} row={row} columns={columns.columns} />
            ))}
          </tbody>
        </table>
      </section>
    </Section>
  );
}

const CELL = "border-rule px-2.5 not-first:border-l";

/** Wide enough for the words of the meaning that is chosen. */
const WIDTHS = { short: "min-w-[124px]", usual: "min-w-[168px]", long: "min-w-[224px]" } as const;

function widthOf(meaning: Meaning): keyof typeof WIDTHS {
  const letters = MEANING_LABELS[meaning].length;
  if (letters <= 9) return "short";
  return letters <= 15 ? "usual" : "long";
}

function ColumnHead({ column, edit }: { column: ColumnView; edit: Props["edit"] }) {
  const name = column.heading.trim() || `Column ${column.column + 1}`;
  const change = (fields: Omit<NonNullable<Edit["columns"]>[number], "column">) =>
    edit({ columns: [{ column: column.column, ...fields }] });
  return (
    <th scope="col" className={`${CELL} pb-2.5 align-bottom nth-2:border-l-0 nth-2:pl-0`}>
      <span className="type-label mb-1 block max-w-[220px] truncate font-semibold text-ink-2" title={name}>
        {name}
      </span>
      <ChoiceField
        label={`What ${name} means`}
        labelHidden
        className={WIDTHS[widthOf(column.meaning)]}
        choices={CHOICES}
        leaveOut={LEAVE_OUT}
        row
        bold
        value={column.meaning}
        onChange={(chosen) => change({ meaning: chosen.currentTarget.value as Meaning })}
      />
      {column.meaning === "price-break" && (
        <BreakQuantityField
          name={name}
          quantity={column.breakQuantity}
          onQuantity={(breakQuantity) => change({ breakQuantity })}
        />
      )}
      {column.supplier !== null && column.meaning !== LEAVE_OUT && (
        <span className="type-label mt-1 block font-normal text-ink-2">of {column.supplier}</span>
      )}
    </th>
  );
}

function SampleLine({ row, columns }: { row: SampleRow; columns: readonly ColumnView[] }) {
  return (
    <tr className="hairline-b h-[33px]">
      <th scope="row" className="heard-only">
        Row {row.row}
      </th>
      {columns.map(({ column, meaning }, place) => {
        const faulty = row.faulty.includes(column);
        const look = faulty
          ? "bg-bad-wash font-semibold text-ink"
          : meaning === LEAVE_OUT
            ? "text-ink-3"
            : "text-ink-2";
        return (
          <td key={column} className={`${CELL} max-w-[240px] truncate nth-2:border-l-0 nth-2:pl-0.5 ${look}`}>
            {row.cells[place] || "–"}
            {faulty && <span className="heard-only"> (in question)</span>}
          </td>
        );
      })}
    </tr>
  );
}

function HeadingChoice({ columns, edit }: Props) {
  const choices = [
    { value: "none", label: "The list has no heading" },
    ...columns.headings.map(({ record, row, text }) => ({
      value: String(record),
      label: `Row ${row}: ${text}`,
    })),
  ];
  return (
    <ChoiceField
      label="Heading"
      className="w-[min(420px,100%)]"
      choices={choices}
      row
      value={columns.headerRecord === null ? "none" : String(columns.headerRecord)}
      onChange={(chosen) => {
        const { value } = chosen.currentTarget;
        edit({ headerRecord: value === "none" ? null : Number(value) });
      }}
    />
  );
}

const PRICED: readonly Meaning[] = ["price-each", "price-break", "line-total"];

function CurrencyNote({ columns }: { columns: ColumnsView }) {
  const priced = columns.columns.some(({ meaning }) => PRICED.includes(meaning));
  if (!priced || columns.currency === null) return null;
  return (
    <p className="type-note self-end pb-2 text-ink-2">
      Prices in {currencySign(columns.currency)}, as the list says.
    </p>
  );
}
