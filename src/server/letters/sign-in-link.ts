import { config } from "#src/server/config.ts";
import { type Letter, letter } from "./letter.ts";

/** A link that signs in without a password. `back` is a path of ours to go on to. */
export function signInLinkLetter(to: string, name: string, token: string, back: string): Letter {
  const onwards = back === "/" ? "" : `&back=${encodeURIComponent(back)}`;
  return letter({
    to,
    subject: "Your link to sign in",
    says: [`${name}, here is the link to sign in to Tinpenny.`],
    action: { words: "Sign in", link: `${config().origin}/sign-in/link?token=${token}${onwards}` },
    ends: [
      "The link works once, within a quarter of an hour. If you did not ask for it, leave the letter, and tell nobody the link.",
    ],
  });
}
