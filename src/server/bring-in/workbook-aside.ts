import { join } from "node:path";
import { Worker } from "node:worker_threads";
import type { WorkbookReading } from "./read-workbook.ts";

/** Twenty thousand rows of ten cells take two seconds on a busy machine of two cores. */
const SECONDS_MOST = 30;
const MEMORY_MB = 1024;

/**
 * Reads a workbook in a thread of its own, which may be slow or run out of memory without harm to the server: then
 * the workbook counts as packed too tightly.
 */
export function readWorkbookAside(bytes: Uint8Array): Promise<WorkbookReading> {
  const file = join(process.cwd(), "src/server/bring-in/workbook-thread.mjs");
  const limits = { maxOldGenerationSizeMb: MEMORY_MB };
  const worker = new Worker(file, { workerData: bytes, resourceLimits: limits });
  return new Promise((resolve, reject) => {
    const tooMuch: WorkbookReading = { ok: false, code: "upload-too-packed" };
    const timer = setTimeout(() => finish(() => resolve(tooMuch)), SECONDS_MOST * 1000);
    function finish(settle: () => void) {
      clearTimeout(timer);
      settle();
      void worker.terminate();
    }
    worker.once("message", (reading: WorkbookReading) => finish(() => resolve(reading)));
    worker.once("error", (error: Error & { code?: string }) =>
      finish(() => (error.code === "ERR_WORKER_OUT_OF_MEMORY" ? resolve(tooMuch) : reject(error))),
    );
    worker.once("exit", () => finish(() => reject(new Error("The thread that reads workbooks ended."))));
  });
}
