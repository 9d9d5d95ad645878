/**
 * An amount as a money field writes it: two decimals at least; nothing where it is not known.
 *
 * @example shownMoney("0.5") === "0.50"
 */
export function shownMoney(value: string | null): string {
  if (value === null) return "";
  const [whole = "0", part = ""] = value.split(".");
  return `${whole}.${part.padEnd(2, "0")}`;
}
