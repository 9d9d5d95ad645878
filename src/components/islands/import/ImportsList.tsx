import { QueryClientProvider, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import type { DELETE } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import].ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports.ts";
import type { ListedImport } from "#src/server/bring-in/listed-imports.ts";
import { CallFailed, call } from "../call.ts";
import { Dialog } from "../parts/Dialog.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { Section } from "../parts/Section.tsx";
import { type Column, Table } from "../parts/Table.tsx";
import { showToast } from "../parts/toasts.ts";
import { pageCache } from "../query-client.ts";
import { type ImportPlace, importKeys, importsApi, importsPath } from "./import-place.ts";
import { Moment } from "./Moment.tsx";
import { outcomeWords } from "./outcome-words.ts";
import { TakeBackDialog } from "./TakeBackDialog.tsx";

interface Props {
  place: ImportPlace;
  initial: ListedImport[];
}

/** Lists begun and not brought in yet, and lists that were brought in. */
export default function ImportsList(props: Props) {
  return (
    <QueryClientProvider client={pageCache()}>
      <Lists {...props} />
    </QueryClientProvider>
  );
}

function Lists({ place, initial }: Props) {
  const { data } = useQuery({
    queryKey: importKeys.list(place),
    queryFn: () => call<typeof GET>("GET", importsApi(place)),
    initialData: initial,
  });
  const [back, setBack] = useState<ListedImport | null>(null);
  const drafts = data.filter(({ state }) => state === "draft");
  const taken = data.filter(({ state }) => state === "taken" || state === "taken-back");
  const queryClient = useQueryClient();
  const again = () => queryClient.invalidateQueries({ queryKey: importKeys.list(place) });

  return (
    <>
      {drafts.length > 0 && <Drafts place={place} drafts={drafts} onDropped={again} />}
      {taken.length > 0 && (
        <Section title="Brought in" aside="the newest first">
          <Table
            caption="Lists brought in"
            columns={takenColumns(setBack)}
            rows={taken}
            keyOf={({ id }) => id}
            height="two-lines"
          />
        </Section>
      )}
      {back && (
        <TakeBackDialog
          place={place}
          list={back}
          onLeave={() => setBack(null)}
          onDone={() => {
            setBack(null);
            showToast({ kind: "good", text: `${back.name} was taken back. Everything stands as before.` });
            void again();
          }}
        />
      )}
    </>
  );
}

function who(name: string | null): string {
  return name === null ? "" : ` by ${name}`;
}

function Drafts({
  place,
  drafts,
  onDropped,
}: {
  place: ImportPlace;
  drafts: ListedImport[];
  onDropped: () => void;
}) {
  const [asked, setAsked] = useState<ListedImport | null>(null);
  const drop = useMutation({
    mutationFn: ({ id, version }: ListedImport) =>
      call<typeof DELETE>("DELETE", importsApi(place, `/${id}?version=${version}`)),
    onSuccess: onDropped,
    onError: (error) =>
      showToast({
        kind: "fault",
        text: error instanceof CallFailed ? error.problem.title : "It was not dropped.",
      }),
    onSettled: () => setAsked(null),
  });
  const columns: Column<ListedImport>[] = [
    {
      key: "name",
      head: "List",
      names: true,
      cell: (list) => <a href={importsPath(place, `/${list.id}`)}>{list.name}</a>,
    },
    { key: "rows", head: "Rows", number: true, cell: ({ rows }) => countText(rows), wide: true },
    {
      key: "when",
      head: "Begun",
      cell: (list) => (
        <>
          <Moment at={list.createdAt} />
          {who(list.createdBy)}
        </>
      ),
    },
    {
      key: "drop",
      head: <span className="heard-only">What to do</span>,
      className: "text-right",
      cell: (list) => (
        <QuietButton onClick={() => setAsked(list)}>
          Drop<span className="heard-only"> {list.name}</span>
        </QuietButton>
      ),
    },
  ];
  return (
    <Section title="Not brought in yet" aside="nothing of these is in use; go on where you left off">
      <Table caption="Lists not brought in yet" columns={columns} rows={drafts} keyOf={({ id }) => id} />
      <Dialog
        open={asked !== null}
        title={`Drop ${asked?.name ?? "this list"}?`}
        safe={{ label: "Keep it", run: () => setAsked(null) }}
        act={{
          label: "Drop it",
          removes: true,
          busy: drop.isPending,
          busyWord: "Dropping",
          run: () => asked && drop.mutate(asked),
        }}
      >
        <p>What was settled in it is forgotten. The file on your computer stays.</p>
      </Dialog>
    </Section>
  );
}

function takenColumns(onTakeBack: (list: ListedImport) => void): Column<ListedImport>[] {
  return [
    { key: "name", head: "List", names: true, cell: ({ name }) => name },
    {
      key: "when",
      head: "Brought in",
      cell: (list) => (
        <>
          {list.takenAt !== null && <Moment at={list.takenAt} />}
          {who(list.takenBy)}
        </>
      ),
    },
    { key: "did", head: "What it did", wide: true, cell: ({ outcome }) => outcomeWords(outcome) },
    {
      key: "back",
      head: <span className="heard-only">What to do</span>,
      className: "text-right",
      cell: (list) => {
        if (list.state === "taken-back") return <span className="text-ink-2">taken back</span>;
        if (!list.canTakeBack) return <span className="text-ink-2">a later list stands on it</span>;
        return (
          <QuietButton onClick={() => onTakeBack(list)}>
            Take back<span className="heard-only"> {list.name}</span>
          </QuietButton>
        );
      },
    },
  ];
}
