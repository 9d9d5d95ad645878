import { register } from "tsx/esm/api";

// A thread does not inherit the loader of TypeScript; it registers its own, then reads its one workbook.
register();
await import("./workbook-worker.ts");
