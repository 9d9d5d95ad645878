import type { AddressInfo } from "node:net";
import PostalMime from "postal-mime";
import { SMTPServer } from "smtp-server";
import { type KeptLetter, keepLetter } from "#src/server/letter-file.ts";
import { newId } from "#src/server/new-id.ts";

const MOST_BYTES = 1024 * 1024;

async function read(raw: Uint8Array, to: string[], at: number): Promise<KeptLetter> {
  const mail = await PostalMime.parse(raw);
  return { at, from: mail.from?.address ?? "", to, subject: mail.subject ?? "", text: mail.text ?? "" };
}

/**
 * A mail server for one machine: takes every letter, sends none on, and keeps them in the data folder to be
 * read on the letters page. Started where no mail server is configured; it listens on loopback only. Port 0
 * takes any free one.
 */
export async function startLetterBox(
  port: number,
  dataFolder: string,
  now: () => number = Date.now,
): Promise<{ port: number; stop: () => Promise<void> }> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["AUTH", "STARTTLS"],
    size: MOST_BYTES,
    logger: false,
    async onData(stream, session, done) {
      try {
        const chunks: Buffer[] = [];
        for await (const chunk of stream) chunks.push(chunk as Buffer);
        const to = session.envelope.rcptTo.map(({ address }) => address);
        keepLetter(dataFolder, newId(), await read(Buffer.concat(chunks), to, now()));
        done();
      } catch (error) {
        done(error as Error);
      }
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, "127.0.0.1", () => resolve());
  });
  server.on("error", (error) => console.error("The letter box:", error.message));
  const { port: taken } = server.server.address() as AddressInfo;
  return { port: taken, stop: () => new Promise((resolve) => server.close(() => resolve())) };
}
