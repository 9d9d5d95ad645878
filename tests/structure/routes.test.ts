import { describe, expect, it } from "vitest";
import { can, PERMISSIONS, type Permission } from "#src/access.ts";
import { POST as makeToken } from "#src/pages/api/workshops/[workshop]/access-tokens.ts";
import { makeKit } from "#src/server/kit-changes.ts";
import type { May, Route } from "#src/server/route.ts";
import { ROLES, type Role } from "#src/shapes/limits.ts";
import { type Asking, call, testApp } from "#tests/support/app.ts";

/**
 * Who may call each method of each address. This is the decision; the declaration in the route has to
 * agree. A new route without a row here fails.
 */
const DECISIONS: Record<string, May> = {
  "GET /account": "in-person",
  "PATCH /account": "in-person",
  "POST /account/confirmation": "in-person",
  "POST /account/email": "in-person",
  "POST /account/identity": "in-person",
  "DELETE /account/identity": "in-person",
  "PUT /account/password": "in-person",
  "POST /account/recovery-codes": "in-person",
  "POST /account/second-factor": "in-person",
  "PUT /account/second-factor": "in-person",
  "POST /account/second-factor/off": "in-person",
  "GET /account/sessions": "in-person",
  "DELETE /account/sessions": "in-person",
  "DELETE /account/sessions/[session]": "in-person",
  "POST /confirm": "anyone",
  "POST /costing": "signed-in",
  "POST /first-owner": "anyone",
  "POST /forgotten": "anyone",
  "POST /identity": "anyone",
  "GET /identity/callback": "anyone",
  "GET /invitation": "anyone",
  "POST /invitation": "anyone",
  "GET /openapi.json": "anyone",
  "POST /reset": "anyone",
  "GET /samples/[file]": "anyone",
  "POST /sign-in": "anyone",
  "POST /sign-in/link": "anyone",
  "POST /sign-in/second-factor": "half-signed-in",
  "POST /sign-in/send-link": "anyone",
  "POST /sign-out": "half-signed-in",
  "POST /sign-out/everywhere": "in-person",
  "GET /workshops/[workshop]/access-tokens": "member",
  "POST /workshops/[workshop]/access-tokens": "member",
  "DELETE /workshops/[workshop]/access-tokens/[token]": "member",
  "GET /workshops/[workshop]/currency-rates": "see-money",
  "POST /workshops/[workshop]/currency-rates/fetch": "change-supply",
  "POST /workshops/[workshop]/currency-rates/file": "change-supply",
  "PUT /workshops/[workshop]/currency-rates/[currency]": "change-supply",
  "DELETE /workshops/[workshop]/currency-rates/[currency]": "change-supply",
  "PATCH /workshops/[workshop]/hour-rate": "change-run",
  "GET /workshops/[workshop]/imports": "change-supply",
  "POST /workshops/[workshop]/imports": "change-supply",
  "GET /workshops/[workshop]/imports/[import]": "change-supply",
  "PATCH /workshops/[workshop]/imports/[import]": "change-supply",
  "DELETE /workshops/[workshop]/imports/[import]": "change-supply",
  "POST /workshops/[workshop]/imports/[import]/take-back": "change-supply",
  "POST /workshops/[workshop]/imports/[import]/take": "change-supply",
  "POST /workshops/[workshop]/imports/pasted": "change-supply",
  "GET /workshops/[workshop]": "manage-workshop",
  "PATCH /workshops/[workshop]": "manage-workshop",
  "DELETE /workshops/[workshop]": "manage-workshop",
  "GET /workshops/[workshop]/invitations": "manage-workshop",
  "POST /workshops/[workshop]/invitations": "manage-workshop",
  "POST /workshops/[workshop]/invitations/[invitation]": "manage-workshop",
  "DELETE /workshops/[workshop]/invitations/[invitation]": "manage-workshop",
  "GET /workshops/[workshop]/kits/[kit]/boards": "see-money",
  "POST /workshops/[workshop]/kits/[kit]/boards/panel-terms": "change-supply",
  "PATCH /workshops/[workshop]/kits/[kit]/boards/panel-terms/[terms]": "change-supply",
  "DELETE /workshops/[workshop]/kits/[kit]/boards/panel-terms/[terms]": "change-supply",
  "POST /workshops/[workshop]/kits/[kit]/boards/quotes": "change-supply",
  "PATCH /workshops/[workshop]/kits/[kit]/boards/quotes/[quote]": "change-supply",
  "DELETE /workshops/[workshop]/kits/[kit]/boards/quotes/[quote]": "change-supply",
  "GET /workshops/[workshop]/kits/[kit]/channels": "see-money",
  "POST /workshops/[workshop]/kits/[kit]/channels": "change-price",
  "PUT /workshops/[workshop]/kits/[kit]/channels": "change-price",
  "PATCH /workshops/[workshop]/kits/[kit]/channels/[channel]": "change-price",
  "DELETE /workshops/[workshop]/kits/[kit]/channels/[channel]": "change-price",
  "POST /workshops/[workshop]/kits/[kit]/charges": "change-run",
  "PATCH /workshops/[workshop]/kits/[kit]/charges/[charge]": "change-run",
  "DELETE /workshops/[workshop]/kits/[kit]/charges/[charge]": "change-run",
  "PATCH /workshops/[workshop]/kits/[kit]/choices/[part]": "change-run",
  "POST /workshops/[workshop]/kits/[kit]/copies": "change-parts",
  "GET /workshops/[workshop]/kits/[kit]/editions/[edition]": "change-parts",
  "PATCH /workshops/[workshop]/kits/[kit]/editions/[edition]": "change-parts",
  "DELETE /workshops/[workshop]/kits/[kit]/editions/[edition]": "change-parts",
  "PATCH /workshops/[workshop]/kits/[kit]/editions/[edition]/price": "change-price",
  "PATCH /workshops/[workshop]/kits/[kit]/editions/[edition]/weight": "change-run",
  "GET /workshops/[workshop]/kits/[kit]/editions": "see-parts",
  "POST /workshops/[workshop]/kits/[kit]/editions": "change-parts",
  "PUT /workshops/[workshop]/kits/[kit]/editions": "change-parts",
  "GET /workshops/[workshop]/kits/[kit]/imports": "change-parts",
  "POST /workshops/[workshop]/kits/[kit]/imports": "change-parts",
  "GET /workshops/[workshop]/kits/[kit]/imports/[import]": "change-parts",
  "PATCH /workshops/[workshop]/kits/[kit]/imports/[import]": "change-parts",
  "DELETE /workshops/[workshop]/kits/[kit]/imports/[import]": "change-parts",
  "GET /workshops/[workshop]/kits/[kit]/imports/[import]/cost": "change-parts",
  "POST /workshops/[workshop]/kits/[kit]/imports/[import]/take-back": "change-parts",
  "POST /workshops/[workshop]/kits/[kit]/imports/[import]/take": "change-parts",
  "POST /workshops/[workshop]/kits/[kit]/imports/pasted": "change-parts",
  "GET /workshops/[workshop]/kits/[kit]": "see-parts",
  "PATCH /workshops/[workshop]/kits/[kit]": "change-parts",
  "DELETE /workshops/[workshop]/kits/[kit]": "change-parts",
  "GET /workshops/[workshop]/kits/[kit]/lines": "see-parts",
  "PATCH /workshops/[workshop]/kits/[kit]/lines": "change-parts",
  "GET /workshops/[workshop]/kits/[kit]/offers": "see-money",
  "POST /workshops/[workshop]/kits/[kit]/packing": "change-run",
  "PATCH /workshops/[workshop]/kits/[kit]/packing/[item]": "change-run",
  "DELETE /workshops/[workshop]/kits/[kit]/packing/[item]": "change-run",
  "GET /workshops/[workshop]/kits/[kit]/plan": "see-money",
  "POST /workshops/[workshop]/kits/[kit]/revisions": "change-parts",
  "GET /workshops/[workshop]/kits/[kit]/revisions/last": "see-parts",
  "PATCH /workshops/[workshop]/kits/[kit]/run": "change-run",
  "PUT /workshops/[workshop]/kits/[kit]/suppliers/[supplier]/shut-out": "change-run",
  "DELETE /workshops/[workshop]/kits/[kit]/suppliers/[supplier]/shut-out": "change-run",
  "POST /workshops/[workshop]/kits/[kit]/tasks": "change-run",
  "PATCH /workshops/[workshop]/kits/[kit]/tasks/[task]": "change-run",
  "DELETE /workshops/[workshop]/kits/[kit]/tasks/[task]": "change-run",
  "GET /workshops/[workshop]/kits": "see-parts",
  "POST /workshops/[workshop]/kits": "change-parts",
  "DELETE /workshops/[workshop]/membership": "member",
  "POST /workshops/[workshop]/offers": "change-supply",
  "PATCH /workshops/[workshop]/offers/[offer]": "change-supply",
  "DELETE /workshops/[workshop]/offers/[offer]": "change-supply",
  "PATCH /workshops/[workshop]/parts/[part]": "change-parts",
  "GET /workshops/[workshop]/parts/[part]/offers": "see-money",
  "POST /workshops/[workshop]/parts/[part]/offers": "change-supply",
  "GET /workshops/[workshop]/people": "manage-workshop",
  "PATCH /workshops/[workshop]/people/[person]": "manage-workshop",
  "DELETE /workshops/[workshop]/people/[person]": "manage-workshop",
  "PUT /workshops/[workshop]/people/[person]/kits": "manage-workshop",
  "GET /workshops/[workshop]/suppliers": "see-money",
  "POST /workshops/[workshop]/suppliers": "change-supply",
  "GET /workshops/[workshop]/suppliers/[supplier]": "see-money",
  "PATCH /workshops/[workshop]/suppliers/[supplier]": "change-supply",
  "DELETE /workshops/[workshop]/suppliers/[supplier]": "change-supply",
  "GET /workshops/[workshop]/suppliers/[supplier]/offers": "see-money",
  "POST /workshops": "in-person",
};

const METHODS = ["GET", "POST", "PUT", "PATCH", "DELETE"] as const;
const BELOW_WORKSHOP = "/workshops/[workshop]";

interface Endpoint {
  name: string;
  method: string;
  path: string;
  route: Route<unknown, unknown>;
}

const files = import.meta.glob<Record<string, unknown>>("/src/pages/api/**/*.ts", { eager: true });

const endpoints: Endpoint[] = Object.entries(files).flatMap(([file, exported]) => {
  const path = file.replace("/src/pages/api", "").replace(/(\/index)?\.ts$/, "");
  return METHODS.filter((method) => method in exported).map((method) => {
    const route = exported[method] as Route<unknown, unknown>;
    return { name: `${method} ${path}`, method, path, route };
  });
});

const inWorkshop = endpoints.filter(({ path }) => path.startsWith(BELOW_WORKSHOP));
const forSomebody = endpoints.filter(({ route }) => route.may !== "anyone");

const app = testApp();

/** A workshop with a kit; every variable of an address that is neither names nothing. */
function place() {
  const workshop = app.workshop();
  const user = app.person("owner", workshop);
  const entry = { name: "Dew Lantern", summary: "", boardNeeded: true, boardShape: "rectangle" } as const;
  const kit = makeKit({ db: app.db, now: app.now, user, workshop }, entry);
  return { workshop, kit, ids: { workshop: workshop.id, kit: kit.id } as Record<string, string> };
}

function ask({ path, method, route }: Endpoint, ids: Record<string, string>, asking: Asking) {
  const names = [...path.matchAll(/\[(\w+)\]/g)].map(([, name]) => name ?? "");
  const params = Object.fromEntries(names.map((name) => [name, ids[name] ?? "names-nothing"]));
  const body = method === "GET" ? undefined : {};
  return call(route, { method, params, body, ...asking });
}

function mayBe(role: Role, may: May): boolean {
  return may in PERMISSIONS ? can(role, may as Permission) : true;
}

describe("every route", () => {
  it("has a decision about who may call it, and declares the same", () => {
    const declared = Object.fromEntries(endpoints.map(({ name, route }) => [name, route.may]));
    expect(declared, "Add, change or remove the row in DECISIONS of this file").toEqual(DECISIONS);
  });

  it("below a workshop asks for a permission there, or for one of its people; no other does", () => {
    const placed = (may: May) => may === "member" || may in PERMISSIONS;
    const odd = endpoints.filter(({ path, route }) => placed(route.may) !== path.startsWith(BELOW_WORKSHOP));
    expect(odd.map(({ name }) => name)).toEqual([]);
  });
});

/** One test for each endpoint, named by it. */
function each(these: Endpoint[], says: string, run: (endpoint: Endpoint) => Promise<void>): void {
  for (const endpoint of these) it(`${endpoint.name}: ${says}`, () => run(endpoint));
}

describe("who may call", () => {
  each(forSomebody, "nobody without signing in", async (endpoint) => {
    const answer = await ask(endpoint, place().ids, {});
    expect([answer.status, answer.problem?.code]).toEqual([401, "sign-in-needed"]);
  });

  each(forSomebody, "not with half a sign-in, unless that is what it is for", async (endpoint) => {
    const { workshop, ids } = place();
    const cookie = app.signIn(app.person("owner", workshop), false);
    const { problem } = await ask(endpoint, ids, { cookie });
    const forHalf = endpoint.route.may === "half-signed-in";
    expect(problem?.code === "second-factor-needed").toBe(!forHalf);
  });

  each(inWorkshop, "a stranger, even an owner elsewhere, learns nothing", async (endpoint) => {
    const { ids } = place();
    const stranger = app.person("owner", app.workshop());
    const answer = await ask(endpoint, ids, { as: stranger });
    expect([answer.status, answer.problem?.code]).toEqual([404, "not-found"]);
  });

  each(inWorkshop, "each role as the permission table says", async (endpoint) => {
    for (const role of ROLES) {
      const { workshop, kit, ids } = place();
      const person = app.person(role, workshop);
      if (role === "co-builder") app.guest(person, kit);
      const { status, problem } = await ask(endpoint, ids, { as: person });
      const refused = problem?.code === "role-may-not";
      expect([role, refused], `${status} ${problem?.code}`).toEqual([role, !mayBe(role, endpoint.route.may)]);
      expect(status === 403).toBe(refused);
    }
  });

  each(inWorkshop, "a token does what its person may, in its own workshop", async (endpoint) => {
    const { workshop, ids } = place();
    const seller = app.person("seller", workshop);
    const elsewhere = app.workshop();
    app.join(seller, elsewhere, "owner");
    const body = { name: "script", days: 1 };
    const here = await call(makeToken, { as: seller, params: { workshop: workshop.id }, body });
    const there = await call(makeToken, { as: seller, params: { workshop: elsewhere.id }, body });
    const refused = (await ask(endpoint, ids, { token: here.body.token })).problem?.code === "role-may-not";
    expect(refused).toBe(!mayBe("seller", endpoint.route.may));
    expect((await ask(endpoint, ids, { token: there.body.token })).status).toBe(404);
  });

  const ofKits = inWorkshop.filter(({ path }) => path.includes("[kit]"));
  each(ofKits, "not a co-builder who was not asked, nor through another workshop", async (endpoint) => {
    const { workshop, kit, ids } = place();
    const coBuilder = app.person("co-builder", workshop);
    expect((await ask(endpoint, ids, { as: coBuilder })).status).toBe(404);
    const other = app.workshop();
    const owner = app.person("owner", other);
    expect((await ask(endpoint, { workshop: other.id, kit: kit.id }, { as: owner })).status).toBe(404);
  });

  const changing = endpoints.filter(({ method }) => method !== "GET");
  each(changing, "not because another site asks", async (endpoint) => {
    const { workshop, ids } = place();
    const owner = app.person("owner", workshop);
    for (const origin of ["https://elsewhere.example", null]) {
      const answer = await ask(endpoint, ids, { as: owner, origin });
      expect([answer.status, answer.problem?.code]).toEqual([403, "other-origin"]);
    }
  });
});
