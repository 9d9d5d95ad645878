import type { ProblemBody } from "#src/server/problem.ts";
import { CallFailed } from "../call.ts";

export interface Sent {
  sent: number;
  of: number;
}

const NO_CONNECTION = {
  code: "no-connection",
  status: 0,
  title: "No connection to Tinpenny.",
  detail: "The list is still on this computer. Try again when the connection is back.",
} as const;

function read(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

/**
 * Sends a list's bytes and tells how far it has come, which `fetch` cannot. Its name travels in a header.
 *
 * @throws CallFailed with the server's problem, or "no-connection".
 */
export function sendList<Reply>(
  path: string,
  file: Blob,
  name: string,
  onProgress: (progress: Sent) => void,
): Promise<Reply> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open("POST", path);
    request.setRequestHeader("content-type", "application/octet-stream");
    request.setRequestHeader("x-file-name", encodeURIComponent(name));
    request.upload.onprogress = ({ loaded, total }) => onProgress({ sent: loaded, of: total });
    request.onerror = () => reject(new CallFailed(NO_CONNECTION));
    request.onload = () => {
      const reply = read(request.responseText);
      if (reply === undefined) reject(new CallFailed(NO_CONNECTION));
      else if (request.status >= 400) reject(new CallFailed(reply as ProblemBody));
      else resolve(reply as Reply);
    };
    request.send(file);
  });
}
