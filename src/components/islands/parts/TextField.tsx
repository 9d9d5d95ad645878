import type { InputHTMLAttributes, ReactNode, TextareaHTMLAttributes } from "react";
import { fieldLook } from "#src/components/field-look.ts";
import { Field, type FieldWords } from "./Field.tsx";

export type TextFieldProps = FieldWords &
  Omit<InputHTMLAttributes<HTMLInputElement>, "className"> & {
    off?: boolean;
    /** In a row of fields: 40 tall. */
    row?: boolean;
    /** Stands inside the field at its right end: "Show" beside a password. */
    inside?: ReactNode;
    /** A sign inside at the left: the search glass. */
    sign?: ReactNode;
  };

/** One line of text. Takes the attributes of an input; works with `defaultValue` in a plain form. */
export function TextField({
  label,
  labelHidden,
  hint,
  wrong,
  className,
  off,
  row,
  inside,
  sign,
  id,
  ...rest
}: TextFieldProps) {
  return (
    <Field {...{ label, labelHidden, hint, wrong, className, id }}>
      {(ids) => (
        <span className="relative block">
          {sign && (
            <span className="pointer-events-none absolute inset-y-0 left-3.5 flex items-center">{sign}</span>
          )}
          <input
            {...rest}
            {...ids}
            readOnly={off || rest.readOnly}
            aria-readonly={off || undefined}
            className={`${fieldLook({ wrong: Boolean(wrong), off, row })} px-3 type-table ${sign ? "pl-10" : ""} ${inside ? "pr-16" : ""}`}
          />
          {inside && <span className="absolute inset-y-0 right-3 flex items-center">{inside}</span>}
        </span>
      )}
    </Field>
  );
}

export type LongTextFieldProps = FieldWords &
  Omit<TextareaHTMLAttributes<HTMLTextAreaElement>, "className"> & { off?: boolean };

/** Several lines of text. */
export function LongTextField({
  label,
  labelHidden,
  hint,
  wrong,
  className,
  off,
  id,
  ...rest
}: LongTextFieldProps) {
  return (
    <Field {...{ label, labelHidden, hint, wrong, className, id }}>
      {(ids) => (
        <textarea
          rows={3}
          {...rest}
          {...ids}
          readOnly={off || rest.readOnly}
          className={`${fieldLook({ wrong: Boolean(wrong), off })} px-3 py-2 type-note`}
        />
      )}
    </Field>
  );
}
