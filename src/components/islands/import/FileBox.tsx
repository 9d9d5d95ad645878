import { countText } from "#src/components/amount-text.ts";
import { buttonLook } from "#src/components/button-look.ts";
import { dialectWords } from "#src/partslist/dialect-words.ts";
import type { FileView } from "#src/server/bring-in/view.ts";
import { SheetIcon } from "../parts/Icons.tsx";
import { type ImportPlace, importsPath } from "./import-place.ts";
import { Moment } from "./Moment.tsx";
import { sizeWords } from "./size-words.ts";

function counted(count: number, one: string, many: string): string {
  return `${countText(count)} ${count === 1 ? one : many}`;
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
          {measures}. {dialectWords(file.dialect)} Text in {file.encoding}.
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
