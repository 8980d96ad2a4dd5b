import { oneLine, picturesOf } from "../mail/Letter";
import { letterHtml } from "../mail/letterHtml";
import { letterText } from "../mail/letterText";
import { markContentId, markPng } from "../mail/pictures";
import { writeLetter } from "../mail/writeLetter";
import { Mail } from "../models/Mail";
import type { Services } from "../Services";

async function compose(mail: Mail, services: Services) {
  const letter = await writeLetter(mail, services);
  const inline = (contentId: string, filename: string, content: Buffer) =>
    ({ cid: contentId, filename, content, contentType: "image/png", contentDisposition: "inline" }) as const;
  return {
    // The address alone: a name in a header is one more thing that somebody else chose.
    to: mail.recipient,
    subject: oneLine(letter.subject),
    messageId: `<${mail.id}@${new URL(services.config.publicUrl).hostname}>`,
    // RFC 3834: nobody's holiday notice should answer it.
    headers: { "Auto-Submitted": "auto-generated" },
    text: letterText(letter),
    html: letterHtml(letter, markContentId),
    attachments: [
      inline(markContentId, "idlewright.png", await markPng()),
      ...picturesOf(letter).map(({ contentId, png }, index) => inline(contentId, `part-${index + 1}.png`, png)),
    ],
  };
}

/**
 * Sends one mail that was queued, once: a mail that is sent already is left alone. Its id makes the Message-ID, so that
 * a mail that is sent again after a crash is known as the same one.
 * Errors: what the mail server or the template threw, kept in `last_error`, so that the job is tried again; after
 * the last try the mail is marked as failed.
 */
export async function sendMail(
  services: Services,
  mailId: string,
  { lastTry, now = new Date() }: { lastTry: boolean; now?: Date },
): Promise<void> {
  const mail = await Mail.findByPk(mailId);
  if (!mail || mail.state === "sent") return;
  try {
    await services.mailer.send(await compose(mail, services));
  } catch (error) {
    const lastError = error instanceof Error ? error.message : String(error);
    await mail.update({ lastError, state: lastTry ? "failed" : "queued" });
    throw error;
  }
  await mail.update({ state: "sent", sentAt: now });
}
