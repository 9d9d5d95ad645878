/** Looks of fields as classes: the box round an entry and its unit boxes. */
export type FieldState = { wrong?: boolean; off?: boolean; row?: boolean };

/** The box itself: 44 tall (40 in rows), sheet ground, its border by state. */
export function fieldLook({ wrong, off, row }: FieldState = {}): string {
  const height = row ? "min-h-10" : "min-h-11";
  const shape = `${height} w-full rounded-control border-solid transition-colors`;
  if (off) return `${shape} border-[1.5px] border-dashed! border-rule-2 bg-tint text-ink-2`;
  if (wrong) return `${shape} border-2 border-bad bg-sheet text-ink`;
  return `${shape} border-[1.5px] border-rule-2 bg-sheet text-ink hover:border-ink`;
}

/** A field made of an entry and unit boxes shows focus round the whole. */
export const FIELD_GROUP_LOOK =
  "flex items-stretch overflow-hidden has-[input:focus-visible]:outline-3 has-[input:focus-visible]:outline-offset-2 has-[input:focus-visible]:outline-petrol";

/** Currency at the left, unit at the right. */
export const UNIT_BOX_LOOK = "flex shrink-0 items-center bg-tint px-3 text-ink-2 type-note";
