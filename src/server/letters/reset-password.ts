import { config } from "#src/server/config.ts";
import { type Letter, letter } from "./letter.ts";

/** The way to a new password for somebody who forgot theirs. */
export function resetPasswordLetter(to: string, name: string, token: string): Letter {
  return letter({
    to,
    subject: "Choose a new password",
    says: [`${name}, a new password was asked for at Tinpenny with this address.`],
    action: { words: "Choose a new password", link: `${config().origin}/reset?token=${token}` },
    ends: [
      "The link works once, within an hour. If you did not ask, leave the letter: your password stays as it is.",
    ],
  });
}
