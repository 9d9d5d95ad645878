/** How people call a revision of a parts list: 1 is "A", 26 is "Z", 27 is "AA". */
export function revisionLetter(number: number): string {
  const rest = Math.floor((number - 1) / 26);
  const letter = String.fromCharCode(65 + ((number - 1) % 26));
  return rest > 0 ? revisionLetter(rest) + letter : letter;
}
