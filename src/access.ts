import type { Role } from "./shapes/limits.ts";

/**
 * Who may do what: the one statement of it. Routes, pages, islands, tests and DEVELOPERS.md read this table.
 * A permission is named by what it lets a person do; `see-…` also decides what leaves the server.
 */
export const PERMISSIONS = {
  "manage-workshop": { roles: ["owner"], does: "people, roles, settings, delete the workshop" },
  "see-parts": {
    roles: ["owner", "designer", "seller", "co-builder"],
    does: "see the parts list, packing lists",
  },
  "change-parts": { roles: ["owner", "designer"], does: "change parts list, editions, stock" },
  "change-supply": { roles: ["owner", "designer"], does: "change offers, suppliers, boards, currency rates" },
  "see-money": { roles: ["owner", "designer", "seller"], does: "see offers, costs, run plan" },
  "change-run": { roles: ["owner", "designer", "seller"], does: "change run plan and scenarios" },
  "change-price": { roles: ["owner", "seller"], does: "change price, channels" },
  "see-interest-names": { roles: ["owner", "seller"], does: "names and addresses on the interest list" },
  "see-interest-counts": { roles: ["owner", "designer", "seller"], does: "counts of the interest list" },
  "propose-substitution": {
    roles: ["owner", "designer", "seller", "co-builder"],
    does: "propose a substitution, comment, add a photo",
  },
  "sign-substitution": { roles: ["owner", "designer", "co-builder"], does: "sign a substitution check" },
  "take-substitution": {
    roles: ["owner", "designer"],
    does: "take a signed substitution into the parts list",
  },
  order: { roles: ["owner", "designer"], does: "orders to suppliers, receiving" },
  "see-orders": { roles: ["owner", "designer", "seller"], does: "see orders" },
} as const satisfies Record<string, { roles: readonly Role[]; does: string }>;

export type Permission = keyof typeof PERMISSIONS;

/** Whether a role may do a thing. */
export function can(role: Role, permission: Permission): boolean {
  return (PERMISSIONS[permission].roles as readonly Role[]).includes(role);
}

/** The roles that may do a thing, for telling a person whom to ask. */
export function rolesThatCan(permission: Permission): readonly Role[] {
  return PERMISSIONS[permission].roles;
}

/** A co-builder sees only the kits they were asked to; every other role sees all kits of the workshop. */
export function seesEveryKit(role: Role): boolean {
  return role !== "co-builder";
}
