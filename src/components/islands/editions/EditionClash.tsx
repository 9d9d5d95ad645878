import { clockTime } from "#src/components/clock-time.ts";
import { ConflictBox } from "#src/components/islands/parts/ConflictBox.tsx";
import type { EditionView } from "#src/server/present.ts";

export type EditionField = "name" | "weight" | "boardsPerKit";

/** Our entry of a field, and the edition as somebody else left it meanwhile. */
export interface MetEdition {
  field: EditionField;
  yours: string | number;
  current: EditionView & { changedBy?: string | null; changedAt?: number | null };
}

const WORDS: Record<EditionField, string> = {
  name: "the name",
  weight: "the share of the run",
  boardsPerKit: "the boards in a kit",
};

/** A field of an edition that two people changed: both values, to choose one. */
export function EditionClash({
  met: { field, yours, current },
  onKeepYours,
  onTakeTheirs,
}: {
  met: MetEdition;
  onKeepYours: () => void;
  onTakeTheirs: () => void;
}) {
  const { changedBy: by, changedAt: at } = current;
  const what = field === "name" ? `${WORDS.name} of an edition` : `${WORDS[field]} of ${current.name}`;
  return (
    <div className="mt-4">
      <ConflictBox
        happened={`${by ?? "Somebody"} changed ${what}${typeof at === "number" ? ` at ${clockTime(at)}` : ""}.`}
        yours={String(yours)}
        theirs={String(current[field])}
        theirWord={by ? `${by}’s` : "Theirs"}
        onKeepYours={onKeepYours}
        onTakeTheirs={onTakeTheirs}
      />
    </div>
  );
}
