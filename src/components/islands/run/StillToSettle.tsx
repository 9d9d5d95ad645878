import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import { type SettleItem, SettleList } from "#src/components/islands/parts/SettleList.tsx";
import { thingLink } from "#src/components/islands/plan/thing-link.ts";
import { thingWords } from "#src/components/islands/plan/thing-words.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import { isNeed, toSettle, worthKnowing } from "#src/costing/to-settle.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** So many at a glance; the rest are on their own pages. */
const SHOWN = 6;

/** What is uncertain although the figures are known, and where it is settled. What is missing stands elsewhere. */
export function StillToSettle({ address, plan, run }: { address: KitAddress; plan: Plan; run: RunResult }) {
  const things = toSettle(plan, run).filter(({ problems }) => !problems.some(({ code }) => isNeed(code)));
  const items = things.map((thing): SettleItem => {
    const { label, href } = thingLink(address, thing);
    return {
      key: `${thing.page} ${thing.key}`,
      kind: "caution",
      text: (
        <>
          {thingWords(thing, plan)} <a href={href}>{label}</a>
        </>
      ),
    };
  });
  const notes = worthKnowing(run);
  return (
    <>
      {items.length > 0 && (
        <MarginNote title="Still to settle">
          <SettleList label="Still to settle" items={items.slice(0, SHOWN)} />
          {items.length > SHOWN && <p className="text-ink-2">And {items.length - SHOWN} more.</p>}
        </MarginNote>
      )}
      {notes.length > 0 && (
        <MarginNote title="Worth knowing">
          {notes.slice(0, SHOWN).map((problem) => (
            <p key={`${problem.code} ${JSON.stringify(problem.at)}`}>{problemSentence(problem, plan)}</p>
          ))}
        </MarginNote>
      )}
    </>
  );
}
