import { type ReactNode, useState } from "react";
import { TextField } from "#src/components/islands/parts/TextField.tsx";

/** A field that is saved when it is left: its entry stays, with the reason, where it cannot be taken. */
export function SavedField({
  label,
  value,
  save,
  off,
  hint,
  inputMode,
  className,
}: {
  label: string;
  value: string;
  /** Saves the entry; a sentence where it cannot be taken. */
  save: (text: string) => string | null | Promise<string | null>;
  off: boolean;
  hint?: ReactNode;
  inputMode?: "numeric" | "decimal";
  className?: string;
}) {
  const [draft, setDraft] = useState<string | null>(null);
  const [wrong, setWrong] = useState<string>();
  const leave = async () => {
    if (draft === null) return;
    const message = draft === value ? null : await save(draft);
    setWrong(message ?? undefined);
    if (message === null) setDraft(null);
  };
  return (
    <TextField
      label={label}
      value={draft ?? value}
      wrong={wrong}
      hint={hint}
      off={off}
      inputMode={inputMode}
      className={className}
      onChange={({ currentTarget }) => setDraft(currentTarget.value)}
      onBlur={() => void leave()}
    />
  );
}
