import { useEffect, useState } from "react";
import { Loading } from "./Loading.tsx";
import type { LaterPart } from "./later-part.ts";
import { showToast } from "./toasts.ts";

export interface LaterProps<Props> {
  part: LaterPart<Props>;
  /** Its properties. */
  give: Props;
  /** What is fetched: "The working". */
  what: string;
  rows?: number;
  /** Classes of the box around the loading state, where the part will lie over the page. */
  frame?: string;
}

/** A part that is fetched on first use. Until it is there: nothing for 300 ms, then the loading state. */
export function Later<Props extends object>({ part, give, what, rows = 4, frame }: LaterProps<Props>) {
  const [isThere, setThere] = useState(part.now() !== null);
  useEffect(() => {
    if (isThere) return;
    part.fetch().then(
      () => setThere(true),
      () =>
        showToast({ kind: "fault", text: `${what} could not be fetched. Try again when you are connected.` }),
    );
  }, [isThere, part, what]);
  const Part = part.now();
  return Part ? <Part {...give} /> : <Loading what={what} rows={rows} frame={frame} />;
}
