import { statSync } from "node:fs";
import { join } from "node:path";
import { afterEach, describe, expect, it } from "vitest";
import { config } from "#src/server/config.ts";
import { startLetterBox } from "#src/server/fakes/letter-box.ts";
import { keepLetter, keptLetters } from "#src/server/letter-file.ts";
import { invitationLetter } from "#src/server/letters/invitation.ts";
import { sendLetter, setMailer } from "#src/server/mail.ts";
import { START, testApp } from "#tests/support/app.ts";

const app = testApp();
afterEach(() => setMailer());

const invited = { to: "tom@example.org", by: "Ines", workshop: "Ferry Yard", role: "seller", kit: null };

describe("letters", () => {
  it("go over SMTP into the letter box and can be read there", async () => {
    const { dataFolder } = config();
    const box = await startLetterBox(0, dataFolder, () => START);
    app.settings({ lettersPort: box.port });
    setMailer();
    await sendLetter(invitationLetter({ ...invited, by: "Zoë", token: "abc" }));
    await box.stop();
    const [kept, ...others] = keptLetters(dataFolder);
    expect(others).toEqual([]);
    expect(kept).toMatchObject({ at: START, to: ["tom@example.org"], subject: "Zoë asks you to Ferry Yard" });
    expect(kept?.from).toBe("tinpenny@localhost");
    expect(kept?.text).toContain(`${config().origin}/invitation?token=abc`);
  });

  it("are readable by their owner only, and the newest 200 stay", () => {
    const { dataFolder } = config();
    const kept = { from: "a@example.org", to: [], subject: "", text: "" };
    for (let at = 1; at <= 203; at++) keepLetter(dataFolder, `id${at}`, { ...kept, at });
    const letters = keptLetters(dataFolder);
    expect(letters.length).toBe(200);
    expect([letters[0]?.at, letters.at(-1)?.at]).toEqual([203, 4]);
    expect(statSync(join(dataFolder, "letters")).mode & 0o777).toBe(0o700);
    expect(statSync(join(dataFolder, "letters", `${"203".padStart(15, "0")}-id203.json`)).mode & 0o777).toBe(
      0o600,
    );
  });

  it("escape what people typed", () => {
    const { html, text } = invitationLetter({ ...invited, by: '<b>"Ines" & co</b>', token: "abc" });
    expect(html).toContain("&lt;b&gt;&quot;Ines&quot; &amp; co&lt;/b&gt;");
    expect(html).not.toContain("<b>");
    expect(text).toContain('<b>"Ines" & co</b>');
  });

  it.each([
    ["a public address in front of it", { origin: "https://kits.example" }],
    ["a server that listens everywhere", { host: "0.0.0.0" }],
    ["a proxy that is trusted", { trustProxy: true }],
  ])("are not kept here with %s, and then nothing can be sent", async (_, changed) => {
    app.settings(changed);
    setMailer();
    await expect(sendLetter(invitationLetter({ ...invited, token: "abc" }))).rejects.toMatchObject({
      code: "mail-not-set-up",
    });
  });
});
