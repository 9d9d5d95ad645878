import { z } from "zod";
import { RowId, Version } from "./field.ts";
import { ROLES, type Role } from "./limits.ts";

/** One of a workshop's people, as its owners see them. */
export interface WorkshopPerson {
  id: string;
  name: string;
  email: string;
  role: Role;
  version: number;
  /** For a co-builder: the kits they were asked to. */
  kits: { id: string; name: string }[];
  /** The person who asks. */
  you: boolean;
}

export const RoleChange = z.strictObject({ role: z.enum(ROLES), version: Version });
export const KitsAskedTo = z.strictObject({ kits: z.array(RowId).max(200) });
