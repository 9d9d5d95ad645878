import { z } from "zod";
import { Back, LinkToken } from "./person.ts";

/** Beginning to sign in with the outside identity provider. */
export const IdentityBeginning = z.strictObject({ back: Back, invitation: LinkToken.optional() });

/** What the provider adds to the address it sends people back to; other parameters are its own affair. */
export const IdentityReturn = z.object({
  code: z.string().max(2000).optional(),
  state: z.string().max(200).optional(),
  error: z.string().max(200).optional(),
});
export type IdentityReturn = z.infer<typeof IdentityReturn>;
