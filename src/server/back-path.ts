const HERE = "http://here.invalid";

/**
 * Where to go on after signing in: a page of ours, or the start. Anything that would lead to another site,
 * such as `//elsewhere.example`, and the addresses of programs count as the start.
 */
export function backPath(text: string | null | undefined): string {
  if (!text?.startsWith("/")) return "/";
  try {
    const { origin, pathname, search, hash } = new URL(text, HERE);
    if (origin !== HERE || pathname.startsWith("//") || pathname.startsWith("/api/")) return "/";
    return pathname + search + hash;
  } catch {
    return "/";
  }
}
