/** The first that fits names it: later ones say that they are like the earlier ones. From memory, no source. */
const BROWSERS: readonly (readonly [RegExp, string])[] = [
  [/\bEdg(e|A|iOS)?\//, "Edge"],
  [/\b(OPR|Opera)\//, "Opera"],
  [/\b(Firefox|FxiOS)\//, "Firefox"],
  [/\bHeadlessChrome\//, "Chromium without a window"],
  [/\b(Chrome|CriOS|Chromium)\//, "Chrome or Chromium"],
  [/\bSafari\//, "Safari"],
];
const SYSTEMS: readonly (readonly [RegExp, string])[] = [
  [/\b(iPhone|iPad)\b/, "iPhone or iPad"],
  [/\bAndroid\b/, "Android"],
  [/\bWindows\b/, "Windows"],
  [/\bMac OS X\b|\bMacintosh\b/, "macOS"],
  [/\bCrOS\b/, "ChromeOS"],
  [/\bLinux\b/, "Linux"],
];

function named(names: typeof BROWSERS, words: string): string | undefined {
  return names.find(([pattern]) => pattern.test(words))?.[1];
}

/** "Firefox on Linux", from what a browser says of itself; what names neither is shown as it came. */
export function browserWords(userAgent: string): string {
  const [browser, system] = [named(BROWSERS, userAgent), named(SYSTEMS, userAgent)];
  if (!browser && !system) return userAgent || "A browser that does not name itself";
  return `${browser ?? "A browser"} on ${system ?? "a system that does not name itself"}`;
}
