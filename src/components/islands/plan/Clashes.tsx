import { clockTime } from "#src/components/clock-time.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { ConflictBox } from "#src/components/islands/parts/ConflictBox.tsx";
import type { Plan } from "#src/shapes/plan.ts";
import { fieldName, fieldValue } from "./field-words.ts";
import { useStore } from "./module-store.ts";
import type { PlanRow } from "./plan-rows.ts";
import { settleClash } from "./save-edits.ts";
import { type Clash, NOTHING_SAVED, saving } from "./saving.ts";

export interface ClashesProps {
  address: KitAddress;
  plan: Plan;
}

function thing(plan: Plan, row: PlanRow): string | undefined {
  if (!("id" in row)) return undefined;
  const rows = [...plan.editions, ...plan.work.tasks, ...plan.packing, ...plan.charges, ...plan.channels];
  return rows.find(({ id }) => id === row.id)?.name;
}

function happened({ by, at, row, field }: Clash, plan: Plan): string {
  const named = fieldName(row, field, thing(plan, row));
  const who = by ?? "Somebody";
  return `${who} changed ${named.charAt(0).toLowerCase()}${named.slice(1)}${at === null ? "" : ` at ${clockTime(at)}`}.`;
}

/** Fields that two people changed: both values, to choose one. */
export function Clashes({ address, plan }: ClashesProps) {
  const { clashes } = useStore(saving, NOTHING_SAVED);
  return clashes.map((clash) => (
    <ConflictBox
      key={`${clash.row.kind} ${"id" in clash.row ? clash.row.id : ""} ${clash.field}`}
      happened={happened(clash, plan)}
      yours={fieldValue(clash.field, clash.yours, plan.currency)}
      theirs={fieldValue(clash.field, clash.theirs, plan.currency)}
      theirWord={clash.by ? `${clash.by}’s` : "Theirs"}
      onKeepYours={() => settleClash(address, clash, "yours")}
      onTakeTheirs={() => settleClash(address, clash, "theirs")}
    />
  ));
}
