import type { AddressObject, ParsedMail } from "mailparser";
import { simpleParser } from "mailparser";
import type { MailMessage } from "./MailMessage";

export type ReceivedMail = Omit<MailMessage, "id" | "receivedAt" | "arrivals">;

/**
 * Takes a raw mail apart.
 *
 * Shape:  `raw` as it came over SMTP (RFC 5322 with MIME); broken MIME gives empty parts, it does not throw.
 * Note:   `html` stays exactly what was sent, `cid:` addresses included; it is not safe to show. See sandboxedHtml.
 */
export async function readMail(raw: Buffer, envelope: MailMessage["envelope"]): Promise<ReceivedMail> {
  const mail = await simpleParser(raw, { keepCidLinks: true, skipTextToHtml: true, skipHtmlToText: true });
  const html = typeof mail.html === "string" ? mail.html : null;
  const text = mail.text ?? null;
  return {
    messageId: mail.messageId ? withoutBrackets(mail.messageId) : null,
    subject: mail.subject ?? "",
    from: mail.from?.text ?? "",
    to: addresses(mail.to),
    envelope,
    headers: readHeaders(mail),
    text,
    html,
    links: findLinks(html, text),
    attachments: mail.attachments.map((part, i) => ({
      filename: part.filename ?? `part-${i + 1}`,
      contentType: part.contentType,
      size: part.size,
      contentId: part.contentId ? withoutBrackets(part.contentId) : null,
      inline: part.related === true || part.contentDisposition === "inline",
      content: part.content,
    })),
  };
}

const withoutBrackets = (id: string) => id.replace(/^<|>$/g, "");

function addresses(to: AddressObject | AddressObject[] | undefined): string[] {
  const objects = Array.isArray(to) ? to : to ? [to] : [];
  return objects.flatMap((object) =>
    object.value.map(({ name, address }) => (name ? `${name} <${address ?? ""}>` : (address ?? ""))),
  );
}

/** The header lines in the order they came, unfolded (RFC 5322, 2.2.3). */
function readHeaders(mail: ParsedMail): MailMessage["headers"] {
  return mail.headerLines.map(({ line }) => {
    const colon = line.indexOf(":");
    const unfolded = line.slice(colon + 1).replace(/\r?\n(?=[ \t])/g, "");
    return { name: line.slice(0, colon), value: unfolded.trim() };
  });
}

function findLinks(html: string | null, text: string | null): string[] {
  const inHtml = [...(html ?? "").matchAll(/\shref\s*=\s*(?:"([^"]*)"|'([^']*)')/gi)].map((m) =>
    (m[1] ?? m[2] ?? "").replace(/&amp;/g, "&").trim(),
  );
  const inText = (text ?? "").match(/https?:\/\/[^\s<>"')\]]+/g) ?? [];
  const webOnly = [...inHtml, ...inText.map((link) => link.replace(/[.,;:!?]+$/, ""))].filter((link) =>
    /^https?:\/\//i.test(link),
  );
  return [...new Set(webOnly)];
}
