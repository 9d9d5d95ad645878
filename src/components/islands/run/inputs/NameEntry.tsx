import { useState } from "react";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { type Entry, take } from "./entry.ts";

/** The name of a row, taken when the field is left; an empty one is not. */
export function NameEntry({ entry, value, off }: { entry: Entry; value: string; off: boolean }) {
  const [draft, setDraft] = useState<string | null>(null);
  function leave() {
    const name = draft?.trim();
    if (name && name !== value) take(entry, name);
    setDraft(null);
  }
  return (
    <TextField
      label="Name"
      labelHidden
      row
      off={off}
      maxLength={120}
      value={draft ?? value}
      onChange={(change) => setDraft(change.currentTarget.value)}
      onBlur={leave}
      onKeyDown={(press) => {
        if (press.key === "Enter") leave();
        if (press.key === "Escape") setDraft(null);
      }}
    />
  );
}
