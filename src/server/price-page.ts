import type { Db } from "#db/client.ts";
import { can } from "#src/access.ts";
import type { Role } from "#src/shapes/limits.ts";
import { requirePermission } from "./route.ts";
import { peopleOf, type WorkshopRow } from "./store/membership.ts";

export interface PricePage {
  /** First names of those who set prices, and of those who only see them. */
  who: { setters: string[]; seers: string[] };
  may: { changeRun: boolean; changePrice: boolean };
}

/** What the price page shows besides the plan: who sets the price, and what this person may. */
export function pricePage({ db, workshop, role }: { db: Db; workshop: WorkshopRow; role: Role }): PricePage {
  requirePermission(role, "see-money");
  const people = peopleOf(db, workshop.id).filter((person) => can(person.role, "see-money"));
  const named = (sets: boolean) =>
    people
      .filter((person) => can(person.role, "change-price") === sets)
      .map(({ name }) => name.split(" ")[0] ?? name);
  return {
    who: { setters: named(true), seers: named(false) },
    may: { changeRun: can(role, "change-run"), changePrice: can(role, "change-price") },
  };
}
