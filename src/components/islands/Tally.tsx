import { useEffect } from "react";
import { moneyText } from "#src/components/amount-text.ts";
import type { Tally as TallyFigures } from "#src/costing/tally.ts";
import { tallyChanges } from "#src/costing/tally-change.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import type { KitAddress } from "./kit-address.ts";
import { Later } from "./parts/Later.tsx";
import { laterPart } from "./parts/later-part.ts";
import { type TallyNote, TallyStrip } from "./parts/TallyStrip.tsx";
import type { ClashesProps } from "./plan/Clashes.tsx";
import { keepEdit, type LastEdit, lastEdit, undoEdit } from "./plan/edit-log.ts";
import { editField } from "./plan/edit-plan.ts";
import { changeWords } from "./plan/field-words.ts";
import { KeyHelp } from "./plan/KeyHelp.tsx";
import { LostConnection } from "./plan/LostConnection.tsx";
import { useStore } from "./plan/module-store.ts";
import { useOpens } from "./plan/open-working.ts";
import { tallyAt } from "./plan/run-of.ts";
import { takeUpEdits, watchPage } from "./plan/save-edits.ts";
import { NOTHING_SAVED, saving } from "./plan/saving.ts";
import { spokenChange, tallyCells } from "./plan/tally-cells.ts";
import { usePlan } from "./plan/use-plan.ts";
import { useQuiet } from "./plan/use-quiet.ts";
import { useSweep } from "./plan/use-sweep.ts";
import { WorkingHost } from "./plan/WorkingHost.tsx";

export interface TallyProps {
  workshop: string;
  kit: string;
  /** Worked out on the server, for the first paint; the plan in the browser takes over. */
  first: TallyFigures;
  may: { changeRun: boolean };
  /** Whether single-letter keys are on, as the person chose. */
  singleKeys?: boolean;
}

const QUIET_MS = 600;

const Clashes = laterPart<ClashesProps>(async () => (await import("./plan/Clashes.tsx")).Clashes);

function setRun(address: KitAddress, kits: number): void {
  const name = (from: unknown) => changeWords("Run", "kits", from, kits, "");
  editField(address, { row: { kind: "run" }, field: "kits", value: kits, name });
}

/** The line that names the edit, with the way back; where the run is no longer known, what it cost before. */
function noteOf(
  edit: LastEdit | null,
  before: TallyFigures | null,
  now: TallyFigures,
): TallyNote | undefined {
  if (!edit || !before) return undefined;
  const undo = { label: "Undo", run: undoEdit };
  if (before.costPerKit.known && !now.costPerKit.known)
    return {
      edit: edit.name,
      text: `At ${before.run} one kit cost ${moneyText(before.costPerKit.value, before.currency)}.`,
      actions: [before.run === now.run ? undo : { ...undo, label: `Go back to ${before.run}` }],
    };
  return {
    edit: edit.name,
    text: "Signed figures show the change.",
    actions: [undo, { label: "Keep, and clear the signs", run: keepEdit }],
  };
}

/** The strip of live answers of a kit's pages, and with it what every such page needs once. */
export function Tally({ workshop, kit, first, may, singleKeys = true }: TallyProps) {
  const address = { workshop, kit };
  const { held } = usePlan(address);
  const { sweep } = useSweep(held?.plan);
  const hasClashes = useStore(saving, NOTHING_SAVED).clashes.length > 0;
  const isThere = held !== undefined;
  useEffect(() => watchPage({ workshop, kit }), [workshop, kit]);
  useEffect(() => {
    if (isThere) takeUpEdits({ workshop, kit });
  }, [isThere, workshop, kit]);
  return (
    <>
      <LostConnection />
      <Strip
        address={address}
        held={held}
        first={first}
        fixed={!may.changeRun}
        sweetSpots={sweep?.sweetSpots.map(({ kits }) => kits) ?? []}
      />
      {held && hasClashes && (
        <Later part={Clashes} give={{ address, plan: held.plan }} what="Two values" rows={2} />
      )}
      <WorkingHost address={address} plan={held?.plan} />
      <KeyHelp on={singleKeys} />
    </>
  );
}

interface StripProps {
  address: KitAddress;
  held: KitPlan | undefined;
  first: TallyFigures;
  fixed: boolean;
  sweetSpots: readonly number[];
}

function Strip({ address, held, first, fixed, sweetSpots }: StripProps) {
  const edit = useStore(lastEdit, null);
  const opens = useOpens();
  const now = held ? tallyAt(held.plan) : first;
  const before = edit ? tallyAt(edit.before.plan) : null;
  const changes = before ? tallyChanges(before, now) : [];
  const said = useQuiet(spokenChange(now, changes), QUIET_MS);
  return (
    <TallyStrip
      run={now.run}
      onRun={(kits) => setRun(address, kits)}
      fixed={fixed}
      sweetSpots={sweetSpots}
      cells={tallyCells(now, {
        address,
        currency: now.currency,
        changes,
        opens: held ? opens : undefined,
      })}
      note={noteOf(edit, before, now)}
      announce={said}
    />
  );
}
