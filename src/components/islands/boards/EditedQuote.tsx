import { useState } from "react";
import { CallFailed } from "#src/components/islands/call.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Dialog } from "#src/components/islands/parts/Dialog.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import type { BoardQuoteView } from "#src/server/board-changes.ts";
import { quoteName } from "./board-words.ts";
import { QuoteForm } from "./QuoteForm.tsx";
import { changeQuote, removeQuote } from "./quotes-store.ts";

export interface EditedQuoteProps {
  address: KitAddress;
  quote: BoardQuoteView;
  onDone: () => void;
}

/** The form of a quote that is there already, with the way to remove it. */
export function EditedQuote({ address, quote, onDone }: EditedQuoteProps) {
  const [asking, setAsking] = useState(false);
  const { id, version, ...first } = quote;
  async function remove() {
    try {
      await removeQuote(address, quote);
      onDone();
    } catch (error) {
      if (!(error instanceof CallFailed)) throw error;
      setAsking(false);
      showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
    }
  }
  return (
    <div className="mb-6 border-l-4 border-petrol pl-5">
      <QuoteForm
        first={first}
        version={version}
        action="Save the quote"
        onLeave={onDone}
        onSave={async (fields, seen) => {
          await changeQuote(address, { id, version: seen }, fields);
          onDone();
        }}
      />
      <Button kind="refuse" size="small" className="mt-4" onClick={() => setAsking(true)}>
        Remove the quote
      </Button>
      <Dialog
        open={asking}
        title={`Remove the quote of ${quoteName({ ...quote, boardsPerPiece: quote.boardsPerPanel ?? 1 })}?`}
        safe={{ label: "Keep it", run: () => setAsking(false) }}
        act={{ label: "Remove it", removes: true, run: () => void remove() }}
      >
        <p>Its lots and charges go with it. If it is chosen, the cheapest of the others is taken.</p>
      </Dialog>
    </div>
  );
}
