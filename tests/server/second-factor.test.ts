import { readdirSync, readFileSync, statSync } from "node:fs";
import { join } from "node:path";
import { base32 } from "oslo/encoding";
import { generateHOTP } from "oslo/otp";
import { describe, expect, it } from "vitest";
import { config } from "#src/server/config.ts";
import { seal, unseal } from "#src/server/own-key.ts";
import {
  authenticatorSetUp,
  newRecoveryCodes,
  newTotpSecret,
  recoveryCodeHash,
  takeTotp,
} from "#src/server/second-factor.ts";
import { changeUser } from "#src/server/store/user.ts";
import { testApp } from "#tests/support/app.ts";

const app = testApp();

/** RFC 4226, appendix D, and RFC 6238, appendix B: the secret of the SHA-1 examples. */
const RFC_SECRET = "12345678901234567890";

describe("one-time codes", () => {
  it.each([
    [0, "755224"],
    [1, "287082"],
    [2, "359152"],
    [3, "969429"],
    [4, "338314"],
    [5, "254676"],
    [6, "287922"],
    [7, "162583"],
    [8, "399871"],
    [9, "520489"],
  ])("are those of RFC 4226, appendix D: count %i gives %s", async (count, code) => {
    expect(await generateHOTP(new TextEncoder().encode(RFC_SECRET), count)).toBe(code);
  });

  /** RFC 6238, appendix B, SHA-1 rows; the six last figures of its eight. */
  it.each([
    [59, "287082"],
    [1111111109, "081804"],
    [1111111111, "050471"],
    [1234567890, "005924"],
    [2000000000, "279037"],
    [20000000000, "353130"],
  ])("are taken at the seconds of RFC 6238, appendix B: %i gives %s", async (seconds, code) => {
    const person = app.person();
    const secret = base32.encode(new TextEncoder().encode(RFC_SECRET), { includePadding: false });
    const user = { ...person, totpSecret: seal(secret, `totp ${person.id}`) };
    expect(await takeTotp(app.db, user, code, seconds * 1000)).toBe(true);
  });

  it("work once, and within a step of now", async () => {
    const person = app.person();
    const user = changeUser(app.db, person.id, { totpSecret: newTotpSecret(person.id) });
    if (!user) throw new Error("no person");
    const { secret } = await authenticatorSetUp(user);
    const step = Math.floor(app.now / 30_000);
    const codeAt = (at: number) => generateHOTP(base32.decode(secret, { strict: false }), at);
    const take = async (at: number) => takeTotp(app.db, user, await codeAt(at), app.now);
    expect(await take(step - 2)).toBe(false);
    expect(await take(step + 2)).toBe(false);
    expect(await take(step)).toBe(true);
    expect(await take(step)).toBe(false);
    expect(await take(step - 1)).toBe(false);
    expect(await take(step + 1)).toBe(true);
  });

  it("are set up by letters, a link and a picture that say the same", async () => {
    const person = app.person(undefined, undefined, { email: "ines@example.org" });
    const user = { ...person, totpSecret: newTotpSecret(person.id) };
    const { secret, link, picture } = await authenticatorSetUp(user);
    expect(secret).toMatch(/^[A-Z2-7]{32}$/);
    expect(link).toMatch(/^otpauth:\/\/totp\/Tinpenny:ines%40example\.org\?/);
    expect(new URL(link).searchParams.get("secret")).toBe(secret);
    expect(picture).toContain("<svg");
  });
});

describe("what is sealed", () => {
  it("opens with the same key and for the same purpose only", () => {
    const sealed = seal("a secret", "totp one");
    expect(sealed).not.toContain("secret");
    expect(unseal(sealed, "totp one")).toBe("a secret");
    expect(unseal(sealed, "totp two")).toBeNull();
    expect(unseal(`${sealed.slice(0, -4)}AAAA`, "totp one")).toBeNull();
    expect(unseal("", "totp one")).toBeNull();
    expect(seal("a secret", "totp one")).not.toBe(sealed);
  });

  it("uses a key that only its owner can read", () => {
    seal("a secret", "totp one");
    const path = join(config().dataFolder, "own.key");
    expect(statSync(path).mode & 0o777).toBe(0o600);
    expect(readFileSync(path).length).toBe(32);
    expect(readdirSync(config().dataFolder)).toEqual(["own.key"]);
  });
});

describe("recovery codes", () => {
  it("are ten, unlike each other, and read however they are typed", () => {
    const codes = newRecoveryCodes();
    expect(new Set(codes).size).toBe(10);
    for (const code of codes) expect(code).toMatch(/^([a-hjkmnp-z2-9]{4}-){3}[a-hjkmnp-z2-9]{4}$/);
    const [code = ""] = codes;
    const hash = recoveryCodeHash("one", code);
    expect(recoveryCodeHash("one", ` ${code.toUpperCase().replaceAll("-", " ")}`)).toBe(hash);
    expect(recoveryCodeHash("two", code)).not.toBe(hash);
    expect(hash).not.toContain(code);
  });
});
