import { counted, listed } from "#src/components/count-words.ts";
import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ConflictBox } from "#src/components/islands/parts/ConflictBox.tsx";
import { ErrorBox } from "#src/components/islands/parts/ErrorBox.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { useStore } from "#src/components/islands/plan/module-store.ts";
import type { PricedPartsList } from "#src/server/present.ts";
import { columnHead } from "./column-defs.ts";
import { lineName, overlapWords } from "./edit-words.ts";
import { equalLines, joinLines } from "./join-lines.ts";
import { editorState, NOTHING_EDITED, settleListClash } from "./list-editor.ts";
import type { PartsWork } from "./use-parts-work.ts";

const MISFITS_SHOWN = 8;

function clock(at: number | null): string {
  if (at === null) return "in the meantime";
  const time = new Date(at).toLocaleTimeString("en-GB", { hour: "2-digit", minute: "2-digit" });
  return `at ${time}`;
}

/** What stands between an edit and the list: another person's value, cells that cannot be taken, equal lines. */
export function EditorBoxes({
  address,
  list,
  work,
}: {
  address: KitAddress;
  list: PricedPartsList;
  work: PartsWork;
}) {
  return (
    <div className="mb-3 flex flex-col gap-3 empty:hidden">
      <Clash address={address} list={list} />
      <Faults list={list} work={work} />
      <Misfits address={address} work={work} />
      <EqualLines list={list} work={work} />
    </div>
  );
}

function Clash({ address, list }: { address: KitAddress; list: PricedPartsList }) {
  const { clash } = useStore(editorState, NOTHING_EDITED);
  if (!clash) return null;
  const { what, yours, theirs } = overlapWords(list, clash.overlaps);
  return (
    <ConflictBox
      happened={`${clash.by ?? "Somebody"} changed ${what} ${clock(clash.at)}.`}
      yours={yours}
      theirs={theirs}
      theirWord={clash.by ? `${clash.by}’s` : "Theirs"}
      onKeepYours={() => settleListClash(address, "yours")}
      onTakeTheirs={() => settleListClash(address, "theirs")}
    />
  );
}

function Faults({ list, work }: { list: PricedPartsList; work: PartsWork }) {
  const faults = [...work.faults.values()];
  if (faults.length === 0) return null;
  return (
    <ErrorBox
      title={faults.length === 1 ? "One cell is not saved" : `${faults.length} cells are not saved`}
      alert
      causes={faults.map((fault) => {
        const place = list.lines.findIndex(({ id }) => id === fault.row);
        return {
          key: `${fault.row} ${fault.column}`,
          place: `Line ${place + 1}`,
          what: columnHead(fault.column, list.editions),
          reason: fault.message,
          ways: <QuietButton onClick={() => work.deeds.dropFault(fault)}>Leave it as it was</QuietButton>,
        };
      })}
    />
  );
}

function Misfits({ address, work }: { address: KitAddress; work: PartsWork }) {
  const { misfits, deeds } = work;
  if (misfits.length === 0) return null;
  const more = misfits.length - MISFITS_SHOWN;
  return (
    <ErrorBox
      title={`Nothing was pasted: ${counted(misfits.length, "cell does", "cells do").toLowerCase()} not fit`}
      alert
      causes={misfits.slice(0, MISFITS_SHOWN).map((misfit) => ({
        key: `${misfit.row} ${misfit.column}`,
        place: `Row ${misfit.row}`,
        what: `cell ${misfit.column}`,
        reason: misfit.message,
        detail: misfit.text === "" ? "The cell is empty." : `The cell says “${misfit.text}”.`,
      }))}
    >
      <p>
        Put these right in your spreadsheet and paste again, or bring the whole block in as a list, where each
        column is told what it means.{more > 0 && ` ${more} more are not shown.`}
      </p>
      <p className="mt-2 flex flex-wrap items-center gap-4">
        <Button size="small" onClick={() => location.assign(kitPath(address, "/parts/bring-in"))}>
          Bring it in as a list
        </Button>
        <QuietButton onClick={deeds.forgetMisfits}>Close</QuietButton>
      </p>
    </ErrorBox>
  );
}

function EqualLines({ list, work }: { list: PricedPartsList; work: PartsWork }) {
  const [group] = equalLines(list);
  if (!group) return null;
  return (
    <p className="type-note text-ink-2">
      {listed(group.map(lineName))} are the same part.{" "}
      <QuietButton onClick={() => work.deeds.take("Equal lines joined.", joinLines(group))}>
        Join them into one line
      </QuietButton>
    </p>
  );
}
