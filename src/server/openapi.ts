import type { z } from "zod";
import { ReckoningReply } from "#src/shapes/reckoning.ts";
import { type DescribedRoute, FAILURES, type Json, operation } from "./openapi-operation.ts";
import type { Route } from "./route.ts";
import { SENTENCES } from "./sentences.ts";
import { sessionCookieName } from "./session.ts";

const METHODS = ["GET", "POST", "PUT", "PATCH", "DELETE"] as const;

/** The module of one address below /api. */
export interface ApiModule {
  /** Path below `src/pages/api`, such as `./workshops/[workshop]/kits/index.ts`. */
  file: string;
  /** Its exports: a route for each method. */
  routes: Record<string, unknown>;
  /** Its text, whose doc comments are the summaries. */
  source: string;
}

function addressOf(file: string): string {
  const path = file.replace(/^\.\//, "").replace(/\.ts$/, "");
  return `/api/${path.replace(/(^|\/)index$/, "").replace(/\[(\w+)\]/g, "{$1}")}`;
}

/** The doc comment above a method's export, as one line of text. */
export function summaryIn(source: string, method: string): string {
  const found = new RegExp(`^/\\*\\*((?:(?!\\*/)[\\s\\S])*)\\*/\\s*export const ${method}\\b`, "m").exec(
    source,
  );
  const lines = (found?.[1] ?? "").split("\n").map((line) => line.replace(/^\s*\*? ?/, "").trim());
  return lines.join(" ").trim();
}

function isRoute(value: unknown): value is Route {
  return typeof value === "function" && "may" in value;
}

/** Replies that have a shape of their own; what the others send is what the routes return. */
const REPLIES: Readonly<Record<string, z.ZodType>> = { "POST /api/costing": ReckoningReply };

function described(modules: readonly ApiModule[]): DescribedRoute[] {
  return modules.flatMap(({ file, routes, source }) =>
    METHODS.flatMap((method) => {
      const route = routes[method];
      if (!isRoute(route)) return [];
      return [{ address: addressOf(file), method, route, summary: summaryIn(source, method) }];
    }),
  );
}

function problemResponses(): Json {
  return Object.fromEntries(
    FAILURES.map((status) => {
      const titles = Object.entries(SENTENCES)
        .filter(([, sentences]) => String(sentences.status) === status)
        .map(([code, { title }]) => `\`${code}\`: ${title}`);
      const content = { "application/problem+json": { schema: { $ref: "#/components/schemas/Problem" } } };
      return [status, { description: titles.join(" ") || "Refused.", content }];
    }),
  );
}

const PROBLEM: Json = {
  type: "object",
  description: "A refusal (RFC 9457): what happened, what to do, and the path of each wrong field.",
  required: ["type", "title", "status", "detail", "code"],
  properties: {
    type: { type: "string" },
    title: { type: "string" },
    status: { type: "integer" },
    detail: { type: "string" },
    code: { type: "string", enum: Object.keys(SENTENCES) },
    errors: {
      type: "array",
      items: {
        type: "object",
        required: ["at", "message"],
        properties: { at: { type: "string" }, message: { type: "string" } },
      },
    },
    current: { description: "For a clash: the row as it stands now." },
  },
};

/**
 * The description of every address below /api, in OpenAPI 3.1: built from the routes themselves, so that it
 * cannot say anything else than they do.
 */
export function openApi(modules: readonly ApiModule[], origin: string): Json {
  const paths: Record<string, Json> = {};
  for (const one of described(modules)) {
    const reply = REPLIES[`${one.method} ${one.address}`];
    paths[one.address] = { ...paths[one.address], [one.method.toLowerCase()]: operation(one, reply) };
  }
  return {
    openapi: "3.1.0",
    info: {
      title: "Tinpenny",
      version: "1",
      description:
        "Amounts are exact decimals as text. A request that changes something comes from the site's own pages with a session, or carries a personal access token.",
    },
    servers: [{ url: origin }],
    paths: Object.fromEntries(Object.entries(paths).sort(([one], [other]) => (one < other ? -1 : 1))),
    components: {
      schemas: { Problem: PROBLEM },
      responses: problemResponses(),
      securitySchemes: {
        session: { type: "apiKey", in: "cookie", name: sessionCookieName() },
        accessToken: { type: "http", scheme: "bearer", description: "A personal access token." },
      },
    },
  };
}
