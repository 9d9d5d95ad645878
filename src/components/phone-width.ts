/** The query of the phone layout, as in `--breakpoint-tablet`. */
export const PHONE = "(width < 45.0625rem)";
