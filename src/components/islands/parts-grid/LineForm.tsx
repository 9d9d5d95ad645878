import { type ReactNode, useId, useRef } from "react";
import { listed } from "#src/components/count-words.ts";
import { SavedField } from "#src/components/islands/forms/SavedField.tsx";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { CheckBox } from "#src/components/islands/parts/CheckBox.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { holdFocus, useModal } from "#src/components/islands/parts/held-focus.ts";
import { CLASS_WORDS, CLASSES_IN_ORDER, MARK_WORDS, MARKS_IN_ORDER } from "#src/components/part-words.ts";
import type { PricedPartsList } from "#src/server/present.ts";
import type { PartFields } from "#src/shapes/part.ts";
import type { PartChoice } from "#src/shapes/part-choice.ts";
import { CHEAPEST } from "./column-defs.ts";
import { lineName } from "./edit-words.ts";
import { amountOrNothing, percentOrNothing, percentWords, wholeOrNothing } from "./form-entries.ts";
import type { OfferChoice } from "./grid-context.ts";
import { type CellColumn, readCell } from "./read-cell.ts";
import { choiceOf, type Line, type Step } from "./steps.ts";
import type { PartsDeeds } from "./use-parts-work.ts";

const MARKS = MARKS_IN_ORDER.map((mark) => ({ value: mark, label: MARK_WORDS[mark] }));
const KINDS = CLASSES_IN_ORDER.map((kind) => ({
  value: CLASS_WORDS[kind].one,
  label: CLASS_WORDS[kind].one,
}));

export interface LineFormProps {
  list: PricedPartsList;
  line: Line;
  offers: readonly OfferChoice[];
  canEdit: boolean;
  canChoose: boolean;
  deeds: PartsDeeds;
  onClose: () => void;
}

/** All fields of one line, in a sheet at the right; on a phone over the page. Each is saved when it is left. */
export function LineForm(props: LineFormProps) {
  const { list, line, canEdit, deeds, onClose } = props;
  const titleId = useId();
  const closeKey = useRef<HTMLButtonElement>(null);
  const box = useModal(true, closeKey);
  const name = lineName(line);

  const cell = (column: CellColumn) => (text: string) => {
    const read = readCell(list, line, column, text);
    if (!read.ok) return read.message;
    deeds.take(`${name} changed.`, read.steps);
    return null;
  };
  const place = list.lines.indexOf(line) + 1;
  return (
    <dialog
      ref={box}
      aria-labelledby={titleId}
      onKeyDown={holdFocus}
      onCancel={(cancel) => {
        cancel.preventDefault();
        onClose();
      }}
      className="mt-auto mr-0 mb-0 ml-auto h-[calc(100dvh-60px)] max-h-none w-full max-w-none border-t-2 border-ink bg-paper text-ink tablet:my-0 tablet:h-dvh tablet:w-[588px] tablet:border-t-0 tablet:border-l-2"
    >
      <div className="flex min-h-full flex-col gap-6 px-4 py-4 tablet:px-7 tablet:py-6">
        <div className="flex items-start justify-between gap-4">
          <h2 id={titleId} className="type-h2">
            Line {place}: {name}
          </h2>
          <Button ref={closeKey} size="small" onClick={onClose}>
            Close
          </Button>
        </div>
        <Group title="In this kit">
          <SavedField
            label="Designators"
            value={line.designators}
            save={cell("designators")}
            off={!canEdit}
          />
          {list.editions.map((edition) => (
            <SavedField
              key={edition.id}
              label={list.editions.length === 1 ? "Quantity" : `Quantity, ${edition.name}`}
              value={String(line.quantities[edition.id] ?? 0)}
              save={cell(`quantity:${edition.id}`)}
              off={!canEdit}
              inputMode="numeric"
            />
          ))}
          <ChoiceField
            label="Mark"
            choices={MARKS}
            value={line.mark}
            disabled={!canEdit}
            onChange={({ currentTarget }) => cell("mark")(currentTarget.value)}
          />
          <SavedField label="Note" value={line.note} save={cell("note")} off={!canEdit} />
        </Group>
        <PartGroup {...props} cell={cell} name={name} />
        <BuyingGroup {...props} name={name} />
        {canEdit && (
          <div className="mt-auto pt-2">
            <Button
              kind="refuse"
              onClick={() => {
                onClose();
                deeds.remove([line.id]);
              }}
            >
              Remove this line
            </Button>
          </div>
        )}
      </div>
    </dialog>
  );
}

function Group({ title, children, note }: { title: string; children: ReactNode; note?: ReactNode }) {
  return (
    <section className="rule-section pt-2.5">
      <h3 className="type-h3 mb-2">{title}</h3>
      {note && <p className="type-note mb-3 text-ink-2">{note}</p>}
      <div className="grid grid-cols-1 gap-x-5 gap-y-4 tablet:grid-cols-2">{children}</div>
    </section>
  );
}

type Cell = (column: CellColumn) => (text: string) => string | null;

function PartGroup({ list, line, canEdit, deeds, cell, name }: LineFormProps & { cell: Cell; name: string }) {
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
    <Group
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
    </Group>
  );
}

function BuyingGroup({
  list,
  line,
  offers,
  canEdit,
  canChoose,
  deeds,
  name,
}: LineFormProps & { name: string }) {
  const { part } = line;
  const choice = choiceOf(list, part.id);
  const choose = (set: PartChoice) => {
    const steps: Step[] = [{ do: "choose", part: part.id, set }];
    deeds.take(`${name}: buying changed.`, steps);
    return null;
  };
  const percent = (field: "spareRate" | "keepShare", most: number) => (entry: string) => {
    const read = percentOrNothing(entry, most);
    return read.ok ? choose({ [field]: read.value }) : read.message;
  };
  const pieces = (entry: string, take: (value: number) => string | null) => {
    const read = wholeOrNothing(entry);
    return read.ok ? take(read.value ?? 0) : read.message;
  };
  const setPart = (set: PartFields) => {
    deeds.take(`${name}: shelf changed.`, [{ do: "change-part", part: part.id, set }]);
    return null;
  };
  const cost = (entry: string) => {
    const read = amountOrNothing(entry, "Write an amount such as 0.062.");
    return read.ok ? setPart({ stockCost: read.value }) : read.message;
  };
  return (
    <Group title="Buying">
      <ChoiceField
        label="Offer"
        choices={[
          { value: CHEAPEST, label: "The cheapest" },
          ...offers.map(({ id, words }) => ({ value: id, label: words })),
        ]}
        value={choice.pinnedOfferId ?? CHEAPEST}
        disabled={!canChoose}
        onChange={({ currentTarget: { value } }) =>
          choose({ pinnedOfferId: value === CHEAPEST ? null : value })
        }
      />
      <CheckBox
        label="Only what the supplier shows in stock"
        className="self-end"
        checked={choice.onlyFromStock}
        disabled={!canChoose}
        onChange={({ currentTarget }) => choose({ onlyFromStock: currentTarget.checked })}
      />
      <SavedField
        label="Spare in %"
        value={percentWords(choice.spareRate)}
        save={percent("spareRate", 999)}
        off={!canChoose}
        inputMode="decimal"
        hint="Empty takes the run’s own."
      />
      <SavedField
        label="Least spare"
        value={String(choice.leastSpare)}
        save={(entry) => pieces(entry, (leastSpare) => choose({ leastSpare }))}
        off={!canChoose}
        inputMode="numeric"
        hint="Pieces over, whatever the run."
      />
      <SavedField
        label="Keeps its value in %"
        value={percentWords(choice.keepShare)}
        save={percent("keepShare", 100)}
        off={!canChoose}
        inputMode="decimal"
        hint="Of what is left over. Empty: all where another kit uses the part, else nothing."
      />
      <SavedField
        label="On the shelf"
        value={String(part.freeStock)}
        save={(entry) => pieces(entry, (freeStock) => setPart({ freeStock }))}
        off={!canEdit}
        inputMode="numeric"
        hint="Pieces not promised elsewhere."
      />
      <SavedField
        label="What one on the shelf cost"
        value={part.stockCost ?? ""}
        save={cost}
        off={!canEdit}
        inputMode="decimal"
      />
    </Group>
  );
}
