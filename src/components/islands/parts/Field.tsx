import { type ReactNode, useId } from "react";
import { BadIcon } from "./Icons.tsx";

/** What every field says about itself. */
export type FieldWords = {
  label: string;
  /** The label is heard, not shown: in rows under a column head. */
  labelHidden?: boolean;
  /** Below the field; for a field that is off, the reason. */
  hint?: ReactNode;
  /** What would be right, in a sentence: "A run is a number from 10 to 500." The entry is kept. */
  wrong?: string;
  className?: string;
};

export type FieldIds = {
  id: string;
  "aria-describedby": string | undefined;
  "aria-invalid": true | undefined;
};

/** Ties label, hint and fault to a control: the control takes the ids it is handed. */
export function Field({
  label,
  labelHidden,
  hint,
  wrong,
  className,
  id,
  children,
}: FieldWords & { id?: string; children: (ids: FieldIds) => ReactNode }) {
  const made = useId();
  const own = id ?? made;
  const described = [wrong && `${own}-wrong`, hint && `${own}-hint`].filter(Boolean).join(" ") || undefined;
  return (
    <div className={className}>
      <label htmlFor={own} className={labelHidden ? "heard-only" : "type-table mb-1 block font-semibold"}>
        {label}
      </label>
      {children({ id: own, "aria-describedby": described, "aria-invalid": wrong ? true : undefined })}
      {wrong && (
        <p id={`${own}-wrong`} className="type-label mt-1 flex gap-2 font-semibold text-bad">
          <BadIcon className="mt-px size-[18px] [--cut:var(--color-sheet)]" />
          {wrong}
        </p>
      )}
      {hint && (
        <p id={`${own}-hint`} className="type-label mt-1 text-ink-2">
          {hint}
        </p>
      )}
    </div>
  );
}
