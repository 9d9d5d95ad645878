import type { MadeAccessToken, NewAccessToken, OwnAccessToken } from "#src/shapes/access-token.ts";
import { TOKENS_MOST } from "#src/shapes/limits.ts";
import { newId } from "./new-id.ts";
import { type Changing, noteChange } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import { newSecretToken, tokenHash } from "./secret-token.ts";
import {
  type AccessTokenRow,
  accessTokensOf,
  addAccessToken,
  removeAccessToken,
} from "./store/access-token.ts";
import { inTransaction } from "./transaction.ts";

const DAY = 24 * 60 * 60 * 1000;

function shown({ id, name, createdAt, expiresAt, lastUsedAt }: AccessTokenRow): OwnAccessToken {
  return { id, name, createdAt, expiresAt, lastUsedAt };
}

/** A person's own tokens in a workshop, also those that ran out, the newest first. */
export function ownAccessTokens({ db, user, workshop }: Changing): OwnAccessToken[] {
  return accessTokensOf(db, workshop.id, user.id)
    .sort((a, b) => b.createdAt - a.createdAt)
    .map(shown);
}

/** Makes a token that speaks for the person in this workshop alone; its secret is in this reply only. */
export function makeAccessToken(given: Changing, { name, days }: NewAccessToken): MadeAccessToken {
  const { db, user, workshop, now } = given;
  if (accessTokensOf(db, workshop.id, user.id).length >= TOKENS_MOST)
    throw wrongField("name", `You have ${TOKENS_MOST} tokens here. Remove one first.`);
  const token = newSecretToken();
  const row: AccessTokenRow = {
    ...{ id: newId(), workshopId: workshop.id, userId: user.id, name, tokenHash: tokenHash(token) },
    ...{ createdAt: now, expiresAt: now + days * DAY, lastUsedAt: null },
  };
  inTransaction(db, () => {
    addAccessToken(db, row);
    noteChange(given, { action: "access-token.make", subjectId: row.id, subjectName: name });
  });
  return { ...shown(row), token };
}

/** Removes a person's own token; it stops working at once. */
export function dropAccessToken(given: Changing, id: string): void {
  const { db, user, workshop } = given;
  inTransaction(db, () => {
    const row = accessTokensOf(db, workshop.id, user.id).find((candidate) => candidate.id === id);
    if (!row || !removeAccessToken(db, workshop.id, user.id, id)) throw new Problem("not-found");
    noteChange(given, { action: "access-token.remove", subjectId: id, subjectName: row.name });
  });
}
