import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { kitPath } from "#src/components/islands/kit-address.ts";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import { type SettleItem, SettleList } from "#src/components/islands/parts/SettleList.tsx";
import { CAUTION_CODES, type Problem } from "#src/costing/problem.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { Plan } from "#src/shapes/plan.ts";

function place(address: KitAddress, { at }: Problem): { label: string; href: string } | null {
  if (at.part) return { label: "Offers", href: kitPath(address, `/offers/${at.part}`) };
  if (at.quote) return { label: "Boards", href: kitPath(address, "/boards") };
  const suppliers = `/workshops/${address.workshop}/suppliers`;
  if (at.supplier) return { label: "Suppliers", href: `${suppliers}/${at.supplier}` };
  if (at.currency) return { label: "Currency rates", href: `${suppliers}#rates` };
  return null;
}

/** So many at a glance; the rest are on their own pages. */
const SHOWN = 6;

const isCaution = ({ code }: Problem) => (CAUTION_CODES as readonly string[]).includes(code);

/** What is uncertain although the figures are known, and where it is settled. What is missing stands elsewhere. */
export function StillToSettle({ address, plan, run }: { address: KitAddress; plan: Plan; run: RunResult }) {
  const items = run.problems.filter(isCaution).map((problem): SettleItem => {
    const where = place(address, problem);
    return {
      key: `${problem.code} ${JSON.stringify(problem.at)}`,
      kind: "caution",
      text: (
        <>
          {problemSentence(problem, plan)} {where && <a href={where.href}>{where.label}</a>}
        </>
      ),
    };
  });
  if (items.length === 0) return null;
  return (
    <MarginNote title="Still to settle">
      <SettleList label="Still to settle" items={items.slice(0, SHOWN)} />
      {items.length > SHOWN && <p className="text-ink-2">And {items.length - SHOWN} more.</p>}
    </MarginNote>
  );
}
