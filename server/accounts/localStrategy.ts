import passport from "passport";
import { Strategy } from "passport-local";
import { User } from "../models/User";
import { passwordMatches } from "./passwords";

/** Address and password, at the same cost whether or not the address is known. */
export function registerLocalStrategy(): void {
  passport.use(
    new Strategy({ usernameField: "email", passwordField: "password" }, (email, password, done) => {
      (async () => {
        const user = await User.findOne({ where: { email } });
        const right = await passwordMatches(password, user && !user.disabledAt ? user.passwordHash : null);
        return right && user ? { id: user.id, role: user.role, workshopId: null } : false;
      })().then(
        (actor) => done(null, actor),
        (error: unknown) => done(error),
      );
    }),
  );
}
