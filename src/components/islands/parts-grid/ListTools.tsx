import { CheckBox } from "#src/components/islands/parts/CheckBox.tsx";
import { FilterGroup } from "#src/components/islands/parts/FilterGroup.tsx";
import { SearchIcon } from "#src/components/islands/parts/Icons.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { useStore } from "#src/components/islands/plan/module-store.ts";
import { ColumnsMenu } from "./ColumnsMenu.tsx";
import type { LineFilter } from "./grid-rows.ts";
import { editorState, NOTHING_EDITED } from "./list-editor.ts";

export interface Looking {
  filter: LineFilter;
  find: string;
  grouped: boolean;
}

export interface ListToolsProps {
  looking: Looking;
  onLook: (change: Partial<Looking>) => void;
  counts: Readonly<Record<LineFilter, number>>;
  /** Letter of the revision that is worked on; `null` where there is none before it to compare with. */
  since: string | null;
  phone: boolean;
  money: boolean;
  /** Undo and redo; `null` for somebody who may not edit. */
  steps: { undo: () => void; redo: () => void } | null;
  /** For how many kits the prices stand, and what they leave out. */
  basis: string | null;
}

/** What stands above the list: find, filter, group, columns, undo. */
export function ListTools({ looking, onLook, counts, since, phone, money, steps, basis }: ListToolsProps) {
  const edited = useStore(editorState, NOTHING_EDITED);
  return (
    <div className="mb-3 flex flex-wrap items-center gap-3 print:hidden">
      <TextField
        label="Find a line"
        labelHidden
        type="search"
        sign={<SearchIcon />}
        placeholder="Find a designator, value or code"
        className="w-full tablet:w-[300px]"
        value={looking.find}
        onChange={({ currentTarget }) => onLook({ find: currentTarget.value })}
      />
      <FilterGroup
        label="Lines"
        value={looking.filter}
        onChoose={(value) => onLook({ filter: value as LineFilter })}
        choices={[
          { value: "all", label: "All", count: counts.all },
          { value: "to-settle", label: "To settle", count: counts["to-settle"] },
          ...(since ? [{ value: "changed", label: `Changed in rev ${since}`, count: counts.changed }] : []),
        ]}
      />
      {!phone && (
        <>
          <CheckBox
            label="Group by kind"
            checked={looking.grouped}
            onChange={({ currentTarget }) => onLook({ grouped: currentTarget.checked })}
          />
          <ColumnsMenu money={money} />
        </>
      )}
      {steps && !phone && (
        <span className="flex gap-4">
          <QuietButton onClick={steps.undo} disabled={edited.undo.length === 0}>
            Undo
          </QuietButton>
          <QuietButton onClick={steps.redo} disabled={edited.redo.length === 0}>
            Redo
          </QuietButton>
        </span>
      )}
      {basis && <p className="type-label ml-auto text-ink-2">{basis}</p>}
    </div>
  );
}
