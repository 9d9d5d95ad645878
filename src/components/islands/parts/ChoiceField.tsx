import type { SelectHTMLAttributes } from "react";
import { fieldLook } from "#src/components/field-look.ts";
import { Field, type FieldWords } from "./Field.tsx";
import { DownIcon } from "./Icons.tsx";

export type Choice = { value: string; label: string; off?: boolean };

export type ChoiceFieldProps = FieldWords &
  Omit<SelectHTMLAttributes<HTMLSelectElement>, "className" | "children"> & {
    choices: readonly Choice[];
    /** The value that means "Leave out": its border is dashed. */
    leaveOut?: string;
    row?: boolean;
    bold?: boolean;
  };

/** One of a list: the browser's own select in our look. Works with `defaultValue` in a plain form. */
export function ChoiceField({
  label,
  labelHidden,
  hint,
  wrong,
  className,
  choices,
  leaveOut,
  row,
  bold,
  id,
  ...rest
}: ChoiceFieldProps) {
  const left = leaveOut !== undefined && (rest.value ?? rest.defaultValue) === leaveOut;
  return (
    <Field {...{ label, labelHidden, hint, wrong, className, id }}>
      {(ids) => (
        <span className="relative block">
          <select
            {...rest}
            {...ids}
            className={`${fieldLook({ wrong: Boolean(wrong), row })} appearance-none pr-9 pl-3 type-table ${left ? "border-dashed! text-ink-2" : ""} ${bold && !left ? "font-semibold" : ""}`}
          >
            {choices.map((choice) => (
              <option key={choice.value} value={choice.value} disabled={choice.off}>
                {choice.label}
              </option>
            ))}
          </select>
          <DownIcon className="pointer-events-none absolute top-1/2 right-3 size-4 -translate-y-1/2" />
        </span>
      )}
    </Field>
  );
}
