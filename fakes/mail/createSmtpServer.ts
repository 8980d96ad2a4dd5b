import type { Readable } from "node:stream";
import { buffer } from "node:stream/consumers";
import { SMTPServer } from "smtp-server";
import type { Mailbox, Refusal } from "./Mailbox";
import { readMail } from "./readMail";

/** Bytes; the order of what real mail servers take. Common practice, no source. */
const LARGEST_MAIL = 25 * 1024 * 1024;

/** An SMTP server (RFC 5321) without passwords or encryption, for loopback only. It puts what it takes in the mailbox. */
export function createSmtpServer(mailbox: Mailbox): SMTPServer {
  return new SMTPServer({
    banner: "mail fake",
    disabledCommands: ["AUTH", "STARTTLS"],
    disableReverseLookup: true,
    size: LARGEST_MAIL,
    closeTimeout: 500,
    onData(stream, session, done) {
      const from = session.envelope.mailFrom ? session.envelope.mailFrom.address : "";
      const to = session.envelope.rcptTo.map(({ address }) => address);
      take(mailbox, stream, { from, to }).then(
        () => done(),
        (error: unknown) => done(error instanceof Error ? error : new Error(String(error))),
      );
    },
  });
}

async function take(mailbox: Mailbox, stream: Readable & { sizeExceeded: boolean }, envelope: Envelope): Promise<void> {
  // Read to the end before refusing: SMTP answers a mail's data only after its last line.
  const raw = await buffer(stream);
  if (stream.sizeExceeded) throw smtpError({ code: 552, text: "Mail is larger than this server takes" });
  const refusal = mailbox.takeRefusal();
  if (refusal) throw smtpError(refusal);
  mailbox.add(await readMail(raw, envelope));
}

type Envelope = { from: string; to: string[] };

const smtpError = ({ code, text }: Refusal) => Object.assign(new Error(text), { responseCode: code });
