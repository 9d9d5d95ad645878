/** "dew-lantern-cost-per-kit": a name that every file system takes. */
export function fileName(kit: string, what: string): string {
  const plain = kit
    .normalize("NFKD")
    .replace(/[^\w]+/g, "-")
    .replace(/^-|-$/g, "")
    .toLowerCase();
  return `${plain || "kit"}-${what}`;
}
