import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { createServer, get, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { brotliCompressSync, brotliDecompressSync } from "node:zlib";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { readyFiles } from "#src/server/ready-files.ts";

let folder: string;
let server: Server;

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), "tinpenny-ready-"));
  writeFileSync(join(folder, "page.abc.js.br"), brotliCompressSync("export const page = 1;"));
  writeFileSync(join(folder, "secret.br"), "not a script");
  const send = readyFiles(folder);
  server = createServer((request, response) => {
    if (!send(request, response)) response.writeHead(204).end();
  });
  await new Promise<void>((listening) => server.listen(0, "127.0.0.1", listening));
});
afterAll(async () => {
  await new Promise((closed) => server.close(closed));
  rmSync(folder, { recursive: true });
});

interface Reply {
  status: number | undefined;
  headers: Record<string, unknown>;
  body: Buffer;
}

function ask(
  path: string,
  headers: Record<string, string> = { "accept-encoding": "gzip, br" },
): Promise<Reply> {
  const { port } = server.address() as AddressInfo;
  return new Promise((resolve, reject) => {
    get({ port, host: "127.0.0.1", path, headers }, (reply) => {
      const parts: Buffer[] = [];
      reply.on("data", (part: Buffer) => parts.push(part));
      reply.on("end", () =>
        resolve({ status: reply.statusCode, headers: reply.headers, body: Buffer.concat(parts) }),
      );
    }).on("error", reject);
  });
}

describe("scripts that lie ready", () => {
  it("are sent compressed, and kept for good", async () => {
    const { status, headers, body } = await ask("/_astro/page.abc.js");
    expect(status).toBe(200);
    expect(headers).toMatchObject({
      "content-type": "text/javascript; charset=utf-8",
      "content-encoding": "br",
      "cache-control": "public, max-age=31536000, immutable",
      vary: "accept-encoding",
    });
    expect(brotliDecompressSync(body).toString()).toBe("export const page = 1;");
  });

  it.each([
    ["a browser that takes no Brotli", "/_astro/page.abc.js", { "accept-encoding": "gzip" }],
    ["part of a file", "/_astro/page.abc.js", { "accept-encoding": "br", range: "bytes=0-3" }],
    ["a script that lies not ready", "/_astro/other.js", undefined],
    ["another kind of file", "/_astro/secret", undefined],
    ["a way out of the folder", "/_astro/../page.abc.js", undefined],
  ])("leave %s to whoever comes next", async (_, path, headers) => {
    expect((await ask(path, headers)).status).toBe(204);
  });

  it("are none where nothing was built", () => {
    const send = readyFiles(join(folder, "nowhere"));
    expect(send({ url: "/_astro/page.abc.js", method: "GET", headers: {} } as never, {} as never)).toBe(
      false,
    );
  });
});
