import { createHash } from "node:crypto";
import { type ImportKind, NAME_LENGTH, UPLOAD_COLUMNS, UPLOAD_ROWS } from "#src/shapes/limits.ts";
import { decodeUpload } from "../decode-upload.ts";
import { newId } from "../new-id.ts";
import type { Changing } from "../note-change.ts";
import { Problem } from "../problem.ts";
import { addImport, type ImportPlace, type NewImport } from "../store/import.ts";
import { type ListShape, NO_DECISIONS } from "./list-draft.ts";
import { readAside } from "./read-aside.ts";
import { readWorkbookAside } from "./workbook-aside.ts";

export const PASTED_NAME = "Pasted cells";

/** The name of an uploaded file, from the header it travels in. */
export function uploadName(request: Request): string {
  const written = request.headers.get("x-file-name") ?? "";
  const name = decoded(written)
    .replace(/^.*[/\\]/, "")
    .trim();
  return (name || "List without a name").slice(0, NAME_LENGTH);
}

function decoded(text: string): string {
  try {
    return decodeURIComponent(text);
  } catch {
    return text;
  }
}

function tooLong(name: string, found: number, what: string, most: number): Problem {
  return new Problem("upload-too-long", { parameters: { name, found, what, most } });
}

/** Refuses what is no list, or more than can be read. */
async function shapeOf(kind: ImportKind, name: string, text: string): Promise<ListShape> {
  // Signs alone, such as the commas of empty cells, are no row.
  if (!/[\p{L}\p{N}]/u.test(text)) throw new Problem("upload-empty", { parameters: { name } });
  const shape = await readAside("shape", { kind, text }, text.split("\n", UPLOAD_ROWS).length);
  if (shape.rows > UPLOAD_ROWS) throw tooLong(name, shape.rows, "rows", UPLOAD_ROWS);
  if (shape.columns > UPLOAD_COLUMNS) throw tooLong(name, shape.columns, "columns", UPLOAD_COLUMNS);
  return shape;
}

type UploadedText = Pick<NewImport, "content" | "encoding" | "sheets">;

/** The text of an upload, or the cells of its first sheet with something in it. */
async function readUpload(name: string, bytes: Uint8Array): Promise<UploadedText> {
  const decodedList = decodeUpload(bytes);
  if (decodedList.ok) return { content: decodedList.text, encoding: decodedList.encoding };
  if (decodedList.code === "upload-too-large")
    throw new Problem("too-large", { parameters: { limit: "5 MB" } });
  if (decodedList.code !== "upload-archive") throw new Problem(decodedList.code, { parameters: { name } });
  const book = await readWorkbookAside(bytes);
  if (!book.ok) throw new Problem(book.code, { parameters: { name, most: "50 MB" } });
  return { content: book.text, encoding: book.kind, sheets: { taken: book.taken, others: book.others } };
}

/**
 * Begins to bring in a list: its bytes are decoded and kept as a draft; nothing else is changed.
 *
 * @throws Problem upload-… for what is neither a list in plain text nor a workbook, or has more rows or columns than can be read.
 */
export async function beginDraft(
  { db, now, user, workshop }: Changing,
  place: Pick<ImportPlace, "kind" | "kitId">,
  name: string,
  bytes: Uint8Array,
): Promise<{ id: string }> {
  const list = await readUpload(name, bytes);
  const { rows, fingerprint } = await shapeOf(place.kind, name, list.content);
  const id = newId();
  addImport(db, {
    id,
    workshopId: workshop.id,
    ...place,
    state: "draft",
    fileName: name,
    byteLength: bytes.byteLength,
    ...list,
    contentHash: createHash("sha256").update(bytes).digest("hex"),
    rowCount: rows,
    fingerprint,
    answers: NO_DECISIONS,
    createdBy: user.id,
    createdAt: now,
  });
  return { id };
}
