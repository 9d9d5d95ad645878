import type { Db } from "#db/client.ts";
import type { Role } from "#src/shapes/limits.ts";
import type { WorkshopPerson } from "#src/shapes/workshop-person.ts";
import { type Changing, noteChange } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import { kitOf } from "./store/kit.ts";
import { addGuest, dropGuest, guestsOf } from "./store/kit-guest.ts";
import {
  changeRole,
  type MembershipRow,
  membershipOf,
  ownersCounted,
  peopleOf,
  removeMembership,
  type WorkshopRow,
} from "./store/membership.ts";
import type { UserRow } from "./store/session.ts";
import { userById } from "./store/user.ts";
import { inTransaction } from "./transaction.ts";

type Given = Changing & { user: UserRow; workshop: WorkshopRow };

/** The people of a workshop, by name, with what co-builders were asked to. For owners. */
export function workshopPeople({ db, user, workshop }: Given): WorkshopPerson[] {
  const guests = guestsOf(db, workshop.id);
  return peopleOf(db, workshop.id).map((person) => ({
    ...person,
    kits: guests
      .filter(({ userId }) => userId === person.id)
      .map(({ kitId, kit }) => ({ id: kitId, name: kit })),
    you: person.id === user.id,
  }));
}

function personIn(db: Db, workshop: WorkshopRow, id: string): { person: UserRow; membership: MembershipRow } {
  const membership = membershipOf(db, workshop.id, id)?.membership;
  const person = userById(db, id);
  if (!membership || !person) throw new Problem("not-found");
  return { person, membership };
}

/** A workshop without an owner could not be managed by anybody. */
function keepAnOwner(db: Db, { workshopId, role }: MembershipRow, person: UserRow): void {
  if (role === "owner" && ownersCounted(db, workshopId) === 1)
    throw new Problem("last-owner", { parameters: { name: person.name } });
}

/** Gives a person another role; somebody who becomes a co-builder sees no kit until asked to one. */
export function giveRole(
  given: Given,
  id: string,
  { role, version }: { role: Role; version: number },
): WorkshopPerson[] {
  const { db, workshop } = given;
  inTransaction(db, () => {
    const { person, membership } = personIn(db, workshop, id);
    if (role !== "owner") keepAnOwner(db, membership, person);
    if (!changeRole(db, { ...membership, version }, role))
      throw new Problem("changed-meanwhile", {
        current: workshopPeople(given).find((row) => row.id === id),
      });
    if (role !== "co-builder") dropGuest(db, workshop.id, id);
    const detail = { role: [membership.role, role] };
    noteChange(given, { action: "person.role", subjectId: id, subjectName: person.name, detail });
  });
  return workshopPeople(given);
}

/** Takes a person out of the workshop, also oneself. Their access tokens stop working. */
export function removePerson(given: Given, id: string): void {
  const { db, workshop, user } = given;
  inTransaction(db, () => {
    const { person, membership } = personIn(db, workshop, id);
    keepAnOwner(db, membership, person);
    removeMembership(db, workshop.id, id);
    const action = id === user.id ? "person.leave" : "person.remove";
    const detail = { role: [membership.role, null] };
    noteChange(given, { action, subjectId: id, subjectName: person.name, detail });
  });
}

/** Sets which kits a co-builder is asked to. */
export function askToKits(given: Given, id: string, kitIds: string[]): WorkshopPerson[] {
  const { db, workshop } = given;
  inTransaction(db, () => {
    const { person, membership } = personIn(db, workshop, id);
    if (membership.role !== "co-builder")
      throw wrongField("kits", `${person.name} is ${membership.role} here and sees every kit.`);
    const kits = kitIds.map((kitId, index) => {
      const kit = kitOf(db, workshop.id, kitId);
      if (!kit) throw wrongField(`kits.${index}`, "There is no such kit in this workshop.");
      return kit;
    });
    dropGuest(db, workshop.id, id);
    for (const kit of kits) addGuest(db, { workshopId: workshop.id, kitId: kit.id, userId: id });
    const detail = { kits: kits.map(({ name }) => name) };
    noteChange(given, { action: "person.kits", subjectId: id, subjectName: person.name, detail });
  });
  return workshopPeople(given);
}
