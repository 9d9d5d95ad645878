import type { ReactNode } from "react";
import { EVIDENCE, NOTE, PAIR } from "#src/components/page-look.ts";

/** Evidence, and beside it the note that comments on it; as `Pair.astro`. */
export function Pair({ children, note }: { children: ReactNode; note?: ReactNode }) {
  return (
    <div className={PAIR}>
      <div className={EVIDENCE}>{children}</div>
      {note && <div className={NOTE}>{note}</div>}
    </div>
  );
}

/** A note in the margin: a short heading and a few sentences. */
export function MarginNote({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section>
      <h3 className="type-h3-margin mb-1">{title}</h3>
      <div className="flex flex-col gap-2">{children}</div>
    </section>
  );
}
