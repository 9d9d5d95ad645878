import { expect, it } from "vitest";
import { ageText, dayAfter, daysBetween, dayText, shortDayText, spanText } from "#src/components/day-text.ts";

it("writes days and spans as the design says", () => {
  expect(dayText("2026-03-09")).toBe("9 March 2026");
  expect(shortDayText("2026-03-30")).toBe("30 March");
  expect([0, 1, 20, 21, 35].map(spanText)).toEqual(["0 days", "1 day", "20 days", "3 weeks", "5 weeks"]);
});

it("reckons across months, leap days and the change to summer time", () => {
  expect(daysBetween("2024-02-28", "2024-03-01")).toBe(2);
  expect(dayAfter("2026-03-28", 2)).toBe("2026-03-30");
  expect(daysBetween("2026-03-09", "2026-03-07")).toBe(-2);
  expect(ageText("2026-03-07", "2026-03-09")).toBe("2 days old");
  expect(ageText("2026-03-09", "2026-03-09")).toBe("today");
});
