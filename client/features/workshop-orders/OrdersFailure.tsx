import { ApiProblem } from "../../lib/ApiProblem";
import { FailureNotice } from "../../ui/FailureNotice";
import { LinkButton } from "../../ui/LinkButton";
import { Notice } from "../../ui/Notice";

/** Why nothing can be shown: not a workshop's account, no such parcel, or what went wrong. */
export function OrdersFailure({ error, what, onRetry }: { error: Error; what: string; onRetry: () => void }) {
  const isProblem = error instanceof ApiProblem;
  if (isProblem && error.is("not-allowed")) {
    return (
      <Notice title="This page is for workshops">
        <p>What you bought yourself is under your orders.</p>
        <LinkButton to="/orders">Your orders</LinkButton>
      </Notice>
    );
  }
  if (isProblem && error.is("not-found")) {
    return (
      <Notice title="There is no such parcel of your workshop">
        <p>Perhaps its address was cut short, or it belongs to another account.</p>
        <LinkButton to="/workshop/orders">Parcels to send</LinkButton>
      </Notice>
    );
  }
  return <FailureNotice error={error} what={what} kept="Nothing has changed with them." onRetry={onRetry} />;
}
