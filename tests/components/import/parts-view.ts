import type { Question } from "#src/partslist/draft.ts";
import type { QuestionsView } from "#src/server/bring-in/view.ts";
import type { PartsImportView } from "#src/server/parts-import.ts";

/** A question whether a quantity or the designators are right. */
export function question(row: number, level: Question["level"]): Question {
  const facts = { quantity: 5, designators: 6 };
  return {
    code: "quantity-mismatch",
    level,
    row,
    subject: `LED${row}`,
    columns: [1],
    facts,
    suggested: { choice: "use-designators", facts },
    alternatives: [
      { choice: "keep-quantity", facts },
      { choice: "type", facts },
    ],
    alsoRows: [],
    answer: null,
  };
}

/** A view of a small parts list with these questions. */
export function partsView(questions: QuestionsView, over: Partial<PartsImportView> = {}): PartsImportView {
  return {
    kind: "parts-list",
    file: {
      id: "draft1",
      version: 1,
      state: "draft",
      name: "lamp.csv",
      bytes: 1900,
      encoding: "UTF-8",
      rows: 26,
      columns: 8,
      dialect: { delimiter: "semicolon", decimalMark: "comma", repaired: false },
      sheets: null,
      sameAs: null,
    },
    columns: { columns: [], headerRecord: 0, headings: [], currency: null, sample: [] },
    counts: {
      rows: 26,
      lines: 20,
      skipped: 3,
      questions: 3,
      joined: 0,
      must: 2,
      look: 1,
      linesWithSuggestions: 23,
    },
    questions,
    skipped: [],
    recognised: { count: 0, rows: [] },
    joinOffers: [],
    difference: {
      counts: { added: 2, removed: 1, changed: 3, revalued: 1, unchanged: 17 },
      added: [],
      removed: [],
      changed: [],
      revalued: [],
    },
    seen: "0".repeat(64),
    prices: {
      offers: 0,
      unnamed: 0,
      pricesFrom: null,
      suppliers: [],
      newSuppliers: [],
      currency: "EUR",
      faults: [],
    },
    ...over,
  };
}
