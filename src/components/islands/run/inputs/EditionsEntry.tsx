import { CheckBox } from "#src/components/islands/parts/CheckBox.tsx";
import { type Entry, take } from "./entry.ts";

interface EditionsEntryProps {
  entry: Entry;
  /** Null: every edition. */
  value: readonly string[] | null;
  editions: readonly { id: string; name: string }[];
  off: boolean;
}

/** Which editions a task or a packing item belongs to; all of them are every edition, also later ones. */
export function EditionsEntry({ entry, value, editions, off }: EditionsEntryProps) {
  const chosen = new Set(value ?? editions.map(({ id }) => id));
  function toggle(id: string, on: boolean) {
    const next = editions.filter((edition) => (edition.id === id ? on : chosen.has(edition.id)));
    if (next.length === 0) return;
    take(entry, next.length === editions.length ? null : next.map((edition) => edition.id));
  }
  return (
    <fieldset className="flex flex-wrap gap-x-4">
      <legend className="heard-only">Editions of {entry.thing}</legend>
      {editions.map(({ id, name }) => (
        <CheckBox
          key={id}
          label={name}
          checked={chosen.has(id)}
          disabled={off}
          onChange={(change) => toggle(id, change.currentTarget.checked)}
        />
      ))}
    </fieldset>
  );
}
