import { Outlet } from "react-router-dom";
import { RequireUser } from "../features/account/RequireUser";

/** Pages for whoever is signed in; others are sent to sign in and come back. */
export function SignedIn() {
  return <RequireUser>{() => <Outlet />}</RequireUser>;
}
