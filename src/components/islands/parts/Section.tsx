import type { ReactNode } from "react";
import { SECTION, SECTION_ASIDE, SECTION_HEAD } from "#src/components/page-look.ts";

export type SectionProps = {
  title: ReactNode;
  aside?: ReactNode;
  actions?: ReactNode;
  id?: string;
  children: ReactNode;
};

/** A part of a page, as `Section.astro`: a line of ink, its name, words beside it, actions at the right. */
export function Section({ title, aside, actions, id, children }: SectionProps) {
  return (
    <section id={id} className={SECTION}>
      <div className={SECTION_HEAD}>
        <h2 className="type-h2">
          {title}
          {aside && <span className={`${SECTION_ASIDE} font-normal tracking-normal`}>{aside}</span>}
        </h2>
        {actions}
      </div>
      {children}
    </section>
  );
}
