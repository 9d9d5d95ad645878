import { countText } from "#src/components/amount-text.ts";

const WORDS = [
  "no",
  "one",
  "two",
  "three",
  "four",
  "five",
  "six",
  "seven",
  "eight",
  "nine",
  "ten",
  "eleven",
  "twelve",
];

/** Small numbers as words in running text: "six", but "26". */
export function numberWord(count: number): string {
  return WORDS[count] ?? countText(count);
}

export function upperFirst(text: string): string {
  return text.slice(0, 1).toUpperCase() + text.slice(1);
}

/** "1 line", "23 lines". */
export function counted(count: number, one: string, many: string): string {
  return `${countText(count)} ${count === 1 ? one : many}`;
}

/** "15", "15 and 21", "15, 21 and 3 more". */
export function rowNumbers(rows: readonly number[]): string {
  const once = [...new Set(rows)].sort((a, b) => a - b);
  if (once.length <= 3) return once.join(", ").replace(/, ([^,]*)$/, " and $1");
  return `${once.slice(0, 2).join(", ")} and ${once.length - 2} more`;
}
