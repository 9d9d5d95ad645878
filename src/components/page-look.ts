/** Looks of a page's parts as classes: pairs of evidence and margin note, sections, the head of a page. */

/** Main of a page of a kit. */
export const MAIN = "gutters page-foot pt-6 tablet:pt-8";

/** Round all pairs of a page: draws the one hairline 340 from the right edge. */
export const PAIRS =
  "relative flex flex-col gap-11 desktop:before:absolute desktop:before:inset-y-0 desktop:before:right-[340px] desktop:before:w-px desktop:before:bg-rule";

/** Evidence and note, level with each other; on a tablet and a phone the note falls below. */
export const PAIR = "grid grid-cols-1 gap-x-14 gap-y-6 desktop:grid-cols-[minmax(0,1fr)_312px]";
export const EVIDENCE = "min-w-0";
/** The note begins level with the heading it comments on; on a tablet it runs in two columns. */
export const NOTE =
  "type-note flex min-w-0 flex-col gap-6 tablet:max-desktop:grid tablet:max-desktop:grid-cols-2 tablet:max-desktop:gap-x-10 desktop:pt-3";

/** A section below its line of ink. */
export const SECTION = "rule-section pt-2.5";
export const SECTION_HEAD = "mb-3 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1";
export const SECTION_ASIDE = "type-label ml-4 inline-block text-ink-2 max-tablet:ml-0 max-tablet:block";
