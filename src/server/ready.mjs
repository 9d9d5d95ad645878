import { spawn, spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";

/**
 * What `npm start` and `npm test` do first, on a machine with nothing but Node.js: install the packages if
 * the lock file changed, build if a source changed. Plain JavaScript without packages, because none are
 * there yet. The second time both steps are skipped, and say so.
 */

const INSTALLED = "node_modules/.tinpenny-lock";
const BUILT = "dist/.tinpenny-sources";
const SOURCES = ["src", "public", "samples", "db", "astro.config.mjs", "package.json", "tsconfig.json"];

function run(command, words) {
  const env = { ...process.env, ASTRO_TELEMETRY_DISABLED: "1" };
  const done = spawnSync(command, words, { stdio: "inherit", env });
  if (done.status !== 0) {
    console.error(`Stopped: "${command} ${words.join(" ")}" failed. What it printed above says why.`);
    process.exit(done.status ?? 1);
  }
}

function files(path) {
  if (!existsSync(path)) return [];
  if (path.includes(".")) return [path];
  return readdirSync(path, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath ?? entry.path, entry.name))
    .sort();
}

function digest(paths) {
  const hash = createHash("sha256");
  for (const path of paths) hash.update(path).update(readFileSync(path));
  return hash.digest("hex");
}

function stamped(path, stamp) {
  return existsSync(path) && readFileSync(path, "utf8") === stamp;
}

/** Installs the packages of the lock file unless just these are installed. */
export function ensureInstalled() {
  const stamp = digest(["package-lock.json"]);
  if (stamped(INSTALLED, stamp)) return console.log("Packages: as they were.");
  console.log("Packages: installing; the database driver is compiled, which takes a minute or two.");
  run("npm", ["ci", "--no-audit", "--no-fund"]);
  writeFileSync(INSTALLED, stamp);
}

/** Builds pages and scripts unless the sources are those of the last build. */
export function ensureBuilt() {
  const stamp = digest(SOURCES.flatMap(files));
  if (stamped(BUILT, stamp)) return console.log("Build: as it was.");
  console.log("Build: making pages and scripts.");
  run("node", ["node_modules/astro/astro.js", "build", "--silent"]);
  writeFileSync(BUILT, stamp);
}

function serve() {
  ensureInstalled();
  ensureBuilt();
  const server = spawn("node", ["--import", "tsx", "src/server/main.ts"], { stdio: "inherit" });
  for (const signal of ["SIGINT", "SIGTERM"]) process.on(signal, () => server.kill(signal));
  server.on("exit", (code) => process.exit(code ?? 0));
}

if (process.argv[2] === "serve") serve();
