import { Pair } from "#src/components/islands/parts/Pair.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import { runOf } from "#src/components/islands/plan/run-of.ts";
import { useSweep } from "#src/components/islands/plan/use-sweep.ts";
import { CannotBeKnown } from "#src/components/islands/run/CannotBeKnown.tsx";
import { PAIRS } from "#src/components/page-look.ts";
import type { PriceYields } from "#src/costing/price/price-yields.ts";
import { AimsSection } from "./AimsSection.tsx";
import { ChannelsSection } from "./ChannelsSection.tsx";
import { EvenSection } from "./EvenSection.tsx";
import { MoneyBars } from "./MoneyBars.tsx";
import { CautionNote, TimeNote, TogetherNote, WholesaleNote } from "./PriceNotes.tsx";
import type { PriceProps } from "./price-props.ts";
import { YieldsSection } from "./YieldsSection.tsx";

interface PriceEvidenceProps extends PriceProps {
  yields: PriceYields;
  /** Whether prices for aims can be told. */
  solved: boolean;
  may: { changeRun: boolean; changePrice: boolean };
  opens: ReturnType<typeof useOpens>;
}

/** What the answer rests on: channels, where the money goes, prices for aims, what this one does. */
export function PriceEvidence({ yields, solved, may, opens, ...props }: PriceEvidenceProps) {
  const { address, context, edition } = props;
  const { plan } = context;
  const { sweep } = useSweep(plan);
  const needs = yields.left.known ? [] : yields.left.needs;
  return (
    <div className={PAIRS}>
      {needs.length > 0 && (
        <Pair>
          <CannotBeKnown {...{ address, plan, needs, may }} title="What a kit leaves is not known yet" />
        </Pair>
      )}
      <Pair
        note={
          <>
            <TogetherNote {...{ context, edition, yields, opens }} />
            <TimeNote {...{ context, edition }} />
            <CautionNote />
          </>
        }
      >
        <ChannelsSection {...props} opens={opens} />
      </Pair>
      {yields.price !== null && (
        <Pair note={<WholesaleNote {...{ context, edition }} />}>
          <MoneyBars {...{ context, edition }} />
        </Pair>
      )}
      {solved && (
        <Pair>
          <AimsSection {...props} />
        </Pair>
      )}
      {yields.price !== null && (
        <Pair>
          <YieldsSection {...{ context, edition, yields, opens }} />
        </Pair>
      )}
      {sweep?.breakEven.known && (
        <Pair>
          <EvenSection {...{ address, context, sweep, opens }} run={runOf(plan)} />
        </Pair>
      )}
    </div>
  );
}
