let read: () => number = Date.now;

/** Milliseconds since 1970 UTC: the only clock of the server. */
export function now(): number {
  return read();
}

/** Today's calendar day in UTC, ISO 8601. */
export function today(): string {
  return new Date(read()).toISOString().slice(0, 10);
}

/** Sets the clock, for tests; without an argument it runs again. */
export function setClock(clock: () => number = Date.now): void {
  read = clock;
}
