import { once } from "node:events";
import type { AddressInfo } from "node:net";
import { createMailApp } from "./createMailApp";
import { createSmtpServer } from "./createSmtpServer";
import { Mailbox, type Refusal } from "./Mailbox";
import type { MailMessage } from "./MailMessage";

export type MailFake = {
  smtpPort: number;
  /** Where people read the mail, without a slash at its end. */
  url: string;
  /** Newest first. */
  messages(): MailMessage[];
  clear(): void;
  /** The first mail that fits, past or to come; rejects after `timeoutMs` (5000 unless told). */
  waitFor(predicate: (mail: MailMessage) => boolean, timeoutMs?: number): Promise<MailMessage>;
  /** The next `count` mails are refused with this SMTP reply (451, try again later, unless told). */
  failNext(count: number, refusal?: Partial<Refusal>): void;
  close(): Promise<void>;
};

export type MailFakeOptions = {
  /** 0 takes a free port. */
  smtpPort?: number;
  httpPort?: number;
  /** How many mails are kept; older ones go. */
  keep?: number;
  now?: () => Date;
};

/** A mail server for development and tests: real SMTP on loopback, and a page to read what it took. Nothing is passed on. */
export async function startMailFake(options: MailFakeOptions = {}): Promise<MailFake> {
  const { smtpPort = 0, httpPort = 0, keep = 500, now = () => new Date() } = options;
  const mailbox = new Mailbox(keep, now);

  const smtp = createSmtpServer(mailbox);
  // A client that breaks off mid-sentence is that client's affair; unheard, the event would end this process.
  smtp.on("error", () => undefined);
  const smtpListener = smtp.listen(smtpPort, "127.0.0.1");
  await once(smtpListener, "listening");

  const http = createMailApp(mailbox).listen(httpPort, "127.0.0.1");
  try {
    await once(http, "listening");
  } catch (error) {
    await new Promise<void>((resolve) => smtp.close(resolve));
    throw error;
  }

  return {
    smtpPort: (smtpListener.address() as AddressInfo).port,
    url: `http://127.0.0.1:${(http.address() as AddressInfo).port}`,
    messages: () => mailbox.messages(),
    clear: () => mailbox.clear(),
    waitFor: (predicate, timeoutMs) => mailbox.waitFor(predicate, timeoutMs),
    failNext: (count, { code = 451, text = "Try again later" } = {}) => mailbox.refuseNext(count, { code, text }),
    close: async () => {
      mailbox.abandon();
      http.closeAllConnections();
      await Promise.all([
        new Promise<void>((resolve) => http.close(() => resolve())),
        new Promise<void>((resolve) => smtp.close(resolve)),
      ]);
    },
  };
}
