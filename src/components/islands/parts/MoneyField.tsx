import { type KeyboardEvent, useRef, useState } from "react";
import { FIELD_GROUP_LOOK, fieldLook, UNIT_BOX_LOOK } from "#src/components/field-look.ts";
import { type MoneyPlaces, readMoney, stepMoney } from "#src/components/money-entry.ts";
import { Field, type FieldWords } from "./Field.tsx";

export type MoneyFieldProps = FieldWords & {
  /** Decimal text such as "34.50"; empty when not known. */
  value: string;
  /** Called when the field is left or stepped, with decimal text; never with what cannot be read. */
  onMoney?: (value: string) => void;
  /** Also called while one types, for figures that follow; Escape then gives back what stood there. */
  live?: boolean;
  name?: string;
  id?: string;
  currency?: string;
  /** "each", "a kit". */
  unit?: string;
  /** 4 for unit prices. */
  places?: MoneyPlaces;
  off?: boolean;
  row?: boolean;
  /** The large price field of the Price page. */
  large?: boolean;
};

/** An amount of money: exact, never below zero. Arrows step by 0.10, with Shift by 1.00. */
export function MoneyField({
  value,
  onMoney,
  live,
  name,
  id,
  currency = "€",
  unit,
  places = 2,
  off,
  row,
  large,
  ...words
}: MoneyFieldProps) {
  const [draft, setDraft] = useState<string | null>(null);
  const [fault, setFault] = useState<string>();
  const wrong = fault ?? words.wrong;
  const begun = useRef(value);

  function type(entry: string) {
    setDraft(entry);
    const read = readMoney(entry, places);
    if (live && read.ok && read.value !== value) onMoney?.(read.value);
  }

  function take(entry: string) {
    const read = readMoney(entry, places);
    setFault(read.ok ? undefined : read.sentence);
    if (!read.ok) return;
    setDraft(null);
    if (read.value !== value) onMoney?.(read.value);
  }

  function step(press: KeyboardEvent<HTMLInputElement>) {
    if (press.key === "Enter") take(press.currentTarget.value);
    if (press.key === "Escape") {
      setDraft(null);
      setFault(undefined);
      if (live && value !== begun.current) onMoney?.(begun.current);
    }
    const direction = press.key === "ArrowUp" ? 1 : press.key === "ArrowDown" ? -1 : 0;
    if (direction === 0 || off) return;
    press.preventDefault();
    const read = readMoney(press.currentTarget.value, places);
    if (read.ok) take(stepMoney(read.value, direction * (press.shiftKey ? 100 : 10)));
  }

  return (
    <Field {...words} id={id} wrong={wrong}>
      {(ids) => (
        <span
          className={`${fieldLook({ wrong: Boolean(wrong), off, row })} ${FIELD_GROUP_LOOK} ${large ? "border-2! border-ink!" : ""}`}
        >
          <span
            aria-hidden="true"
            className={`${UNIT_BOX_LOOK} border-r border-rule ${large ? "type-h1! px-5 font-normal!" : ""}`}
          >
            {currency}
          </span>
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
            onKeyDown={step}
            className={`w-full min-w-0 bg-transparent px-3 text-right outline-none ${large ? "type-price py-2.5" : "text-[1.1875rem] leading-6 font-semibold"}`}
          />
          {unit && <span className={`${UNIT_BOX_LOOK} border-l border-rule`}>{unit}</span>}
        </span>
      )}
    </Field>
  );
}
