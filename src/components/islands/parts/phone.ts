import { useSyncExternalStore } from "react";
import { PHONE } from "#src/components/phone-width.ts";

function watch(changed: () => void): () => void {
  const query = matchMedia(PHONE);
  query.addEventListener("change", changed);
  return () => query.removeEventListener("change", changed);
}

/** Whether the page is as narrow as a phone; on the server, no. */
export function usePhone(): boolean {
  return useSyncExternalStore(
    watch,
    () => matchMedia(PHONE).matches,
    () => false,
  );
}
