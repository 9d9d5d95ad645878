import { ROLES, type Role } from "#src/shapes/limits.ts";

const MANY: Record<Role, string> = {
  owner: "owners",
  designer: "designers",
  seller: "sellers",
  "co-builder": "co-builders",
};

/** "4 people: 1 owner, 2 designers, 1 co-builder". */
export function peopleCounted(people: readonly { role: Role }[]): string {
  const parts = ROLES.flatMap((role) => {
    const count = people.filter((person) => person.role === role).length;
    return count === 0 ? [] : [`${count} ${count === 1 ? role : MANY[role]}`];
  });
  return `${people.length === 1 ? "1 person" : `${people.length} people`}: ${parts.join(", ")}`;
}

/** The kits a person sees: all of them, or those they were asked to by name. */
export function kitsSeen({ role, kits }: { role: Role; kits: readonly { name: string }[] }): string {
  if (role !== "co-builder") return "All";
  return kits.length === 0 ? "None yet" : kits.map(({ name }) => name).join(", ");
}
