import { listed } from "#src/components/count-words.ts";
import { SavedField } from "#src/components/islands/forms/SavedField.tsx";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { CLASS_WORDS, CLASSES_IN_ORDER } from "#src/components/part-words.ts";
import type { PartFields } from "#src/shapes/part.ts";
import { lineName } from "./edit-words.ts";
import { FieldGroup } from "./FieldGroup.tsx";
import { amountOrNothing } from "./form-entries.ts";
import type { LineFormProps } from "./LineForm.tsx";
import type { CellColumn } from "./read-cell.ts";

const KINDS = CLASSES_IN_ORDER.map((kind) => ({
  value: CLASS_WORDS[kind].one,
  label: CLASS_WORDS[kind].one,
}));

/** Takes what was written for a column of the line, or says what is wrong with it. */
export type TakeCell = (column: CellColumn) => (text: string) => string | null;

/** What the part of a line is: shared with the other lines and kits that use it. */
export function PartGroup({
  list,
  line,
  canEdit,
  deeds,
  cell,
  name,
}: LineFormProps & { cell: TakeCell; name: string }) {
  const { part } = line;
  const others = list.lines.filter((one) => one !== line && one.part.id === part.id).map(lineName);
  const users = listed([...others, ...part.alsoIn]);
  const set = (fields: PartFields) => {
    deeds.take(`${name} changed.`, [{ do: "change-part", part: part.id, set: fields }]);
    return null;
  };
  const text = (field: keyof PartFields) => (entry: string) => set({ [field]: entry.trim() });
  const property = (field: "tolerance" | "power" | "voltage") => (entry: string) =>
    set({ [field]: entry.trim() === "" ? null : entry.trim() });
  const spacing = (entry: string) => {
    const read = amountOrNothing(entry, "Write millimetres such as 5.08.");
    return read.ok ? set({ holeSpacing: read.value }) : read.message;
  };
  return (
    <FieldGroup
      title="The part"
      note={
        users !== "" && (
          <>
            {users} use{others.length + part.alsoIn.length === 1 ? "s" : ""} this part too. Another part, body
            or maker’s number is for this line only; all else changes there as well.
          </>
        )
      }
    >
      <SavedField
        label="Part"
        value={part.spec === "" ? part.name : `${part.name}, ${part.spec}`}
        save={cell("part")}
        off={!canEdit}
        hint="What it is called, then the rest after a comma."
      />
      <ChoiceField
        label="Kind"
        choices={KINDS}
        value={CLASS_WORDS[part.class].one}
        disabled={!canEdit}
        onChange={({ currentTarget }) => cell("class")(currentTarget.value)}
      />
      <SavedField label="Body and holes" value={part.package} save={cell("package")} off={!canEdit} />
      <SavedField
        label="Hole spacing in mm"
        value={part.holeSpacing ?? ""}
        save={spacing}
        off={!canEdit}
        inputMode="decimal"
      />
      <SavedField
        label="Tolerance"
        value={part.tolerance ?? ""}
        save={property("tolerance")}
        off={!canEdit}
      />
      <SavedField label="Power" value={part.power ?? ""} save={property("power")} off={!canEdit} />
      <SavedField label="Voltage" value={part.voltage ?? ""} save={property("voltage")} off={!canEdit} />
      <SavedField label="Drawer" value={part.drawer} save={cell("drawer")} off={!canEdit} />
      <SavedField label="Maker" value={part.manufacturer} save={text("manufacturer")} off={!canEdit} />
      <SavedField
        label="Maker’s part number"
        value={part.manufacturerPartNumber}
        save={cell("partNumber")}
        off={!canEdit}
      />
      <SavedField
        label="Datasheet"
        value={part.datasheet}
        save={text("datasheet")}
        off={!canEdit}
        hint={
          /^https?:\/\//.test(part.datasheet) && (
            <a href={part.datasheet} rel="noreferrer">
              Open the datasheet
            </a>
          )
        }
      />
      <SavedField label="Note on the part" value={part.note} save={text("note")} off={!canEdit} />
      {canEdit && users !== "" && (
        <div className="col-span-full">
          <Button
            size="row"
            onClick={() =>
              deeds.take(`${name} has a part of its own.`, [{ do: "own-part", line: line.id, set: {} }])
            }
          >
            Give this line a part of its own
          </Button>
          <p className="type-label mt-1 text-ink-2">It begins without offers.</p>
        </div>
      )}
    </FieldGroup>
  );
}
