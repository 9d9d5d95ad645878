import { z } from "zod";
import { RowId } from "./field.ts";
import { ROLES, type Role } from "./limits.ts";
import { Email, LinkToken, NewPassword, PersonName } from "./person.ts";

/** An invitation as the owner sends it; a co-builder is asked to one kit. */
export const NewInvitation = z
  .strictObject({ email: Email, role: z.enum(ROLES), kit: RowId.nullable() })
  .refine(({ role, kit }) => (role === "co-builder") === (kit !== null), {
    path: ["kit"],
    message: "Choose the kit a co-builder is asked to; other roles see every kit.",
  });
export type NewInvitation = z.infer<typeof NewInvitation>;

/** An invitation that was not taken, as the owner sees it. Times in milliseconds since 1970. */
export interface OpenInvitation {
  id: string;
  email: string;
  role: Role;
  kit: { id: string; name: string } | null;
  /** Name of who asked; `null` where they are gone. */
  by: string | null;
  sentAt: number;
  expiresAt: number;
  /** Whether its time ran out. */
  ended: boolean;
}

/** What the holder of an invitation's link sees before taking it. */
export interface SeenInvitation {
  workshop: string;
  by: string | null;
  email: string;
  role: Role;
  kit: string | null;
  /** Whether somebody with this address has an account: they sign in first. */
  hasAccount: boolean;
}

export const InvitationLink = z.strictObject({ token: LinkToken });

/** Taking an invitation; name and password only for somebody who has no account yet. */
export const TakenInvitation = z.strictObject({
  token: LinkToken,
  name: PersonName.optional(),
  password: NewPassword.optional(),
});
export type TakenInvitation = z.infer<typeof TakenInvitation>;
