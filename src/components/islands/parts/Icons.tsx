/**
 * The signs of the product, drawn because the typeface has no ticks or arrows. Each takes its colour from the text
 * (`currentColor`); the cut-out of a filled sign takes `--cut`, paper unless told. They are decoration beside words:
 * always hidden from screen readers.
 */
import type { ReactNode } from "react";

export type IconProps = { className?: string };

function Sign({ className = "size-[18px]", children }: IconProps & { children: ReactNode }) {
  return (
    <svg
      viewBox="0 0 18 18"
      className={`inline-block shrink-0 ${className}`}
      aria-hidden="true"
      focusable="false"
    >
      {children}
    </svg>
  );
}

const stroke = {
  fill: "none",
  stroke: "currentColor",
  strokeLinecap: "round",
  strokeLinejoin: "round",
} as const;
const cut = "var(--cut, var(--color-paper))";

/** Bare tick: settled, fits, better. */
export function TickIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path
        d="M3.2 9.6l3.9 4 7.7-9.4"
        {...stroke}
        strokeWidth={2.4}
        strokeLinecap="butt"
        strokeLinejoin="miter"
      />
    </Sign>
  );
}

/** Disc with tick: good, done, chosen. */
export function DoneIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <circle cx={9} cy={9} r={7.8} fill="currentColor" />
      <path d="M5.2 9.3l2.7 2.7 5-5.6" fill="none" stroke={cut} strokeWidth={2} />
    </Sign>
  );
}

/** Triangle with mark: caution, to settle. */
export function CautionIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path
        d="M9 1.8L17 16H1Z"
        fill="currentColor"
        stroke="currentColor"
        strokeWidth={1}
        strokeLinejoin="round"
      />
      <path d="M9 6.6v4.6" stroke={cut} strokeWidth={2} />
      <path d="M9 12.4v2" stroke={cut} strokeWidth={2} />
    </Sign>
  );
}

/** Square with cross: bad, does not fit. */
export function BadIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <rect x={1.5} y={1.5} width={15} height={15} fill="currentColor" />
      <path d="M5.6 5.6l6.8 6.8M12.4 5.6l-6.8 6.8" stroke={cut} strokeWidth={2} />
    </Sign>
  );
}

/** Dashed open ring: waiting for somebody. */
export function WaitingIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <circle
        cx={9}
        cy={9}
        r={7}
        fill="none"
        stroke="currentColor"
        strokeWidth={2}
        strokeDasharray="2.9 2.6"
      />
    </Sign>
  );
}

/** Equals sign: opens a working. */
export function EqualsIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path d="M3 6.4h12M3 11.6h12" stroke="currentColor" strokeWidth={2.2} />
    </Sign>
  );
}

export function SearchIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <circle cx={7.6} cy={7.6} r={4.9} fill="none" stroke="currentColor" strokeWidth={2} />
      <path d="M11.3 11.3l4.6 4.6" stroke="currentColor" strokeWidth={2.4} />
    </Sign>
  );
}

/** Down mark of a choice. */
export function DownIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path
        d="M4.6 6.9L9 11.3l4.4-4.4"
        {...stroke}
        strokeWidth={2.2}
        strokeLinecap="butt"
        strokeLinejoin="miter"
      />
    </Sign>
  );
}

export function UpIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path
        d="M4.6 11.1L9 6.7l4.4 4.4"
        {...stroke}
        strokeWidth={2.2}
        strokeLinecap="butt"
        strokeLinejoin="miter"
      />
    </Sign>
  );
}

export function LeftIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path
        d="M15 9H4M8 4.6L3.6 9 8 13.4"
        {...stroke}
        strokeWidth={2}
        strokeLinecap="butt"
        strokeLinejoin="miter"
      />
    </Sign>
  );
}

export function RightIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path
        d="M3 9h11M10 4.6L14.4 9 10 13.4"
        {...stroke}
        strokeWidth={2}
        strokeLinecap="butt"
        strokeLinejoin="miter"
      />
    </Sign>
  );
}

export function MinusIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path d="M3.4 9h11.2" stroke="currentColor" strokeWidth={2} />
    </Sign>
  );
}

export function PlusIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path d="M3.4 9h11.2M9 3.4v11.2" stroke="currentColor" strokeWidth={2} />
    </Sign>
  );
}

export function PrintIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path d="M5 6.5V2.5h8v4M5 13H2.5V6.5h13V13H13M5 10.5h8v5H5Z" {...stroke} strokeWidth={1.6} />
    </Sign>
  );
}

/** A sheet with a table: an uploaded list. */
export function SheetIcon({ className }: IconProps) {
  return (
    <Sign className={className}>
      <path
        d="M3 1.5h8.5L15 5v11.5H3ZM11.5 1.5V5H15M5.2 8h7.6M5.2 10.6h7.6M5.2 13.2h7.6M7.8 8v5.2"
        {...stroke}
        strokeWidth={1.1}
      />
    </Sign>
  );
}

/** Ring with a gap: at work. It turns; with less motion asked for it stands beside its word. */
export function BusyIcon({ className }: IconProps) {
  return (
    <Sign className={`motion-safe:animate-ring ${className ?? "size-[18px]"}`}>
      <circle
        cx={9}
        cy={9}
        r={6.6}
        fill="none"
        stroke="currentColor"
        strokeWidth={3}
        strokeDasharray="31 10.5"
      />
    </Sign>
  );
}
