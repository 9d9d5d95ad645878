import { config } from "#src/server/config.ts";
import { type Letter, letter } from "./letter.ts";

/** What changed about a person's way in; each is told by letter, in case it was not them. */
const CHANGES = {
  password: { subject: "Your password was changed", says: "your password at Tinpenny was changed." },
  email: {
    subject: "Your email address was changed",
    says: "your account at Tinpenny has another email address now.",
  },
  "second-factor-on": {
    subject: "The second factor is on",
    says: "signing in to Tinpenny asks for a code from your authenticator now.",
  },
  "second-factor-off": {
    subject: "The second factor is off",
    says: "signing in to Tinpenny no longer asks for a code from an authenticator.",
  },
  identity: {
    subject: "Another way to sign in",
    says: "your account at Tinpenny can now be opened through an outside account that has your address.",
  },
  "recovery-code": {
    subject: "A recovery code was used",
    says: "somebody signed in to Tinpenny with one of your recovery codes. It does not work again.",
  },
} as const;

export type AccountChange = keyof typeof CHANGES;

/** Tells a person that their way in was changed, so that they notice if somebody else did it. */
export function accountChangedLetter(to: string, name: string, change: AccountChange): Letter {
  const { subject, says } = CHANGES[change];
  return letter({
    to,
    subject,
    says: [`${name}, ${says}`],
    ends: [
      `If this was you, there is nothing to do. If not, choose a new password at ${config().origin}/forgotten and end the other sign-ins on your account page.`,
    ],
  });
}
