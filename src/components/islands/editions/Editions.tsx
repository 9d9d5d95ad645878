import { useState } from "react";
import { CallFailed, call } from "#src/components/islands/call.ts";
import { SavedField } from "#src/components/islands/forms/SavedField.tsx";
import { type KitAddress, kitApi } from "#src/components/islands/kit-address.ts";
import { Dialog } from "#src/components/islands/parts/Dialog.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { saving } from "#src/components/islands/plan/saving.ts";
import type {
  DELETE,
  GET as LOSS,
  PATCH,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/[edition]/index.ts";
import type { GET, PUT } from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/index.ts";
import type { EditionLoss } from "#src/server/edition-changes.ts";
import type { EditionView } from "#src/server/present.ts";
import { EDITIONS_MOST } from "#src/shapes/limits.ts";
import { EditionClash, type EditionField, type MetEdition } from "./EditionClash.tsx";
import { refusal } from "./edition-refusal.ts";
import { lossWords } from "./loss-words.ts";
import { NewEdition } from "./NewEdition.tsx";
import { OrderKey } from "./OrderKey.tsx";

export interface EditionsProps {
  address: KitAddress;
  first: EditionView[];
  canEdit: boolean;
}

function whole(text: string): number | null {
  return /^\d{1,7}$/.test(text.trim()) ? Number(text.trim()) : null;
}

/** The editions of a kit: names, shares of the run, boards; added, reordered, removed. */
export default function Editions({ address, first, canEdit }: EditionsProps) {
  const [editions, setEditions] = useState(first);
  const [met, setMet] = useState<MetEdition | null>(null);
  const [leaving, setLeaving] = useState<{ edition: EditionView; loss: EditionLoss } | null>(null);
  const path = (id: string) => kitApi(address, `/editions/${id}`);
  const saved = () => saving.change((now) => ({ ...now, savedAt: Date.now() }));

  async function reload() {
    setEditions(await call<typeof GET>("GET", kitApi(address, "/editions")));
  }

  const put = (after: EditionView) =>
    setEditions((now) => now.map((one) => (one.id === after.id ? after : one)));

  async function change(
    edition: EditionView,
    field: EditionField,
    yours: string | number,
  ): Promise<string | null> {
    try {
      const body = { [field]: yours, version: edition.version };
      const after = await call<typeof PATCH>("PATCH", path(edition.id), body);
      if (after) put(after);
      saved();
      return null;
    } catch (error) {
      if (!(error instanceof CallFailed) || error.problem.code !== "changed-meanwhile") return refusal(error);
      return meetOther(edition, { field, yours, current: error.problem.current as MetEdition["current"] });
    }
  }

  /** Somebody was quicker. Another field of theirs is no matter; the same one is for the person to choose. */
  async function meetOther(before: EditionView, one: MetEdition): Promise<string | null> {
    const { current, field } = one;
    put(current);
    if (current[field] === before[field]) return change(current, field, one.yours);
    if (current[field] !== one.yours) setMet(one);
    return null;
  }

  async function move(place: number, by: 1 | -1) {
    const order = editions.map(({ id }) => id);
    const [id] = order.splice(place, 1);
    if (id === undefined) return;
    order.splice(place + by, 0, id);
    try {
      setEditions(await call<typeof PUT>("PUT", kitApi(address, "/editions"), { editions: order }));
      saved();
    } catch (error) {
      showToast({ kind: "fault", text: refusal(error) });
    }
  }

  async function ask(edition: EditionView) {
    const loss = await call<typeof LOSS>("GET", path(edition.id));
    setLeaving({ edition, loss });
  }

  async function remove({ id, version }: EditionView) {
    setLeaving(null);
    try {
      await call<typeof DELETE>("DELETE", `${path(id)}?version=${version}`);
      setEditions((now) => now.filter((one) => one.id !== id));
      saved();
    } catch (error) {
      showToast({ kind: "fault", text: refusal(error) });
      await reload();
    }
  }

  return (
    <div>
      <ul aria-label="Editions">
        {editions.map((edition, place) => (
          <li key={edition.id} className="hairline-b flex flex-wrap items-start gap-x-5 gap-y-3 py-4">
            <SavedField
              label="Name"
              className="w-full tablet:w-64"
              value={edition.name}
              off={!canEdit}
              save={(text) => change(edition, "name", text)}
            />
            <SavedField
              label="Share of the run"
              className="w-36"
              value={String(edition.weight)}
              off={!canEdit}
              inputMode="numeric"
              save={(text) => {
                const weight = whole(text);
                return weight === null
                  ? "Write a whole number; 0 makes none of it."
                  : change(edition, "weight", weight);
              }}
            />
            <SavedField
              label="Boards in a kit"
              className="w-36"
              value={String(edition.boardsPerKit)}
              off={!canEdit}
              inputMode="numeric"
              save={(text) => {
                const boardsPerKit = whole(text);
                return boardsPerKit === null || boardsPerKit > 100
                  ? "Write a whole number up to 100."
                  : change(edition, "boardsPerKit", boardsPerKit);
              }}
            />
            {canEdit && (
              <div className="flex items-center gap-2 tablet:mt-[28px]">
                <OrderKey
                  label={`${edition.name}, up`}
                  off={place === 0}
                  onPress={() => void move(place, -1)}
                  up
                />
                <OrderKey
                  label={`${edition.name}, down`}
                  off={place === editions.length - 1}
                  onPress={() => void move(place, 1)}
                />
                {editions.length > 1 && (
                  <QuietButton className="ml-2" onClick={() => void ask(edition)}>
                    Remove
                  </QuietButton>
                )}
              </div>
            )}
          </li>
        ))}
      </ul>
      {met && (
        <EditionClash
          met={met}
          onKeepYours={() => {
            setMet(null);
            void change(met.current, met.field, met.yours);
          }}
          onTakeTheirs={() => setMet(null)}
        />
      )}
      {canEdit && editions.length < EDITIONS_MOST && (
        <NewEdition
          address={address}
          editions={editions}
          onMade={(made) => setEditions([...editions, made])}
        />
      )}
      <Dialog
        open={leaving !== null}
        title={`Remove ${leaving?.edition.name ?? ""}?`}
        safe={{ label: "Keep it", run: () => setLeaving(null) }}
        act={{ label: "Remove it", removes: true, run: () => leaving && void remove(leaving.edition) }}
      >
        {leaving && <p>{lossWords(leaving.loss)}</p>}
      </Dialog>
    </div>
  );
}
