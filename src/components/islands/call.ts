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

/** A change this small still arrives when the page is left at once; browsers keep 64 KiB in all. */
const KEPT_ALIVE_CHARACTERS = 16_000;

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
  if (input === undefined) return (await send(method, path, {})) as ReplyOf<Route>;
  const body = JSON.stringify(input);
  const init = {
    body,
    headers: { "content-type": "application/json" },
    keepalive: body.length < KEPT_ALIVE_CHARACTERS,
  };
  return (await send(method, path, init)) as ReplyOf<Route>;
}

/** Sends a file's bytes to a route that takes bytes; its name travels in a header. */
export async function sendFile<Route>(path: string, file: Blob, name: string): Promise<ReplyOf<Route>> {
  const headers = { "content-type": "application/octet-stream", "x-file-name": encodeURIComponent(name) };
  return (await send("POST", path, { body: file, headers })) as ReplyOf<Route>;
}
