import { z } from "zod";
import { Version } from "./field.ts";
import { Email, NewPassword, Password, PersonName, SecondFactorCode } from "./person.ts";

/** What a person's own account page shows. */
export interface Account {
  id: string;
  name: string;
  email: string;
  emailConfirmed: boolean;
  hasPassword: boolean;
  secondFactor: boolean;
  recoveryCodesLeft: number;
  /** Whether single letters act as keys; they can be turned off (WCAG 2.2, 2.1.4). */
  singleKeys: boolean;
  /** The outside identity provider of this server; `null` where none is set up. */
  identity: { provider: string; connected: boolean } | null;
  version: number;
}

/** One of a person's own sign-ins. Times in milliseconds since 1970. */
export interface OwnSession {
  id: string;
  browser: string;
  createdAt: number;
  lastSeenAt: number;
  /** The one that asks. */
  current: boolean;
}

/** A person who has a password shows with it that it is them; one who has none must have signed in just now. */
const Sure = { password: Password.optional() };

export const AccountChange = z.strictObject({
  name: PersonName.optional(),
  singleKeys: z.boolean().optional(),
  version: Version,
});
export type AccountChange = z.infer<typeof AccountChange>;

export const EmailChange = z.strictObject({ email: Email, ...Sure });
export const PasswordChange = z.strictObject({ ...Sure, newPassword: NewPassword });
export const MadeSure = z.strictObject(Sure);
export const FirstCode = z.strictObject({ code: SecondFactorCode });
