import { register } from "tsx/esm/api";

// A thread does not inherit the loader of TypeScript; it registers its own, then becomes the reader of lists.
register();
await import("./reading-worker.ts");
