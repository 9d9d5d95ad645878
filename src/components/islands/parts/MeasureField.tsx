import { type KeyboardEvent, useRef, useState } from "react";
import { FIELD_GROUP_LOOK, fieldLook, UNIT_BOX_LOOK } from "#src/components/field-look.ts";
import { type MeasureEntry, readMeasure } from "#src/components/measure-entry.ts";
import { Field, type FieldWords } from "./Field.tsx";

export type MeasureFieldProps = FieldWords & {
  /** Decimal text in `unit`; empty when not known. */
  value: string;
  /** mm, V, µF, … ; or a counted thing such as "pieces". */
  unit: string;
  /** Called when the field is left, with decimal text in `unit`. */
  onMeasure?: (value: string) => void;
  /** Also called while one types, for figures that follow; Escape then gives back what stood there. */
  live?: boolean;
  /** What is wrong with a value that can be read, such as one out of range; it is then not handed on. */
  check?: (value: string) => string | undefined;
  name?: string;
  id?: string;
  off?: boolean;
  row?: boolean;
};

/** A measure. A unit typed after the number converts it: "0.8 cm" in a field of mm becomes 8. */
export function MeasureField({
  value,
  unit,
  onMeasure,
  live,
  check,
  name,
  id,
  off,
  row,
  ...words
}: MeasureFieldProps) {
  const [draft, setDraft] = useState<string | null>(null);
  const [fault, setFault] = useState<string>();
  const wrong = fault ?? words.wrong;
  const begun = useRef(value);

  function readChecked(entry: string): MeasureEntry {
    const read = readMeasure(entry, unit);
    const sentence = read.ok && read.value !== "" ? check?.(read.value) : undefined;
    return sentence === undefined ? read : { ok: false, sentence };
  }

  function type(entry: string) {
    setDraft(entry);
    const read = readChecked(entry);
    if (live && read.ok && read.value !== value) onMeasure?.(read.value);
  }

  function key({ key, currentTarget }: KeyboardEvent<HTMLInputElement>) {
    if (key === "Enter") take(currentTarget.value);
    if (key !== "Escape") return;
    setDraft(null);
    setFault(undefined);
    if (live && value !== begun.current) onMeasure?.(begun.current);
  }

  function take(entry: string) {
    const read = readChecked(entry);
    setFault(read.ok ? undefined : read.sentence);
    if (!read.ok) return;
    setDraft(null);
    if (read.value !== value) onMeasure?.(read.value);
  }

  return (
    <Field {...words} id={id} wrong={wrong}>
      {(ids) => (
        <span className={`${fieldLook({ wrong: Boolean(wrong), off, row })} ${FIELD_GROUP_LOOK}`}>
          <input
            {...ids}
            name={name}
            inputMode="decimal"
            autoComplete="off"
            readOnly={off}
            value={draft ?? value}
            onFocus={() => {
              begun.current = value;
            }}
            onChange={(change) => type(change.currentTarget.value)}
            onBlur={(leave) => draft !== null && take(leave.currentTarget.value)}
            onKeyDown={key}
            className="w-full min-w-0 bg-transparent px-3 text-right text-[1.1875rem] leading-6 font-semibold outline-none"
          />
          <span className={`${UNIT_BOX_LOOK} border-l border-rule`}>{unit}</span>
        </span>
      )}
    </Field>
  );
}
