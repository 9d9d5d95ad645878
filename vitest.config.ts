/// <reference types="vitest/config" />
import { getViteConfig } from "astro/config";

export default getViteConfig({
  test: {
    include: ["tests/**/*.test.{ts,tsx}"],
    environment: "node",
    // Generous: password hashing and the database are slow on a machine that is busy with other things.
    testTimeout: 60_000,
    hookTimeout: 60_000,
    setupFiles: ["tests/support/strict.ts"],
  },
});
