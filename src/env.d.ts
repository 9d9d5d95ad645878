/// <reference types="astro/client" />

declare namespace App {
  interface Locals {
    /** Who is signed in, on pages; `null` on pages for anyone. Routes under /api find out for themselves. */
    user: import("#src/server/store/session.ts").UserRow | null;
    session: import("#src/server/store/session.ts").SessionRow | null;
    /** The place of a page under /workshops/[workshop]; `kit` only below /kits/[kit]. */
    workshop: import("#src/server/store/membership.ts").WorkshopRow;
    role: import("#src/shapes/limits.ts").Role;
    kit: import("#src/server/store/kit.ts").KitRow;
    /** How the kit of the page stands; holds money, so only what a role may see is taken from it. */
    state: import("#src/server/trail.ts").KitState;
    stops: import("#src/server/trail.ts").KitStop[];
    head: import("#src/server/page-head.ts").PageHead;
    /** Why a page could not be shown, for the page that says so. */
    problem: import("#src/server/problem.ts").ProblemBody | undefined;
    /** For style elements that a library adds in the browser. */
    styleNonce: string;
  }
}
