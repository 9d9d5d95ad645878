/** "1.9 kB", "3.4 MB": how large a file is, in the units people see elsewhere (1 kB is 1000 bytes). */
export function sizeWords(bytes: number): string {
  if (bytes < 1000) return `${bytes} bytes`;
  const [amount, unit] = bytes < 1_000_000 ? [bytes / 1000, "kB"] : [bytes / 1_000_000, "MB"];
  return `${amount < 10 ? amount.toFixed(1) : Math.round(amount)} ${unit}`;
}
