import { looksLikeDesignators, readDesignators } from "./designators.ts";

/** What the cells of a column hold, as shares of the filled cells (0 to 1). */
export interface ColumnCells {
  /** Whether the column has a heading. */
  headed: boolean;
  filled: number;
  /** Filled cells as a share of the rows looked at. */
  fill: number;
  designators: number;
  names: number;
  integers: number;
  /** Whole numbers that count up: 1, 2, 3. */
  sequence: boolean;
  decimals: number;
  money: number;
  urls: number;
  values: number;
  packages: number;
  codes: number;
  flags: number;
  marks: number;
  words: number;
  sentences: number;
  long: number;
  distinct: number;
  examples: string[];
}

const DESIGNATOR_LETTERS =
  /^(?:A|AMP|ANT|AR|AT|B|BAT|BR|BT|BTN|BUZZER|BZ|C|CARD|CB|CM|CN|CON|CONN|COMP|CR|CT|CV|D|DA|DD|DS|DZ|E|ENC|F|FB|FID|FL|FU|G|GN|H|HDR|HL|HS|IC|J|JMP|JP|JT|K|L|LD|LDO|LDR|LED|LS|M|MCU|MH|MIC|MK|MOD|MOV|MP|N|NT|OC|OK|OPT|OSC|P|PAD|PCB|PD|PL|POT|PS|PTC|Q|R|RA|REG|REL|RL|RN|RP|RT|RV|RY|S|SA|SB|SC|SG|SK|SL|SP|SPK|ST|SV|SW|T|TB|TC|TH|TL|TM|TP|TR|TS|U|UR|USB|USBC|V|VC|VD|VDR|VR|VT|W|X|XA|XC|XP|XS|XT|XTAL|Y|Z|ZD|ZF|ZQ)$/;
const PACKAGE_CODE = /^[CRLD]?(?:0201|0402|0603|0805|1206|1210|1812|2010|2512|3216|3528)$/i;
const PACKAGE =
  /^(?:smd |smt |tht )?(?:[crld]?(?:0201|0402|0603|0805|1206|1210|1812|2010|2512|0204|0207|0309|0411|0414)|(?:p?dip|dil|so|soic|sop|ssop|tssop|msop|qfp|lqfp|tqfp|qfn|dfn|sot|to|do|sod|sma|smb|smc|bga|plcc|sip|melf|hc)[- ]?\d*.*|.*(?:axial|radial|vertical|horizontal|inline|smd|dip|sot|qfn|tht|pinhead|pinheader|disc|\d ?mm\b|metric|capc|resc|handsolder).*|rm ?\d.*)$/i;
const VALUE =
  /(?:^|[\s,_(])(?:\d{1,4}[RKkMnpuµμ]\d{1,3}|\d+(?:[.,]\d+)?\s?(?:[kKMRΩΩpnuµμ]|[pnuµμmPNU]?[FH]|[kKMm]?(?:Ω|Ω|ohms?)|[kKM]?[Hh][Zz]|mfd))(?![A-Za-z0-9])/i;
const FLAG =
  /^(?:x|y|n|yes|no|ja|nein|oui|non|si|sí|nee|tak|nie|ano|ne|sim|nao|não|true|false|wahr|falsch|vrai|faux|verdadero|falso|0|1|ok|✓|✔|dnp|dnf|fitted|not fitted|excluded|включено|да|нет|是|否)$/i;
const MARK = /^(?:x|dnp|dnf|dni|nm|nf|n\.?b\.?|not fitted|no|do not (?:place|fit|populate))$/i;
const MONEY =
  /^(?:[A-Z]{0,3}[€$£¥₽]|(?:eur|usd|gbp|chf|pln|czk|rub|sek)\b)\s*\d[\d.,\s]*|^\d[\d.,\s]*\s*(?:[€$£¥₽]|(?:eur|usd|gbp|chf|zł|kč|kr|руб)\b)/i;

const EMPTY_SHARES = {
  designators: 0,
  names: 0,
  integers: 0,
  decimals: 0,
  money: 0,
  urls: 0,
  values: 0,
  packages: 0,
  codes: 0,
  flags: 0,
  marks: 0,
  words: 0,
  sentences: 0,
  long: 0,
};
type Shares = typeof EMPTY_SHARES;

/** Looks at the cells of one column (a sample is enough) and says what they hold. */
export function lookAtColumn(cells: readonly string[], headed = false): ColumnCells {
  const filled = cells.map((cell) => cell.trim()).filter((cell) => cell !== "");
  const counts: Shares = { ...EMPTY_SHARES };
  for (const cell of filled) count(counts, cell);
  const shares = { ...EMPTY_SHARES };
  for (const key of Object.keys(counts) as (keyof Shares)[]) shares[key] = counts[key] / (filled.length || 1);
  return {
    ...shares,
    headed,
    filled: filled.length,
    fill: filled.length / (cells.length || 1),
    sequence: countsUp(filled),
    distinct: new Set(filled).size / (filled.length || 1),
    examples: filled.slice(0, 3),
  };
}

function count(counts: Shares, cell: string): void {
  if (/^\d{1,7}$/.test(cell)) counts.integers++;
  else if (/^\d*[.,]\d+$|^\d{1,3}(?:[.,\s]\d{3})+(?:[.,]\d+)?$/.test(cell)) counts.decimals++;
  else if (/^(?:https?:\/\/|www\.)/i.test(cell)) counts.urls++;
  else if (MONEY.test(cell)) counts.money++;
  else countText(counts, cell);
  if (FLAG.test(cell)) counts.flags++;
  if (MARK.test(cell)) counts.marks++;
  if (PACKAGE.test(cell)) counts.packages++;
}

function countText(counts: Shares, cell: string): void {
  if (holdsDesignators(cell)) counts.designators++;
  else if (/^[A-Za-z0-9_+\-*,; ]{1,40}$/.test(cell) && isName(cell)) counts.names++;
  if (VALUE.test(cell)) counts.values++;
  if (/^(?=.*\d)[A-Za-z0-9./+#_*-]{4,40}$/.test(cell)) counts.codes++;
  if (!/\d/.test(cell)) counts.words++;
  if (/\s/.test(cell)) counts.sentences++;
  if (cell.length > 28) counts.long++;
}

function isName(cell: string): boolean {
  const read = readDesignators(cell);
  return read.designators.length > 0 && read.unclear.length === 0;
}

/** As a board drawing writes them: known letters and a number that is no package or part number. */
export function holdsDesignators(cell: string): boolean {
  if (!/^[A-Za-zА-Я]{1,6}[ _]{0,2}\d/.test(cell) || !looksLikeDesignators(cell)) return false;
  const first = readDesignators(cell).designators[0] ?? "";
  const letters = /^[A-Za-zА-Я]+/.exec(first)?.[0] ?? "";
  const digits = /\d+/.exec(first)?.[0] ?? "";
  return DESIGNATOR_LETTERS.test(letters.toUpperCase()) && digits.length <= 4 && !PACKAGE_CODE.test(first);
}

function countsUp(filled: readonly string[]): boolean {
  if (filled.length < 3) return false;
  let up = 0;
  for (let at = 1; at < filled.length; at++)
    if (
      /^\d+\.?$/.test(filled[at] ?? "") &&
      Number.parseInt(filled[at] ?? "", 10) === Number.parseInt(filled[at - 1] ?? "", 10) + 1
    )
      up++;
  return up >= (filled.length - 1) * 0.85;
}
