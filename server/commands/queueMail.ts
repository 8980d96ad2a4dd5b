import { QueryTypes, type Transaction } from "sequelize";
import { database } from "../db/inTransaction";
import { addJob } from "../jobs/addJob";

/** What each template is filled with. */
export type MailPayloads = {
  "verify-email": { displayName: string; url: string };
  "reset-password": { displayName: string; url: string };
  "password-changed": { displayName: string };
  "address-in-use": { displayName: string; url: string };
  "order-confirmation": { orderId: string };
  "new-order": { parcelId: string };
  "parcel-dispatched": { parcelId: string };
  "order-refunded": { orderId: string; reason: string };
};

/**
 * Writes a mail and the job that sends it, in the caller's transaction. The same `cause` is written once, whatever is
 * retried; it names the event and the recipient, for example `order-confirmation:<order id>:buyer`.
 */
export async function queueMail<Template extends keyof MailPayloads>(
  mail: { cause: string; template: Template; recipient: string; payload: MailPayloads[Template] },
  transaction: Transaction,
): Promise<void> {
  const written = await database().query<{ id: string }>(
    `INSERT INTO mails (cause, template, recipient, payload) VALUES ($cause, $template, $recipient, $payload::jsonb)
     ON CONFLICT (cause) DO NOTHING RETURNING id`,
    { bind: { ...mail, payload: JSON.stringify(mail.payload) }, type: QueryTypes.SELECT, transaction },
  );
  for (const { id } of written) await addJob("sendMail", { mailId: id }, transaction, { key: `mail:${id}` });
}
