import { activity } from "#db/schema/activity.ts";
import type { Db } from "../client.ts";
import { seedId, WORKSHOP_ID } from "./seed-id.ts";

const HOUR = 60 * 60 * 1000;

interface SeedNews {
  hoursAgo: number;
  person: string;
  kit: string;
  action: string;
  subject: readonly string[];
  name: string;
  detail?: Record<string, unknown>;
}

/** What the people of the demonstration did shortly before it is first opened. Invented. */
const NEWS: readonly SeedNews[] = [
  {
    hoursAgo: 3,
    person: "tom",
    kit: "Dew Lantern",
    action: "edition.change",
    subject: ["edition", "Dew Lantern", "Full kit"],
    name: "Full kit",
    detail: { price: ["32.00", "34.00"] },
  },
  {
    hoursAgo: 7,
    person: "milo",
    kit: "Dew Lantern",
    action: "part.choose",
    subject: ["part", "term2"],
    name: "Screw terminal",
  },
];

export function loadNews(db: Db, now: number): void {
  for (const { hoursAgo, person, kit, action, subject, name, detail = {} } of NEWS)
    db.insert(activity)
      .values({
        id: seedId("news", person, ...subject),
        workshopId: WORKSHOP_ID,
        kitId: seedId("kit", kit),
        userId: seedId("user", person),
        at: now - hoursAgo * HOUR,
        action,
        subjectId: seedId(...subject),
        subjectName: name,
        detail,
      })
      .run();
}
