import { join } from "node:path";
import type { Logger } from "pino";
import { z } from "zod";
import type { Config } from "#server/config/environment.ts";
import type { Queue } from "#server/jobs/queue.ts";
import { type MailFake, startMailFake } from "./fake/smtp.ts";
import { type Letter, letter } from "./letter.ts";
import { renderLetter } from "./letters/render-letter.tsx";
import { createSmtpMailer, type Mailer } from "./mailer.ts";

const sendPayload = z.object({ to: z.string(), letter });

interface MailParts {
  config: Pick<Config, "FAKES" | "SMTP_URL" | "MAIL_FROM" | "UPLOADS_DIR">;
  queue: Queue;
  log: Logger;
}

/** Where the mail fake keeps its letters. */
export function mailFakeFolder(uploads: string): string {
  return join(uploads, "dev-mail");
}

/** Letters go out through the queue: a mail server that is down holds nobody up and loses nothing. */
export function createMail({ config, queue, log }: MailParts) {
  let mailer: Mailer | null = null;
  let fake: MailFake | null = null;

  queue.register("mail.send", sendPayload, async ({ to, letter }) => {
    if (!mailer) throw new Error("Mail is not started");
    await mailer.send({ to, ...(await renderLetter(letter)) });
  });

  function sendLetter(to: string, letter: Letter): void {
    queue.enqueue("mail.send", { to, letter });
  }

  async function start(): Promise<void> {
    if (config.FAKES) {
      fake = await startMailFake({ folder: mailFakeFolder(config.UPLOADS_DIR), log });
      mailer = createSmtpMailer(`smtp://127.0.0.1:${fake.port}`, config.MAIL_FROM);
    } else {
      mailer = createSmtpMailer(config.SMTP_URL, config.MAIL_FROM);
    }
  }

  async function stop(): Promise<void> {
    mailer?.close();
    await fake?.stop();
  }

  return { sendLetter, start, stop };
}
