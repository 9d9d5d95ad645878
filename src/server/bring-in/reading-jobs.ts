import { editParts } from "./edit-parts.ts";
import { shapeOfList } from "./list-draft.ts";
import { partsTaking, summariseParts } from "./parts-summary.ts";
import { editPrices, pricesTaking, summarisePrices } from "./price-summary.ts";

/** The readings of lists, by name: plain data in and out, so that each can be done here or in another thread. */
export const READING_JOBS = {
  shape: shapeOfList,
  "parts-summary": summariseParts,
  "parts-edit": editParts,
  "parts-taking": partsTaking,
  "prices-summary": summarisePrices,
  "prices-edit": editPrices,
  "prices-taking": pricesTaking,
} as const;

export type ReadingJobs = typeof READING_JOBS;
export type ReadingJob = keyof ReadingJobs;
