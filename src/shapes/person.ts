import { z } from "zod";
import { ListedCurrency } from "./currency.ts";
import { Name } from "./field.ts";
import * as limits from "./limits.ts";

/** An address in lower case, as it is stored and looked up. */
export const Email = z
  .string()
  .trim()
  .toLowerCase()
  .max(limits.EMAIL_LENGTH, "An email address has at most 254 characters.")
  .pipe(z.email("Write an email address such as ines@example.org."));

export const PersonName = z
  .string()
  .trim()
  .min(1, "Write your name.")
  .max(limits.NAME_LENGTH, `A name has at most ${limits.NAME_LENGTH} characters.`);

/** A password somebody signs in with: any text, since older rules may have been others. */
export const Password = z.string().min(1, "Write your password.").max(limits.PASSWORD_MOST);

/** A password somebody chooses: long rather than complicated, and not one sign over and over. */
export const NewPassword = z
  .string()
  .min(
    limits.PASSWORD_LEAST,
    `Use at least ${limits.PASSWORD_LEAST} characters. Four or five words are good.`,
  )
  .max(limits.PASSWORD_MOST, `Use at most ${limits.PASSWORD_MOST} characters.`)
  .refine((text) => new Set(text).size >= limits.PASSWORD_DIFFERENT_LEAST, {
    message: `Use at least ${limits.PASSWORD_DIFFERENT_LEAST} different characters.`,
  });

/** The secret of a link in a letter. */
export const LinkToken = z.string().regex(/^\w{40}$/, "This link is not whole. Copy all of it.");

/** What an authenticator shows, or a recovery code. */
export const SecondFactorCode = z.string().trim().min(6, "Write the six figures.").max(40);

/** A path of ours to go on to after signing in. */
export const Back = z.string().max(500).optional();

export const SignIn = z.strictObject({ email: Email, password: Password });

/** What follows a right password, link or identity: the second factor, or the place they wanted. */
export interface SignInStep {
  next: "second-factor" | "done";
}

export const SendLink = z.strictObject({ email: Email, back: Back });
export const LinkOnly = z.strictObject({ token: LinkToken });
export const Reset = z.strictObject({ token: LinkToken, password: NewPassword });

export const Forgotten = z.strictObject({ email: Email });
export const SecondFactor = z.strictObject({ code: SecondFactorCode });

export const FirstOwner = z.strictObject({
  name: PersonName,
  email: Email,
  password: NewPassword,
  workshop: Name,
  currency: ListedCurrency,
});
export type FirstOwner = z.infer<typeof FirstOwner>;
