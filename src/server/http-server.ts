import {
  createServer,
  type IncomingMessage,
  type RequestListener,
  type Server,
  type ServerResponse,
} from "node:http";
import { fileURLToPath } from "node:url";
import compression from "compression";
import { type Config, listensOnLoopback } from "./config.ts";
import { readyFiles } from "./ready-files.ts";

/** No reply needs a request larger than this; each route has its own, smaller limit and counts as it reads. */
const MOST_BYTES = 16 * 1024 * 1024;
const HEADER_TIME = 15_000;
const REQUEST_TIME = 120_000;

/**
 * Makes what Astro believes about the address true: it trusts Host and X-Forwarded-*, so they are set from
 * the configured origin, and a stranger's X-Forwarded-For is dropped unless a proxy of ours is trusted. Of
 * several addresses in it only the last is the proxy's own word; the others are what the stranger sent.
 */
export function settleAddress(request: IncomingMessage, config: Pick<Config, "origin" | "trustProxy">): void {
  const origin = new URL(config.origin);
  request.headers.host = origin.host;
  request.headers["x-forwarded-host"] = origin.host;
  request.headers["x-forwarded-proto"] = origin.protocol.slice(0, -1);
  delete request.headers["x-forwarded-port"];
  const from = config.trustProxy
    ? String(request.headers["x-forwarded-for"] ?? "")
        .split(",")
        .at(-1)
    : "";
  if (from?.trim()) request.headers["x-forwarded-for"] = from.trim();
  else delete request.headers["x-forwarded-for"];
}

/**
 * Whether a browser on this machine was led here under another site's name (DNS rebinding). That site's
 * scripts could then read pages that are open on this machine, such as the letters.
 */
function isOtherName(request: IncomingMessage, origin: string): boolean {
  const hostOf = (address: string) => new URL(address).hostname.replace(/^\[|\]$/g, "");
  if (!listensOnLoopback(hostOf(origin))) return false;
  const asked = `http://${request.headers.host ?? ""}`;
  return !URL.canParse(asked) || !listensOnLoopback(hostOf(asked));
}

function refusedName(request: IncomingMessage, response: ServerResponse, origin: string): boolean {
  if (!isOtherName(request, origin)) return false;
  response.writeHead(421, { "content-type": "text/plain; charset=utf-8" });
  response.end(`Tinpenny is at ${origin} and answers to no other name.`);
  return true;
}

function tooLarge(request: IncomingMessage, response: ServerResponse): boolean {
  if (Number(request.headers["content-length"] ?? 0) <= MOST_BYTES) return false;
  response.writeHead(413, { "content-type": "application/problem+json", connection: "close" });
  response.end(
    JSON.stringify({ type: "about:blank", status: 413, title: "This is larger than the server takes." }),
  );
  return true;
}

const BUILT = fileURLToPath(new URL("../../dist/client/_astro/", import.meta.url));

/** The HTTP server in front of Astro's handler: address settled, size capped, replies compressed. */
export function httpServer(handler: RequestListener, config: Pick<Config, "origin" | "trustProxy">): Server {
  const compress = compression();
  const sendReady = readyFiles(BUILT);
  const server = createServer((request, response) => {
    if (refusedName(request, response, config.origin)) return;
    settleAddress(request, config);
    if (tooLarge(request, response)) return;
    if (sendReady(request, response)) return;
    compress(request as never, response as never, () => handler(request, response));
  });
  server.headersTimeout = HEADER_TIME;
  server.requestTimeout = REQUEST_TIME;
  return server;
}
