const WORDS = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten"];

/** A small number in words, a larger one in figures: "three", "23". */
export function numberWord(count: number): string {
  return WORDS[count] ?? String(count);
}

/** "One line", "23 lines": a number with its noun, fit to begin a sentence. */
export function counted(count: number, one: string, many: string): string {
  const text = `${numberWord(count)} ${count === 1 ? one : many}`;
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** "R1", "R1 and R7", "R1, R2 and R7". */
export function listed(names: readonly string[]): string {
  if (names.length < 2) return names[0] ?? "";
  return `${names.slice(0, -1).join(", ")} and ${names.at(-1)}`;
}
