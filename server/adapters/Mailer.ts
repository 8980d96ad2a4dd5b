import nodemailer, { type SendMailOptions } from "nodemailer";
import type { Config } from "../config";

export type Mailer = {
  /** Hands a mail to the server that sends it; throws where it was not taken. */
  send(mail: SendMailOptions): Promise<void>;
  close(): void;
};

export function createMailer({ smtpUrl, from }: Config["mail"]): Mailer {
  const transport = nodemailer.createTransport(
    {
      url: smtpUrl,
      pool: true,
      maxConnections: 2,
      connectionTimeout: 10_000,
      greetingTimeout: 10_000,
      socketTimeout: 20_000,
    },
    { from, disableFileAccess: true, disableUrlAccess: true },
  );
  return {
    send: async (mail) => {
      await transport.sendMail(mail);
    },
    close: () => transport.close(),
  };
}
