import { buttonLook } from "#src/components/button-look.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { ErrorBox, type ErrorCause } from "#src/components/islands/parts/ErrorBox.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { type MissingThing, missingThings } from "#src/components/islands/plan/missing-things.ts";
import type { Need } from "#src/costing/problem.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { take } from "./inputs/entry.ts";

export interface CannotBeKnownProps {
  address: KitAddress;
  plan: Plan;
  /** "One kit of 260 cannot be costed yet". */
  title: string;
  needs: readonly Need[];
  may: { changeRun: boolean; changePrice: boolean };
}

function mayTake({ noneOfIt }: MissingThing, may: CannotBeKnownProps["may"]): boolean {
  return noneOfIt !== null && (noneOfIt.row.kind === "channel" ? may.changePrice : may.changeRun);
}

/** What cannot be worked out, and for each missing thing its reason and the ways on. */
export function CannotBeKnown({ address, plan, title, needs, may }: CannotBeKnownProps) {
  const causes = missingThings(plan, needs, address).map((thing): ErrorCause => {
    const { key, what, reason, detail, way, noneOfIt } = thing;
    return {
      key,
      what: what || undefined,
      reason,
      detail,
      ways: (
        <>
          <a href={way.href} className={buttonLook("secondary", "row")}>
            {way.label}
          </a>
          {noneOfIt && mayTake(thing, may) && (
            <QuietButton onClick={() => take({ address, currency: plan.currency, ...noneOfIt }, "0")}>
              {noneOfIt.label}
            </QuietButton>
          )}
        </>
      ),
    };
  });
  return <ErrorBox title={title} causes={causes} />;
}
