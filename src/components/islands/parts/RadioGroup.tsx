import { type InputHTMLAttributes, type ReactNode, useId } from "react";

export type RadioChoice = { value: string; label: ReactNode; detail?: ReactNode; off?: boolean };

export type RadioGroupProps = {
  legend: string;
  legendHidden?: boolean;
  name?: string;
  choices: readonly RadioChoice[];
  value?: string;
  defaultValue?: string;
  onChoose?: (value: string) => void;
  /** Side by side instead of one below the other. */
  inline?: boolean;
  /** Each choice in a frame, the chosen one on petrol-wash: for forms of a few large choices. */
  framed?: boolean;
};

/** One of a few, all in view. Arrow keys move, as in every radio group. */
export function RadioGroup({
  legend,
  legendHidden,
  name,
  choices,
  inline,
  framed,
  ...rest
}: RadioGroupProps) {
  const own = useId();
  return (
    <fieldset>
      <legend className={legendHidden ? "heard-only" : "type-table mb-1 font-semibold"}>{legend}</legend>
      <div className={`flex ${inline ? "flex-wrap gap-x-6" : `flex-col ${framed ? "gap-2.5" : ""}`}`}>
        {choices.map((choice) => (
          <Radio key={choice.value} {...choice} name={name ?? own} group={rest} framed={framed} />
        ))}
      </div>
    </fieldset>
  );
}

type Group = Pick<RadioGroupProps, "value" | "defaultValue" | "onChoose">;

function Radio({
  value,
  label,
  detail,
  off,
  name,
  group,
  framed,
}: RadioChoice & { name: string; group: Group; framed?: boolean }) {
  const id = useId();
  return (
    <label
      htmlFor={id}
      className={`type-table inline-flex min-h-10 gap-3 py-2 ${detail ? "items-center" : "items-start"} ${framed ? "rounded-control border-[1.5px] border-rule-2 bg-sheet px-4 py-3 hover:border-ink has-checked:border-2 has-checked:border-petrol has-checked:bg-petrol-wash" : ""}`}
    >
      <RadioDot
        id={id}
        name={name}
        value={value}
        disabled={off}
        checked={group.value === undefined ? undefined : group.value === value}
        defaultChecked={group.defaultValue === undefined ? undefined : group.defaultValue === value}
        onChange={() => group.onChoose?.(value)}
      />
      <span>
        <span className={detail ? "block font-semibold" : ""}>{label}</span>
        {detail && <span className="block">{detail}</span>}
      </span>
    </label>
  );
}

/** The round alone, 22 across: for choosing a row of a table, where `aria-label` names it. */
export function RadioDot({ className, ...rest }: Omit<InputHTMLAttributes<HTMLInputElement>, "type">) {
  return (
    <input
      type="radio"
      {...rest}
      className={`size-[22px] shrink-0 appearance-none rounded-full border-2 border-ink bg-sheet checked:border-[6px] checked:border-petrol disabled:border-dashed disabled:border-rule-2 disabled:bg-tint ${className ?? ""}`}
    />
  );
}
