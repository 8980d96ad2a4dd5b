import { html, type Markup } from "./html";
import type { MailMessage } from "./MailMessage";

/** The list, newest first. */
export function listPage(mails: MailMessage[]): string {
  const count = mails.length === 1 ? "1 mail" : `${mails.length} mails`;
  return page(
    `${count} sent`,
    html`<header>
      <h1>Mail that was sent</h1>
      <form method="post" action="/clear"><button type="submit">Clear all mail</button></form>
    </header>
    <main>
      <p>${count}, newest first. Nothing here left this computer. <a href="/">Look again</a></p>
      ${mails.length > 0 ? html`<ol class="mails">${mails.map(listItem)}</ol>` : html`<p>No mail has come in yet.</p>`}
    </main>`,
  );
}

const listItem = (mail: MailMessage) => html`<li>
  <a href="/messages/${mail.id}">${mail.subject || "(no subject)"}</a>
  <p>To ${recipients(mail)}</p>
  <p>${time(mail.receivedAt)}</p>
  ${again(mail)}
</li>`;

/** One mail: both parts, links, attachments and every header. Its HTML only ever shows inside the sandboxed frame. */
export function messagePage(mail: MailMessage): string {
  const subject = mail.subject || "(no subject)";
  return page(
    subject,
    html`<header><a href="/">All mail</a></header>
    <main>
      <h1>${subject}</h1>
      <dl>
        <dt>From</dt><dd>${mail.from || mail.envelope.from || "(nobody)"}</dd>
        <dt>To</dt><dd>${recipients(mail)}</dd>
        <dt>Delivered to</dt><dd>${mail.envelope.to.join(", ")}</dd>
        <dt>Received</dt><dd>${time(mail.receivedAt)}</dd>
        <dt>Message-ID</dt><dd>${mail.messageId ?? "(none)"}</dd>
      </dl>
      ${again(mail)}
      <h2>HTML part</h2>
      ${mail.html === null ? html`<p>This mail has no HTML part.</p>` : frame(mail)}
      <h2>Plain-text part</h2>
      ${mail.text === null ? html`<p>This mail has no plain-text part.</p>` : html`<pre>${mail.text}</pre>`}
      <h2>Links</h2>
      ${mail.links.length > 0 ? html`<ul>${mail.links.map(link)}</ul>` : html`<p>This mail has no web links.</p>`}
      <h2>Attachments</h2>
      ${mail.attachments.length > 0 ? html`<ul>${attachments(mail)}</ul>` : html`<p>This mail has no attachments.</p>`}
      <h2>Headers</h2>
      <details><summary>All ${mail.headers.length} headers</summary>
        <dl>${mail.headers.map(({ name, value }) => html`<dt>${name}</dt><dd>${value}</dd>`)}</dl>
      </details>
      <p><a href="/messages/${mail.id}.json">This mail as JSON</a></p>
    </main>`,
  );
}

export const notFoundPage = () =>
  page(
    "Not here",
    html`<header><a href="/">All mail</a></header>
    <main><h1>Not here</h1><p>There is no such mail. It may have been cleared, or pushed out by newer mail.</p></main>`,
  );

/** A mail may not run, send, frame or fetch anything; its links open a tab of their own. */
const frame = (mail: MailMessage) => html`<iframe title="HTML part of the mail" src="/messages/${mail.id}/html"
  sandbox="allow-popups allow-popups-to-escape-sandbox" referrerpolicy="no-referrer"></iframe>`;

const link = (href: string) => html`<li><a href="${href}" rel="noreferrer noopener" target="_blank">${href}</a></li>`;

const attachments = (mail: MailMessage) =>
  mail.attachments.map(
    (part, i) => html`<li>
      <a href="/messages/${mail.id}/attachments/${i}" download>${part.filename}</a>
      (${part.contentType}, ${part.size} bytes${part.inline ? ", shown in the text" : ""})
    </li>`,
  );

const recipients = (mail: MailMessage) => mail.to.join(", ") || mail.envelope.to.join(", ") || "(nobody)";

const again = (mail: MailMessage) =>
  mail.arrivals > 1 ? html`<p class="again">This Message-ID arrived ${mail.arrivals} times</p>` : "";

const time = (at: Date) =>
  html`<time datetime="${at.toISOString()}">${at.toISOString().slice(0, 19).replace("T", " ")} UTC</time>`;

function page(title: string, body: Markup): string {
  return html`<!doctype html>
<html lang="en">
<head>
  <meta charset="utf-8">
  <meta name="viewport" content="width=device-width, initial-scale=1">
  <title>${title}</title>
  <link rel="stylesheet" href="/mail.css">
  <link rel="icon" href="data:,">
</head>
<body>${body}</body>
</html>`.value;
}
