/** Steps people count in: 1, 2, 5 and their tens. */
const STEPS = [1, 2, 5, 10];

/** The smallest round step that gives at most `most` steps over a span. */
export function roundStep(span: number, most: number): number {
  if (!(span > 0)) return 1;
  const rough = span / most;
  const power = 10 ** Math.floor(Math.log10(rough));
  return power * (STEPS.find((step) => step * power >= rough * (1 - 1e-9)) ?? 10);
}

/** Round figures of an axis between two values, both ends included where they are round. */
export function roundTicks(from: number, to: number, most: number): number[] {
  const step = roundStep(to - from, most);
  const first = Math.ceil(from / step - 1e-9);
  const last = Math.floor(to / step + 1e-9);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, place) => (first + place) * step);
}

/** Round figures that enclose two values. */
export function axisTicks(low: number, high: number, most: number): number[] {
  const step = roundStep(high - low, most - 1);
  const first = Math.floor(low / step + 1e-9);
  const last = Math.ceil(high / step - 1e-9);
  return Array.from({ length: last - first + 1 }, (_, place) =>
    Number(((first + place) * step).toPrecision(12)),
  );
}
