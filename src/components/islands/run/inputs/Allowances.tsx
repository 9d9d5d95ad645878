import { RUN_LEAST, RUN_MOST } from "#src/shapes/limits.ts";
import { AmountEntry, NumberEntry, RateEntry } from "./fields.tsx";
import type { InputProps } from "./input-props.ts";

/** Spare parts, boards that fail, kits that need a part again, and how far runs are compared. */
export function Allowances({ address, held, may }: InputProps) {
  const { plan, spare } = held;
  const off = !may.changeRun;
  const entry = (field: string) => ({
    address,
    row: { kind: "run" } as const,
    field,
    currency: plan.currency,
  });
  return (
    <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-3">
      <RateEntry
        label="Spare parts"
        hint={spare.own.length > 0 ? `${spare.own.length} parts have a rate of their own.` : "Of every part."}
        most={999}
        off={off}
        value={spare.rate}
        entry={entry("spareRate")}
      />
      <RateEntry
        label="Kits that need a part again"
        most={100}
        off={off}
        value={plan.replacements.share}
        entry={entry("replacementShare")}
      />
      <AmountEntry
        label="Cost of a replacement"
        unit="each"
        mayBeEmpty
        off={off}
        value={plan.replacements.costEach}
        entry={entry("replacementCost")}
      />
      {plan.boards.needed && (
        <>
          <RateEntry
            label="Boards that are good"
            most={100}
            off={off}
            value={plan.boards.yield}
            entry={entry("boardYield")}
          />
          <RateEntry
            label="Sure of enough boards"
            hint="How sure you want to be that enough are good."
            below={100}
            off={off}
            value={plan.boards.confidence}
            entry={entry("boardConfidence")}
          />
        </>
      )}
      <NumberEntry
        label="Compare runs up to"
        whole
        least={RUN_LEAST}
        most={RUN_MOST}
        unit="kits"
        off={off}
        value={plan.run.sweepTo}
        entry={entry("sweepTo")}
      />
    </div>
  );
}
