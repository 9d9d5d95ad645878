import { useId, useRef } from "react";
import { SavedField } from "#src/components/islands/forms/SavedField.tsx";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { holdFocus, useModal } from "#src/components/islands/parts/held-focus.ts";
import { MARK_WORDS, MARKS_IN_ORDER } from "#src/components/part-words.ts";
import type { PricedPartsList } from "#src/server/present.ts";
import { BuyingGroup } from "./BuyingGroup.tsx";
import { lineName } from "./edit-words.ts";
import { FieldGroup } from "./FieldGroup.tsx";
import type { OfferChoice } from "./grid-context.ts";
import { PartGroup, type TakeCell } from "./PartGroup.tsx";
import { readCell } from "./read-cell.ts";
import type { Line } from "./steps.ts";
import type { PartsDeeds } from "./use-parts-work.ts";

const MARKS = MARKS_IN_ORDER.map((mark) => ({ value: mark, label: MARK_WORDS[mark] }));

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

  const cell: TakeCell = (column) => (text) => {
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
        <FieldGroup title="In this kit">
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
        </FieldGroup>
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
