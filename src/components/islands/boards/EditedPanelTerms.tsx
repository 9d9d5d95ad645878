import { useState } from "react";
import { CallFailed } from "#src/components/islands/call.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Dialog } from "#src/components/islands/parts/Dialog.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import type { PanelTermsView } from "#src/server/panel-terms-changes.ts";
import { PanelTermsForm } from "./PanelTermsForm.tsx";
import { blankTerms, termsDraft } from "./panel-terms-draft.ts";
import { addTerms, changeTerms, removeTerms } from "./panel-terms-store.ts";

export interface EditedPanelTermsProps {
  address: KitAddress;
  /** Terms that are there; null: new ones, of `boardHouse`. */
  terms: PanelTermsView | null;
  boardHouse: string;
  /** Absent where there is nothing else to go back to. */
  onLeave?: () => void;
  onSaved: (boardHouse: string) => void;
}

/** The form of a house's panels, new or to be changed, with the way to remove them. */
export function EditedPanelTerms(props: EditedPanelTermsProps) {
  const { address, terms, boardHouse, onLeave, onSaved } = props;
  if (terms === null)
    return (
      <PanelTermsForm
        first={blankTerms(boardHouse)}
        version={0}
        action="Lay out its panels"
        onLeave={onLeave}
        onSave={async (fields) => {
          await addTerms(address, fields);
          onSaved(fields.boardHouse);
        }}
      />
    );
  return (
    <>
      <PanelTermsForm
        first={termsDraft(terms)}
        version={terms.version}
        action="Save the panels"
        onLeave={onLeave}
        onSave={async (fields, version) => {
          await changeTerms(address, { id: terms.id, version }, fields);
          onSaved(fields.boardHouse);
        }}
      />
      <Removal {...{ address, terms, onSaved }} />
    </>
  );
}

function Removal({
  address,
  terms,
  onSaved,
}: Pick<EditedPanelTermsProps, "address" | "onSaved"> & { terms: PanelTermsView }) {
  const [asking, setAsking] = useState(false);
  async function remove() {
    try {
      await removeTerms(address, terms);
      onSaved("");
    } catch (error) {
      if (!(error instanceof CallFailed)) throw error;
      setAsking(false);
      showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
    }
  }
  return (
    <>
      <Button kind="refuse" size="small" className="mt-4" onClick={() => setAsking(true)}>
        Remove its panels
      </Button>
      <Dialog
        open={asking}
        title={`Remove the panels of ${terms.boardHouse}?`}
        safe={{ label: "Keep them", run: () => setAsking(false) }}
        act={{ label: "Remove them", removes: true, run: () => void remove() }}
      >
        <p>Its quotes stay with their prices. Their panels are no longer drawn.</p>
      </Dialog>
    </>
  );
}
