import { CallFailed } from "#src/components/islands/call.ts";

/** What the server says of a change it refuses: its first sentence for a field, or what happened. */
export function refusal(error: unknown): string {
  if (!(error instanceof CallFailed)) throw error;
  const { title, detail, errors } = error.problem;
  return errors?.[0]?.message ?? `${title} ${detail}`;
}
