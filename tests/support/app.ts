import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join as joinPath } from "node:path";
import { afterEach, beforeEach } from "vitest";
import { type Db, migrateDb, openDb } from "#db/client.ts";
import { kitGuests } from "#db/schema/guests.ts";
import { kits } from "#db/schema/kits.ts";
import { users } from "#db/schema/people.ts";
import { memberships, workshops } from "#db/schema/workshops.ts";
import { setClock } from "#src/server/clock.ts";
import { type Config, config, readConfig, setConfig } from "#src/server/config.ts";
import { setDb } from "#src/server/db.ts";
import { laterDone } from "#src/server/later.ts";
import type { Letter } from "#src/server/letters/letter.ts";
import { setMailer } from "#src/server/mail.ts";
import { newId } from "#src/server/new-id.ts";
import type { ProblemBody } from "#src/server/problem.ts";
import type { Route } from "#src/server/route.ts";
import { beginSession } from "#src/server/session.ts";
import type { KitRow } from "#src/server/store/kit.ts";
import type { WorkshopRow } from "#src/server/store/membership.ts";
import type { UserRow } from "#src/server/store/session.ts";
import type { Role } from "#src/shapes/limits.ts";

/** The moment every test begins: Monday 9 March 2026, 10:00 UTC. */
export const START = Date.UTC(2026, 2, 9, 10);

let image: Buffer | undefined;

/** A fresh database in memory: migrated once per file of tests, then cloned from its bytes. */
export function freshDb(): Db {
  if (!image) {
    const db = openDb(":memory:");
    migrateDb(db);
    image = db.$client.serialize();
    db.$client.close();
  }
  return openDb(Buffer.from(image));
}

/** A person with the cookie of a finished sign-in. */
export interface TestPerson extends UserRow {
  cookie: string;
}

export interface Asking {
  /** Who asks; left out, nobody is signed in. */
  as?: TestPerson;
  /** A cookie of its own, such as a sign-in that waits for the second factor. */
  cookie?: string;
  /** A personal access token, as a script sends it. */
  token?: string;
  /** The address's variables, such as `{ workshop, kit }`. */
  params?: Record<string, string>;
  query?: Record<string, string>;
  /** Sent as JSON. */
  body?: unknown;
  /** Sent as it is, with its content type, instead of `body`. */
  bytes?: { content: Uint8Array | string; type: string };
  /** `null` sends no Origin header; left out, it is our own. */
  origin?: string | null;
  method?: string;
  headers?: Record<string, string>;
  /** The IP address it comes from. */
  address?: string;
}

export interface Answer<R> {
  status: number;
  /** The JSON of a reply that succeeded, typed as the route returns it; text where it was not JSON. */
  body: R;
  /** The failure, where it was one. */
  problem: ProblemBody | null;
  headers: Headers;
}

function requestOf(asking: Asking): Request {
  const url = new URL(`${config().origin}/api`);
  for (const [name, value] of Object.entries(asking.query ?? {})) url.searchParams.set(name, value);
  const headers = new Headers(asking.headers);
  const cookie = asking.cookie ?? asking.as?.cookie;
  if (cookie) headers.set("cookie", cookie);
  if (asking.token) headers.set("authorization", `Bearer ${asking.token}`);
  const origin = asking.origin === undefined ? config().origin : asking.origin;
  if (origin !== null && !asking.token) headers.set("origin", origin);
  const method = asking.method ?? "POST";
  if (asking.bytes) {
    headers.set("content-type", asking.bytes.type);
    return new Request(url, { method, headers, body: asking.bytes.content as BodyInit });
  }
  if (asking.body === undefined) return new Request(url, { method, headers });
  headers.set("content-type", "application/json");
  return new Request(url, { method, headers, body: JSON.stringify(asking.body) });
}

/**
 * Calls a route in memory, as the server would. The method is POST unless said, so that the check of the
 * origin always runs.
 */
export async function call<R>(route: Route<unknown, R>, asking: Asking = {}): Promise<Answer<R>> {
  const request = requestOf(asking);
  const response = await route({
    request,
    params: asking.params ?? {},
    clientAddress: asking.address ?? "192.0.2.1",
  });
  const text = await response.text();
  const type = response.headers.get("content-type") ?? "";
  const read: unknown = type.includes("json") && text ? JSON.parse(text) : text || undefined;
  const problem = type.startsWith("application/problem+json") ? (read as ProblemBody) : null;
  return { status: response.status, body: read as R, problem, headers: response.headers };
}

/** The `name=value` of a Set-Cookie header, as a browser sends it back. */
export function cookieOf(setCookie: string | null): string {
  return setCookie?.split(";")[0] ?? "";
}

export interface App {
  readonly db: Db;
  readonly now: number;
  /** Lets time pass, in milliseconds. */
  pass(milliseconds: number): void;
  /** The letters that went out, once nothing is left to do. */
  letters(): Promise<Letter[]>;
  /** Changes settings for this test. */
  settings(changed: Partial<Config>): void;
  workshop(over?: Partial<WorkshopRow>): WorkshopRow;
  /** A person, signed in; with a role and a workshop also one of its people. */
  person(role?: Role, workshop?: WorkshopRow, over?: Partial<UserRow>): TestPerson;
  /** Makes a person one of a workshop's people. */
  join(person: UserRow, workshop: WorkshopRow, role: Role): void;
  kit(workshop: WorkshopRow, over?: Partial<KitRow>): KitRow;
  /** Asks a co-builder to a kit. */
  guest(person: UserRow, kit: KitRow): void;
  /** The cookie of another sign-in of this person; not `complete`: it waits for the second factor. */
  signIn(person: UserRow, complete?: boolean): string;
}

interface Ground {
  db: Db;
  now: number;
  folder: string;
  made: number;
  letters: Letter[];
}

/** The secret of the link in a letter. */
export function tokenIn(letter: Letter | undefined): string {
  return /token=(\w+)/.exec(letter?.text ?? "")?.[1] ?? "";
}

function newGround(): Ground {
  const folder = mkdtempSync(joinPath(tmpdir(), "tinpenny-test-"));
  const ground: Ground = { db: freshDb(), now: START, folder, made: 0, letters: [] };
  setDb(ground.db);
  setConfig(readConfig({ TINPENNY_DATA: folder }));
  setClock(() => ground.now);
  setMailer(async (letter) => void ground.letters.push(letter));
  return ground;
}

function builders(ground: () => Ground): App {
  const app: App = {
    get db() {
      return ground().db;
    },
    get now() {
      return ground().now;
    },
    pass(milliseconds) {
      ground().now += milliseconds;
    },
    async letters() {
      await laterDone();
      return ground().letters;
    },
    settings(changed) {
      setConfig({ ...config(), ...changed });
    },
    workshop(over) {
      const row = { id: newId(), name: "Ferry Yard", currency: "EUR", createdAt: app.now, ...over };
      return app.db.insert(workshops).values(row).returning().get();
    },
    person(role, workshop, over) {
      const number = ++ground().made;
      const named = { email: `person${number}@example.org`, name: `Person ${number}` };
      const row = { id: newId(), ...named, emailConfirmedAt: app.now, createdAt: app.now, ...over };
      const user = app.db.insert(users).values(row).returning().get();
      if (role && workshop) app.join(user, workshop, role);
      return { ...user, cookie: app.signIn(user) };
    },
    join(person, workshop, role) {
      const row = { workshopId: workshop.id, userId: person.id, role, createdAt: app.now };
      app.db.insert(memberships).values(row).run();
    },
    kit(workshop, over) {
      const number = ++ground().made;
      const row = { id: newId(), workshopId: workshop.id, name: `Kit ${number}`, summary: "" };
      return app.db
        .insert(kits)
        .values({ ...row, createdAt: app.now, ...over })
        .returning()
        .get();
    },
    guest(person, kit) {
      const row = { workshopId: kit.workshopId, kitId: kit.id, userId: person.id };
      app.db.insert(kitGuests).values(row).run();
    },
    signIn(person, complete = true) {
      return cookieOf(beginSession(app.db, person.id, "A browser for tests", complete, app.now));
    },
  };
  return app;
}

/**
 * The ground every test of the server stands on: before each test a fresh database, a clock that stands at
 * `START`, a data folder of its own, and letters that are only collected. Called once, at the top of a file of tests.
 */
export function testApp(): App {
  let ground: Ground | undefined;
  beforeEach(() => {
    ground = newGround();
  });
  afterEach(async () => {
    if (!ground) return;
    await laterDone();
    ground.db.$client.close();
    rmSync(ground.folder, { recursive: true, force: true });
    setConfig();
    setClock();
    setMailer();
    ground = undefined;
  });
  return builders(() => {
    if (!ground) throw new Error("The builders work inside a test, not while the file is read.");
    return ground;
  });
}
