import type { APIContext } from "astro";
import type { z } from "zod";
import type { Db } from "#db/client.ts";
import { can, type Permission, rolesThatCan, seesEveryKit } from "#src/access.ts";
import { JSON_BYTES, type Role } from "#src/shapes/limits.ts";
import { checked } from "./checked.ts";
import { now } from "./clock.ts";
import { config } from "./config.ts";
import { serverDb } from "./db.ts";
import { Problem, problemReply } from "./problem.ts";
import { readBytes, readJson } from "./read-body.ts";
import { tokenHash } from "./secret-token.ts";
import { sessionOf } from "./session.ts";
import { accessTokenByHash, touchAccessToken } from "./store/access-token.ts";
import { type KitRow, kitOf } from "./store/kit.ts";
import { isGuestOf, membershipOf, type WorkshopRow } from "./store/membership.ts";
import type { SessionRow, UserRow } from "./store/session.ts";

/** What every handler is given. */
export interface Common {
  db: Db;
  now: number;
  request: Request;
  url: URL;
  params: Record<string, string>;
  /** Where the request came from, for limits on attempts. */
  address: string;
  /** Headers of the reply; a handler adds cookies here. */
  headers: Headers;
}
interface Person {
  user: UserRow;
  /** `null` for a script with an access token. */
  session: SessionRow | null;
}
/** A person at a browser, not a script with an access token. */
export interface InPerson extends Person {
  session: SessionRow;
}
interface Place {
  workshop: WorkshopRow;
  role: Role;
}
interface InKit {
  /** The kit of the address; only where the address has `[kit]`. */
  kit: KitRow;
}

/**
 * Who may call: a permission in the workshop of the address; `member`: anybody of that workshop;
 * `signed-in`: any person or script; `in-person`: any person, but no script; `half-signed-in`: also somebody
 * who still owes the second factor, but no script; or `anyone`.
 */
export type May = Permission | "member" | "signed-in" | "in-person" | "half-signed-in" | "anyone";

const NOWHERE: readonly May[] = ["signed-in", "in-person", "half-signed-in", "anyone"];
const NOT_FOR_SCRIPTS: readonly May[] = ["in-person", "half-signed-in"];

type Handed<M extends May> = Common &
  (M extends "anyone"
    ? unknown
    : M extends "signed-in"
      ? Person
      : M extends "in-person" | "half-signed-in"
        ? InPerson
        : Person & Place & InKit);

interface Declaration<M extends May, I extends z.ZodType, Q extends z.ZodType, R> {
  may: M;
  /** Shape of the JSON body. */
  input?: I;
  /** Shape of the query string. */
  query?: Q;
  /** A body of raw bytes instead of JSON, such as an uploaded file; its limit is `limit`. */
  bytes?: true;
  /** Most bytes of the body. */
  limit?: number;
  status?: number;
  /** Does the one thing. What it returns is sent as JSON, a `Response` as it is, `undefined` as 204. */
  run(given: Handed<M> & { input: z.output<I>; query: z.output<Q>; bytes: Uint8Array }): R | Promise<R>;
}

export interface Route<I = unknown, R = unknown> {
  (context: Pick<APIContext, "request" | "params"> & { clientAddress?: string }): Promise<Response>;
  may: May;
  /** Whether a JSON body is read, for the test that lists every address. */
  input: z.ZodType | null;
  query: z.ZodType | null;
  /** Whether the body is raw bytes. */
  bytes: boolean;
  /** Of a reply that succeeded. */
  status: number;
  /** Only in types: what the browser sends and receives. */
  readonly types?: { input: I; reply: R };
}

/** What the browser sends to a route. */
export type InputOf<T> = T extends Route<infer I, unknown> ? I : never;
/** What a route sends back, as it arrives after JSON. */
export type ReplyOf<T> = T extends Route<unknown, infer R> ? R : never;

function checkOrigin(request: Request): void {
  if (request.method === "GET" || request.method === "HEAD") return;
  const origin = request.headers.get("origin");
  if (origin !== config().origin)
    throw new Problem("other-origin", { parameters: { origin: config().origin } });
}

function personOf(db: Db, request: Request, time: number, may: May): Person & { onlyIn: string | null } {
  const bearer = /^Bearer (\w+)$/.exec(request.headers.get("authorization") ?? "")?.[1];
  if (bearer) {
    if (NOT_FOR_SCRIPTS.includes(may)) throw new Problem("not-for-scripts");
    const found = accessTokenByHash(db, tokenHash(bearer), time);
    if (!found) throw new Problem("sign-in-needed");
    touchAccessToken(db, found.token.id, time);
    return { user: found.user, session: null, onlyIn: found.token.workshopId };
  }
  checkOrigin(request);
  const { session, user } = sessionOf(db, request, time);
  if (!session) throw new Problem("sign-in-needed");
  if (!session.complete && may !== "half-signed-in") throw new Problem("second-factor-needed");
  return { user, session, onlyIn: null };
}

/** Refuses a script, where only a person at a browser may do a thing. */
export function requireBrowser(session: SessionRow | null): asserts session is SessionRow {
  if (session === null) throw new Problem("not-for-scripts");
}

/** The workshop and kit of an address, for this person: a stranger learns nothing, not even that it exists. */
export function placeOf(
  db: Db,
  user: UserRow,
  workshopId: string,
  kitId: string | undefined,
): Place & { kit: KitRow | undefined } {
  const found = membershipOf(db, workshopId, user.id);
  if (!found) throw new Problem("not-found");
  const kit = kitId === undefined ? undefined : kitOf(db, workshopId, kitId);
  if (kitId !== undefined && !kit) throw new Problem("not-found");
  const { role } = found.membership;
  if (kit && !seesEveryKit(role) && !isGuestOf(db, kit.id, user.id)) throw new Problem("not-found");
  return { workshop: found.workshop, role, kit };
}

/** Refuses a role that may not do a thing, naming the roles that may. */
export function requirePermission(role: Role, permission: Permission): void {
  if (!can(role, permission))
    throw new Problem("role-may-not", { parameters: { role, roles: rolesThatCan(permission).join(", ") } });
}

function reply(value: unknown, status: number, headers: Headers): Response {
  if (value instanceof Response) {
    for (const [name, content] of headers) value.headers.append(name, content);
    return value;
  }
  if (!headers.has("cache-control")) headers.set("cache-control", "no-store");
  if (value === undefined) return new Response(null, { status: 204, headers });
  headers.set("content-type", "application/json");
  return new Response(JSON.stringify(value), { status, headers });
}

/**
 * Declares an endpoint: who may call it, what it takes, and the one thing it does. In this order: person
 * (401), workshop and kit of the address (404 for strangers), permission (403), body (400, 413, 415, 422).
 * A request that changes something must come from our own origin, or carry an access token.
 */
export function route<M extends May, R, I extends z.ZodType = z.ZodType, Q extends z.ZodType = z.ZodType>(
  declared: Declaration<M, I, Q, R>,
): Route<z.input<I>, Awaited<R>> {
  async function answer(context: Parameters<Route>[0]): Promise<Response> {
    const { request } = context;
    const db = serverDb();
    const params = context.params as Record<string, string>;
    const url = new URL(request.url);
    const headers = new Headers();
    const common = { db, now: now(), request, url, params, address: context.clientAddress ?? "", headers };
    const given: Record<string, unknown> = { ...common };
    if (declared.may === "anyone") checkOrigin(request);
    else {
      const { onlyIn, ...person } = personOf(db, request, common.now, declared.may);
      Object.assign(given, person);
      if (!NOWHERE.includes(declared.may)) {
        if (onlyIn !== null && onlyIn !== params.workshop) throw new Problem("not-found");
        const place = placeOf(db, person.user, params.workshop ?? "", params.kit);
        if (declared.may !== "member") requirePermission(place.role, declared.may as Permission);
        Object.assign(given, place);
      }
    }
    if (declared.query) given.query = checked(declared.query, Object.fromEntries(url.searchParams));
    const limit = declared.limit ?? JSON_BYTES;
    if (declared.bytes) given.bytes = await readBytes(request, limit);
    if (declared.input) given.input = checked(declared.input, await readJson(request, limit));
    return reply(await declared.run(given as never), declared.status ?? 200, headers);
  }

  const handler = async (context: Parameters<Route>[0]) => {
    try {
      return await answer(context);
    } catch (error) {
      if (error instanceof Problem) return problemReply(error);
      throw error;
    }
  };
  return Object.assign(handler, {
    may: declared.may,
    input: declared.input ?? null,
    query: declared.query ?? null,
    bytes: declared.bytes ?? false,
    status: declared.status ?? 200,
  }) as unknown as Route<z.input<I>, Awaited<R>>;
}
