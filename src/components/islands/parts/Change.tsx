import { TickIcon } from "./Icons.tsx";

/** Lower cost, higher earnings, fewer to break even, less cash are better; a price is neither. */
export type ChangeTurn = "better" | "worse" | "neither";

export type ChangeProps = {
  /** Signed and written: "−€2.14". */
  amount: string;
  turn: ChangeTurn;
};

const WASH: Record<ChangeTurn, string> = {
  better: "bg-good-wash",
  worse: "bg-caution-wash",
  neither: "bg-tint",
};

/** A signed change beside its figure. */
export function Change({ amount, turn }: ChangeProps) {
  return (
    <span
      className={`inline-flex items-center gap-1 rounded-chip px-1.5 py-px whitespace-nowrap font-semibold text-ink type-label ${WASH[turn]}`}
    >
      {turn === "better" && <TickIcon className="size-4 text-good" />}
      {amount}
      {turn !== "neither" && <span className="heard-only">, {turn}</span>}
    </span>
  );
}
