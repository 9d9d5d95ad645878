import type { ColumnMapping } from "#src/partslist/mapping.ts";
import { openQuestions } from "#src/partslist/read-list.ts";
import type { DraftDecisions, DraftEdit } from "#src/shapes/import.ts";
import { editedDecisions, editedMapping, editsColumns } from "./edit-draft.ts";
import { openList } from "./list-draft.ts";
import { type PartsSummaryJob, summariseParts } from "./parts-summary.ts";
import { readParts } from "./read-parts.ts";

export interface EditPartsJob extends PartsSummaryJob {
  edit: DraftEdit;
}

export interface EditedParts {
  mapping: ColumnMapping | null;
  decisions: DraftDecisions;
  summary: ReturnType<typeof summariseParts>;
}

/** An edit of a parts list in draft: what it decides, and how the list then reads. */
export function editParts({ edit, source, ...rest }: EditPartsJob): EditedParts {
  const draft = openList(source);
  const mapping = editsColumns(edit) ? editedMapping(source.kind, draft, edit) : source.mapping;
  const open = edit.takeSuggestions ? openQuestions(readParts({ ...source, mapping }).result.rows) : [];
  const decisions = editedDecisions(source.decisions, edit, open);
  return {
    mapping,
    decisions,
    summary: summariseParts({ ...rest, source: { ...source, mapping, decisions } }),
  };
}
