import { clockTime } from "#src/components/clock-time.ts";
import { useStore } from "./plan/module-store.ts";
import { NOTHING_SAVED, saving } from "./plan/saving.ts";

/** How saving stands, for the header of a kit's pages: "Saving", "Saved 14:32", or nothing yet. */
export function SaveState() {
  const { waiting, savedAt, lostAt } = useStore(saving, NOTHING_SAVED);
  const words =
    lostAt !== null && waiting > 0
      ? `Not saved since ${clockTime(lostAt)}`
      : waiting > 0
        ? "Saving"
        : savedAt !== null
          ? `Saved ${clockTime(savedAt)}`
          : "";
  return <span className="type-label text-ink-2">{words}</span>;
}
