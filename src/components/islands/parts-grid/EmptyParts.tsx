import { UploadBox } from "#src/components/islands/import/UploadBox.tsx";
import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";
import type { PricedPartsList } from "#src/server/present.ts";
import { LineEntry } from "./LineEntry.tsx";

/** A kit without parts: bring a list, or write the first line. */
export function EmptyParts({
  address,
  list,
  kits,
  canEdit,
  example,
}: {
  address: KitAddress;
  list: PricedPartsList | null;
  kits: number;
  canEdit: boolean;
  /** Another kit of the workshop that has a list. */
  example: { id: string; name: string } | null;
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
        {list && <LineEntry address={address} list={list} />}
      </Section>
      <p>
        Want to look round first?{" "}
        {example && (
          <>
            <a href={kitPath({ ...address, kit: example.id }, "/details#copy")}>
              Copy {example.name} as an example kit
            </a>
            , or{" "}
          </>
        )}
        <a href={kitPath(address, "/parts/bring-in")}>see what a list can look like</a>.
      </p>
    </div>
  );
}
