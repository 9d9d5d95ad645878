import { useSyncExternalStore } from "react";

function words(moment: number, timeZone: string | undefined): string {
  const date = new Date(moment);
  const day = date.toLocaleDateString("en-GB", { day: "numeric", month: "long", year: "numeric", timeZone });
  return `${day}, ${date.toLocaleTimeString("en-GB", { hour: "2-digit", minute: "2-digit", timeZone })}`;
}

const never = () => () => {};

/** "9 March 2026, 14:32", in the reader's own time; the server, which does not know it, writes UTC until then. */
export function Moment({ at }: { at: number }) {
  const text = useSyncExternalStore(
    never,
    () => words(at, undefined),
    () => words(at, "UTC"),
  );
  return <time dateTime={new Date(at).toISOString()}>{text}</time>;
}
