import { parentPort, workerData } from "node:worker_threads";
import { readWorkbook } from "./read-workbook.ts";

/** A thread for one workbook, which is ended if it takes too long. */
parentPort?.postMessage(readWorkbook(workerData as Uint8Array));
