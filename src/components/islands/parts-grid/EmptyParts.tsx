import { type FormEvent, useRef, useState } from "react";
import { UploadBox } from "#src/components/islands/import/UploadBox.tsx";
import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import type { PricedPartsList } from "#src/server/present.ts";
import { newLineId } from "./new-line-id.ts";
import { type CellColumn, type DraftCells, lineFromCells } from "./read-cell.ts";
import { editAndTell } from "./use-parts-work.ts";

interface FirstField {
  column: CellColumn;
  label: string;
  example: string;
  className: string;
}

/** The first line as a row of fields, ready to type: with it the grid begins. */
function FirstLine({ address, list }: { address: KitAddress; list: PricedPartsList }) {
  const [cells, setCells] = useState<DraftCells>({});
  const [wrong, setWrong] = useState<string>();
  const form = useRef<HTMLFormElement>(null);
  const fields: FirstField[] = [
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
    if (read.ok) editAndTell(address, "First line added.", read.steps);
    else form.current?.querySelector<HTMLInputElement>("input[name=part]")?.focus();
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

/** A kit without parts: bring a list, or write the first line. */
export function EmptyParts({
  address,
  list,
  kits,
  canEdit,
}: {
  address: KitAddress;
  list: PricedPartsList | null;
  kits: number;
  canEdit: boolean;
}) {
  if (!canEdit) return null;
  return (
    <div className="flex flex-col gap-9">
      <UploadBox
        place={address}
        kits={kits}
        words={{
          title: "Drop a parts list here",
          what: "A bill of materials from your drawing program, or a spreadsheet.",
        }}
      />
      <Section title="Or write the first line" aside="the grid grows as you type; Enter adds the line">
        {list && <FirstLine address={address} list={list} />}
      </Section>
      <p>
        Want to look round first?{" "}
        <a href={`/workshops/${address.workshop}`}>Copy another kit as an example</a>, or{" "}
        <a href={kitPath(address, "/parts/bring-in")}>see what a list can look like</a>.
      </p>
    </div>
  );
}
