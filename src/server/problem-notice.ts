import { config } from "./config.ts";
import { Problem } from "./problem.ts";
import { type ProblemCode, SENTENCES } from "./sentences.ts";

/** What a page says about a failure that an address names, such as `?problem=identity-failed`; or nothing. */
export function problemNotice(url: URL): { title: string; detail: string } | null {
  const code = url.searchParams.get("problem") ?? "";
  if (!Object.hasOwn(SENTENCES, code)) return null;
  const provider = config().identityProvider?.name ?? "";
  const { title, detail } = new Problem(code as ProblemCode, { parameters: { provider } }).body();
  return { title, detail };
}
