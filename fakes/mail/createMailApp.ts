import express, { type Express, type Request, type Response } from "express";
import type { Mailbox } from "./Mailbox";
import type { MailMessage } from "./MailMessage";
import { listPage, messagePage, notFoundPage } from "./mailPages";
import { mailStyles } from "./mailStyles";
import { MAIL_POLICY, sandboxedHtml } from "./sandboxedHtml";

const PAGE_POLICY =
  "default-src 'none'; style-src 'self'; img-src data:; frame-src 'self'; form-action 'self'; base-uri 'none'; frame-ancestors 'none'";

/** The pages and the JSON to read what was sent. Works without scripts. */
export function createMailApp(mailbox: Mailbox): Express {
  const app = express();
  app.disable("x-powered-by");
  app.use((_req, res, next) => {
    res.set({
      "Content-Security-Policy": PAGE_POLICY,
      "X-Content-Type-Options": "nosniff",
      // "no-referrer" would also blank the origin of this page's own form (Fetch standard, "append a request Origin").
      "Referrer-Policy": "same-origin",
      "Cache-Control": "no-store",
    });
    next();
  });

  const withMail =
    (answer: (mail: MailMessage, req: Request, res: Response) => void) => (req: Request, res: Response) => {
      const mail = mailbox.get(String(req.params.id));
      if (mail) answer(mail, req, res);
      else notFound(res);
    };

  app.get("/", (_req, res) => {
    res.type("html").send(listPage(mailbox.messages()));
  });
  app.get("/mail.css", (_req, res) => {
    res.type("css").send(mailStyles);
  });
  app.get("/messages.json", (_req, res) => {
    res.json(mailbox.messages().map(summary));
  });
  app.get(
    "/messages/:id.json",
    withMail((mail, _req, res) => {
      const attachments = mail.attachments.map(({ content: _content, ...described }) => described);
      res.json({ ...mail, attachments });
    }),
  );
  app.get(
    "/messages/:id/html",
    withMail((mail, _req, res) => {
      res.set("Content-Security-Policy", MAIL_POLICY).type("html").send(sandboxedHtml(mail));
    }),
  );
  app.get(
    "/messages/:id/attachments/:index",
    withMail((mail, req, res) => {
      const part = mail.attachments[Number(req.params.index)];
      if (!part) return notFound(res);
      // Saved, never shown: an attached page would otherwise run as this site.
      res.attachment(part.filename).set("Content-Security-Policy", MAIL_POLICY);
      res.type("application/octet-stream").send(part.content);
    }),
  );
  app.get(
    "/messages/:id",
    withMail((mail, _req, res) => {
      res.type("html").send(messagePage(mail));
    }),
  );
  app.post("/clear", (req, res) => {
    if (!fromThisSite(req)) return void res.status(403).type("text").send("Only this page may clear the mail.\n");
    mailbox.clear();
    res.redirect(303, "/");
  });
  app.delete("/messages", (req, res) => {
    if (!fromThisSite(req)) return void res.sendStatus(403);
    mailbox.clear();
    res.sendStatus(204);
  });
  app.use((_req, res) => notFound(res));
  return app;
}

const summary = ({ id, receivedAt, messageId, arrivals, from, to, subject }: MailMessage) => ({
  id,
  receivedAt,
  messageId,
  arrivals,
  from,
  to,
  subject,
});

function notFound(res: Response): void {
  res.status(404).type("html").send(notFoundPage());
}

/** Browsers name the page a form came from; programs that name none are let through. A sandboxed mail sends "null". */
function fromThisSite(req: Request): boolean {
  const origin = req.get("origin");
  return origin === undefined || origin === `http://${req.get("host") ?? ""}`;
}
