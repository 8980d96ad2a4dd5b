import type { ReactNode } from "react";
import { Navigate, useLocation } from "react-router-dom";
import { useSessionUser } from "../../lib/session";
import { Skeleton } from "../../ui/Skeleton";

type User = NonNullable<ReturnType<typeof useSessionUser>>;

/** Shows a page to whoever is signed in, and sends others to sign in and back. The server decides; this spares a refusal. */
export function RequireUser({ children }: { children: (user: User) => ReactNode }) {
  const user = useSessionUser();
  const { pathname, search } = useLocation();
  if (user === undefined) {
    return (
      <div className="page grid gap-4 py-10">
        <Skeleton className="h-10 w-64" />
        <Skeleton className="h-40 w-full" />
      </div>
    );
  }
  if (user === null) return <Navigate replace to={`/sign-in?next=${encodeURIComponent(pathname + search)}`} />;
  return children(user);
}
