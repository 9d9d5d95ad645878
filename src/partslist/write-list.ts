export interface WriteOptions {
  delimiter?: "," | ";" | "\t";
  /** A byte-order mark lets older spreadsheets see that the file is UTF-8. */
  byteOrderMark?: boolean;
}

/**
 * First characters that make a spreadsheet take a cell as a formula or command. OWASP, "CSV Injection"
 * (2023): = + - @ tab and carriage return, also in full width.
 */
const HARMFUL = /^[=+\-@\t\r\n＝＋－＠]/;
const NUMBER = /^[+-]?\d+(?:\.\d+)?$/;

/**
 * A cell a spreadsheet shows and does not run: one that begins with = + - @ tab or a line break is led by
 * an apostrophe. Plain numbers stay numbers ("-5" is no formula).
 */
export function safeCell(text: string): string {
  return HARMFUL.test(text) && !NUMBER.test(text) ? `'${text}` : text;
}

/** Takes back the apostrophe of `safeCell`, for reading our own files again. */
export function unsafeCell(text: string): string {
  return text.startsWith("'") && HARMFUL.test(text.slice(1)) ? text.slice(1) : text;
}

/**
 * Rows to CSV after RFC 4180, section 2: CRLF line ends, a cell with a delimiter, quote or line break in
 * quotes, quotes doubled. Blanks at the ends of a cell are kept by quotes as well.
 */
export function writeList(rows: readonly (readonly string[])[], options: WriteOptions = {}): string {
  const { delimiter = ",", byteOrderMark = false } = options;
  const special = new RegExp(`["\\r\\n${delimiter === "\t" ? "\\t" : delimiter}]|^\\s|\\s$`);
  const cell = (text: string): string => {
    const safe = safeCell(text);
    return special.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
  };
  const lines = rows.map((row) => (row.length === 1 && row[0] === "" ? '""' : row.map(cell).join(delimiter)));
  return `${byteOrderMark ? "\uFEFF" : ""}${lines.map((line) => `${line}\r\n`).join("")}`;
}
