import type { ReactNode } from "react";

/** Something that is there to be looked into and does not stand open. */
export function Folded({ summary, children }: { summary: ReactNode; children: ReactNode }) {
  return (
    <details className="hairline-b py-2">
      <summary className="type-note min-h-8 py-1 font-semibold text-petrol underline decoration-[1.5px] underline-offset-4 hover:text-petrol-hi">
        {summary}
      </summary>
      <div className="pt-1 pb-3">{children}</div>
    </details>
  );
}
