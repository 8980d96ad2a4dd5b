import { useLocation, useSearchParams } from "react-router-dom";
import { useSessionUser } from "../../lib/session";
import { useTitle } from "../../lib/useTitle";
import { LinkButton } from "../../ui/LinkButton";
import { nextPage } from "./nextPage";
import { SendVerification } from "./SendVerification";

export function CheckMailPage() {
  useTitle("Look in your mail");
  const user = useSessionUser();
  const [search] = useSearchParams();
  const state: unknown = useLocation().state;
  const email =
    typeof state === "object" && state && "email" in state && typeof state.email === "string"
      ? state.email
      : user?.email;
  return (
    <div className="page grid gap-6 py-10">
      <h1>Look in your mail</h1>
      <p className="max-w-prose">
        A mail is on its way{email ? ` to ${email}` : ""} with a link that confirms the address. It works for three
        days. You can look and fill your basket now; paying waits for it.
      </p>
      {user && !user.emailVerified && <SendVerification />}
      <LinkButton to={nextPage(search)} className="justify-self-start">
        Go on
      </LinkButton>
    </div>
  );
}
