import { config } from "#src/server/config.ts";
import { type Letter, letter } from "./letter.ts";

interface Invited {
  to: string;
  by: string;
  workshop: string;
  role: string;
  /** Name of the kit a co-builder is asked to. */
  kit: string | null;
  token: string;
}

/** Asks somebody into a workshop. */
export function invitationLetter({ to, by, workshop, role, kit, token }: Invited): Letter {
  const place = kit ? `the kit ${kit} of ${workshop}` : workshop;
  return letter({
    to,
    subject: `${by} asks you to ${workshop}`,
    says: [
      `${by} asks you to ${place} on Tinpenny, as ${role}.`,
      "Tinpenny works out what a kit of parts costs and how many to make.",
    ],
    action: { words: "See the invitation", link: `${config().origin}/invitation?token=${token}` },
    ends: [
      `The link is for you alone and works for a week. If you do not know ${by}, leave the letter: nothing happens.`,
    ],
  });
}
