import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { noteEdit } from "./edit-log.ts";
import { fieldsNow, type PlanRow } from "./plan-rows.ts";
import { editRow, heldPlan } from "./save-edits.ts";

/** One field of one row, with the words for the note line: `(from) => "Run changed from 100 to 120."` */
export interface FieldEdit {
  row: PlanRow;
  field: string;
  value: unknown;
  name: (from: unknown) => string;
}

/** Changes one field: on this screen and in its figures at once, on the server soon, with a way back. */
export function editField(address: KitAddress, { row, field, value, name }: FieldEdit): void {
  const before = heldPlan(address);
  if (!before) return;
  const from = fieldsNow(before, row, [field])[field];
  if (JSON.stringify(from) === JSON.stringify(value)) return;
  editRow(address, row, { [field]: value });
  noteEdit({
    before,
    from,
    at: Date.now(),
    field: `${row.kind} ${"id" in row ? row.id : ""} ${field}`,
    nameFrom: name,
    undo: () => editRow(address, row, { [field]: from }),
  });
}
