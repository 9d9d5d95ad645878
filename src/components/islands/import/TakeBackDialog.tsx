import { useMutation } from "@tanstack/react-query";
import { useState } from "react";
import type { POST } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import]/take-back.ts";
import type { LaterChange } from "#src/server/bring-in/later-changes.ts";
import type { ListedImport } from "#src/server/bring-in/listed-imports.ts";
import { CallFailed, call } from "../call.ts";
import { Dialog } from "../parts/Dialog.tsx";
import { type ImportPlace, importsApi } from "./import-place.ts";
import { laterChangeWords } from "./later-change-words.ts";

interface Props {
  place: ImportPlace;
  list: Pick<ListedImport, "id" | "name" | "version">;
  onLeave: () => void;
  onDone: () => void;
}

const SHOWN = 6;

/** Asks before a list is taken back; where something was changed since, says what and offers both ways. */
export function TakeBackDialog({ place, list, onLeave, onDone }: Props) {
  const [changes, setChanges] = useState<LaterChange[] | null>(null);
  const [fault, setFault] = useState<string | null>(null);
  const back = useMutation({
    mutationFn: () =>
      call<typeof POST>("POST", importsApi(place, `/${list.id}/take-back`), {
        version: list.version,
        ...(changes && { evenSo: true as const }),
      }),
    onSuccess: onDone,
    onError: (error) => {
      if (!(error instanceof CallFailed)) throw error;
      const { code, title, detail, current } = error.problem;
      if (code === "changed-since-taken") setChanges((current as { changes: LaterChange[] }).changes);
      else setFault(`${title} ${detail}`);
    },
  });
  return (
    <Dialog
      open
      title={changes ? `Take back ${list.name} all the same?` : `Take back ${list.name}?`}
      safe={{ label: "Leave it as it is", run: onLeave }}
      act={{
        label: changes ? "Take it back all the same" : "Take it back",
        removes: true,
        busy: back.isPending,
        busyWord: "Taking back",
        run: () => back.mutate(),
      }}
    >
      {changes ? (
        <>
          <p>Some of what it brought in was changed since. Taking it back undoes these changes too:</p>
          <ul className="mt-2 list-disc pl-6">
            {changes.slice(0, SHOWN).map((change, place) => (
              // biome-ignore lint/suspicious/noArrayIndexKey: the list does not change while it is shown.
              <li key={place}>{laterChangeWords(change)}</li>
            ))}
            {changes.length > SHOWN && <li>and {changes.length - SHOWN} more</li>}
          </ul>
        </>
      ) : (
        <p>Everything it touched goes back to what it was: lines, parts and prices.</p>
      )}
      {fault && (
        <p role="alert" className="mt-2 font-semibold text-bad">
          {fault}
        </p>
      )}
    </Dialog>
  );
}
