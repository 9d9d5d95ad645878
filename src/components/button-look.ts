/** The looks of everything that is pressed, as classes: for React buttons, for links in Astro pages, for form posts. */
export type ButtonKind = "primary" | "secondary" | "refuse";
/** 44 high; 36 in panels and beside answers; 40 inside rows. */
export type ButtonSize = "normal" | "small" | "row";
export type ButtonState = "on" | "off" | "busy";

const SIZES: Record<ButtonSize, string> = {
  normal: "min-h-11 px-[18px] py-[7px] type-button",
  small: "min-h-9 px-3.5 py-1 type-table font-semibold",
  row: "min-h-10 px-4 py-[5px] type-table font-semibold",
};

const KINDS: Record<ButtonKind, string> = {
  primary:
    "border-petrol bg-petrol text-on-petrol hover:border-petrol-hi hover:bg-petrol-hi hover:text-on-petrol active:border-petrol-hi active:bg-petrol-hi active:[box-shadow:inset_0_3px_0_var(--color-outline)]",
  secondary:
    "border-ink bg-sheet text-ink hover:bg-petrol-wash hover:text-ink active:bg-tint active:[box-shadow:inset_0_2px_0_var(--color-rule-2)]",
  refuse:
    "border-bad bg-sheet text-bad hover:bg-bad-wash hover:text-ink active:bg-tint active:[box-shadow:inset_0_2px_0_var(--color-bad)]",
};

const SHAPE =
  "inline-flex items-center justify-center gap-2 print:hidden rounded-control border-[1.5px] border-solid text-center no-underline transition-colors tablet:whitespace-nowrap";

/** Classes of a button. At most one primary stands in a view. */
export function buttonLook(
  kind: ButtonKind = "secondary",
  size: ButtonSize = "normal",
  state: ButtonState = "on",
): string {
  if (state === "off") return `${SHAPE} ${SIZES[size]} border-dashed! border-rule-2 bg-tint text-ink-2`;
  if (state === "busy" && kind === "primary")
    return `${SHAPE} ${SIZES[size]} border-petrol bg-petrol text-on-petrol`;
  if (state === "busy") return `${SHAPE} ${SIZES[size]} border-ink bg-sheet text-ink`;
  return `${SHAPE} ${SIZES[size]} ${KINDS[kind]}`;
}

/** Quiet: the second choice beside a button. Petrol words, underlined, no border. */
export const QUIET_LOOK =
  "inline-block print:hidden font-medium text-petrol underline decoration-[1.5px] underline-offset-4 hover:text-petrol-hi disabled:text-ink-2";

/** "Show the working": an equals sign and words. */
export const WORKING_LOOK =
  "inline-flex print:hidden min-h-7 items-center gap-2 type-table font-semibold text-petrol no-underline hover:text-petrol-hi hover:underline underline-offset-4";
