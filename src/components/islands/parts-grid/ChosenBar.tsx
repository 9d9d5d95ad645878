import { type FormEvent, useState } from "react";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { CLASS_WORDS, CLASSES_IN_ORDER, MARK_WORDS, MARKS_IN_ORDER } from "#src/components/part-words.ts";
import type { LineMark, PartClass } from "#src/shapes/limits.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { CHEAPEST } from "./column-defs.ts";
import { equalLines, joinLines } from "./join-lines.ts";
import type { Line, Step } from "./steps.ts";
import type { PartsDeeds } from "./use-parts-work.ts";

const NONE = { value: "", label: "Choose" };
const MARKS = [NONE, ...MARKS_IN_ORDER.map((mark) => ({ value: mark, label: MARK_WORDS[mark] }))];
const KINDS = [NONE, ...CLASSES_IN_ORDER.map((kind) => ({ value: kind, label: CLASS_WORDS[kind].one }))];

/** Suppliers that offer one of the chosen parts, each with how many of them. */
function suppliersOf(plan: Plan | null, lines: readonly Line[]): { value: string; label: string }[] {
  const ids = new Set(lines.map(({ part }) => part.id));
  const parts = plan?.parts.filter(({ id }) => ids.has(id)) ?? [];
  const sell = (supplier: string) =>
    parts.filter(({ offers }) => offers.some((one) => one.supplier === supplier));
  return (plan?.suppliers ?? [])
    .filter(({ id }) => sell(id).length > 0)
    .map(({ id, name }) => ({ value: id, label: `${name} (${sell(id).length} of ${parts.length})` }));
}

/** Pins every chosen part to a supplier's offer where it has one; or frees all for the cheapest. */
function pinSteps(plan: Plan, lines: readonly Line[], supplier: string): Step[] {
  const ids = [...new Set(lines.map(({ part }) => part.id))];
  return ids.flatMap((id): Step[] => {
    if (supplier === CHEAPEST) return [{ do: "choose", part: id, set: { pinnedOfferId: null } }];
    const offer = plan.parts.find((part) => part.id === id)?.offers.find((one) => one.supplier === supplier);
    return offer ? [{ do: "choose", part: id, set: { pinnedOfferId: offer.id } }] : [];
  });
}

export interface ChosenBarProps {
  lines: readonly Line[];
  plan: Plan | null;
  deeds: PartsDeeds;
  onDone: () => void;
}

/** What can be done to all chosen lines at once. */
export function ChosenBar({ lines, plan, deeds, onDone }: ChosenBarProps) {
  const [drawer, setDrawer] = useState("");
  const count = lines.length === 1 ? "1 line" : `${lines.length} lines`;
  const suppliers = suppliersOf(plan, lines);
  const joinable = equalLines({ lines: [...lines] }).flatMap(joinLines);
  const parts = [...new Set(lines.map(({ part }) => part.id))];

  function setDrawers(submit: FormEvent) {
    submit.preventDefault();
    deeds.take(
      `Drawer ${drawer.trim()} for ${count}.`,
      parts.map((part): Step => ({ do: "change-part", part, set: { drawer: drawer.trim() } })),
    );
    setDrawer("");
  }

  return (
    <section
      aria-label="Chosen lines"
      className="mb-3 flex flex-wrap items-end gap-x-4 gap-y-3 border-[1.5px] border-ink bg-sheet px-4 py-3"
    >
      <p role="status" className="type-table w-full font-semibold">
        {count} chosen
      </p>
      <ChoiceField
        label="Mark"
        row
        className="w-40"
        choices={MARKS}
        value=""
        onChange={({ currentTarget }) => {
          const mark = currentTarget.value as LineMark;
          if (mark)
            deeds.take(
              `${count} marked: ${MARK_WORDS[mark].toLowerCase()}.`,
              lines.map(({ id }): Step => ({ do: "change-line", line: id, set: { mark } })),
            );
        }}
      />
      <ChoiceField
        label="Kind"
        row
        className="w-48"
        choices={KINDS}
        value=""
        onChange={({ currentTarget }) => {
          const kind = currentTarget.value as PartClass;
          if (kind)
            deeds.take(
              `${count}: kind set.`,
              parts.map((part): Step => ({ do: "change-part", part, set: { class: kind } })),
            );
        }}
      />
      <form onSubmit={setDrawers} className="flex items-end gap-2">
        <TextField
          label="Drawer"
          row
          className="w-24"
          value={drawer}
          onChange={({ currentTarget }) => setDrawer(currentTarget.value)}
        />
        <Button type="submit" size="row">
          Set
        </Button>
      </form>
      {plan && suppliers.length > 0 && (
        <ChoiceField
          label="Buy from"
          row
          className="w-56"
          choices={[NONE, { value: CHEAPEST, label: "The cheapest" }, ...suppliers]}
          value=""
          onChange={({ currentTarget }) => {
            const supplier = currentTarget.value;
            if (supplier) deeds.take(`${count}: offers chosen.`, pinSteps(plan, lines, supplier));
          }}
        />
      )}
      <div className="ml-auto flex flex-wrap items-center gap-4">
        {joinable.length > 0 && (
          <Button
            size="row"
            onClick={() => {
              deeds.take("Equal lines joined.", joinable);
              onDone();
            }}
          >
            Join equal lines
          </Button>
        )}
        <Button
          size="row"
          kind="refuse"
          onClick={() => {
            deeds.remove(lines.map(({ id }) => id));
            onDone();
          }}
        >
          Remove {count}
        </Button>
        <QuietButton onClick={onDone}>Choose none</QuietButton>
      </div>
    </section>
  );
}
