import { type InputHTMLAttributes, type ReactNode, useId } from "react";
import { TickIcon } from "./Icons.tsx";

export type CheckBoxProps = Omit<InputHTMLAttributes<HTMLInputElement>, "type" | "className"> & {
  label: ReactNode;
  hint?: ReactNode;
  wrong?: string;
  className?: string;
};

/** A box of 24 with a drawn tick; box and label are one target, 40 tall. */
export function CheckBox({ label, hint, wrong, className, ...rest }: CheckBoxProps) {
  const id = useId();
  return (
    <div className={className}>
      <label className="type-table inline-flex min-h-10 items-start gap-3 py-2">
        <span className="relative -my-px inline-flex size-6 shrink-0">
          <input
            type="checkbox"
            {...rest}
            aria-describedby={hint || wrong ? id : undefined}
            className="peer size-6 appearance-none rounded-chip border-2 border-ink bg-sheet checked:border-petrol checked:bg-petrol disabled:border-dashed disabled:border-rule-2 disabled:bg-tint"
          />
          <TickIcon className="pointer-events-none invisible absolute inset-[3px] size-[18px] text-on-petrol peer-checked:visible" />
        </span>
        <span>{label}</span>
      </label>
      {(hint || wrong) && (
        <p id={id} className={`type-label pl-9 ${wrong ? "font-semibold text-bad" : "text-ink-2"}`}>
          {wrong ?? hint}
        </p>
      )}
    </div>
  );
}
