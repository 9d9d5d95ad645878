import { QueryClientProvider, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import type { Outcome } from "#src/server/bring-in/outcome.ts";
import { kitKeys } from "../kit-address.ts";
import { Button } from "../parts/Button.tsx";
import { ErrorBox } from "../parts/ErrorBox.tsx";
import { pageCache } from "../query-client.ts";
import { ColumnsSection } from "./ColumnsSection.tsx";
import { DeskHead } from "./DeskHead.tsx";
import { DifferenceSection } from "./DifferenceSection.tsx";
import { FileBox } from "./FileBox.tsx";
import { RecognisedRows, SkippedRows } from "./FoldedRows.tsx";
import { type ImportPlace, importKeys } from "./import-place.ts";
import { JoinsSection } from "./JoinsSection.tsx";
import { OfferDifferenceSection } from "./OfferDifferenceSection.tsx";
import { PricesSection } from "./PricesSection.tsx";
import { RowsSection } from "./RowsSection.tsx";
import { TakeBar } from "./TakeBar.tsx";
import { TakenPage } from "./TakenPage.tsx";
import { type DraftHandle, type ImportView, useDraft } from "./use-import.ts";

interface Props {
  place: ImportPlace;
  initial: ImportView;
  /** Letter of the list that stands; "" for a price list. */
  revision: string;
  money: boolean;
}

/** One list being brought in: its file, what its columns mean, rows to settle, what changes, and the taking. */
export default function ImportDesk(props: Props) {
  return (
    <QueryClientProvider client={pageCache()}>
      <Desk {...props} />
    </QueryClientProvider>
  );
}

function Desk({ place, initial, revision, money }: Props) {
  const queryClient = useQueryClient();
  const draft = useDraft(place, initial);
  const [taken, setTaken] = useState<{ outcome: Outcome; revision?: string } | null>(null);
  const { view } = draft;

  if (taken) return <TakenPage place={place} file={view.file} taken={taken} />;
  return (
    <div className="flex flex-col">
      <DeskHead view={view} />
      {draft.clash && <Clash onReload={draft.reload} />}
      <FileBox place={place} file={view.file} />
      <div className="flex flex-col gap-11" aria-busy={draft.busy || undefined}>
        <ColumnsSection columns={view.columns} edit={draft.edit} />
        <Rows draft={draft} />
        {view.kind === "parts-list" ? (
          <DifferenceSection
            place={place}
            id={view.file.id}
            version={view.file.version}
            difference={view.difference}
            revision={revision}
            money={money}
          />
        ) : (
          <OfferDifferenceSection difference={view.difference} />
        )}
        <TakeBar
          place={place}
          view={view}
          revision={revision}
          reading={draft.busy}
          onTaken={(done) => {
            setTaken(done);
            const after = { ...view, file: { ...view.file, state: "taken" as const } };
            queryClient.setQueryData(importKeys.one(view.file.id), after);
            if (place.kit) void queryClient.invalidateQueries({ queryKey: kitKeys.plan(place.kit) });
          }}
        />
      </div>
    </div>
  );
}

/** Rows to settle, what was skipped or recognised, equal rows, and prices. */
function Rows({ draft: { view, edit } }: { draft: DraftHandle }) {
  const parts = view.kind === "price-list" ? view.parts : undefined;
  return (
    <>
      <div>
        <RowsSection questions={view.questions} parts={parts} edit={edit} />
        <SkippedRows skipped={view.skipped} />
        {view.kind === "parts-list" && <RecognisedRows recognised={view.recognised} />}
      </div>
      {view.kind === "parts-list" && (
        <JoinsSection offers={view.joinOffers} joined={view.counts.joined} edit={edit} />
      )}
      <PricesSection prices={view.prices} edit={edit} />
    </>
  );
}

function Clash({ onReload }: { onReload: () => void }) {
  return (
    <div className="mb-9">
      <ErrorBox title="This draft was changed elsewhere" alert>
        <p>Somebody, or you in another window, settled something in it. Your last change was not kept.</p>
        <p className="mt-3">
          <Button size="small" onClick={onReload}>
            Show it as it is now
          </Button>
        </p>
      </ErrorBox>
    </div>
  );
}
