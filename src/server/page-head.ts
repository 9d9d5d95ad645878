import type { Db } from "#db/client.ts";
import { can, seesEveryKit } from "#src/access.ts";
import type { Role } from "#src/shapes/limits.ts";
import type { KitRow } from "./store/kit.ts";
import { guestsOf } from "./store/kit-guest.ts";
import { peopleOf, type WorkshopRow, workshopsOf } from "./store/membership.ts";
import type { UserRow } from "./store/session.ts";

/** What the header of a page shows: where one can go, who is here, what is one's own. */
export interface PageHead {
  home: string;
  places: { key: Section; label: string; href: string }[];
  people: { name: string; initials: string; you: boolean }[];
  yours: { label: string; href: string }[];
}

export type Section = "kits" | "suppliers" | "people" | "settings";

function initials(name: string): string {
  const words = name.split(/\s+/).filter(Boolean);
  const letters = words.length > 1 ? [words[0], words.at(-1)] : [words[0]];
  return letters.map((word) => [...(word ?? "?")][0]?.toUpperCase()).join("");
}

function places(base: string, role: Role): PageHead["places"] {
  const all = [
    { key: "kits", label: "Kits", href: base, shown: true },
    { key: "suppliers", label: "Suppliers", href: `${base}/suppliers`, shown: can(role, "see-money") },
    { key: "people", label: "People", href: `${base}/people`, shown: can(role, "manage-workshop") },
    { key: "settings", label: "Settings", href: `${base}/settings`, shown: can(role, "see-money") },
  ] as const;
  return all.filter(({ shown }) => shown).map(({ key, label, href }) => ({ key, label, href }));
}

function yours(db: Db, user: UserRow, here: string): PageHead["yours"] {
  const others = workshopsOf(db, user.id).filter(({ workshop }) => workshop.id !== here);
  return [
    { label: "Your account", href: "/account" },
    { label: "How it is reckoned", href: "/methods" },
    ...others.map(({ workshop }) => ({ label: workshop.name, href: `/workshops/${workshop.id}` })),
  ];
}

/** People of the workshop; on a kit's page without the co-builders who were not asked to it. */
function peopleHere(db: Db, workshopId: string, kit: KitRow | undefined) {
  const asked = guestsOf(db, workshopId).filter(({ kitId }) => kitId === kit?.id);
  const guests = new Set(asked.map(({ userId }) => userId));
  return peopleOf(db, workshopId).filter(({ id, role }) => !kit || seesEveryKit(role) || guests.has(id));
}

/** Gathers the header for this person's page in this workshop. */
export function pageHead(
  db: Db,
  user: UserRow,
  workshop: WorkshopRow,
  role: Role,
  kit: KitRow | undefined,
): PageHead {
  const base = `/workshops/${workshop.id}`;
  return {
    home: base,
    places: places(base, role),
    people: peopleHere(db, workshop.id, kit).map(({ id, name }) => ({
      name,
      initials: initials(name),
      you: id === user.id,
    })),
    yours: yours(db, user, workshop.id),
  };
}

/** The header of a person's pages outside any workshop: the way to each of theirs. */
export function ownHead(db: Db, user: UserRow): PageHead {
  const { name } = user;
  return {
    home: "/",
    places: [],
    people: [{ name, initials: initials(name), you: true }],
    yours: yours(db, user, ""),
  };
}
