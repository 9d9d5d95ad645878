import { expect, test } from "vitest";
import { readBytes, readJson } from "#src/server/read-body.ts";

/** A body in pieces, without a Content-Length. */
function streamed(pieces: number, size: number): Request {
  let sent = 0;
  const body = new ReadableStream({
    pull(controller) {
      if (sent++ < pieces) controller.enqueue(new Uint8Array(size));
      else controller.close();
    },
  });
  return new Request("http://127.0.0.1/", { method: "POST", body, duplex: "half" } as RequestInit);
}

test("a body without a stated length is counted as it arrives, and refused once it is too large", async () => {
  await expect(readBytes(streamed(1000, 1024), 10 * 1024)).rejects.toMatchObject({ code: "too-large" });
  expect((await readBytes(streamed(5, 1024), 10 * 1024)).byteLength).toBe(5 * 1024);
});

function json(text: string, type = "application/json"): Request {
  return new Request("http://127.0.0.1/", { method: "POST", body: text, headers: { "content-type": type } });
}

test("a body that is not JSON is refused with the reason", async () => {
  await expect(readJson(json("{"), 100)).rejects.toMatchObject({ code: "not-json" });
  await expect(readJson(json("{}", "text/plain"), 100)).rejects.toMatchObject({ code: "wrong-media-type" });
  expect(await readJson(json('{"a":1}', "application/json; charset=utf-8"), 100)).toEqual({ a: 1 });
});
