import { type FormEvent, useRef, useState } from "react";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import type { PricedPartsList } from "#src/server/present.ts";
import { newLineId } from "./new-line-id.ts";
import { type CellColumn, type DraftCells, lineFromCells } from "./read-cell.ts";
import { editAndTell } from "./use-parts-work.ts";

interface EntryField {
  column: CellColumn;
  label: string;
  example: string;
  className: string;
}

export interface LineEntryProps {
  address: KitAddress;
  list: PricedPartsList;
  onAdded?: () => void;
}

/** A new line as a row of fields, ready to type; on a phone below each other. */
export function LineEntry({ address, list, onAdded }: LineEntryProps) {
  const [cells, setCells] = useState<DraftCells>({});
  const [wrong, setWrong] = useState<string>();
  const form = useRef<HTMLFormElement>(null);
  const fields: EntryField[] = [
    { column: "designators", label: "Designators", example: "R1, R2", className: "tablet:w-[170px]" },
    { column: `quantity:${list.editions[0]?.id}`, label: "Qty", example: "2", className: "tablet:w-[84px]" },
    { column: "part", label: "Part", example: "10 kΩ, 5 %, 0.25 W", className: "grow" },
    { column: "package", label: "Body and holes", example: "axial, 10 mm", className: "tablet:w-[220px]" },
    { column: "drawer", label: "Drawer", example: "A1", className: "tablet:w-[112px]" },
  ];

  function add(submit: FormEvent) {
    submit.preventDefault();
    const first = cells[`quantity:${list.editions[0]?.id}`];
    const everywhere = Object.fromEntries(list.editions.map(({ id }) => [`quantity:${id}`, first ?? ""]));
    const read = lineFromCells(list, newLineId(), { ...cells, ...everywhere });
    setWrong(read.ok ? undefined : read.message);
    if (read.ok) {
      editAndTell(address, `${cells.designators?.trim() || cells.part?.trim()} added.`, read.steps);
      setCells({});
      onAdded?.();
    } else form.current?.querySelector<HTMLInputElement>("input[name=part]")?.focus();
  }

  return (
    <form ref={form} onSubmit={add}>
      <div className="hairline-b flex gap-2 pb-3 max-tablet:flex-col tablet:items-start">
        {fields.map(({ column, label, example, className }) => (
          <TextField
            key={column}
            label={label}
            row
            name={column}
            className={className}
            placeholder={example}
            autoComplete="off"
            wrong={column === "part" ? wrong : undefined}
            value={cells[column] ?? ""}
            onChange={({ currentTarget }) => setCells({ ...cells, [column]: currentTarget.value })}
          />
        ))}
      </div>
      <Button type="submit" className="mt-3">
        Add the line
      </Button>
    </form>
  );
}
