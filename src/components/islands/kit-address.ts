/** Which kit a page is about: enough to build every address below it. */
export interface KitAddress {
  workshop: string;
  kit: string;
}

/** `/api/workshops/w/kits/k` + rest, for calls. */
export function kitApi({ workshop, kit }: KitAddress, rest = ""): string {
  return `/api/workshops/${workshop}/kits/${kit}${rest}`;
}

/** `/workshops/w/kits/k` + rest, for links. */
export function kitPath({ workshop, kit }: KitAddress, rest = ""): string {
  return `/workshops/${workshop}/kits/${kit}${rest}`;
}

/** Keys of the shared query cache; a change to the kit's data invalidates `plan`. */
export const kitKeys = {
  plan: (kit: string) => ["plan", kit] as const,
  lines: (kit: string) => ["lines", kit] as const,
  offers: (kit: string) => ["offers", kit] as const,
  boards: (kit: string) => ["boards", kit] as const,
  run: (kit: string) => ["run", kit] as const,
  imports: (kit: string) => ["imports", kit] as const,
};
