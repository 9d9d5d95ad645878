const MOMENT = new Intl.DateTimeFormat("en-GB", {
  day: "numeric",
  month: "long",
  year: "numeric",
  hour: "2-digit",
  minute: "2-digit",
  timeZone: "UTC",
});
const DAY = new Intl.DateTimeFormat("en-GB", {
  day: "numeric",
  month: "long",
  year: "numeric",
  timeZone: "UTC",
});

/** "9 March 2026, 14:32 UTC", from milliseconds since 1970. */
export function momentText(at: number): string {
  return `${MOMENT.format(at).replace(" at ", ", ")} UTC`;
}

/** "9 March 2026", from milliseconds since 1970. */
export function momentDay(at: number): string {
  return DAY.format(at);
}
