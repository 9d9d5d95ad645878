import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { dayAfter, dayNumber, dayOf, daysBetween, mondayOf } from "#src/costing/calendar/days.ts";

const DAY_MS = 24 * 60 * 60 * 1000;
const iso = (number: number) => new Date(number * DAY_MS).toISOString().slice(0, 10);

/** Years 1 to 9999; the language's own calendar (ECMAScript, Time Values) is the reference. */
const numbers = fc.integer({ min: -719_162, max: 2_932_896 });

describe("days as whole numbers", () => {
  it("agree with the language's own calendar", () => {
    fc.assert(
      fc.property(numbers, (number) => {
        expect(dayOf(number)).toBe(iso(number));
        expect(dayNumber(iso(number))).toBe(number);
      }),
    );
  });

  it("cross leap days: 2000 has one, 1900 and 2100 have none (Gregorian rule)", () => {
    expect(dayAfter("2000-02-28", 1)).toBe("2000-02-29");
    expect(dayAfter("1900-02-28", 1)).toBe("1900-03-01");
    expect(dayAfter("2100-03-01", -1)).toBe("2100-02-28");
    expect(daysBetween("2027-12-31", "2028-12-31")).toBe(366);
  });

  it("begin their weeks on Monday", () => {
    fc.assert(
      fc.property(numbers, (number) => {
        const monday = mondayOf(iso(number));
        expect(new Date(`${monday}T00:00:00Z`).getUTCDay()).toBe(1);
        expect(daysBetween(monday, iso(number))).toBeGreaterThanOrEqual(0);
        expect(daysBetween(monday, iso(number))).toBeLessThan(7);
      }),
    );
  });
});
