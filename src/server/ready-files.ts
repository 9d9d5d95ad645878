import { createReadStream, existsSync, readdirSync } from "node:fs";
import type { IncomingMessage, ServerResponse } from "node:http";
import { join } from "node:path";

/** Sends a file that lies ready, and says whether it did. */
export type SendReady = (request: IncomingMessage, response: ServerResponse) => boolean;

/**
 * Sends scripts that the build has compressed, to browsers that take Brotli. Their names change with
 * their content, so they are kept for good. `folder` is that of the built files; without one nothing lies ready.
 */
export function readyFiles(folder: string): SendReady {
  const ready = new Set(existsSync(folder) ? readdirSync(folder).filter((name) => name.endsWith(".br")) : []);
  return (request, response) => {
    const [, file = ""] = /^\/_astro\/([\w.-]+\.js)$/.exec(request.url ?? "") ?? [];
    const takes = /\bbr\b/.test(String(request.headers["accept-encoding"] ?? ""));
    if (request.method !== "GET" || request.headers.range || !takes || !ready.has(`${file}.br`)) return false;
    response.writeHead(200, {
      "content-type": "text/javascript; charset=utf-8",
      "content-encoding": "br",
      "cache-control": "public, max-age=31536000, immutable",
      vary: "accept-encoding",
      "x-content-type-options": "nosniff",
    });
    const bytes = createReadStream(join(folder, `${file}.br`));
    bytes.on("error", () => response.destroy());
    bytes.pipe(response);
    return true;
  };
}
