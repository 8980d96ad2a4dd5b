import { useSessionUser } from "../../lib/session";
import { LinkButton } from "../../ui/LinkButton";
import { Notice } from "../../ui/Notice";

/** Nothing gathered: what to do next. */
export function EmptyBasket() {
  const user = useSessionUser();
  return (
    <Notice title="Nothing lies in the basket">
      <p>Measure the worn part; what fits it can be put in here from several workshops and is paid at once.</p>
      {user === null && <p className="text-soft">Gathered something while signed in? Sign in to see it again.</p>}
      <div className="flex flex-wrap gap-3 pt-1">
        <LinkButton to="/" look="primary">
          Measure a part
        </LinkButton>
        {user ? (
          <LinkButton to="/orders">Your orders</LinkButton>
        ) : (
          <LinkButton to="/sign-in?next=/basket">Sign in</LinkButton>
        )}
      </div>
    </Notice>
  );
}
