import { MarginNote } from "#src/components/islands/parts/Pair.tsx";

/** What stands beside each group of entries: how it is reckoned with. */

export function MixNote() {
  return (
    <MarginNote title="How a run is mixed">
      <p>A share counts beside the others. Kits stay whole, so a run is split as nearly as it goes.</p>
    </MarginNote>
  );
}

export function SaleNote() {
  return (
    <MarginNote title="What is left of a price">
      <p>
        Of what the buyer pays go the tax inside it, the fee, postage and packing. What is left comes in; less
        the time to sell it, it is what a kit brings in.
      </p>
    </MarginNote>
  );
}

export function WorkNote() {
  return (
    <MarginNote title="Getting faster">
      <p>
        Each time the number of kits made doubles, one kit takes this share of the time. Kits made before
        count too, so a second run begins faster.
      </p>
    </MarginNote>
  );
}

export function PackingNote() {
  return (
    <MarginNote title="For which editions">
      <p>An item counts in the editions that are ticked, and in no other.</p>
    </MarginNote>
  );
}

export function ChargesNote() {
  return (
    <MarginNote title="What later runs can share">
      <p>
        A cost that serves later runs too can be spread over more kits than this run makes. The run then bears
        its part of it.
      </p>
    </MarginNote>
  );
}

export function AllowancesNote({ boardsHref }: { boardsHref: string | null }) {
  return (
    <MarginNote title="What these change">
      <p>
        Spare parts are bought with the rest, and stay with you if nothing is lost. A kit that needs a part
        again costs the replacement.
      </p>
      {boardsHref && (
        <p>
          How many boards to order follows from how many are good. <a href={boardsHref}>Boards</a>
        </p>
      )}
    </MarginNote>
  );
}
