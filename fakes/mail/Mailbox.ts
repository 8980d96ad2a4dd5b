import type { MailMessage } from "./MailMessage";
import type { ReceivedMail } from "./readMail";

export type Refusal = {
  /** SMTP reply code: 4xx means try again, 5xx means never (RFC 5321, 4.2.1). */
  code: number;
  text: string;
};

type Watcher = {
  predicate: (mail: MailMessage) => boolean;
  found: (mail: MailMessage) => void;
  abandoned: () => void;
};

/** What arrived, in memory: the newest `keep` mails. Asking for what has not come yet is `waitFor`. */
export class Mailbox {
  #kept: Omit<MailMessage, "arrivals">[] = [];
  #lastId = 0;
  #refusals: Refusal[] = [];
  #watchers = new Set<Watcher>();

  constructor(
    private readonly keep: number,
    private readonly now: () => Date,
  ) {}

  add(mail: ReceivedMail): void {
    this.#lastId += 1;
    this.#kept = [{ ...mail, id: String(this.#lastId), receivedAt: this.now() }, ...this.#kept].slice(0, this.keep);
    const newest = this.messages()[0];
    for (const watcher of newest ? [...this.#watchers] : []) {
      if (newest && watcher.predicate(newest)) watcher.found(newest);
    }
  }

  /** Newest first. */
  messages(): MailMessage[] {
    const arrivals = new Map<string | null, number>();
    for (const { messageId } of this.#kept) arrivals.set(messageId, (arrivals.get(messageId) ?? 0) + 1);
    return this.#kept.map((mail) => ({
      ...mail,
      arrivals: mail.messageId === null ? 1 : (arrivals.get(mail.messageId) ?? 1),
    }));
  }

  get(id: string): MailMessage | undefined {
    return this.messages().find((mail) => mail.id === id);
  }

  clear(): void {
    this.#kept = [];
  }

  /**
   * The newest mail that fits, at once if it is there, else the first that comes.
   * Error: rejects after `timeoutMs` (5 s unless told), naming the subjects that did come.
   */
  waitFor(predicate: (mail: MailMessage) => boolean, timeoutMs = 5000): Promise<MailMessage> {
    const there = this.messages().find(predicate);
    if (there) return Promise.resolve(there);

    return new Promise((resolve, reject) => {
      const settle = (finish: () => void) => {
        clearTimeout(timer);
        this.#watchers.delete(watcher);
        finish();
      };
      const timer = setTimeout(() => {
        const subjects = this.messages().map((mail) => JSON.stringify(mail.subject));
        const there = subjects.join(", ") || "none";
        settle(() => reject(new Error(`No such mail within ${timeoutMs} ms; there are: ${there}`)));
      }, timeoutMs);
      const watcher: Watcher = {
        predicate,
        found: (mail) => settle(() => resolve(mail)),
        abandoned: () => settle(() => reject(new Error("The mail fake was closed"))),
      };
      this.#watchers.add(watcher);
    });
  }

  /** Ends every wait: nothing more will come. */
  abandon(): void {
    for (const watcher of [...this.#watchers]) watcher.abandoned();
  }

  /** The next `count` mails are refused after their data was sent. */
  refuseNext(count: number, refusal: Refusal): void {
    for (let i = 0; i < count; i += 1) this.#refusals.push(refusal);
  }

  takeRefusal(): Refusal | undefined {
    return this.#refusals.shift();
  }
}
