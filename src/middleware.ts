import { defineMiddleware } from "astro:middleware";
import { randomBytes } from "node:crypto";
import type { APIContext } from "astro";
import { now, today } from "./server/clock.ts";
import { serverDb } from "./server/db.ts";
import { kitState } from "./server/kit-state.ts";
import { pageHead } from "./server/page-head.ts";
import { Problem, problemReply } from "./server/problem.ts";
import { placeOf } from "./server/route.ts";
import { addSecurityHeaders, contentSecurityPolicy } from "./server/security-headers.ts";
import { sessionOf } from "./server/session.ts";
import { setLastWorkshop } from "./server/store/user.ts";
import { kitStops } from "./server/trail.ts";
import { notTaken } from "./server/wrong-method.ts";

/** Sends somebody who is not signed in to the sign-in page, and back here afterwards. */
function toSignIn(context: APIContext): Response {
  const back = context.url.pathname + context.url.search;
  return context.redirect(`/sign-in?back=${encodeURIComponent(back)}`, 303);
}

/** Finds out, for a page, who asks and where; a page below a workshop exists only for its people. */
function enter(context: APIContext): Response | undefined {
  const { locals, request, params } = context;
  const db = serverDb();
  const { session, user } = sessionOf(db, request, now());
  locals.session = session?.complete ? session : null;
  locals.user = session?.complete ? user : null;
  if (params.workshop === undefined) return undefined;
  if (!locals.user) return toSignIn(context);
  const place = placeOf(db, locals.user, params.workshop, params.kit);
  Object.assign(locals, place);
  if (locals.user.lastWorkshopId !== place.workshop.id)
    setLastWorkshop(db, locals.user.id, place.workshop.id);
  if (place.kit) {
    locals.state = kitState(db, place.workshop, place.kit, today());
    locals.stops = kitStops(place.role, locals.state);
  }
  locals.head = pageHead(db, locals.user, place.workshop, place.role, place.kit);
  return undefined;
}

/** A page that cannot be shown says why, with the problem's own status. */
async function refusal(context: APIContext, problem: Problem): Promise<Response> {
  context.locals.problem = problem.body();
  const { status } = context.locals.problem;
  const shown = await context.rewrite(status === 404 ? "/404" : "/refused");
  return new Response(shown.body, { status, headers: shown.headers });
}

async function page(context: APIContext, next: () => Promise<Response>): Promise<Response> {
  try {
    return enter(context) ?? (await next());
  } catch (error) {
    if (error instanceof Problem) return refusal(context, error);
    throw error;
  }
}

/** Every address below /api by its file, so that a method it does not take is told from an address that is none. */
const addresses = import.meta.glob<Record<string, unknown>>("./pages/api/**/*.ts");

async function unanswered({ request, routePattern }: APIContext): Promise<Response> {
  const load = addresses[`./pages${routePattern}.ts`] ?? addresses[`./pages${routePattern}/index.ts`];
  return problemReply(notTaken(request.method, await load?.()));
}

async function api(context: APIContext, next: () => Promise<Response>): Promise<Response> {
  try {
    const response = await next();
    const isOurs = response.headers.get("content-type")?.includes("json") ?? false;
    return response.status === 404 && !isOurs ? unanswered(context) : response;
  } catch (error) {
    console.error(error);
    return problemReply(new Problem("our-mistake"));
  }
}

export const onRequest = defineMiddleware(async (context, next) => {
  context.locals.styleNonce = randomBytes(16).toString("base64");
  const response = context.url.pathname.startsWith("/api/")
    ? await api(context, next)
    : await page(context, next);
  const policy = response.headers.get("content-security-policy");
  if (policy)
    response.headers.set("content-security-policy", contentSecurityPolicy(policy, context.locals.styleNonce));
  addSecurityHeaders(response.headers);
  // Pages are personal, or have a secret in their address: after signing out, Back shows nothing.
  if (!response.headers.has("cache-control")) response.headers.set("cache-control", "no-store");
  return response;
});
