/** Whole cells that say a part is not fitted. */
const WHOLE =
  /^(?:dnp|dnf|dni|dnm|dns|nopop|no[- ]?pop|np|nm|nf|n\.\s?m\.|n\.?\s?b\.?|not (?:fitted|placed|populated|mounted|used|installed|assembled)|no (?:stuff|place|fit|mount|load)|do not (?:place|populate|fit|mount|install|stuff|use|assemble)|unpopulated|unbestückt|nicht bestück(?:t|en)|non mont[ée]e?|ne pas monter|sin montar|no (?:montar|poner)|non montare|non montato|niet (?:plaatsen|gemonteerd)|nie montować|neosazovat|neosazeno|não montar|monteras ej|не устанавливать|не ставить|未実装|不贴|不焊)$/i;
/** The same inside a longer text: "10k (DNP)", "DNP_100n", "100n / not fitted". */
const INSIDE =
  /(?:^|[\s(/[,;_*-])(?:DNP|DNF|DNI|DNM|NOPOP|n\.\s?b\.|not fitted|not populated|not placed|not mounted|no[- ]stuff|do not (?:place|populate|fit|mount|install|stuff)|nicht bestückt|unbestückt|non monté|no montar|non montare|niet plaatsen|nie montować|neosazovat|não montar|не устанавливать|未実装|不贴)(?:$|[\s)/\],;_*-])/i;
/** Cells that leave it open. */
const MAYBE = /^(?:n\/?a|none|nc|n\/c|-+|tbd|open|leer|keine?|vide|optional|opt|option)$/i;

const YES =
  /^(?:x|✓|✔|✗|✘|1|y|yes|true|t|ja|j|wahr|oui|vrai|si|sí|verdadero|vero|tak|ano|sim|dnp|dnf|dni|exclude[d]?|да|是|●|•|\*)$/i;
const NO =
  /^(?:|0|n|no|false|f|nein|falsch|non|faux|falso|nee|nie|ne|nao|não|nej|нет|否|-|–|fitted|fit|place[d]?|populate[d]?|mounted|in kit|in|ok)$/i;

/** True where a text says plainly that the part is not fitted. */
export function saysNotFitted(text: string): boolean {
  const plain = text.trim();
  return plain !== "" && (WHOLE.test(plain) || INSIDE.test(plain));
}

/** True where a value such as "n/a" or "NC" may mean that nothing is fitted. */
export function maySayNotFitted(text: string): boolean {
  return MAYBE.test(text.trim());
}

/** Reads a column headed "not fitted": a cross, yes, 1 or the mark itself. `null` where the cell says neither. */
export function readDoNotPlace(text: string): boolean | null {
  const plain = text.trim();
  if (NO.test(plain)) return false;
  if (YES.test(plain) || saysNotFitted(plain)) return true;
  return null;
}

/** Reads a column headed "fitted": no, 0 or a mark for not fitted means it is not. `null` where the cell is empty or says neither. */
export function readPlace(text: string): boolean | null {
  const plain = text.trim();
  if (plain === "") return null;
  if (
    saysNotFitted(plain) ||
    /^(?:dnp|dnf|dni|0|n|no|false|nein|falsch|non|faux|falso|nee|nie|ne|nao|não|nej|нет|否)$/i.test(plain)
  )
    return false;
  return YES.test(plain) || NO.test(plain) ? true : null;
}

/** The text without the mark: "10k (DNP)" and "10k (non monté)" are "10k". */
export function withoutMark(text: string): string {
  return text
    .replace(/\s*[([]\s*([^()[\]]{2,30}?)\s*[)\]]/g, (whole, inside: string) =>
      saysNotFitted(inside) ? "" : whole,
    )
    .replace(/^(?:DNP|DNF|DNI|NOPOP)[\s_:/-]+(?=\S)/i, "")
    .replace(/[\s_:/,;-]+(?:DNP|DNF|DNI|NOPOP)$/i, "")
    .trim();
}
