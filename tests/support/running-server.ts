import { type ChildProcess, spawn } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";

/** The built server with the demonstration in a data folder of its own, for pictures and measurements. */
export interface RunningServer {
  origin: string;
  dataFolder: string;
  /** Stops it and removes its data. */
  stop(): Promise<void>;
}

async function answers(url: string, server: ChildProcess): Promise<void> {
  for (let tries = 0; tries < 200; tries++) {
    if (server.exitCode !== null) throw new Error(`The server ended with ${server.exitCode}.`);
    const reply = await fetch(url).catch(() => undefined);
    if (reply?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error("The server did not answer within 20 seconds.");
}

/** Starts the built server (run `npm run build` first) and waits until it answers. */
export async function startServer(port: number): Promise<RunningServer> {
  const dataFolder = mkdtempSync(join(tmpdir(), "tinpenny-running-"));
  const origin = `http://127.0.0.1:${port}`;
  const server = spawn("node", ["--import", "tsx", "src/server/main.ts"], {
    stdio: ["ignore", "ignore", "inherit"],
    env: {
      ...process.env,
      TINPENNY_PORT: String(port),
      TINPENNY_LETTERS_PORT: String(port + 1),
      TINPENNY_DATA: dataFolder,
    },
  });
  await answers(`${origin}/sign-in`, server);
  return {
    origin,
    dataFolder,
    async stop() {
      const ended = new Promise((resolve) => server.once("exit", resolve));
      server.kill("SIGTERM");
      await ended;
      rmSync(dataFolder, { recursive: true, force: true });
    },
  };
}

/** Password of one of the demonstration's people, from the file the server wrote. */
export function demoPassword(dataFolder: string, email: string): string {
  const lines = readFileSync(join(dataFolder, "demonstration-passwords.txt"), "utf8").split("\n");
  const password = lines.find((line) => line.startsWith(`${email} `))?.split(/\s+/)[1];
  if (!password) throw new Error(`The demonstration has nobody with the address ${email}.`);
  return password;
}
