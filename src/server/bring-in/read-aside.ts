import { join } from "node:path";
import { Worker } from "node:worker_threads";
import { READING_JOBS, type ReadingJob, type ReadingJobs } from "./reading-jobs.ts";

type Input<Job extends ReadingJob> = Parameters<ReadingJobs[Job]>[0];
type Result<Job extends ReadingJob> = ReturnType<ReadingJobs[Job]>;

/**
 * From so many rows on a list is read in another thread. Measured on a busy machine of two cores, with every cell of
 * every row different: 20,000 rows take 2.7 seconds of its time, 1,000 about 150 milliseconds.
 */
const ROWS_ASIDE = 1000;

interface Reply {
  id: number;
  result?: unknown;
  fault?: string;
}

interface Aside {
  worker: Worker;
  waiting: Map<number, { resolve(result: unknown): void; reject(error: Error): void }>;
}

let aside: Aside | undefined;
let lastId = 0;

/** The thread is started at the first large list and kept; it does not keep the process alive. */
function startAside(): Aside {
  const file = join(process.cwd(), "src/server/bring-in/reading-thread.mjs");
  const started: Aside = { worker: new Worker(file), waiting: new Map() };
  started.worker.unref();
  started.worker.on("message", ({ id, result, fault }: Reply) => {
    const waiter = started.waiting.get(id);
    started.waiting.delete(id);
    if (started.waiting.size === 0) started.worker.unref();
    if (fault === undefined) waiter?.resolve(result);
    else waiter?.reject(new Error(fault));
  });
  const ended = (error?: Error) => {
    if (aside === started) aside = undefined;
    for (const waiter of started.waiting.values())
      waiter.reject(error ?? new Error("The thread that reads lists ended."));
    started.waiting.clear();
  };
  started.worker.on("error", ended);
  started.worker.on("exit", () => ended());
  return started;
}

function readInWorker<Job extends ReadingJob>(job: Job, input: Input<Job>): Promise<Result<Job>> {
  aside ??= startAside();
  const { worker, waiting } = aside;
  const id = ++lastId;
  return new Promise((resolve, reject) => {
    waiting.set(id, { resolve: resolve as (result: unknown) => void, reject });
    worker.ref();
    worker.postMessage({ id, job, input });
  });
}

/** Reads a list of so many rows: here where that takes no time worth speaking of, else in another thread. */
export async function readAside<Job extends ReadingJob>(
  job: Job,
  input: Input<Job>,
  rows: number,
): Promise<Result<Job>> {
  if (rows >= ROWS_ASIDE) return readInWorker(job, input);
  return READING_JOBS[job](input as never) as Result<Job>;
}
