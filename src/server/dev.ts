import { dev } from "astro";
import { config } from "./config.ts";
import { prepare } from "./prepare.ts";

/** `npm run dev`: the same preparation as in production, then Astro's development server. */
const settings = config();
process.env.ASTRO_TELEMETRY_DISABLED = "1";
await prepare(settings);
await dev({
  root: process.cwd(),
  server: { host: settings.host, port: settings.port },
  // Two development servers in one checkout would otherwise write over each other.
  vite: { cacheDir: `node_modules/.vite/${settings.port}` },
});
