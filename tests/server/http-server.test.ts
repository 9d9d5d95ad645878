import { once } from "node:events";
import { request as httpRequest, type IncomingHttpHeaders, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { gunzipSync } from "node:zlib";
import { afterEach, expect, test } from "vitest";
import { httpServer } from "#src/server/http-server.ts";

let server: Server | undefined;
afterEach(() => {
  server?.close();
  server?.closeAllConnections();
});

const ORIGIN = "https://kits.example.org";

/** A server in front of a handler that sends back the headers it was given, or a long text. */
async function listening(trustProxy = false, origin = ORIGIN): Promise<number> {
  server = httpServer(
    (request, response) => {
      response.setHeader("content-type", "text/plain");
      response.end(request.url === "/long" ? "kit ".repeat(2000) : JSON.stringify(request.headers));
    },
    { origin, trustProxy },
  );
  server.listen(0, "127.0.0.1");
  await once(server, "listening");
  return (server.address() as AddressInfo).port;
}

function ask(port: number, path: string, headers: Record<string, string>, method = "GET") {
  return new Promise<{ status: number; headers: IncomingHttpHeaders; body: Buffer }>((resolve, reject) => {
    const request = httpRequest({ host: "127.0.0.1", port, path, method, headers }, (response) => {
      const chunks: Buffer[] = [];
      response.on("data", (chunk: Buffer) => chunks.push(chunk));
      response.on("end", () =>
        resolve({ status: response.statusCode ?? 0, headers: response.headers, body: Buffer.concat(chunks) }),
      );
    });
    request.on("error", reject);
    request.end();
  });
}

test("Astro is told the configured address, whatever the request claims", async () => {
  const port = await listening();
  const claimed = {
    host: "evil.example",
    "x-forwarded-host": "evil.example",
    "x-forwarded-for": "203.0.113.9",
  };
  const seen = JSON.parse((await ask(port, "/", claimed)).body.toString());
  expect(seen.host).toBe("kits.example.org");
  expect(seen["x-forwarded-host"]).toBe("kits.example.org");
  expect(seen["x-forwarded-proto"]).toBe("https");
  expect(seen["x-forwarded-for"]).not.toBe("203.0.113.9");
});

test("a proxy that is trusted may say where a request came from", async () => {
  const port = await listening(true);
  const seen = JSON.parse((await ask(port, "/", { "x-forwarded-for": "203.0.113.9" })).body.toString());
  expect(seen["x-forwarded-for"]).toBe("203.0.113.9");
});

test("of several addresses only the proxy's own, the last, is believed", async () => {
  const port = await listening(true);
  const claimed = { "x-forwarded-for": "198.51.100.1, 203.0.113.9" };
  const seen = JSON.parse((await ask(port, "/", claimed)).body.toString());
  expect(seen["x-forwarded-for"]).toBe("203.0.113.9");
});

test.each([
  ["127.0.0.1:4321", 200],
  ["localhost:4321", 200],
  ["[::1]:4321", 200],
  ["evil.example:4321", 421],
  ["127.0.0.1.evil.example", 421],
  ["not a name", 421],
])("a server on this machine asked as %s answers %i", async (host, status) => {
  const port = await listening(false, "http://127.0.0.1:4321");
  expect((await ask(port, "/", { host })).status).toBe(status);
});

test("replies are sent compressed to those who can read that", async () => {
  const port = await listening();
  const packed = await ask(port, "/long", { "accept-encoding": "gzip" });
  expect(packed.headers["content-encoding"]).toBe("gzip");
  expect(gunzipSync(packed.body).toString()).toBe("kit ".repeat(2000));
  expect((await ask(port, "/long", {})).headers["content-encoding"]).toBeUndefined();
});

test("a body that says it is huge is refused before it is read", async () => {
  const port = await listening();
  const refused = await ask(port, "/", { "content-length": String(64 * 1024 * 1024) }, "POST");
  expect(refused.status).toBe(413);
});
