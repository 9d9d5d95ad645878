import type { APIContext } from "astro";
import { describe, expect, it } from "vitest";
import { onRequest } from "#src/middleware.ts";
import { landingPath } from "#src/server/landing.ts";
import { removeMembership } from "#src/server/store/membership.ts";
import { userById } from "#src/server/store/user.ts";
import { type TestPerson, testApp } from "#tests/support/app.ts";

const app = testApp();
const METHODS = ["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE", "OPTIONS"];
const files = import.meta.glob<Record<string, unknown>>("/src/pages/api/**/*.ts", { eager: true });

/** What is answered where the address itself answers so, or nothing does. */
async function answered(routePattern: string, method: string, own = new Response(null, { status: 404 })) {
  const request = new Request("http://127.0.0.1/api/an-address", { method });
  const context = { request, url: new URL(request.url), routePattern, locals: {} } as unknown as APIContext;
  return (await onRequest(context, async () => own)) as Response;
}

describe("a method that an address does not take", () => {
  it.each(Object.keys(files))("is refused at %s with the methods it takes", async (file) => {
    const pattern = file.replace("/src/pages", "").replace(/(\/index)?\.ts$/, "");
    const taken = METHODS.filter((method) => method in (files[file] ?? {}) || method === "HEAD");
    const allowed = "GET" in (files[file] ?? {}) ? taken : taken.filter((method) => method !== "HEAD");
    expect(allowed.length).toBeGreaterThan(0);
    for (const method of METHODS.filter((one) => !allowed.includes(one))) {
      const reply = await answered(pattern, method);
      expect([method, reply.status]).toEqual([method, 405]);
      expect(reply.headers.get("content-type")).toBe("application/problem+json");
      expect(reply.headers.get("allow")?.split(", ").sort()).toEqual([...allowed].sort());
      expect(await reply.json()).toMatchObject({ code: "not-this-method", status: 405 });
    }
  });

  it("is told from an address that is none, and from a thing that is not there", async () => {
    const none = await answered("/404", "GET", new Response("<html>", { status: 404 }));
    expect([none.status, none.headers.get("allow")]).toEqual([404, null]);
    const headers = { "content-type": "application/problem+json" };
    const gone = await answered("/api/costing", "GET", new Response("{}", { status: 404, headers }));
    expect(gone.status).toBe(404);
  });
});

describe("signing in with several workshops", () => {
  /** Opens a page of a workshop. */
  async function visit(person: TestPerson, workshop: string) {
    const request = new Request(`http://127.0.0.1/workshops/${workshop}`, {
      headers: { cookie: person.cookie },
    });
    const params = { workshop };
    const context = { request, url: new URL(request.url), params, locals: {} } as unknown as APIContext;
    await onRequest(context, async () => new Response("page"));
    return landingPath(app.db, userById(app.db, person.id) ?? person);
  }

  it("leads to the one they were in last, and elsewhere once they have left it", async () => {
    const [first, second] = [app.workshop(), app.workshop()];
    const person = app.person("owner", first);
    app.join(person, second, "designer");
    for (const { id } of [second, first, second]) expect(await visit(person, id)).toBe(`/workshops/${id}`);
    removeMembership(app.db, second.id, person.id);
    expect(landingPath(app.db, userById(app.db, person.id) ?? person)).toBe(`/workshops/${first.id}`);
  });
});
