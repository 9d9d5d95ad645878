import { readdirSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { beforeEach, describe, expect, it } from "vitest";
import { PERMISSIONS } from "#src/access.ts";
import { GET } from "#src/pages/api/openapi.json.ts";
import { summaryIn } from "#src/server/openapi.ts";
import { call, testApp } from "#tests/support/app.ts";

testApp();

type Json = Record<string, unknown>;
interface Operation {
  operationId: string;
  summary: string;
  description: string;
  security: Json[];
  parameters?: { name: string; in: string; required: boolean; schema: Json }[];
  requestBody?: { required: boolean; content: Record<string, { schema: Json }> };
  responses: Record<string, Json>;
}
interface Document {
  openapi: string;
  info: { title: string; version: string };
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Json; responses: Json; securitySchemes: Json };
}

let document: Document;
beforeEach(async () => {
  document = (await call(GET, { method: "GET" })).body as unknown as Document;
});

const operations = () =>
  Object.entries(document.paths).flatMap(([address, methods]) =>
    Object.entries(methods).map(([method, operation]) => ({ address, method, operation })),
  );

/** Every `$ref` anywhere in a value. */
function refs(value: unknown): string[] {
  if (Array.isArray(value)) return value.flatMap(refs);
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([name, inner]) =>
    name === "$ref" && typeof inner === "string" ? [inner] : refs(inner),
  );
}

describe("the description of the API", () => {
  it("has an address for every route file", () => {
    const folder = fileURLToPath(new URL("../../src/pages/api", import.meta.url));
    const files = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((file) =>
      file.endsWith(".ts"),
    );
    const addresses = files.map((file) =>
      join("/api", file)
        .replace(/\.ts$/, "")
        .replace(/\/index$/, "")
        .replace(/\[(\w+)\]/g, "{$1}"),
    );
    expect(Object.keys(document.paths).sort()).toEqual(addresses.sort());
  });

  it("is OpenAPI 3.1 whose references lead somewhere and whose operations have different names", () => {
    expect(document.openapi).toBe("3.1.0");
    expect(document.info).toMatchObject({ title: "Tinpenny", version: "1" });
    const dangling = refs(document).filter((ref) => {
      const path = ref.replace(/^#\//, "").split("/");
      return path.reduce<unknown>((at, name) => (at as Json | undefined)?.[name], document) === undefined;
    });
    expect(dangling).toEqual([]);
    const names = operations().map(({ operation }) => operation.operationId);
    expect(new Set(names).size).toBe(names.length);
  });

  it("says of every operation what it does, who may, and how it refuses", () => {
    for (const { address, method, operation } of operations()) {
      const where = `${method} ${address}`;
      expect(operation.summary, where).toMatch(/^[A-Z].*\.$/);
      const statuses = Object.keys(operation.responses);
      expect(
        statuses.some((status) => status.startsWith("2") || status.startsWith("3")),
        where,
      ).toBe(true);
      if (operation.security.length > 0) expect(statuses, where).toEqual(expect.arrayContaining(["401"]));
      for (const security of operation.security)
        expect(Object.keys(document.components.securitySchemes), where).toEqual(
          expect.arrayContaining(Object.keys(security)),
        );
      if (operation.requestBody) expect(statuses, where).toEqual(expect.arrayContaining(["413", "422"]));
    }
  });

  it("names every variable of an address as a parameter", () => {
    for (const { address, operation } of operations()) {
      const named = [...address.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
      const path = (operation.parameters ?? []).filter((parameter) => parameter.in === "path");
      expect(path.map(({ name }) => name)).toEqual(named);
      expect(path.every(({ required }) => required)).toBe(true);
    }
  });

  it("takes bodies from the shapes: amounts are text with their pattern, strangers are refused", () => {
    const body =
      document.paths["/api/workshops/{workshop}/kits/{kit}/channels/{channel}"]?.patch?.requestBody;
    const schema = body?.content["application/json"]?.schema as { properties: Json; required: string[] };
    expect(schema).toMatchObject({ type: "object", additionalProperties: false, required: ["version"] });
    expect(JSON.stringify(schema.properties.feeFixed)).toContain('"type":"string"');
    expect(JSON.stringify(schema.properties.feeFixed)).toContain("pattern");
  });

  it("says what costing a plan answers, down to the lines of a working", () => {
    const replies = document.paths["/api/costing"]?.post?.responses["200"] as {
      content: Record<string, { schema: { properties: Record<string, Json> } }>;
    };
    const { run, workings } = replies.content["application/json"]?.schema.properties ?? {};
    expect(run).toMatchObject({ type: "object", properties: { spent: { anyOf: expect.any(Array) } } });
    expect(workings).toMatchObject({ items: { properties: { lines: { type: "array" } } } });
  });

  it("names the roles of a permission", () => {
    const run = document.paths["/api/workshops/{workshop}/kits/{kit}/run"]?.patch;
    expect(run?.description).toContain(PERMISSIONS["change-run"].roles.join(", "));
  });
});

describe("a summary", () => {
  it("is the doc comment right above the method, without its stars", () => {
    const source =
      "/** Other. */\nconst x = 1;\n\n/**\n * Adds a\n * row.\n */\nexport const POST = route({});\n/** Reads. */\nexport const GET = route({});\n";
    expect(summaryIn(source, "POST")).toBe("Adds a row.");
    expect(summaryIn(source, "GET")).toBe("Reads.");
    expect(summaryIn(source, "PATCH")).toBe("");
  });
});
