import { z } from "zod";
import { PERMISSIONS } from "#src/access.ts";
import type { May, Route } from "./route.ts";

export type Json = Record<string, unknown>;

/** One method of one address, as its route declares it. */
export interface DescribedRoute {
  /** `/api/workshops/{workshop}/kits` */
  address: string;
  method: string;
  route: Route;
  summary: string;
}

const WHO: Record<Exclude<May, keyof typeof PERMISSIONS>, string> = {
  member: "Anybody of the workshop.",
  "signed-in": "Anybody who is signed in, and scripts.",
  "in-person": "Anybody who is signed in, but no script.",
  "half-signed-in": "Anybody who is signed in, also before the second factor; no script.",
  anyone: "Anyone.",
};

function who(may: May): string {
  if (!(may in PERMISSIONS)) return WHO[may as keyof typeof WHO];
  const { roles, does } = PERMISSIONS[may as keyof typeof PERMISSIONS];
  return `Needs the permission "${may}" (${does}): ${roles.join(", ")}.`;
}

function security(may: May): Json[] {
  if (may === "anyone") return [];
  const script = may !== "in-person" && may !== "half-signed-in";
  return script ? [{ session: [] }, { accessToken: [] }] : [{ session: [] }];
}

/** A Zod shape as JSON Schema, as what is sent. */
function schema(shape: z.ZodType): Json {
  const { $schema: _, ...rest } = z.toJSONSchema(shape, { io: "input", unrepresentable: "any" }) as Json;
  return rest;
}

function pathParameters(address: string): Json[] {
  return [...address.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
    name,
    in: "path",
    required: true,
    schema: { type: "string" },
  }));
}

function queryParameters(route: Route): Json[] {
  if (!route.query) return [];
  const { properties = {}, required = [] } = schema(route.query) as {
    properties?: Record<string, Json>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, shape]) => ({
    name,
    in: "query",
    required: required.includes(name),
    schema: shape,
  }));
}

/** Statuses of refusals that routes answer with. */
export const FAILURES = ["400", "401", "403", "404", "409", "413", "415", "422", "429"] as const;

/** Statuses a route can answer with when it refuses. */
function failures(address: string, route: Route): (typeof FAILURES)[number][] {
  const inPlace = address.includes("{");
  const can: Record<(typeof FAILURES)[number], boolean> = {
    "400": route.input !== null,
    "401": route.may !== "anyone",
    "403": route.may !== "anyone" || route.input !== null,
    "404": inPlace,
    "409": inPlace && route.input !== null,
    "413": route.input !== null || route.bytes,
    "415": route.input !== null,
    "422": route.input !== null || route.query !== null || route.bytes,
    "429": route.may === "anyone" && route.input !== null,
  };
  return FAILURES.filter((status) => can[status]);
}

function replies(address: string, route: Route, reply: z.ZodType | undefined): Json {
  const json = { "application/json": { schema: reply ? schema(reply) : {} } };
  const refusals = failures(address, route).map((status) => [
    status,
    { $ref: `#/components/responses/${status}` },
  ]);
  return { [route.status]: { description: "Done.", content: json }, ...Object.fromEntries(refusals) };
}

function body(route: Route): Json | undefined {
  if (route.bytes)
    return {
      required: true,
      content: { "application/octet-stream": { schema: { type: "string", format: "binary" } } },
    };
  if (!route.input) return undefined;
  return { required: true, content: { "application/json": { schema: schema(route.input) } } };
}

/** The operation of a route: who may, what it takes, how it can refuse. */
export function operation(
  { address, method, route, summary }: DescribedRoute,
  reply: z.ZodType | undefined,
): Json {
  const parameters = [...pathParameters(address), ...queryParameters(route)];
  const requestBody = body(route);
  return {
    operationId: `${method.toLowerCase()}${address.replace(/[^a-zA-Z]+(\w)/g, (_, letter: string) => letter.toUpperCase()).replace(/\W/g, "")}`,
    summary: summary.split(/(?<=\.)\s/)[0],
    description: `${summary} ${who(route.may)}`.trim(),
    security: security(route.may),
    ...(parameters.length > 0 && { parameters }),
    ...(requestBody && { requestBody }),
    responses: replies(address, route, reply),
  };
}
