type MailAttachment = {
  filename: string;
  contentType: string;
  /** Bytes. */
  size: number;
  /** Without angle brackets; null when nothing refers to it. */
  contentId: string | null;
  /** The mail itself shows it (a drawing in the text), rather than offering it for saving. */
  inline: boolean;
  content: Buffer;
};

/** One mail as the server took it, every part decoded. */
export type MailMessage = {
  /** Counts up from "1" for the life of the server, also across `clear()`. */
  id: string;
  receivedAt: Date;
  /** The Message-ID header without angle brackets. */
  messageId: string | null;
  /** How many of the kept mails carry this Message-ID, this one included: 2 or more means it was sent again. */
  arrivals: number;
  subject: string;
  /** The headers, as written: "Ada Example <ada@example.test>". */
  from: string;
  to: string[];
  /** What SMTP said, which is where a mail really goes (blind copies are only here). */
  envelope: { from: string; to: string[] };
  headers: { name: string; value: string }[];
  text: string | null;
  html: string | null;
  /** Web addresses (http and https only) found in either part, in order, each once. */
  links: string[];
  attachments: MailAttachment[];
};
