import { type KeyboardEvent, type ReactNode, useEffect, useRef, useState } from "react";
import { useHoldRepeat } from "./hold-repeat.ts";
import { MinusIcon, PlusIcon } from "./Icons.tsx";

export type StepperProps = {
  /** "Run of", "How many?". Written above the figure unless hidden. */
  label: string;
  labelHidden?: boolean;
  value: number;
  onStep: (value: number) => void;
  least: number;
  most: number;
  /** What may be typed where that is wider than what the keys reach. */
  typedLeast?: number;
  typedMost?: number;
  /** Below the figure, in place of nothing: the bands, on a phone. */
  below?: ReactNode;
  /** Smaller figure, for forms. */
  small?: boolean;
};

/** Minus, figure, plus. Holding a key repeats; the figure becomes a field when pressed. */
export function Stepper({
  label,
  labelHidden,
  value,
  onStep,
  least,
  most,
  below,
  small,
  ...typed
}: StepperProps) {
  const current = useRef(value);
  current.current = value;

  function stepBy(by: 1 | -1): boolean {
    const next = Math.min(Math.max(current.current + by, least), most);
    if (next === current.current) return false;
    current.current = next;
    onStep(next);
    return next !== (by === 1 ? most : least);
  }

  return (
    // biome-ignore lint/a11y/useSemanticElements: three controls of one value, not a set of form fields.
    <div role="group" aria-label={label} className="inline-flex items-center gap-4 max-tablet:gap-1">
      <StepKey name="One less" off={value <= least} step={() => stepBy(-1)} sign={<MinusIcon />} />
      <span className="inline-flex min-w-11 flex-col items-center">
        {!labelHidden && <span className="type-label text-ink-2 max-tablet:hidden">{label}</span>}
        <StepFigure
          label={label}
          value={value}
          least={typed.typedLeast ?? least}
          most={typed.typedMost ?? most}
          onType={onStep}
          small={small}
        />
        {below}
      </span>
      <StepKey name="One more" off={value >= most} step={() => stepBy(1)} sign={<PlusIcon />} />
    </div>
  );
}

function StepKey({
  name,
  off,
  step,
  sign,
}: {
  name: string;
  off: boolean;
  step: () => boolean;
  sign: ReactNode;
}) {
  const hold = useHoldRepeat(step);
  return (
    <button
      type="button"
      aria-label={name}
      aria-disabled={off || undefined}
      {...hold}
      className={`flex h-11 w-10 shrink-0 touch-manipulation select-none items-center justify-center rounded-control border-[1.5px] tablet:size-10 ${off ? "border-dashed border-rule-2 bg-tint text-ink-2" : "border-ink bg-sheet text-ink hover:bg-petrol-wash active:bg-tint"}`}
    >
      {sign}
    </button>
  );
}

type FigureProps = {
  label: string;
  value: number;
  least: number;
  most: number;
  onType: (value: number) => void;
  small?: boolean;
};

function StepFigure({ label, value, least, most, onType, small }: FigureProps) {
  const [draft, setDraft] = useState<string | null>(null);
  const field = useRef<HTMLInputElement>(null);
  const button = useRef<HTMLButtonElement>(null);
  const editing = draft !== null;
  useEffect(() => {
    if (editing) field.current?.select();
  }, [editing]);

  const look = small
    ? "text-[1.3125rem] leading-7 font-bold"
    : "text-[1.3125rem] leading-6 font-bold tablet:text-[1.6875rem] tablet:leading-[1.9375rem] tracking-[-0.01em]";
  const wrong = editing && !inRange(draft, least, most);

  function close(keep: boolean) {
    if (keep && draft !== null && inRange(draft, least, most) && Number(draft) !== value)
      onType(Number(draft));
    setDraft(null);
    requestAnimationFrame(() => button.current?.focus());
  }

  function onKey(press: KeyboardEvent<HTMLInputElement>) {
    if (press.key === "Enter" && !wrong) close(true);
    if (press.key === "Escape") close(false);
  }

  if (!editing)
    return (
      <button
        ref={button}
        type="button"
        aria-label={`${label} ${value}, type another`}
        onClick={() => setDraft(String(value))}
        className={`min-w-11 text-center ${look}`}
      >
        {value}
      </button>
    );
  return (
    <span className="relative">
      <input
        ref={field}
        aria-label={label}
        aria-invalid={wrong || undefined}
        inputMode="numeric"
        value={draft}
        onChange={(change) => setDraft(change.currentTarget.value)}
        onKeyDown={onKey}
        onBlur={() => {
          if (!wrong && Number(draft) !== value) onType(Number(draft));
          setDraft(null);
        }}
        className={`w-16 rounded-control border-[1.5px] bg-sheet text-center ${wrong ? "border-bad" : "border-rule-2"} ${look}`}
      />
      {wrong && (
        <span
          role="alert"
          className="type-ruler absolute top-full left-1/2 z-10 mt-1 -translate-x-1/2 rounded-chip border border-bad bg-sheet px-2 py-0.5 font-semibold whitespace-nowrap text-bad"
        >
          From {least} to {most}
        </span>
      )}
    </span>
  );
}

function inRange(text: string, least: number, most: number): boolean {
  return /^\d+$/.test(text.trim()) && Number(text) >= least && Number(text) <= most;
}
