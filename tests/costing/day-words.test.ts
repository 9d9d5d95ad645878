import { expect, test } from "vitest";
import { dayWords, shortDayWords } from "#src/costing/day-words.ts";

test("days are written as the design says, without leading noughts", () => {
  expect(dayWords("2026-03-09")).toBe("9 March 2026");
  expect(dayWords("2026-11-27")).toBe("27 November 2026");
  expect(shortDayWords("2026-03-30")).toBe("30 March");
  expect(shortDayWords("0805-12-01")).toBe("1 December");
});

test("every month has its English name", () => {
  const english = new Intl.DateTimeFormat("en-GB", { month: "long", timeZone: "UTC" });
  for (let month = 0; month < 12; month += 1) {
    const day = new Date(Date.UTC(2027, month, 15));
    expect(shortDayWords(day.toISOString().slice(0, 10))).toBe(`15 ${english.format(day)}`);
  }
});
