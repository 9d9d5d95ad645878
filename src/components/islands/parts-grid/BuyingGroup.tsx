import { SavedField } from "#src/components/islands/forms/SavedField.tsx";
import { CheckBox } from "#src/components/islands/parts/CheckBox.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import type { PartFields } from "#src/shapes/part.ts";
import type { PartChoice } from "#src/shapes/part-choice.ts";
import { CHEAPEST } from "./column-defs.ts";
import { FieldGroup } from "./FieldGroup.tsx";
import { amountOrNothing, percentOrNothing, percentWords, wholeOrNothing } from "./form-entries.ts";
import type { LineFormProps } from "./LineForm.tsx";
import { choiceOf, type Step } from "./steps.ts";

/** How the part of a line is bought in this kit, and what of it lies on the shelf. */
export function BuyingGroup({
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
    <FieldGroup title="Buying">
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
    </FieldGroup>
  );
}
