import { zodResolver } from "@hookform/resolvers/zod";
import type { Resolver } from "react-hook-form";
import { z } from "zod";
import { Address } from "#shared/schemas/order";
import type { SavedAddress } from "./api";

/** The choice of an address that is written here. */
export const otherAddress = "other";

export type CheckoutValues = {
  /** The id of a saved address, or `otherAddress`. */
  choice: string;
  shippingAddress: Address;
  hasOtherBilling: boolean;
  billingAddress: Address;
};

export const emptyAddress = (country: string): Address => ({
  name: "",
  line1: "",
  line2: "",
  postcode: "",
  town: "",
  region: "",
  country,
});

const text = z.string().max(500);
const AddressDraft = z.object({
  name: text,
  line1: text,
  line2: text,
  postcode: text,
  town: text,
  region: text,
  country: text,
});
const CheckoutDraft = z.object({
  choice: text,
  shippingAddress: AddressDraft,
  hasOtherBilling: z.boolean(),
  billingAddress: AddressDraft,
});

/** What the form starts with: what was typed in this tab before, else the address used last, else nothing. */
export function startValues(draft: unknown, saved: readonly SavedAddress[], shipTo: string): CheckoutValues {
  const kept = CheckoutDraft.safeParse(draft);
  const isKnown = (choice: string) => choice === otherAddress || saved.some(({ id }) => id === choice);
  if (kept.success && isKnown(kept.data.choice)) return kept.data;
  return {
    choice: saved[0]?.id ?? otherAddress,
    shippingAddress: kept.success ? kept.data.shippingAddress : emptyAddress(shipTo),
    hasOtherBilling: kept.success && kept.data.hasOtherBilling,
    billingAddress: kept.success ? kept.data.billingAddress : emptyAddress(shipTo),
  };
}

const unchecked = z.unknown();

/** Checks what is shown and nothing else, with the words of the server's own schema. */
export const checkoutResolver: Resolver<CheckoutValues> = (values, context, options) => {
  const shown = z.object({
    choice: z.string(),
    shippingAddress: values.choice === otherAddress ? Address : unchecked,
    hasOtherBilling: z.boolean(),
    billingAddress: values.hasOtherBilling ? Address : unchecked,
  });
  return (zodResolver(shown) as unknown as Resolver<CheckoutValues>)(values, context, options);
};

/** Where the parcels go, by these values. */
export function shippingOf(values: CheckoutValues, saved: readonly SavedAddress[]): Address {
  const chosen = saved.find(({ id }) => id === values.choice);
  if (!chosen) return values.shippingAddress;
  const { id: _, ...address } = chosen;
  return address;
}
