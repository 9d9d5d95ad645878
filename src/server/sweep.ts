import { type Db, openDb } from "#db/client.ts";
import { now } from "./clock.ts";
import { databasePath } from "./db.ts";
import { dropEndedAttempts } from "./store/attempt.ts";
import { dropInvitationsBefore } from "./store/invitation.ts";
import { dropEndedTokens } from "./store/one-time-token.ts";
import { dropEndedSessions } from "./store/session.ts";

const HOUR = 60 * 60 * 1000;
const INVITATIONS_STAY = 30 * 24 * HOUR;

/** Removes what has run out and nobody needs: sign-ins, links, counts of attempts, invitations of long ago. */
export function sweep(db: Db, at: number): void {
  dropEndedSessions(db, at);
  dropEndedTokens(db, at);
  dropEndedAttempts(db, at);
  dropInvitationsBefore(db, at - INVITATIONS_STAY);
}

/** Sweeps now and every hour; the timer alone does not keep the process running. */
export function keepSwept(dataFolder: string): void {
  const sweepOnce = () => {
    const db = openDb(databasePath(dataFolder));
    try {
      sweep(db, now());
    } catch (error) {
      console.error(error);
    } finally {
      db.$client.close();
    }
  };
  sweepOnce();
  setInterval(sweepOnce, HOUR).unref();
}
