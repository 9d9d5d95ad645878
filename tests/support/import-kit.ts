import { editions } from "#db/schema/kits.ts";
import { POST as TAKE } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import]/take.ts";
import { POST as TAKE_BACK } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import]/take-back.ts";
import {
  DELETE as DROP,
  PATCH as EDIT,
  GET as LOOK,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import].ts";
import { GET as LIST, POST as UPLOAD } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports.ts";
import type { PartsImportView } from "#src/server/parts-import.ts";
import type { KitRow } from "#src/server/store/kit.ts";
import { lineQuantitiesOf, linesOf } from "#src/server/store/line.ts";
import type { WorkshopRow } from "#src/server/store/membership.ts";
import { offersOf } from "#src/server/store/offer.ts";
import { suppliersOf } from "#src/server/store/supplier.ts";
import type { DraftEdit } from "#src/shapes/import.ts";
import type { App, TestPerson } from "./app.ts";
import { call } from "./app.ts";

/** A kit with two editions and nothing in its list, and its calls for bringing in lists. */
export function importKit(app: App) {
  const workshop = app.workshop();
  const as = app.person("designer", workshop);
  const kit = app.kit(workshop);
  const edition = (name: string, position: number) => ({
    id: `${name}-${kit.id}`,
    workshopId: workshop.id,
    kitId: kit.id,
    name,
    position,
    weight: 1,
    boardsPerKit: 1,
  });
  app.db
    .insert(editions)
    .values([edition("full", 0), edition("bare", 1)])
    .run();
  return { workshop, as, kit, ...importCalls(app, as, workshop, kit) };
}

/** The calls of one person for one kit's lists. */
export function importCalls(app: App, as: TestPerson, workshop: WorkshopRow, kit: KitRow) {
  const params = { workshop: workshop.id, kit: kit.id };
  const at = (id: string) => ({ ...params, import: id });
  const upload = (content: string | Uint8Array, name = "list.csv") =>
    call(UPLOAD, {
      as,
      params,
      bytes: { content, type: "application/octet-stream" },
      headers: { "x-file-name": encodeURIComponent(name) },
    });
  const look = (id: string) => call(LOOK, { as, params: at(id), method: "GET" });
  const edit = (id: string, body: DraftEdit) => call(EDIT, { as, params: at(id), body, method: "PATCH" });
  const take = (id: string, view: Pick<PartsImportView, "file" | "seen">) =>
    call(TAKE, { as, params: at(id), body: { version: view.file.version, seen: view.seen } });
  /** Begins, looks at and takes a list that leaves nothing to settle. */
  async function bringIn(content: string, name?: string) {
    const { id } = (await upload(content, name)).body;
    const view = (await look(id)).body;
    app.pass(1000);
    return { id, view, ...(await take(id, view)) };
  }
  return {
    upload,
    look,
    edit,
    take,
    bringIn,
    list: () => call(LIST, { as, params, method: "GET" }),
    drop: (id: string, version: number) =>
      call(DROP, { as, params: at(id), query: { version: String(version) }, method: "DELETE" }),
    takeBack: (id: string, version: number, evenSo?: true) =>
      call(TAKE_BACK, { as, params: at(id), body: { version, evenSo } }),
    /** Everything a list may touch, for comparing before and after. Versions are left out: they only count up. */
    standing: () => ({
      lines: linesOf(app.db, kit.id).map(({ line, part }) => ({
        ...line,
        version: 0,
        part: { ...part, version: 0 },
      })),
      quantities: lineQuantitiesOf(app.db, kit.id).sort((a, b) =>
        (a.lineId + a.editionId).localeCompare(b.lineId + b.editionId),
      ),
      offers: offersOf(app.db, workshop.id).map(({ offer, breaks }) => ({ ...offer, version: 0, breaks })),
      suppliers: suppliersOf(app.db, workshop.id).map((row) => ({ ...row, version: 0 })),
    }),
  };
}
