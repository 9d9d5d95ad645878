import type { ProblemBody } from "#src/server/problem.ts";
import type { InputOf, ReplyOf } from "#src/server/route.ts";

/** A request the server refused, or that never reached it; its sentences are meant for the person. */
export class CallFailed extends Error {
  constructor(
    readonly problem: Omit<ProblemBody, "code" | "type"> & { code: ProblemBody["code"] | "no-connection" },
  ) {
    super(problem.title);
  }
}

function noConnection(): CallFailed {
  return new CallFailed({
    code: "no-connection",
    status: 0,
    title: "No connection to Tinpenny.",
    detail: "Your change is still on this screen. Try again when the connection is back.",
  });
}

async function send(method: string, path: string, init: RequestInit): Promise<unknown> {
  const response = await fetch(path, { method, ...init }).catch(() => {
    throw noConnection();
  });
  if (response.status === 204) return undefined;
  const reply: unknown = await response.json().catch(() => {
    throw noConnection();
  });
  if (!response.ok) throw new CallFailed(reply as ProblemBody);
  return reply;
}

/**
 * A request that is kept alive still arrives when the page is left at once. Browsers keep 64 KiB of bodies in all
 * and refuse what is more (Fetch standard, HTTP-network-or-cache fetch, in-flight keepalive bytes).
 */
const KEPT_ALIVE_BYTES = 60_000;
let keptAlive = 0;
let atRisk = 0;

/** Whether a change is under way that is lost if the page is left now. */
export function callsAtRisk(): boolean {
  return atRisk > 0;
}

/** Sends a change so that it outlives the page, as long as there is room for it. */
async function sendChange(method: string, path: string, init: RequestInit, bytes: number): Promise<unknown> {
  const keepalive = keptAlive + bytes <= KEPT_ALIVE_BYTES;
  if (keepalive) keptAlive += bytes;
  else atRisk += 1;
  try {
    return await send(method, path, { ...init, keepalive });
  } finally {
    if (keepalive) keptAlive -= bytes;
    else atRisk -= 1;
  }
}

type Method = "GET" | "POST" | "PATCH" | "PUT" | "DELETE";

/**
 * Calls one of our own routes. `Route` is the type of its export, so that body and reply are checked:
 * `call<typeof PATCH>("PATCH", path, change)`.
 *
 * @throws CallFailed with the server's problem, or "no-connection".
 */
export async function call<Route>(
  method: Method,
  path: string,
  input?: InputOf<Route>,
): Promise<ReplyOf<Route>> {
  if (method === "GET") return (await send(method, path, {})) as ReplyOf<Route>;
  if (input === undefined) return (await sendChange(method, path, {}, 0)) as ReplyOf<Route>;
  const body = JSON.stringify(input);
  const init = { body, headers: { "content-type": "application/json" } };
  return (await sendChange(method, path, init, new Blob([body]).size)) as ReplyOf<Route>;
}

/** Sends a file's bytes to a route that takes bytes; its name travels in a header. */
export async function sendFile<Route>(path: string, file: Blob, name: string): Promise<ReplyOf<Route>> {
  const headers = { "content-type": "application/octet-stream", "x-file-name": encodeURIComponent(name) };
  return (await send("POST", path, { body: file, headers })) as ReplyOf<Route>;
}
