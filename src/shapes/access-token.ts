import { z } from "zod";
import { Name } from "./field.ts";
import { TOKEN_DAYS_MOST } from "./limits.ts";

export const NewAccessToken = z.strictObject({
  name: Name,
  /** How many days it works. */
  days: z
    .int("Write whole days.")
    .min(1, "A token works for at least one day.")
    .max(TOKEN_DAYS_MOST, `A token works for at most ${TOKEN_DAYS_MOST} days.`),
});
export type NewAccessToken = z.infer<typeof NewAccessToken>;

/** A person's own token in a workshop; the secret itself is stored nowhere. Times in milliseconds since 1970. */
export interface OwnAccessToken {
  id: string;
  name: string;
  createdAt: number;
  expiresAt: number;
  lastUsedAt: number | null;
}

/** The reply to making one: the only time its secret is shown. */
export interface MadeAccessToken extends OwnAccessToken {
  token: string;
}
