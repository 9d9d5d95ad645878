/** A line of a frame: +-----+, |---|---|, ├──┼──┤, ===== =====. */
const FRAME = /^[\s+\-=_|:─━═│┃║┌┐└┘├┤┬┴┼╔╗╚╝╠╣╦╩╬╒╕╘╛╞╡╤╧╪╓╖╙╜╟╢╥╨╫]+$/;
const EDGE = /^\s*[|│┃║]/;
const PARTING = /[|│┃║]/;

export function isFrameLine(line: string): boolean {
  return FRAME.test(line) && /[-=_─━═]{2}/.test(line);
}

/**
 * A table drawn with lines, as in a README or a terminal: the cells between the uprights. Where each row
 * stands between two rules, the lines of a row are joined. `null` if the text is not drawn.
 */
export function drawnTable(text: string): { rows: string[][]; lines: number[] } | null {
  const lines = text.split(/\r?\n|\r/);
  const filled = lines.filter((line) => line.trim() !== "");
  const edged = filled.filter((line) => EDGE.test(line) || isFrameLine(line));
  if (edged.length < 3 || edged.length < filled.length * 0.6 || !filled.some(isFrameLine)) return null;
  const content = edged.filter((line) => !isFrameLine(line));
  if (content.length < 2) return null;
  const ruled = edged.length - content.length > content.length * 0.4 && edged.length - content.length > 3;
  return ruled ? joinBetweenRules(lines) : { rows: lines.map(drawnCells), lines: lines.map((_, i) => i) };
}

function drawnCells(line: string): string[] {
  if (isFrameLine(line) || !EDGE.test(line)) return [line];
  const parts = line.trim().split(PARTING).slice(1);
  if (parts.at(-1)?.trim() === "") parts.pop();
  return parts.map((part) => part.trim());
}

function joinBetweenRules(lines: readonly string[]): { rows: string[][]; lines: number[] } {
  const rows: string[][] = [];
  const starts: number[] = [];
  let open = false;
  lines.forEach((line, at) => {
    const inside = EDGE.test(line) && !isFrameLine(line);
    const last = rows.at(-1);
    if (inside && open && last) {
      drawnCells(line).forEach((cell, column) => {
        last[column] = [last[column] ?? "", cell].filter((text) => text !== "").join(" ");
      });
    } else {
      rows.push(drawnCells(line));
      starts.push(at);
    }
    open = inside;
  });
  return { rows, lines: starts };
}
