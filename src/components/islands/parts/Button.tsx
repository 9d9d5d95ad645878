import { type ComponentProps, type ReactNode, useId } from "react";
import { type ButtonKind, type ButtonSize, buttonLook } from "#src/components/button-look.ts";
import { BusyIcon } from "./Icons.tsx";

export type ButtonProps = Omit<ComponentProps<"button">, "disabled"> & {
  children: ReactNode;
  kind?: ButtonKind;
  size?: ButtonSize;
  /** Why it cannot be pressed now. It stays in the tab order, and the reason is written below it. */
  offBecause?: string;
  /** At work: it keeps its width, shows a ring and `busyWord`, and does nothing. */
  busy?: boolean;
  busyWord?: string;
};

/** A button. `type` is "button" unless told; a form's own button says `type="submit"`. */
export function Button({
  kind,
  size,
  offBecause,
  busy,
  busyWord = "Working",
  children,
  className,
  ...rest
}: ButtonProps) {
  const reasonId = useId();
  const still = Boolean(offBecause) || busy === true;
  const button = (
    <button
      type="button"
      {...rest}
      onClick={still ? (press) => press.preventDefault() : rest.onClick}
      aria-disabled={still || undefined}
      aria-describedby={offBecause ? reasonId : rest["aria-describedby"]}
      className={`${buttonLook(kind, size, offBecause ? "off" : busy ? "busy" : "on")} ${className ?? ""}`}
    >
      {busy === undefined ? children : <BusyLabel busy={busy} word={busyWord} label={children} />}
    </button>
  );
  if (!offBecause) return button;
  return (
    <span className="inline-flex flex-col items-start gap-1">
      {button}
      <span id={reasonId} className="text-ink-2 type-label">
        {offBecause}
      </span>
    </span>
  );
}

/** Both labels lie in one cell, so the width is that of the longer and does not jump. */
function BusyLabel({ busy, word, label }: { busy: boolean; word: string; label: ReactNode }) {
  return (
    <span className="grid [&>*]:[grid-area:1/1]">
      <span className={busy ? "invisible" : ""}>{label}</span>
      <span className={`inline-flex items-center justify-center gap-2 ${busy ? "" : "invisible"}`}>
        <BusyIcon />
        {word}
      </span>
    </span>
  );
}
