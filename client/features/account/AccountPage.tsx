import { Link, useNavigate } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { Button } from "../../ui/Button";
import { FailureNotice } from "../../ui/FailureNotice";
import { LinkButton } from "../../ui/LinkButton";
import { RuledHeading } from "../../ui/RuledHeading";
import { useSignOut, useSignOutElsewhere } from "./api";
import { ChangePasswordForm } from "./ChangePasswordForm";
import { RequireUser } from "./RequireUser";
import { SendVerification } from "./SendVerification";

const roleWords = { restorer: "restorer", workshop: "workshop owner", administrator: "administrator" };

export function AccountPage() {
  useTitle("Your account");
  const navigate = useNavigate();
  const signOut = useSignOut();
  const signOutElsewhere = useSignOutElsewhere();
  return (
    <RequireUser>
      {(user) => (
        <div className="page grid gap-10 py-10">
          <header className="flex flex-wrap items-end justify-between gap-4">
            <div className="grid gap-1">
              <h1>{user.displayName}</h1>
              <p className="text-soft">
                {user.email}, {roleWords[user.role]}
              </p>
            </div>
            <div className="flex flex-wrap gap-3">
              <LinkButton to="/orders" look="primary">
                Your orders
              </LinkButton>
              <Button
                disabled={signOut.isPending}
                onClick={() => signOut.mutate(undefined, { onSuccess: () => void navigate("/") })}
              >
                Sign out
              </Button>
            </div>
          </header>
          {!user.emailVerified && (
            <section className="grid gap-3">
              <RuledHeading>Your address is not confirmed yet</RuledHeading>
              <SendVerification />
            </section>
          )}
          {user.role === "workshop" && (
            <section className="grid gap-3">
              <RuledHeading>Your workshop</RuledHeading>
              <ul className="grid gap-2">
                <li>
                  <Link to="/workshop/orders" className="inline-block min-h-6">
                    Parcels to send
                  </Link>
                </li>
                <li>
                  <Link to="/workshop/settings" className="inline-block min-h-6">
                    Words, postage and tax
                  </Link>
                </li>
              </ul>
            </section>
          )}
          <section className="grid gap-5">
            <RuledHeading>Password</RuledHeading>
            <ChangePasswordForm />
          </section>
          <section className="grid gap-3">
            <RuledHeading>Other places</RuledHeading>
            <p className="max-w-prose">Ends your session on every other phone and computer. You stay signed in here.</p>
            <Button
              className="justify-self-start"
              disabled={signOutElsewhere.isPending}
              onClick={() => signOutElsewhere.mutate()}
            >
              Sign out everywhere else
            </Button>
            <p role="status">{signOutElsewhere.isSuccess && "Every other session has ended."}</p>
            {signOutElsewhere.isError && (
              <FailureNotice error={signOutElsewhere.error} what="The other sessions could not be ended" />
            )}
          </section>
          <p className="text-soft">
            Looking for a part? <Link to="/">Measure it</Link>.
          </p>
        </div>
      )}
    </RequireUser>
  );
}
