import type { ReactNode } from "react";

/** One state on the sheet, with its name below. */
export function State({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div>
      <div className="flex min-h-11 flex-wrap items-start gap-3">{children}</div>
      <p className="type-label mt-2 text-ink-2">{name}</p>
    </div>
  );
}
