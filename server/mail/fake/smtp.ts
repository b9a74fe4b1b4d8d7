import { once } from "node:events";
import type { AddressInfo } from "node:net";
import { buffer } from "node:stream/consumers";
import type { Logger } from "pino";
import { SMTPServer } from "smtp-server";
import { keepLetter } from "./letter-store.ts";

export interface MailFake {
  port: number;
  stop(): Promise<void>;
}

/** A real mail server on the loopback that delivers to a folder and nowhere else. Port 0 takes a free one. */
export async function startMailFake({
  folder,
  log,
  port = 0,
}: {
  folder: string;
  log: Logger;
  port?: number;
}): Promise<MailFake> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["AUTH", "STARTTLS"],
    size: 10 * 1024 * 1024,
    onData(stream, _session, done) {
      buffer(stream)
        .then((raw) => keepLetter(folder, raw))
        .then(() => done(), done);
    },
  });
  server.on("error", (error) => log.warn({ err: error }, "the mail fake had a fault"));
  const listening = server.listen(port, "127.0.0.1");
  await once(listening, "listening");
  return {
    port: (listening.address() as AddressInfo).port,
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  };
}
