/**
 * Days as whole numbers, so that spans can be reckoned without a clock: day 0 is 1 January 1970, in the proleptic
 * Gregorian calendar (ISO 8601-1:2019, 4.2.1). Day texts are ISO 8601, "2026-03-09".
 */

/** Days of a common year before each month. */
const BEFORE_MONTH = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334] as const;
const EPOCH_YEAR = 1970;

function isLeap(year: number): boolean {
  return (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
}

/** Whole times that `by` goes into `value`, towards minus infinity. */
function times(value: number, by: number): number {
  return (value - (((value % by) + by) % by)) / by;
}

/** Leap days in the years before this one, from year 1. */
function leapDaysBefore(year: number): number {
  const last = year - 1;
  return times(last, 4) - times(last, 100) + times(last, 400);
}

function daysBeforeYear(year: number): number {
  return (year - EPOCH_YEAR) * 365 + leapDaysBefore(year) - leapDaysBefore(EPOCH_YEAR);
}

function daysBeforeMonth(year: number, month: number): number {
  return (BEFORE_MONTH[month - 1] as number) + (month > 2 && isLeap(year) ? 1 : 0);
}

/**
 * The number of a day.
 *
 * @example dayNumber("1970-01-02") === 1; dayNumber("2026-03-09") === 20521
 */
export function dayNumber(day: string): number {
  const [year, month, inMonth] = day.split("-").map((text) => Number.parseInt(text, 10)) as [
    number,
    number,
    number,
  ];
  return daysBeforeYear(year) + daysBeforeMonth(year, month) + inMonth - 1;
}

/**
 * The text of a day of the years 1 to 9999.
 *
 * @example dayOf(20521) === "2026-03-09"
 */
export function dayOf(number: number): string {
  let year = EPOCH_YEAR + times(number, 366);
  while (daysBeforeYear(year + 1) <= number) year += 1;
  while (daysBeforeYear(year) > number) year -= 1;
  const inYear = number - daysBeforeYear(year);
  let month = 12;
  while (daysBeforeMonth(year, month) > inYear) month -= 1;
  const inMonth = inYear - daysBeforeMonth(year, month) + 1;
  return [
    String(year).padStart(4, "0"),
    String(month).padStart(2, "0"),
    String(inMonth).padStart(2, "0"),
  ].join("-");
}

/**
 * The day so many days later; earlier where `days` is negative.
 *
 * @example dayAfter("2026-02-28", 1) === "2026-03-01"
 */
export function dayAfter(day: string, days: number): string {
  return dayOf(dayNumber(day) + days);
}

/**
 * Whole days from one day to another; negative where the other is earlier.
 *
 * @example daysBetween("2026-03-09", "2026-03-30") === 21
 */
export function daysBetween(from: string, to: string): number {
  return dayNumber(to) - dayNumber(from);
}

/**
 * The Monday of a day's week (ISO 8601: weeks begin on Monday).
 *
 * @example mondayOf("2026-03-11") === "2026-03-09"
 */
export function mondayOf(day: string): string {
  const number = dayNumber(day);
  // 1 January 1970 was a Thursday: its Monday is day −3.
  return dayOf(times(number + 3, 7) * 7 - 3);
}
