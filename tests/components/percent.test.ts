import fc from "fast-check";
import { expect, it } from "vitest";
import { fromPercent, toPercent } from "#src/components/percent.ts";

it("moves the point and nothing else", () => {
  expect(toPercent("0.029")).toBe("2.9");
  expect(toPercent("1")).toBe("100");
  expect(toPercent("0")).toBe("0");
  expect(toPercent("0.005")).toBe("0.5");
  expect(fromPercent("2.9")).toBe("0.029");
  expect(fromPercent("100")).toBe("1");
  expect(fromPercent("0.5")).toBe("0.005");
  expect(fromPercent("21")).toBe("0.21");
});

it("gives back what it was given", () => {
  const percent = fc.tuple(fc.nat(999), fc.nat(9999)).map(([whole, after]) => `${whole}.${after}1`);
  fc.assert(fc.property(percent, (text) => toPercent(fromPercent(text)) === text));
});
