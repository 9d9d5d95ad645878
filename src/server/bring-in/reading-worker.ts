import { parentPort } from "node:worker_threads";
import { READING_JOBS, type ReadingJob } from "./reading-jobs.ts";

/** Another thread that reads large lists, so that the server goes on answering meanwhile. */
parentPort?.on("message", ({ id, job, input }: { id: number; job: ReadingJob; input: never }) => {
  try {
    parentPort?.postMessage({ id, result: READING_JOBS[job](input) });
  } catch (error) {
    parentPort?.postMessage({
      id,
      fault: error instanceof Error ? (error.stack ?? error.message) : String(error),
    });
  }
});
