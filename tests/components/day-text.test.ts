import { expect, it } from "vitest";
import { ageText, spanText } from "#src/components/day-text.ts";

it("writes spans and ages as the design says", () => {
  expect([0, 1, 20, 21, 35].map(spanText)).toEqual(["0 days", "1 day", "20 days", "3 weeks", "5 weeks"]);
  expect(ageText("2026-03-07", "2026-03-09")).toBe("2 days old");
  expect(ageText("2026-02-02", "2026-03-09")).toBe("5 weeks old");
  expect(ageText("2026-03-09", "2026-03-09")).toBe("today");
});
