import { useState } from "react";
import { countText, rateText } from "#src/components/amount-text.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { editField } from "#src/components/islands/plan/edit-plan.ts";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { toPercent } from "#src/components/percent.ts";
import { enoughGood } from "#src/costing/enough-boards.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import type { BoardsResult } from "#src/costing/run-result.ts";
import { shiftDecimal } from "#src/partslist/exact-decimal.ts";
import { readNumber } from "#src/partslist/numbers.ts";
import type { Plan } from "#src/shapes/plan.ts";

interface HowManyBoardsProps {
  address: KitAddress;
  plan: Plan;
  boards: BoardsResult;
  canChoose: boolean;
}

/** Boards to order so that enough are good: yield, how sure, and what each number of boards gives. */
export function HowManyBoards({ address, plan, boards, canChoose }: HowManyBoardsProps) {
  const opens = useOpens();
  const { open, onOpen, controls } = opens("boards-to-order");
  return (
    <div className="flex flex-col gap-5">
      <div className="flex flex-wrap items-start gap-x-6 gap-y-4">
        <HundredthsField
          label="Good boards of a hundred"
          share={plan.boards.yield}
          off={!canChoose}
          hint="100: every board is tested before it is sent, or you take the risk."
          onShare={(value) =>
            editField(address, {
              row: { kind: "run" },
              field: "boardYield",
              value,
              name: (from) => `Yield changed from ${rateText(String(from))} to ${rateText(value)}.`,
            })
          }
        />
        {plan.boards.yield !== "1" && (
          <HundredthsField
            label="Enough are good in … of 100 runs"
            share={plan.boards.confidence}
            below
            off={!canChoose}
            onShare={(value) =>
              editField(address, {
                row: { kind: "run" },
                field: "boardConfidence",
                value,
                name: (from) => `Boards: sure to ${rateText(value)} instead of ${rateText(String(from))}.`,
              })
            }
          />
        )}
      </div>
      <p>
        {inWords(boards)}{" "}
        <ShowWorking
          of="boards to order"
          open={open}
          onClick={onOpen}
          aria-controls={open ? controls : undefined}
        />
      </p>
      {boards.toOrder !== null &&
        /[1-9]/.test(boards.yield) &&
        boards.yield !== "1" &&
        boards.required > 0 && <ChanceTable boards={boards} toOrder={boards.toOrder} />}
    </div>
  );
}

function inWords({ required, toOrder, yield: good, confidence }: BoardsResult): string {
  if (toOrder === null)
    return `${countText(required)} boards go into the kits. With this yield no number is enough.`;
  if (toOrder === required) return `${countText(required)} boards go into the kits, and as many are ordered.`;
  const hundredth = (share: string) => rateText(share).replace("\u00a0%", "");
  return `${countText(required)} boards go into the kits. When ${hundredth(good)} of 100 are good, ${countText(toOrder)} must be ordered to have enough in ${hundredth(confidence)} of 100 runs.`;
}

interface HundredthsFieldProps {
  label: string;
  /** 0 to 1 as decimal text. */
  share: string;
  /** It must stay below 100. */
  below?: boolean;
  off: boolean;
  hint?: string;
  onShare: (share: string) => void;
}

/** A share in hundredths, up to four decimals of them. */
function HundredthsField({ label, share, below, off, hint, onShare }: HundredthsFieldProps) {
  const [draft, setDraft] = useState<string | null>(null);
  const shown = rateText(share).replace("\u00a0%", "");
  const share_ = draft === null ? share : readHundredths(draft, below === true);
  const wrong =
    share_ === null
      ? `Write a number above 0${below ? " and below 100" : ", at most 100"}, such as 97.5.`
      : undefined;
  const take = () => {
    if (draft === null || share_ === null) return;
    setDraft(null);
    if (share_ !== share) onShare(share_);
  };
  return (
    <TextField
      {...{ label, hint, off, wrong }}
      inputMode="decimal"
      autoComplete="off"
      value={draft ?? shown}
      onChange={(change) => setDraft(change.currentTarget.value)}
      onBlur={take}
      onKeyDown={(press) => {
        if (press.key === "Enter") take();
        if (press.key === "Escape") setDraft(null);
      }}
      className="w-72"
    />
  );
}

function readHundredths(entry: string, below: boolean): string | null {
  const read = readNumber(entry.replace("%", ""), null);
  const value = Number(read);
  if (read === null || value <= 0 || value > 100 || (below && value === 100)) return null;
  const share = shiftDecimal(read, -2);
  return (share.split(".")[1]?.length ?? 0) > 6 ? null : share;
}

/** A few numbers of boards round the one that is ordered, with the chance that enough of them are good. */
function ChanceTable({ boards, toOrder }: { boards: BoardsResult; toOrder: number }) {
  const first = Math.max(boards.required, toOrder - 2);
  const rows = Array.from({ length: 5 }, (_, place) => first + place);
  const columns: Column<number>[] = [
    { key: "ordered", head: "Boards ordered", names: true, cell: countText },
    {
      key: "chance",
      head: "Enough are good",
      number: true,
      cell: (ordered) => inHundred(enoughGood(boards.required, ordered, boards.yield)),
    },
  ];
  return (
    <div className="max-w-[360px]">
      <Table
        caption="Chance that enough boards are good"
        height="dense"
        rows={rows}
        columns={columns}
        keyOf={String}
        chosen={(ordered) => ordered === toOrder}
      />
    </div>
  );
}

/** "96 in 100"; near certainty one more figure tells. */
function inHundred(chance: string): string {
  const hundredths = toPercent(chance);
  if (Number(hundredths) <= 99) return `${roundedText(hundredths, 0)} in 100`;
  return Number(hundredths) >= 99.95 ? "all but surely" : `${roundedText(hundredths, 1)} in 100`;
}
