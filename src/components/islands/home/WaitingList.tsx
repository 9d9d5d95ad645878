import { SettleList } from "#src/components/islands/parts/SettleList.tsx";

export interface WaitingThing {
  key: string;
  kit: string;
  kind: "bad" | "caution";
  words: string;
  href: string;
}

/** What waits for a person over all their kits, each with the way to it. Rendered on the server alone. */
export function WaitingList({ things, more }: { things: readonly WaitingThing[]; more: number }) {
  return (
    <>
      <SettleList
        label="Waiting for you"
        items={things.map(({ key, kit, kind, words, href }) => ({
          key,
          kind,
          over: kit,
          text: <a href={href}>{words}</a>,
        }))}
      />
      {more > 0 && <p className="type-note text-ink-2">And {more} more, on the pages of the kits.</p>}
    </>
  );
}
