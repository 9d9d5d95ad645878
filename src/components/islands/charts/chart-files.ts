import { CHART_FONTS } from "#src/components/chart-fonts.ts";

/** What a drawing takes from the page's style sheets; everything else stands in its own attributes. */
const STYLES = [
  "fill",
  "fill-opacity",
  "stroke",
  "stroke-width",
  "stroke-opacity",
  "stroke-dasharray",
  "stroke-linejoin",
  "stroke-linecap",
  "paint-order",
  "opacity",
  "font-family",
  "font-size",
  "font-weight",
  "text-anchor",
  "display",
  "visibility",
] as const;

const NAMESPACE = "http://www.w3.org/2000/svg";

/** A file's address as it may stand in an attribute: the page's address before a `#` is dropped. */
const withoutPage = (value: string) => value.replace(/url\("?[^"#)]*#([\w-]+)"?\)/g, "url(#$1)");

function inline(from: Element, to: Element): void {
  const style = getComputedStyle(from);
  for (const name of STYLES) {
    const value = style.getPropertyValue(name);
    if (value !== "") to.setAttribute(name, withoutPage(value));
  }
  for (const name of ["class", "style", "tabindex", "role", "aria-hidden"]) to.removeAttribute(name);
  [...from.children].forEach((child, place) => {
    const copy = to.children[place];
    if (copy) inline(child, copy);
  });
}

async function asDataUrl(url: string): Promise<string> {
  const blob = await (await fetch(url)).blob();
  return new Promise((done, failed) => {
    const reader = new FileReader();
    reader.addEventListener("load", () => done(String(reader.result)));
    reader.addEventListener("error", () => failed(reader.error));
    reader.readAsDataURL(blob);
  });
}

async function fontFaces(): Promise<string> {
  const faces = await Promise.all(
    CHART_FONTS.map(
      async ({ weight, url }) =>
        `@font-face{font-family:"Source Sans 3";font-weight:${weight};src:url(${await asDataUrl(url)}) format("woff2")}`,
    ),
  );
  return faces.join("");
}

/**
 * A rendered chart as a drawing that stands alone: computed styles as attributes, its title, its ground, and
 * the typeface it is set in.
 */
export async function chartSvg(chart: SVGSVGElement, title: string): Promise<string> {
  const copy = chart.cloneNode(true) as SVGSVGElement;
  inline(chart, copy);
  const { width, height } = chart.getBoundingClientRect();
  copy.setAttribute("xmlns", NAMESPACE);
  copy.setAttribute("width", String(Math.round(width)));
  copy.setAttribute("height", String(Math.round(height)));
  copy.setAttribute("viewBox", `0 0 ${Math.round(width)} ${Math.round(height)}`);
  const named = document.createElementNS(NAMESPACE, "title");
  named.textContent = title;
  const style = document.createElementNS(NAMESPACE, "style");
  style.textContent = await fontFaces();
  const ground = document.createElementNS(NAMESPACE, "rect");
  ground.setAttribute("width", "100%");
  ground.setAttribute("height", "100%");
  ground.setAttribute("fill", getComputedStyle(document.documentElement).backgroundColor);
  for (const cursor of copy.querySelectorAll(".recharts-tooltip-cursor")) cursor.remove();
  copy.prepend(named, style, ground);
  return new XMLSerializer().serializeToString(copy);
}

/** A drawing as a picture, twice as fine as the screen's points. */
export async function svgPng(svg: string): Promise<Blob> {
  const picture = new Image();
  const address = URL.createObjectURL(new Blob([svg], { type: "image/svg+xml" }));
  try {
    picture.src = address;
    await picture.decode();
    const canvas = document.createElement("canvas");
    canvas.width = picture.naturalWidth * 2;
    canvas.height = picture.naturalHeight * 2;
    canvas.getContext("2d")?.drawImage(picture, 0, 0, canvas.width, canvas.height);
    return await new Promise((done, failed) =>
      canvas.toBlob((blob) => (blob ? done(blob) : failed(new Error("The picture is empty."))), "image/png"),
    );
  } finally {
    URL.revokeObjectURL(address);
  }
}

/** Hands a file to the person. */
export function giveFile(content: Blob, name: string): void {
  const address = URL.createObjectURL(content);
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
