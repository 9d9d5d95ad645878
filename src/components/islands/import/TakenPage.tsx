import { useEffect, useRef, useState } from "react";
import { buttonLook } from "#src/components/button-look.ts";
import type { Outcome } from "#src/server/bring-in/outcome.ts";
import type { FileView } from "#src/server/bring-in/view.ts";
import { QuietButton } from "../parts/QuietButton.tsx";
import { homePath, type ImportPlace, importsPath } from "./import-place.ts";
import { outcomeWords } from "./outcome-words.ts";
import { TakeBackDialog } from "./TakeBackDialog.tsx";

interface Props {
  place: ImportPlace;
  file: FileView;
  taken: { outcome: Outcome; revision?: string };
}

/** After a list was brought in: what that did, where to go on, and the way back. */
export function TakenPage({ place, file, taken }: Props) {
  const [asking, setAsking] = useState(false);
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  const { newSuppliers } = taken.outcome.offers;
  return (
    <div>
      <h1 ref={heading} tabIndex={-1} className="type-h1">
        The list is in
      </h1>
      <p className="type-answer mt-1.5" role="status">
        <b>{file.name}:</b> {outcomeWords(taken.outcome)}.{" "}
        {taken.revision && <>The parts list is now rev {taken.revision}.</>}
      </p>
      {newSuppliers.length > 0 && (
        <p className="mt-2">
          The freight of {newSuppliers.join(", ")} is not known yet.{" "}
          <a href={`/workshops/${place.workshop}/suppliers`}>Set their terms</a>
        </p>
      )}
      <p className="mt-6 flex flex-wrap items-center gap-4">
        <a href={homePath(place)} className={buttonLook("primary")}>
          {place.kit ? "See the parts list" : "See the suppliers"}
        </a>
        <QuietButton onClick={() => setAsking(true)}>Take it back</QuietButton>
      </p>
      {asking && (
        <TakeBackDialog
          place={place}
          list={{ id: file.id, name: file.name, version: file.version + 1 }}
          onLeave={() => setAsking(false)}
          onDone={() => location.assign(importsPath(place))}
        />
      )}
    </div>
  );
}
