import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { POST } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import]/take.ts";
import type { Outcome } from "#src/server/bring-in/outcome.ts";
import { CallFailed, call } from "../call.ts";
import { Button } from "../parts/Button.tsx";
import { ErrorBox } from "../parts/ErrorBox.tsx";
import { type ImportPlace, importKeys, importsApi } from "./import-place.ts";
import { faultPlace } from "./PricesSection.tsx";
import type { ImportView } from "./use-import.ts";
import { takeWords, thenWords, whyNotYet } from "./why-not-yet.ts";

interface Props {
  place: ImportPlace;
  view: ImportView;
  revision: string;
  /** An edit is on its way: the rows are being read anew. */
  reading: boolean;
  onTaken: (taken: { outcome: Outcome; revision?: string }) => void;
}

function toColumns(): void {
  document.getElementById("columns")?.scrollIntoView({ block: "start" });
  document.querySelector<HTMLElement>("#columns select")?.focus({ preventScroll: true });
}

/** The foot of the page: what will then be so, and the one button that does it. */
export function TakeBar({ place, view, revision, reading, onTaken }: Props) {
  const queryClient = useQueryClient();
  const { id, version } = view.file;
  const take = useMutation({
    mutationFn: () =>
      call<typeof POST>("POST", importsApi(place, `/${id}/take`), { version, seen: view.seen }),
    onSuccess: onTaken,
    onError: (error) => {
      if (!(error instanceof CallFailed)) throw error;
      if (error.problem.status === 409) void queryClient.invalidateQueries({ queryKey: importKeys.one(id) });
    },
  });
  return (
    <section id="bring-in" aria-label="Bring in" className="rule-section flex flex-col gap-4 pt-4">
      {take.error instanceof CallFailed && <TakeFault error={take.error} />}
      <div className="flex items-start justify-between gap-x-8 gap-y-4 max-tablet:flex-col-reverse">
        <p className="pt-2 text-ink-2">{thenWords(view, revision)}</p>
        <div className="flex shrink-0 items-start gap-3 max-tablet:w-full max-tablet:flex-col">
          <Button onClick={toColumns}>Back to columns</Button>
          <Button
            kind="primary"
            offBecause={reading ? "The rows are being read." : whyNotYet(view)}
            busy={take.isPending}
            busyWord="Bringing in"
            onClick={() => take.mutate()}
          >
            {takeWords(view)}
          </Button>
        </div>
      </div>
    </section>
  );
}

function TakeFault({ error }: { error: CallFailed }) {
  const { title, detail, errors = [] } = error.problem;
  return (
    <ErrorBox
      title={title}
      alert
      causes={errors.map(({ at, message }) => ({ key: at, place: faultPlace(at), reason: message }))}
    >
      <p>{detail}</p>
    </ErrorBox>
  );
}
