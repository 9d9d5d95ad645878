import type { ReactNode } from "react";

/** Fields of a line under one heading, two beside each other where there is room. */
export function FieldGroup({
  title,
  children,
  note,
}: {
  title: string;
  children: ReactNode;
  note?: ReactNode;
}) {
  return (
    <section className="rule-section pt-2.5">
      <h3 className="type-h3 mb-2">{title}</h3>
      {note && <p className="type-note mb-3 text-ink-2">{note}</p>}
      <div className="grid grid-cols-1 gap-x-5 gap-y-4 tablet:grid-cols-2">{children}</div>
    </section>
  );
}
