/** A working as it stands on squared paper: every figure already written, ready to show, copy or print. */
export type PaperSource = { label: string; href: string };

export type PaperSub = { label: string; amount: string; source?: PaperSource; onOpen?: () => void };

export type PaperLine = {
  /** a, b, c …: other lines refer to it. */
  letter?: string;
  label: string;
  sign?: "+" | "−" | "×" | "÷" | "=";
  /** "455.25"; without currency, which the basis names. Where subs are summed it stands on their last line. */
  amount?: string;
  /** What the amount is the sum of. They are ruled off and carried out on their last line. */
  subs?: readonly PaperSub[];
  source?: PaperSource;
  onOpen?: () => void;
  /** The figure asked for: double rule under it. */
  result?: boolean;
  /** Leaves an empty line above: a second sum begins. */
  apart?: boolean;
};

export type Paper = {
  /** "Cost per kit at a run of 120". */
  of: string;
  /** "In euro, without VAT". */
  basis: string;
  lines: readonly PaperLine[];
  /** Rounding and rules, once each, in words. */
  notes: readonly string[];
  /** Pages that explain the rules it follows. */
  methods: readonly PaperSource[];
  /** "Worked at 14:32 from rev C and the prices of 9 March." */
  foot: string;
};

/** A single rule stands under what is summed: the line before each "=". */
export function ruledOff(lines: readonly PaperLine[], place: number): boolean {
  return lines[place + 1]?.sign === "=" && !lines[place]?.result;
}

type Row = { left: string; sub: string; sign: string; amount: string };

function rowsOf(line: PaperLine): Row[] {
  const letter = line.letter ? `${line.letter}  ` : "   ";
  const own = { left: letter + line.label, sub: "", sign: line.sign ?? "", amount: line.amount ?? "" };
  const subs = line.subs ?? [];
  if (subs.length === 0) return [own];
  const carried = subs.map((sub, place) => ({
    left: `     ${sub.label}`,
    sub: sub.amount,
    sign: place === subs.length - 1 ? own.sign : "",
    amount: place === subs.length - 1 ? own.amount : "",
  }));
  return [{ ...own, sign: "", amount: "" }, ...carried];
}

function width(rows: readonly Row[], of: (row: Row) => string): number {
  return Math.max(0, ...rows.map((row) => of(row).length));
}

/** The working as plain text with its amounts in columns, for pasting into a letter or a message. */
export function paperAsText(paper: Paper): string {
  const rows = paper.lines.flatMap(rowsOf);
  const left = width(rows, (row) => row.left);
  const sub = width(rows, (row) => row.sub);
  const amount = width(rows, (row) => row.amount);
  const lines = rows.map((row) =>
    `${row.left.padEnd(left)}  ${row.sub.padStart(sub)}  ${row.sign.padEnd(1)}  ${row.amount.padStart(amount)}`.trimEnd(),
  );
  return [paper.of, paper.basis, "", ...lines, "", ...paper.notes, paper.foot].join("\n");
}
