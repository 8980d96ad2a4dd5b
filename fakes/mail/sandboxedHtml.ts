import { escapeHtml } from "./html";
import type { MailMessage } from "./MailMessage";

/**
 * The policy a mail's own HTML is served with. Whoever opens its address directly is as safe as in the frame:
 * no scripts, no forms, no plug-ins, no fetching of anything, an origin of its own (CSP Level 3, 6.3.2 sandbox).
 * A link may open a new, ordinary tab, because a mail is there to be followed.
 */
export const MAIL_POLICY = [
  "sandbox allow-popups allow-popups-to-escape-sandbox",
  "default-src 'none'",
  "img-src data:",
  "style-src 'unsafe-inline'",
  "form-action 'none'",
  "frame-ancestors 'self'",
].join("; ");

/**
 * A mail's HTML part with its own pictures put in and its links sent to a new tab.
 * To be served with MAIL_POLICY only: the markup itself is untouched and may be hostile.
 */
export function sandboxedHtml(mail: MailMessage): string {
  const withPictures = (mail.html ?? "").replace(/\bcid:([^"'\s)>]+)/gi, (reference, id: string) => {
    const part = mail.attachments.find(({ contentId }) => contentId === decode(id));
    if (!part?.contentType.startsWith("image/")) return reference;
    return `data:${escapeHtml(part.contentType)};base64,${part.content.toString("base64")}`;
  });
  return withTarget(withPictures);
}

/** `<base>` goes into the head: in front of the doctype it would switch the mail to quirks mode. */
function withTarget(page: string): string {
  const base = '<base target="_blank">';
  const opening = /<head(?:\s[^>]*)?>/i.exec(page) ?? /<html(?:\s[^>]*)?>/i.exec(page) ?? /<!doctype[^>]*>/i.exec(page);
  const at = opening ? opening.index + opening[0].length : 0;
  return page.slice(0, at) + base + page.slice(at);
}

function decode(id: string): string {
  try {
    return decodeURIComponent(id);
  } catch {
    return id;
  }
}
