import type { Db } from "#db/client.ts";
import { inTransaction } from "../transaction.ts";

/** Thrown to have a transaction undone whose result is wanted all the same. */
class Undone extends Error {}

/** What a change would lead to: it is made, looked at, and undone before anybody else can see it. */
export function tryOut<T>(db: Db, change: () => T): T {
  let result: { value: T } | undefined;
  try {
    inTransaction(db, () => {
      result = { value: change() };
      throw new Undone();
    });
  } catch (error) {
    if (!(error instanceof Undone)) throw error;
  }
  return (result as { value: T }).value;
}
