import nodemailer, { type Transporter } from "nodemailer";
import { type Config, config, lettersStayHere } from "./config.ts";
import { later } from "./later.ts";
import type { Letter } from "./letters/letter.ts";
import { Problem } from "./problem.ts";

/** Takes a letter away; resolves when a mail server has it. */
export type Mailer = (letter: Letter) => Promise<void>;

const PATIENCE = 20_000;

function transportOf(settings: Config): Transporter | null {
  const patience = { connectionTimeout: PATIENCE, greetingTimeout: PATIENCE, socketTimeout: PATIENCE };
  const from = { from: settings.mailFrom };
  if (settings.smtpUrl) return nodemailer.createTransport({ url: settings.smtpUrl, ...patience }, from);
  if (!lettersStayHere(settings)) return null;
  const here = { host: "127.0.0.1", port: settings.lettersPort, secure: false, ignoreTLS: true };
  return nodemailer.createTransport({ ...here, ...patience }, from);
}

function mailerOf(settings: Config): Mailer {
  const transport = transportOf(settings);
  return async (letter) => {
    if (!transport) throw new Problem("mail-not-set-up");
    await transport.sendMail({ ...letter, disableFileAccess: true, disableUrlAccess: true });
  };
}

let mailer: Mailer | undefined;

/**
 * Sends a letter and waits until the mail server has it.
 *
 * @throws Problem "mail-not-set-up" or "mail-not-sent".
 */
export async function sendLetter(letter: Letter): Promise<void> {
  mailer ??= mailerOf(config());
  try {
    await mailer(letter);
  } catch (error) {
    if (error instanceof Problem) throw error;
    console.error("A letter was not sent:", (error as Error).message);
    throw new Problem("mail-not-sent");
  }
}

/** Sends a letter after the reply; one that cannot be sent is written to the server's own log. */
export function postLetter(letter: Letter): void {
  later(async () => {
    try {
      await sendLetter(letter);
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      if (error.code === "mail-not-set-up") console.error(error.body().title);
    }
  });
}

/** Puts another mailer in its place, for tests; without an argument the configured one again. */
export function setMailer(other?: Mailer): void {
  mailer = other;
}
