/** One measured figure: what it is, and what it was asked to be. */
export interface BenchRow {
  what: string;
  /** As measured, in `unit`: the median of several runs where it is a time. */
  value: number;
  unit: string;
  /** The aim in words: "under 50 ms". */
  aim: string;
  met: boolean;
  /** What it was measured on, or why it is to be read with care. */
  note: string;
}
