import type { ReactNode } from "react";
import { type ChipKind, StateIcon } from "./Chip.tsx";

export type SettleItem = {
  key: string;
  kind: Extract<ChipKind, "caution" | "bad" | "waiting">;
  /** Whose it is, in grey above: the kit. */
  over?: ReactNode;
  /** One sentence, with its link. */
  text: ReactNode;
  /** One or two small buttons. */
  actions?: ReactNode;
};

/** What waits to be settled, worst first. */
export function SettleList({ items, label }: { items: readonly SettleItem[]; label: string }) {
  return (
    <ul aria-label={label}>
      {items.map((item) => (
        <li key={item.key} className="hairline-b flex gap-3 py-2 type-note last:border-b-0">
          <StateIcon kind={item.kind} className="mt-[3px] size-[18px]" />
          <div className="min-w-0">
            {item.over && <p className="type-label font-semibold text-ink-2">{item.over}</p>}
            <p>{item.text}</p>
            {item.actions && <div className="mt-2 flex flex-wrap gap-2">{item.actions}</div>}
          </div>
        </li>
      ))}
    </ul>
  );
}

export type RepairItem = {
  key: string;
  kind: Extract<ChipKind, "caution" | "bad">;
  /** "Row 15". */
  row: string;
  /** What the row is: "LED1-LED6". */
  what: string;
  /** What is wrong with it, in a sentence. */
  wrong: string;
  /** The suggested repair as a button (330 wide, text at the left). */
  suggestion: ReactNode;
  /** The other choice, as quiet text. */
  other?: ReactNode;
};

/** Rows of an import to settle: row, what it is, what is wrong, the suggested repair, the other choice. */
export function RepairList({ items, label }: { items: readonly RepairItem[]; label: string }) {
  return (
    <ul aria-label={label}>
      {items.map((item) => (
        <li
          key={item.key}
          className="hairline-b grid min-h-[59px] items-center gap-x-4 gap-y-1 py-2 max-desktop:grid-cols-[18px_1fr] desktop:grid-cols-[18px_80px_112px_minmax(0,1fr)_330px_200px]"
        >
          <StateIcon kind={item.kind} />
          <span className="font-semibold">{item.row}</span>
          <span className="text-ink-2 max-desktop:col-start-2">{item.what}</span>
          <span className="max-desktop:col-start-2">{item.wrong}</span>
          <span className="max-desktop:col-start-2 [&>button]:w-full [&>button]:max-w-[330px] [&>button]:justify-start [&>button]:text-left">
            {item.suggestion}
          </span>
          <span className="type-table max-desktop:col-start-2">{item.other}</span>
        </li>
      ))}
    </ul>
  );
}
