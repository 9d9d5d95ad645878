/**
 * Edits that were under way when a page was left. Nobody was there to hear the answer, so the next page of the same
 * kit in this tab sends them again, with the version they had seen: what arrived is recognised, what somebody else
 * was quicker with is shown. They belong to a person, as another may sign in on the same tab.
 */
function keyOf(saver: string, kit: string): string {
  const person = document.querySelector<HTMLMetaElement>('meta[name="person"]')?.content ?? "";
  return `unsaved ${saver} ${person} ${kit}`;
}

/** Puts edits by for the next page; none takes away those put by before. */
export function keepEdits(saver: string, kit: string, edits: readonly object[]): void {
  try {
    if (edits.length > 0) sessionStorage.setItem(keyOf(saver, kit), JSON.stringify(edits));
    else sessionStorage.removeItem(keyOf(saver, kit));
  } catch {
    // Storage that is full or switched off keeps nothing; the edits were sent all the same.
  }
}

/** Takes the edits that the page before put by; they are given once. */
export function keptEdits<Edit extends object>(saver: string, kit: string): Edit[] {
  try {
    const kept = sessionStorage.getItem(keyOf(saver, kit));
    sessionStorage.removeItem(keyOf(saver, kit));
    return kept === null ? [] : (JSON.parse(kept) as Edit[]);
  } catch {
    return [];
  }
}
