import { readdirSync, readFileSync } from "node:fs";
import { dirname, join, normalize } from "node:path";

export interface SourceFile {
  path: string;
  text: string;
}

/** Every source file below a folder of the project, by path. */
export function sourcesIn(folder: string): SourceFile[] {
  return readdirSync(folder, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && /\.(ts|tsx|astro|mjs)$/.test(entry.name))
    .map((entry) => join(entry.parentPath, entry.name))
    .sort()
    .map((path) => ({ path, text: readFileSync(path, "utf8") }));
}

export interface Import {
  /** Package name, or path from the project's root. */
  target: string;
  typeOnly: boolean;
  /** Fetched when that line runs, not with the file. */
  onUse: boolean;
  written: string;
}

const STATEMENT =
  /(?:^|\n)\s*(?:import|export)\s+(type\s+)?(?:[^"';]*?\sfrom\s+)?["']([^"']+)["']|import\(\s*["']([^"']+)["']\s*\)/g;

function resolve(from: string, written: string): string {
  if (written.startsWith("#")) return written.slice(1);
  if (written.startsWith(".")) return normalize(join(dirname(from), written));
  return written.startsWith("node:")
    ? "node:"
    : written
        .split("/")
        .slice(0, written.startsWith("@") ? 2 : 1)
        .join("/");
}

/** What a file imports; type imports are marked, since they leave no trace in what runs. */
export function importsOf({ path, text }: SourceFile): Import[] {
  return [...text.matchAll(STATEMENT)].map((match) => {
    const written = (match[2] ?? match[3]) as string;
    const before = text.slice(Math.max(0, (match.index ?? 0) - 12), match.index);
    const typeOnly = match[1] !== undefined || (match[3] !== undefined && !/await\s*$/.test(before));
    return { target: resolve(path, written), typeOnly, onUse: match[3] !== undefined, written };
  });
}
