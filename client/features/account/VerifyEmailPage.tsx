import { useEffect, useRef } from "react";
import { useLocation } from "react-router-dom";
import { useSessionUser } from "../../lib/session";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { LinkButton } from "../../ui/LinkButton";
import { useVerifyEmail } from "./api";
import { SendVerification } from "./SendVerification";

/** Opened from the mail: the token stands behind the hash, so no server and no other site sees it. */
export function VerifyEmailPage() {
  useTitle("Confirm your address");
  const token = useLocation().hash.slice(1);
  const user = useSessionUser();
  const { mutate, isSuccess, isError, error } = useVerifyEmail();
  const sent = useRef(false);
  useEffect(() => {
    if (sent.current) return;
    sent.current = true;
    mutate(token);
  }, [mutate, token]);

  return (
    <div className="page grid gap-6 py-10">
      <h1>{isSuccess ? "Your address is confirmed" : "Confirming your address"}</h1>
      <p role="status">{isSuccess ? "You can pay for what you find now." : !isError && "One moment."}</p>
      {isError && <FailureNotice error={error} what="The link did not work" />}
      {isError && user && !user.emailVerified && <SendVerification />}
      {isSuccess && (
        <div className="flex flex-wrap gap-3">
          <LinkButton to="/basket" look="primary">
            To the basket
          </LinkButton>
          <LinkButton to="/find">Find parts</LinkButton>
        </div>
      )}
    </div>
  );
}
