import { useMemo } from "react";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { BusyIcon } from "#src/components/islands/parts/Icons.tsx";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { usePhone } from "#src/components/islands/parts/phone.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import { withoutWords } from "#src/costing/problem-words.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { SweepColumns, SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { BuildUpSection } from "./BuildUpSection.tsx";
import { CannotBeKnown } from "./CannotBeKnown.tsx";
import { CostSection } from "./CostSection.tsx";
import { costPoints } from "./cost-points.ts";
import { EditionsSection } from "./EditionsSection.tsx";
import { EvenNotes } from "./EvenNotes.tsx";
import { EvenSection } from "./EvenSection.tsx";
import { LeftOverSection } from "./LeftOverSection.tsx";
import { RunsWorthALook } from "./RunsWorthALook.tsx";
import { StillToSettle } from "./StillToSettle.tsx";
import { SweetSpotNotes } from "./SweetSpotNotes.tsx";
import { WeighsMost } from "./WeighsMost.tsx";
import { WhyThisRun } from "./WhyThisRun.tsx";
import { worthALook } from "./worth-a-look.ts";

export interface EvidenceProps {
  address: KitAddress;
  plan: Plan;
  run: RunResult;
  sweep: SweepResult;
  columns: SweepColumns;
  /** The figures leave out what is missing. */
  isPartial: boolean;
  workingOut: boolean;
  may: { changeRun: boolean; changePrice: boolean };
  opens: ReturnType<typeof useOpens>;
  onChoose: (kits: number) => void;
}

/** The evidence for the answer: runs to compare, both charts, the build-up, editions, what is left over. */
export function RunEvidence(props: EvidenceProps) {
  const { address, plan, run, sweep, columns, isPartial, may, opens } = props;
  const narrow = usePhone();
  const partial = isPartial ? withoutWords(sweep.needs) : null;
  const anyKnown = columns.used.some((value) => value !== null);
  const shared = { plan, run, sweep, columns, narrow, opens, partial };
  return (
    <>
      <Pair
        note={
          <>
            {props.workingOut && (
              <p role="status" className="flex items-center gap-2 text-ink-2">
                <BusyIcon className="size-4" /> Working out every run size
              </p>
            )}
            {run.perKit.used.known && <WhyThisRun {...{ plan, run, sweep, columns, opens }} />}
            <StillToSettle address={address} plan={plan} run={run} />
          </>
        }
      >
        {anyKnown ? <Compared {...props} partial={partial} /> : <NothingKnown />}
      </Pair>
      {anyKnown && (
        <Pair note={<SweetSpotNotes plan={plan} sweep={sweep} run={run.kits} />}>
          <CostSection {...shared} />
        </Pair>
      )}
      {columns.brings.some((value) => value !== null) ? (
        <Pair note={<EvenNotes plan={plan} sweep={sweep} run={run.kits} opens={opens} />}>
          <EvenSection {...shared} />
        </Pair>
      ) : (
        <Pair>
          <TakingsNotKnown address={address} plan={plan} run={run} may={may} />
        </Pair>
      )}
      <Pair note={<WeighsMost plan={plan} run={run} />}>
        <BuildUpSection run={run} opens={opens} />
      </Pair>
      <Pair
        note={
          run.editions.length > 1 && (
            <MarginNote title="Shared costs">
              <p>
                Freight, once-only costs and setting up are shared by the value of what each edition costs
                directly.
              </p>
            </MarginNote>
          )
        }
      >
        <EditionsSection run={run} opens={opens} />
      </Pair>
      <Pair
        note={
          <MarginNote title="Spent and used">
            <p>
              Spent is all the money this run needs. Used leaves out what keeps on the shelf for another kit,
              and counts stock taken from it.
            </p>
          </MarginNote>
        }
      >
        <LeftOverSection address={address} plan={plan} run={run} opens={opens} />
      </Pair>
    </>
  );
}

function NothingKnown() {
  return (
    <Section title="What is still known">
      <p className="type-note">Nothing yet: no run size can be worked out.</p>
    </Section>
  );
}

/** Runs worth a look; where the chosen one is not known, the sizes that still are. */
function Compared({
  run,
  sweep,
  columns,
  may,
  onChoose,
  partial,
}: EvidenceProps & { partial: string | null }) {
  const known = run.perKit.used.known;
  const points = useMemo(() => costPoints(columns, "used", { from: 1, to: sweep.to }), [columns, sweep.to]);
  const rows = worthALook(sweep, columns, points, run.kits);
  return (
    <RunsWorthALook
      title={known ? "Runs worth a look" : "What is still known"}
      aside={partial ?? (known ? "sweet spots, ends of a step, and round numbers" : undefined)}
      rows={rows}
      run={run.kits}
      currency={run.currency}
      onChoose={may.changeRun ? onChoose : undefined}
    />
  );
}

function TakingsNotKnown({
  address,
  plan,
  run,
  may,
}: Pick<EvidenceProps, "address" | "plan" | "run" | "may">) {
  const needs = run.bringsPerKit.known ? [] : run.bringsPerKit.needs;
  return (
    <Section title="Takings against total cost">
      <CannotBeKnown
        address={address}
        plan={plan}
        needs={needs}
        may={may}
        title="What a kit brings in is not known yet"
      />
    </Section>
  );
}
