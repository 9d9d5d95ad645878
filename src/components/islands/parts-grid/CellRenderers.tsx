import type { CustomCellEditorProps, CustomCellRendererProps } from "ag-grid-react";
import { useEffect, useRef } from "react";
import { Bands } from "#src/components/islands/parts/Bands.tsx";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import type { GridContext } from "./grid-context.ts";
import type { GridRow } from "./grid-rows.ts";

type CellProps = CustomCellRendererProps<GridRow, string, GridContext>;

/** The number of a line: a button that opens all of its fields. The grid's Enter key does the same. */
export function PlaceCell({ data, context }: CellProps) {
  if (data?.kind !== "line") return null;
  if (!context.canOpen) return <span>{data.place}</span>;
  return (
    <button
      type="button"
      tabIndex={-1}
      aria-label={`Line ${data.place}, all fields`}
      onClick={() => context.openLine(data.id)}
      className="w-full cursor-pointer text-right underline decoration-rule-2 decoration-dotted underline-offset-4 hover:text-petrol"
    >
      {data.place}
    </button>
  );
}

/** Two lines of a row, the lower smaller; on a phone the cell grows with its words. */
const STACKED =
  "flex flex-col py-2 leading-[1.1875rem] whitespace-normal *:last:text-[0.9375rem] max-tablet:py-1.5";

/** Words that go on in a second line where a row has two. */
export function WordsCell({ valueFormatted, value, context }: CellProps) {
  const words = valueFormatted ?? value;
  if (!context.folded) return <span>{words}</span>;
  return <span className="block py-2 leading-[1.1875rem] whitespace-normal max-tablet:py-1.5">{words}</span>;
}

/** A part: what it is called, then the rest more quietly; where there is little room below each other. */
export function PartCell({ data, value, valueFormatted, context }: CellProps) {
  if (data?.kind !== "line") return <span>{valueFormatted}</span>;
  const { name, spec } = data.line.part;
  if (value !== (spec === "" ? name : `${name}, ${spec}`)) return <span>{value}</span>;
  return (
    <span className={context.folded ? STACKED : undefined}>
      <b className="font-semibold">{name}</b>{" "}
      <span className={`text-ink-2 ${context.folded ? "" : "ml-1.5"}`}>{spec}</span>
    </span>
  );
}

export function BandsCell({ data }: CellProps) {
  if (data?.kind !== "line" || data.bands === null) return null;
  return (
    <Bands
      colours={data.bands.colours}
      tolerance={data.bands.tolerance}
      width={52}
      className="align-middle"
    />
  );
}

/** Supplier, then the order code more quietly. A pinned offer says so. */
export function SupplierCell({ data, value, context }: CellProps) {
  if (data?.kind === "total")
    return (
      <span className={`block text-right ${context.folded ? "leading-5 whitespace-normal" : ""}`}>
        {value}
      </span>
    );
  if (data?.kind !== "line" || !data.money) return null;
  const { supplier, orderCode, pinned } = data.money;
  if (supplier === "") return <span className="text-ink-2">{value}</span>;
  return (
    <span className={context.folded ? STACKED : undefined}>
      <span>{supplier}</span>{" "}
      <span className="text-ink-2">
        {orderCode}
        {pinned && ", pinned"}
      </span>
    </span>
  );
}

/** What one kit's share costs: opens its working. */
export function PerKitCell({ data, value, node, context }: CellProps) {
  if (node.rowPinned)
    return value && <span className="rule-result inline-block pl-3 leading-6">{value}</span>;
  if (data?.kind !== "line" || !value) return null;
  return (
    <button
      type="button"
      tabIndex={-1}
      aria-label={`Per kit ${value}, show the working`}
      onClick={() => context.openWorking(data.line.part.id)}
      className="foot-dotted cursor-pointer leading-6 hover:border-petrol hover:border-solid"
    >
      {value}
    </button>
  );
}

export function StateCell({ data, value }: CellProps) {
  if (data?.kind === "draft") return value ? <Chip kind="caution">{value}</Chip> : null;
  if (data?.kind !== "line") return null;
  const { kind, word } = data.state;
  return (
    <Chip kind={kind} className="align-middle">
      {word}
    </Chip>
  );
}

/** The heading of a group of lines. */
export function GroupCell({ data }: CellProps) {
  if (data?.kind !== "group") return null;
  return (
    <div className="flex h-full items-end gap-3 px-2.5 pb-1.5">
      <b className="font-semibold">{data.name}</b>
      <span className="text-ink-2">{data.count === 1 ? "1 line" : `${data.count} lines`}</span>
    </div>
  );
}

export interface EditorChoice {
  value: string;
  words: string;
}

/** One of a list, in a cell: the browser's own select, opened at once. */
export function ChoiceEditor({
  value,
  onValueChange,
  stopEditing,
  colDef,
  choices,
}: CustomCellEditorProps<GridRow, string> & { choices: readonly EditorChoice[] }) {
  const select = useRef<HTMLSelectElement>(null);
  useEffect(() => {
    select.current?.focus();
  }, []);
  return (
    <select
      ref={select}
      aria-label={colDef.headerName}
      value={value ?? ""}
      onChange={(change) => {
        onValueChange(change.currentTarget.value);
        // The grid reads the value after React has handed it over.
        setTimeout(() => stopEditing());
      }}
      className="h-full w-full bg-sheet px-2 text-ink"
    >
      {choices.map((choice) => (
        <option key={choice.value} value={choice.value}>
          {choice.words}
        </option>
      ))}
    </select>
  );
}
