import { keepPreviousData, useQuery } from "@tanstack/react-query";
import { type ReactNode, useEffect } from "react";
import { useForm, useWatch } from "react-hook-form";
import { basketQuery } from "../../lib/basket";
import { keepDraft, readDraft } from "../../lib/keptCheckout";
import { listFieldErrors } from "../../lib/listFieldErrors";
import { keepShipTo, storedShipTo } from "../../lib/preferences";
import { CheckField } from "../../ui/CheckField";
import { FailureNotice } from "../../ui/FailureNotice";
import { type FormError, FormErrors } from "../../ui/FormErrors";
import { AddressFields } from "./AddressFields";
import type { SavedAddress } from "./api";
import { BasketSkeleton } from "./BasketSkeleton";
import { CheckBeforePaying } from "./CheckBeforePaying";
import { CheckoutProblem } from "./CheckoutProblem";
import { type CheckoutValues, checkoutResolver, startValues } from "./checkoutValues";
import { Step } from "./Step";
import { useOrder } from "./useOrder";
import { WhereTo } from "./WhereTo";

type Props = { userId: string; saved: readonly SavedAddress[]; sendVerification: ReactNode };

/** Both addresses have the same fields: the summary says which is meant. */
const errorsWithPlace = (errors: FormError[]): FormError[] =>
  errors.map(({ field, message }) => ({
    field,
    message: field?.startsWith("billingAddress") ? `${message}, for the bill` : message,
  }));

/** Where to, who pays, what is bought: one form, nothing of which is lost. */
export function CheckoutForm({ userId, saved, sendVerification }: Props) {
  const form = useForm<CheckoutValues>({
    resolver: checkoutResolver,
    // The summary takes the focus, and leads to each field.
    shouldFocusError: false,
    defaultValues: startValues(readDraft(userId), saved, storedShipTo()),
  });
  useEffect(() => {
    const stop = form.subscribe({ formState: { values: true }, callback: ({ values }) => keepDraft(userId, values) });
    return stop;
  }, [form, userId]);

  // Only these, so that a keystroke does not draw every part again.
  const [choice, written, hasOtherBilling] = useWatch({
    control: form.control,
    name: ["choice", "shippingAddress.country", "hasOtherBilling"],
  });
  const country = saved.find(({ id }) => id === choice)?.country ?? written;
  useEffect(() => {
    if (country) keepShipTo(country);
  }, [country]);
  const prices = useQuery({ ...basketQuery(country || storedShipTo()), placeholderData: keepPreviousData });
  const basket = prices.data;
  const { problem, changes, isSending, order } = useOrder(form, saved, basket);
  const { errors, submitCount } = form.formState;

  return (
    <form noValidate onSubmit={(event) => void form.handleSubmit(order)(event)} className="grid grid-cols-1 gap-10">
      <FormErrors errors={errorsWithPlace(listFieldErrors(errors))} attempt={submitCount} />
      <fieldset disabled={isSending} className="contents">
        <Step number={1} title="Where to">
          <WhereTo form={form} saved={saved} />
        </Step>
        <Step number={2} title="Who pays">
          <div className="grid gap-5">
            <CheckField label="The bill goes to another address" {...form.register("hasOtherBilling")} />
            {hasOtherBilling && <AddressFields form={form} name="billingAddress" group="billing" />}
          </div>
        </Step>
        <Step number={3} title="Check before you pay">
          {prices.error && (
            <FailureNotice
              error={prices.error}
              what="What you are buying could not be fetched"
              kept="What you typed is kept."
              onRetry={() => void prices.refetch()}
            />
          )}
          {!basket && !prices.error && <BasketSkeleton />}
          {basket && (
            <CheckBeforePaying
              basket={basket}
              isStale={prices.isPlaceholderData}
              isSending={isSending}
              problem={
                problem && (
                  <CheckoutProblem
                    error={problem}
                    changes={changes}
                    basket={basket}
                    sendVerification={sendVerification}
                  />
                )
              }
            />
          )}
        </Step>
      </fieldset>
    </form>
  );
}
