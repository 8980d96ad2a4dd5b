import type { MailPayloads } from "../commands/queueMail";
import type { Services } from "../Services";
import { addressInUseLetter, passwordChangedLetter, resetPasswordLetter, verifyEmailLetter } from "./accountLetters";
import type { Letter } from "./Letter";
import { newOrder } from "./newOrder";
import { orderConfirmation } from "./orderConfirmation";
import { orderRefunded } from "./orderRefunded";
import { parcelDispatched } from "./parcelDispatched";

type Writer<Name extends keyof MailPayloads> = (
  payload: MailPayloads[Name],
  services: Services,
) => Letter | Promise<Letter>;

const writers: { [Name in keyof MailPayloads]: Writer<Name> } = {
  "verify-email": verifyEmailLetter,
  "reset-password": resetPasswordLetter,
  "password-changed": (payload, { config }) => passwordChangedLetter(payload, config.publicUrl),
  "address-in-use": addressInUseLetter,
  "order-confirmation": ({ orderId }, services) => orderConfirmation(orderId, services),
  "new-order": ({ parcelId }, services) => newOrder(parcelId, services),
  "parcel-dispatched": ({ parcelId }, services) => parcelDispatched(parcelId, services),
  "order-refunded": ({ orderId, reason }, services) => orderRefunded(orderId, reason, services),
};

/** What a queued mail says. Errors: throws for a template that does not exist. */
export async function writeLetter(
  { template, payload }: { template: string; payload: unknown },
  services: Services,
): Promise<Letter> {
  const writer = (writers as Record<string, Writer<keyof MailPayloads> | undefined>)[template];
  if (!writer) throw new Error(`there is no mail template ${template}`);
  return writer(payload as MailPayloads[keyof MailPayloads], services);
}
