import { countText } from "#src/components/amount-text.ts";
import { buttonLook } from "#src/components/button-look.ts";
import { listed } from "#src/components/count-words.ts";
import { dialectWords } from "#src/partslist/dialect-words.ts";
import type { FileView } from "#src/server/bring-in/view.ts";
import { SheetIcon } from "../parts/Icons.tsx";
import { type ImportPlace, importsPath } from "./import-place.ts";
import { Moment } from "./Moment.tsx";
import { sizeWords } from "./size-words.ts";

function counted(count: number, one: string, many: string): string {
  return `${countText(count)} ${count === 1 ? one : many}`;
}

/** "Read from the sheet “List”, the first of 3 that hold something; “Notes” and “Old” were not read." */
function sheetWords({ taken, others }: NonNullable<FileView["sheets"]>): string {
  if (others.length === 0) return `Read from the sheet “${taken}”, each number with all of its digits.`;
  const names = listed(others.map((name) => `“${name}”`));
  return `Read from the sheet “${taken}”, the first of ${others.length + 1} that hold something. ${names} ${others.length === 1 ? "was" : "were"} not read: copy the cells and paste them to bring them in.`;
}

/** Which file it is, and how its text was understood. */
export function FileBox({ place, file }: { place: ImportPlace; file: FileView }) {
  const measures = [
    counted(file.rows, "row", "rows"),
    counted(file.columns, "column", "columns"),
    sizeWords(file.bytes),
  ].join(", ");
  return (
    <section
      id="file"
      aria-label="The file"
      className="mb-9 flex items-center gap-x-5 gap-y-3 rounded-control border-[1.5px] border-rule-2 bg-sheet px-5 py-4 max-tablet:flex-col max-tablet:items-start"
    >
      <SheetIcon className="size-10 max-tablet:hidden" />
      <div className="min-w-0 grow">
        <h2 className="type-h3 break-words">{file.name}</h2>
        <p className="text-ink-2">
          {measures}. {file.sheets ? sheetWords(file.sheets) : dialectWords(file.dialect)}
          {!file.sheets && ` Text in ${file.encoding}.`}
        </p>
        {file.sameAs && (
          <p className="mt-1">
            <b>This is the same list as {file.sameAs.name}</b>
            {file.sameAs.takenAt !== null && (
              <>
                , brought in on <Moment at={file.sameAs.takenAt} />
              </>
            )}
            .
          </p>
        )}
      </div>
      <a href={importsPath(place)} className={`${buttonLook("secondary", "small")} shrink-0`}>
        Choose another file
      </a>
    </section>
  );
}
