import { randomBytes } from "node:crypto";
import { generateRandomString } from "oslo/crypto";
import { base32 } from "oslo/encoding";
import { createTOTPKeyURI, generateHOTP } from "oslo/otp";
import { toString as drawQr } from "qrcode";
import type { Db } from "#db/client.ts";
import { seal, unseal } from "./own-key.ts";
import { tokenHash } from "./secret-token.ts";
import { takeRecoveryCode } from "./store/recovery-code.ts";
import type { UserRow } from "./store/session.ts";
import { takeTotpStep } from "./store/user.ts";

/** RFC 6238 with its defaults: SHA-1, six digits, thirty seconds; 160 bits of secret as RFC 4226 recommends. */
const STEP = 30_000;
const SECRET_BYTES = 20;
/** A clock that is a step early or late is still taken. */
const STEPS_OFF = 1;
export const RECOVERY_CODES = 10;
/** Letters and digits that are not taken for one another. */
const UNLIKE = "abcdefghjkmnpqrstuvwxyz23456789";

function purposeOf(userId: string): string {
  return `totp ${userId}`;
}

/** A new secret for an authenticator, sealed for storing. */
export function newTotpSecret(userId: string): string {
  return seal(base32.encode(randomBytes(SECRET_BYTES), { includePadding: false }), purposeOf(userId));
}

function secretOf(user: UserRow): string | null {
  return user.totpSecret === null ? null : unseal(user.totpSecret, purposeOf(user.id));
}

/** What an authenticator needs: the secret in letters, the same as a link, and that as a picture (SVG). */
export interface AuthenticatorSetUp {
  secret: string;
  link: string;
  picture: string;
}

/** @throws when the secret cannot be opened: the key file was lost. */
export async function authenticatorSetUp(user: UserRow): Promise<AuthenticatorSetUp> {
  const secret = secretOf(user);
  if (secret === null) throw new Error("The second factor's secret does not open with this server's key.");
  const link = createTOTPKeyURI("Tinpenny", user.email, base32.decode(secret, { strict: false }));
  const picture = await drawQr(link, { type: "svg", margin: 4, errorCorrectionLevel: "M" });
  return { secret, link, picture };
}

/** The time step whose code this is, near to now; `null` if none. */
async function stepOf(user: UserRow, code: string, now: number): Promise<number | null> {
  const secret = secretOf(user);
  if (secret === null) return null;
  const key = base32.decode(secret, { strict: false });
  const current = Math.floor(now / STEP);
  for (let step = current - STEPS_OFF; step <= current + STEPS_OFF; step++)
    if ((await generateHOTP(key, step)) === code) return step;
  return null;
}

/** Whether the authenticator shows this code now, and it was not used before. Uses it up. */
export async function takeTotp(db: Db, user: UserRow, code: string, now: number): Promise<boolean> {
  const step = await stepOf(user, code.replace(/\s/g, ""), now);
  return step !== null && takeTotpStep(db, user.id, step);
}

/** Ten new recovery codes of 79 bits, in four groups of letters and digits that look unlike. */
export function newRecoveryCodes(): string[] {
  const group = () => generateRandomString(4, UNLIKE);
  return Array.from({ length: RECOVERY_CODES }, () => [group(), group(), group(), group()].join("-"));
}

/** What is stored of a recovery code; how it was typed makes no difference. */
export function recoveryCodeHash(userId: string, code: string): string {
  return tokenHash(`${userId} ${code.toLowerCase().replace(/[^a-z0-9]/g, "")}`);
}

/** Which second factor this is: an authenticator's code or a recovery code, used up; `null` for neither. */
export async function takeSecondFactor(
  db: Db,
  user: UserRow,
  code: string,
  now: number,
): Promise<"authenticator" | "recovery-code" | null> {
  if (await takeTotp(db, user, code, now)) return "authenticator";
  return takeRecoveryCode(db, user.id, recoveryCodeHash(user.id, code), now) ? "recovery-code" : null;
}
