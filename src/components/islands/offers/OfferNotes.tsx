import type { ReactNode } from "react";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import { SettleList } from "#src/components/islands/parts/SettleList.tsx";
import { thingLink } from "#src/components/islands/plan/thing-link.ts";
import { thingKind, thingWords } from "#src/components/islands/plan/thing-words.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import type { OpenThing } from "#src/costing/to-settle.ts";
import type { KitSupply } from "./kit-supply.ts";
import { offerNotes, singleSourced } from "./settle-offers.ts";

interface OfferNotesProps {
  address: KitAddress;
  supply: KitSupply;
  things: readonly OpenThing[];
}

/** Beside the lines: what is to settle, and what is only worth knowing. */
export function OfferNotes({ address, supply, things }: OfferNotesProps) {
  return (
    <>
      <MarginNote title={things.length === 0 ? "Nothing to settle" : `To settle, ${things.length}`}>
        {things.length === 0 ? (
          <p>Every part has a fresh price and enough in stock.</p>
        ) : (
          <SettleList
            label="To settle"
            items={things.map((thing) => {
              const { label, href } = thingLink(address, thing);
              return {
                key: thing.key,
                kind: thingKind(thing),
                text: (
                  <>
                    {thingWords(thing, supply.plan)} <a href={href}>{label}</a>
                  </>
                ),
              };
            })}
          />
        )}
      </MarginNote>
      <WorthKnowing supply={supply} />
    </>
  );
}

function WorthKnowing({ supply }: { supply: KitSupply }): ReactNode {
  const notes = offerNotes(supply);
  const single = singleSourced(supply);
  if (notes.length + single.length === 0) return null;
  return (
    <MarginNote title="Worth knowing">
      {notes.map((problem) => (
        <p key={`${problem.code} ${JSON.stringify(problem.at)}`}>{problemSentence(problem, supply.plan)}</p>
      ))}
      {single.length > 0 && (
        <p>
          From one supplier alone:{" "}
          {single.map(({ id, name }, place) => (
            <span key={id}>
              {place > 0 && ", "}
              <a href={supply.partHref(id)}>{name}</a>
            </span>
          ))}
          . If that supplier runs out, the run waits.
        </p>
      )}
    </MarginNote>
  );
}
