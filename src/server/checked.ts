import type { z } from "zod";
import { type FieldError, Problem } from "./problem.ts";

/** What is wrong with a value, field by field; `under` stands before each path. */
function fieldErrors(error: z.ZodError, under: string): FieldError[] {
  return error.issues.map(({ path, message }) => ({
    at: [under, ...path].filter((step) => step !== "").join("."),
    message,
  }));
}

/**
 * A value held against a shape: as the shape reads it, or a 422 that names each wrong field.
 *
 * @param under path of the value in the whole input, such as `change.3`; empty for the input itself.
 */
export function checked<T extends z.ZodType>(shape: T, value: unknown, under = ""): z.output<T> {
  const read = shape.safeParse(value);
  if (read.success) return read.data;
  throw new Problem("wrong-input", { errors: fieldErrors(read.error, under) });
}
