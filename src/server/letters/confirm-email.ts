import { config } from "#src/server/config.ts";
import { type Letter, letter } from "./letter.ts";

/** Asks the holder of an address to confirm it. */
export function confirmEmailLetter(to: string, name: string, token: string): Letter {
  return letter({
    to,
    subject: "Confirm your email address",
    says: [`${name}, you gave this address to Tinpenny. Confirm that it is yours.`],
    action: { words: "Confirm the address", link: `${config().origin}/confirm?token=${token}` },
    ends: [
      "The link works once, within two days. If you did not give this address, leave the letter: nothing happens.",
    ],
  });
}
