import { Figure } from "./Figure.tsx";
import type { TallyCell } from "./TallyStrip.tsx";

/** Underlined as links are; a dotted foot would promise a working. */
const FIGURE_LINK = "whitespace-nowrap decoration-2 underline-offset-4 hover:text-petrol";

/** The figure of a cell, or what stands in its place while it is not known. */
export function CellFigure({ cell, workingOut }: { cell: TallyCell; workingOut?: boolean }) {
  if (cell.value === null)
    return (
      <span className="block max-w-full overflow-hidden text-[1rem] leading-[1.9375rem] font-medium text-ellipsis whitespace-nowrap text-ink-2 tablet:text-[1.1875rem]">
        {cell.needsHref ? (
          <a href={cell.needsHref} className="text-ink-2">
            {cell.needs ?? "not known"}
          </a>
        ) : (
          (cell.needs ?? "not known")
        )}
      </span>
    );
  if (cell.href)
    return (
      <a href={cell.href} className={`type-tally ${FIGURE_LINK} ${workingOut ? "text-ink-2" : "text-ink"}`}>
        {cell.value}
      </a>
    );
  return (
    <span className="whitespace-nowrap">
      <Figure
        label={cell.label}
        value={cell.value}
        onOpen={cell.onOpen}
        open={cell.open}
        className={`type-tally ${workingOut ? "text-ink-2" : ""}`}
      />
      {cell.after && <span className="type-table ml-1.5 font-medium">{cell.after}</span>}
    </span>
  );
}
