import { seedId, WORKSHOP_ID } from "#db/seed/seed-id.ts";

/** Every page that `npm run screens` takes a picture of, signed in as the owner unless `stranger`. */
export interface PictureOf {
  name: string;
  path: string;
  stranger?: true;
}

const workshop = `/workshops/${WORKSHOP_ID}`;

function kit(name: string, rest: string): string {
  return `${workshop}/kits/${seedId("kit", name)}/${rest}`;
}

export const PAGES: readonly PictureOf[] = [
  { name: "sign-in", path: "/sign-in", stranger: true },
  { name: "forgotten", path: "/forgotten", stranger: true },
  { name: "not-found", path: "/no-such-page" },
  { name: "kits", path: workshop },
  { name: "new-kit", path: `${workshop}/kits/new` },
  { name: "suppliers", path: `${workshop}/suppliers` },
  { name: "supplier", path: `${workshop}/suppliers/${seedId("supplier", "Lumenhof")}` },
  { name: "price-list", path: `${workshop}/suppliers/bring-in` },
  { name: "people", path: `${workshop}/people` },
  { name: "settings", path: `${workshop}/settings` },
  { name: "account", path: "/account" },
  { name: "parts", path: kit("Dew Lantern", "parts") },
  { name: "parts-empty", path: kit("Moth Lamp", "parts") },
  { name: "details", path: kit("Dew Lantern", "details") },
  { name: "bring-in", path: kit("Dew Lantern", "parts/bring-in") },
  { name: "offers", path: kit("Dew Lantern", "offers") },
  { name: "offer", path: kit("Dew Lantern", `offers/${seedId("part", "ledww")}`) },
  { name: "boards", path: kit("Dew Lantern", "boards") },
  { name: "boards-no-panels", path: kit("Cricket Box", "boards") },
  { name: "boards-empty", path: kit("Moth Lamp", "boards") },
  { name: "run", path: kit("Dew Lantern", "run") },
  { name: "run-not-known", path: kit("Tide Clock", "run") },
  { name: "run-empty", path: kit("Moth Lamp", "run") },
  { name: "price", path: kit("Dew Lantern", "price") },
  { name: "price-two-channels", path: kit("Bench Pip", "price") },
  { name: "price-not-known", path: kit("Tide Clock", "price") },
  { name: "price-empty", path: kit("Moth Lamp", "price") },
];
