import latin400 from "@fontsource/source-sans-3/files/source-sans-3-latin-400-normal.woff2?url";
import latin600 from "@fontsource/source-sans-3/files/source-sans-3-latin-600-normal.woff2?url";
import latin700 from "@fontsource/source-sans-3/files/source-sans-3-latin-700-normal.woff2?url";

/** The cuts that charts are set in, for a drawing that leaves the page with its letters. */
export const CHART_FONTS = [
  { weight: 400, url: latin400 },
  { weight: 600, url: latin600 },
  { weight: 700, url: latin700 },
] as const;
