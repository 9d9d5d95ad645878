import { spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import { ensureBuilt, ensureInstalled } from "../src/server/ready.mjs";

/** `npm test`: installs, then runs every check and test there is, and closes with the count of all. */

const RESULTS = "test-results";
const CHROMIUM = ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"];

let passed = 0;
let failed = 0;

function command(words, env = {}) {
  return (
    spawnSync(words[0], words.slice(1), { stdio: "inherit", env: { ...process.env, NO_COLOR: "1", ...env } })
      .status === 0
  );
}

/** A check without tests of its own counts as one. */
function check(name, words) {
  console.log(`\n${name}`);
  if (command(words, { ASTRO_TELEMETRY_DISABLED: "1" })) passed += 1;
  else failed += 1;
}

function readResults(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, "utf8")) : undefined;
}

/** A run that ended badly without a failed test (a crash, a broken config) counts as one failure. */
function count(good, bad, ended) {
  passed += good;
  failed += bad + (!ended && bad === 0 ? 1 : 0);
}

function unitAndApiTests() {
  console.log("\nUnit and API tests");
  const path = `${RESULTS}/vitest.json`;
  const ended = command([
    "npx",
    "vitest",
    "run",
    "--reporter=dot",
    "--reporter=json",
    `--outputFile.json=${path}`,
  ]);
  const results = readResults(path);
  count(results?.numPassedTests ?? 0, results?.numFailedTests ?? 0, ended);
}

function findChromium() {
  const found = CHROMIUM.find(existsSync);
  if (found || process.getuid?.() !== 0 || !existsSync("/usr/bin/apt-get")) return found;
  console.log("Chromium: installing Debian's package.");
  command(["apt-get", "update", "-qq"]);
  command(["apt-get", "install", "-y", "-qq", "chromium"], { DEBIAN_FRONTEND: "noninteractive" });
  return CHROMIUM.find(existsSync);
}

function browserTests() {
  console.log("\nBrowser tests");
  const chromium = findChromium();
  if (!chromium) {
    console.error(
      "There is no Chromium. Install it (Debian: apt-get install chromium), then run npm test again.",
    );
    return count(0, 0, false);
  }
  const path = `${RESULTS}/browser.json`;
  const ended = command(["npx", "playwright", "test", "--reporter=line,json"], {
    PLAYWRIGHT_JSON_OUTPUT_NAME: path,
    TINPENNY_CHROMIUM: chromium,
  });
  const stats = readResults(path)?.stats;
  count(stats?.expected ?? 0, (stats?.unexpected ?? 0) + (stats?.flaky ?? 0), ended);
}

ensureInstalled();
rmSync(RESULTS, { recursive: true, force: true });
mkdirSync(RESULTS);
check("Formatter and linter", ["npx", "biome", "check", "--error-on-warnings", "."]);
check("Types of the pages", ["npx", "astro", "check", "--minimumFailingSeverity", "warning"]);
check("Types of the costing core, which knows no platform", ["npx", "tsc", "-p", "src/costing"]);
check("Types of the list reader, which knows no platform", ["npx", "tsc", "-p", "src/partslist"]);
unitAndApiTests();
ensureBuilt();
browserTests();
console.log(`\n${passed} passed, ${failed} failed`);
process.exit(failed === 0 ? 0 : 1);
