import { z } from "zod";
import { MONEY_WHOLE_DIGITS, PANEL_SIDE_MOST, UNIT_PRICE_PLACES } from "./limits.ts";

const whole = `\\d{1,${MONEY_WHOLE_DIGITS}}`;

/** Exact decimal text, not negative: `"0.062"`, at most 12 digits before and 6 after the point. */
export const Amount = z
  .string()
  .regex(
    new RegExp(`^${whole}(\\.\\d{1,${UNIT_PRICE_PLACES}})?$`),
    "Write a number such as 0.062: digits with a point, not negative, at most 6 decimals.",
  );

/** A length in millimetres as decimal text, in whole micrometres, 0 allowed: a router's width, a rail. */
export const Millimetres = z
  .string()
  .regex(/^\d{1,4}(\.\d{1,3})?$/, "Write millimetres such as 2.4: not negative, at most 3 decimals.")
  .refine((text) => Number(text) <= PANEL_SIDE_MOST, `Write at most ${PANEL_SIDE_MOST} mm.`);

/** The side of a thing in millimetres: more than nothing. */
export const Side = Millimetres.refine((text) => /[1-9]/.test(text), "Write a measure of more than 0 mm.");

/** A share or rate from 0 up to but not including 1, as decimal text: `"0.029"` is 2.9 %. */
export const RateBelowOne = z
  .string()
  .regex(/^0(\.\d{1,6})?$/, "Write a rate from 0 up to, but not including, 100 %.");

/** A rate below 1 that may be negative, such as a discount: `"-0.06"` is 6 % dearer. */
export const SignedRateBelowOne = z
  .string()
  .regex(
    /^(-\d{1,3}(\.\d{1,6})?|0(\.\d{1,6})?)$/,
    "Write a rate below 100 %, with a minus where it is dearer.",
  );

/** A share from 0 to 1 inclusive. */
export const Share = z.string().regex(/^(0(\.\d{1,6})?|1(\.0{1,6})?)$/, "Write a share from 0 to 100 %.");

/** A rate that may exceed 1, such as an import duty or a spare rate. */
export const Rate = z
  .string()
  .regex(/^\d{1,3}(\.\d{1,6})?$/, "Write a rate such as 0.05 for 5 %: not negative, at most 6 decimals.");

/** A conversion rate: reporting units per one foreign unit; more than nothing. */
export const ConversionRate = z
  .string()
  .regex(/^\d{1,9}(\.\d{1,10})?$/, "Write a rate such as 0.92: digits with a point, at most 10 decimals.")
  .refine((text) => /[1-9]/.test(text), "A conversion rate is more than 0.");

/** Three letters of ISO 4217. */
export const CurrencyCode = z
  .string()
  .regex(/^[A-Z]{3}$/, "Write the three letters of the currency, such as EUR.");

/** A calendar day, ISO 8601: `"2026-03-09"`. */
export const Day = z.iso.date("Write a day of the calendar, such as 2026-03-09.");
