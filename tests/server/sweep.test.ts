import { expect, it } from "vitest";
import { invitations } from "#db/schema/guests.ts";
import { attemptCounts, oneTimeTokens, sessions } from "#db/schema/people.ts";
import { POST as forgotten } from "#src/pages/api/forgotten.ts";
import { POST as invite } from "#src/pages/api/workshops/[workshop]/invitations.ts";
import { sweep } from "#src/server/sweep.ts";
import { call, testApp } from "#tests/support/app.ts";

const app = testApp();
const DAY = 24 * 60 * 60 * 1000;

it("removes what has run out, and keeps what has not", async () => {
  const workshop = app.workshop();
  const owner = app.person("owner", workshop);
  const body = { email: "tom@example.org", role: "seller", kit: null };
  await call(invite, { as: owner, params: { workshop: workshop.id }, body });
  await call(forgotten, { body: { email: owner.email } });
  await app.letters();
  const counted = () =>
    [sessions, oneTimeTokens, attemptCounts, invitations].map(
      (table) => app.db.select().from(table).all().length,
    );
  const before = counted();
  expect(before).toEqual([1, 1, 4, 1]);
  sweep(app.db, app.now);
  expect(counted()).toEqual(before);
  sweep(app.db, app.now + 2 * DAY);
  expect(counted()).toEqual([1, 0, 0, 1]);
  sweep(app.db, app.now + 38 * DAY);
  expect(counted()).toEqual([0, 0, 0, 0]);
});
