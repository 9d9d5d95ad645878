import type { RequestListener } from "node:http";
import { config, lettersStayHere } from "./config.ts";
import { httpServer } from "./http-server.ts";
import { prepare } from "./prepare.ts";
import { keepSwept } from "./sweep.ts";

/** The production entry: settings, what must stand before, then the server. */
async function main(): Promise<void> {
  const settings = config();
  await prepare(settings);
  keepSwept(settings.dataFolder);
  process.env.ASTRO_NODE_AUTOSTART = "disabled";
  const entry = new URL("../../dist/server/entry.mjs", import.meta.url);
  const { handler } = (await import(entry.href)) as { handler: RequestListener };
  const server = httpServer(handler, settings);
  server.listen(settings.port, settings.host, () => {
    console.log(`Tinpenny is at ${settings.origin}`);
    if (lettersStayHere(settings)) console.log(`Letters stay here: ${settings.origin}/letters`);
    else if (!settings.smtpUrl) console.log("No mail goes out: set TINPENNY_SMTP_URL.");
  });
  for (const signal of ["SIGINT", "SIGTERM"] as const)
    process.on(signal, () => {
      server.close(() => process.exit(0));
      server.closeIdleConnections();
    });
}

await main();
