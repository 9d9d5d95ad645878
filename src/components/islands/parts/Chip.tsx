import type { ReactNode } from "react";
import { BadIcon, CautionIcon, DoneIcon, TickIcon, WaitingIcon } from "./Icons.tsx";

/** good, caution, bad, waiting have a wash; `plain` is the bare tick of what is in order; `neutral` has no sign. */
export type ChipKind = "good" | "caution" | "bad" | "waiting" | "plain" | "neutral";

const WASH: Record<ChipKind, string> = {
  good: "bg-good-wash",
  caution: "bg-caution-wash",
  bad: "bg-bad-wash",
  waiting: "bg-tint",
  neutral: "bg-tint",
  plain: "",
};

/** A sign and a word. The word says what is wrong ("95 short"), not the class of the fault. */
export function Chip({
  kind,
  children,
  className,
}: {
  kind: ChipKind;
  children: ReactNode;
  className?: string;
}) {
  return (
    <span
      className={`inline-flex items-center gap-1.5 rounded-chip py-0.5 whitespace-nowrap text-ink type-label ${kind === "plain" ? "" : "px-1.5 pr-2 font-semibold"} ${WASH[kind]} ${className ?? ""}`}
    >
      <StateIcon kind={kind} />
      {children}
    </span>
  );
}

/** The sign of a state alone, in its colour; always beside words. */
export function StateIcon({ kind, className = "size-[18px]" }: { kind: ChipKind; className?: string }) {
  if (kind === "good") return <DoneIcon className={`${className} text-good`} />;
  if (kind === "caution") return <CautionIcon className={`${className} text-caution`} />;
  if (kind === "bad") return <BadIcon className={`${className} text-bad`} />;
  if (kind === "waiting") return <WaitingIcon className={`${className} text-ink-2`} />;
  if (kind === "plain") return <TickIcon className={`${className} text-good`} />;
  return null;
}
