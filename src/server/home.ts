import type { Db } from "#db/client.ts";
import { can } from "#src/access.ts";
import { type Tally, tallyOf } from "#src/costing/tally.ts";
import type { OpenThing } from "#src/costing/to-settle.ts";
import type { Role } from "#src/shapes/limits.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { kitState } from "./kit-state.ts";
import { type NewsEntry, newsFor } from "./news.ts";
import type { KitRow } from "./store/kit.ts";
import type { WorkshopRow } from "./store/membership.ts";
import type { UserRow } from "./store/session.ts";
import { type KitStop, kitStops, waitingThings } from "./trail.ts";
import { visibleKits } from "./visible-kits.ts";

/** A kit as the home page shows it; figures only for a role that may see money. */
export interface HomeKit {
  kit: KitRow;
  empty: boolean;
  stops: KitStop[];
  money: { tally: Tally; plan: Plan; waiting: OpenThing[] } | null;
}

export interface Home {
  kits: HomeKit[];
  closed: KitRow[];
  /** What other people did since yesterday, the newest first. */
  news: NewsEntry[];
}

function homeKit(db: Db, workshop: WorkshopRow, role: Role, kit: KitRow, asOf: string): HomeKit {
  const state = kitState(db, workshop, kit, asOf);
  const { plan, result } = state;
  return {
    kit,
    empty: plan.lines === 0,
    stops: kitStops(role, state),
    money: can(role, "see-money") ? { tally: tallyOf(result), plan, waiting: waitingThings(state) } : null,
  };
}

/** Gathers the home page of a workshop for one person: their kits as they stand, and what is new. */
export function home(
  db: Db,
  workshop: WorkshopRow,
  role: Role,
  user: UserRow,
  now: number,
  asOf: string,
): Home {
  const kits = visibleKits(db, workshop.id, role, user.id);
  const kitIds = kits.map(({ id }) => id);
  return {
    kits: kits
      .filter(({ closedAt }) => closedAt === null)
      .map((kit) => homeKit(db, workshop, role, kit, asOf)),
    closed: kits.filter(({ closedAt }) => closedAt !== null),
    news: newsFor(db, { workshopId: workshop.id, role, userId: user.id, kitIds }, now),
  };
}
