import { useSyncExternalStore } from "react";
import { momentText } from "#src/components/moment-text.ts";

const never = () => () => {};

/** "9 March 2026, 14:32", in the reader's own time; the server, which does not know it, writes UTC until then. */
export function Moment({ at }: { at: number }) {
  const text = useSyncExternalStore(
    never,
    () => momentText(at, "time"),
    () => `${momentText(at, "time", "UTC")} UTC`,
  );
  return <time dateTime={new Date(at).toISOString()}>{text}</time>;
}
