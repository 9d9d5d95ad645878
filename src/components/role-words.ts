import type { Role } from "#src/shapes/limits.ts";

/** What each role may do, in a line; `access.ts` holds the exact table. */
const DOES: Record<Role, string> = {
  owner: "Everything, and the people, settings and the workshop itself.",
  designer: "Parts, offers, boards, runs and orders. Sees prices, not the names of buyers.",
  seller: "Prices, runs and buyers. Sees parts and orders.",
  "co-builder":
    "Sees the parts of the kits they are asked to, and checks substitutions. No prices, no buyers.",
};

const NAMES: Record<Role, string> = {
  owner: "Owner",
  designer: "Designer",
  seller: "Seller",
  "co-builder": "Co-builder",
};

/** "Owner" for a chip or a choice. */
export function roleName(role: Role): string {
  return NAMES[role];
}

/** A sentence for choosing a role. */
export function roleDoes(role: Role): string {
  return DOES[role];
}
