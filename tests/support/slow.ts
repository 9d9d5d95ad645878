/** Milliseconds a test may take that tries thousands of cases: a stop for one that hangs, not a measure of speed. */
export const MANY_CASES = 120_000;
