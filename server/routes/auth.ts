import {
  ChangePassword,
  RequestPasswordReset,
  ResetPassword,
  Session,
  SignedUp,
  SignIn,
  SignUp,
  VerifyEmail,
} from "#shared/schemas/session";
import { endSessions } from "../accounts/endSessions";
import { registerLocalStrategy } from "../accounts/localStrategy";
import { hashPassword, passwordMatches, refuseGuessable } from "../accounts/passwords";
import { forgiveAccount, signInLimits, spendAccountTry } from "../accounts/signInLimits";
import { mergeBasket } from "../commands/mergeBasket";
import { requestPasswordReset, resetPassword, setPassword } from "../commands/resetPassword";
import { sendVerification, signUp } from "../commands/signUp";
import { verifyEmail } from "../commands/verifyEmail";
import { inTransaction } from "../db/inTransaction";
import { AppError } from "../errors/AppError";
import { type Endpoint, endpoint } from "../http/endpoint";
import { authenticate, endSession, startSession } from "../http/signIn";
import { User } from "../models/User";
import { presentSession } from "../presenters/presentSession";
import type { Services } from "../Services";

const tag = "Session";

export function authRoutes({ config, limits, logger }: Services): Endpoint[] {
  registerLocalStrategy();
  return [
    endpoint(
      {
        method: "get",
        path: "/auth/session",
        summary: "Who is signed in, and the token for unsafe calls.",
        tag,
        access: "anyone",
        answer: Session,
      },
      ({ req }) => presentSession(req, config),
    ),
    endpoint(
      {
        method: "post",
        path: "/auth/sign-up",
        summary: "Opens an account and mails a link that confirms its address.",
        tag,
        access: "anyone",
        body: SignUp,
        answer: SignedUp,
        status: 201,
        limit: signInLimits.signUp,
      },
      async ({ body, now }) => {
        await signUp(body, config.publicUrl, now);
        return { email: body.email };
      },
    ),
    endpoint(
      {
        method: "post",
        path: "/auth/sign-in",
        summary: "Starts a session. What was gathered before joins the basket of the account.",
        tag,
        access: "anyone",
        body: SignIn,
        answer: Session,
        limit: signInLimits.perAddress,
      },
      async ({ req, res, body, now }) => {
        await spendAccountTry(limits, body.email);
        const actor = await authenticate(req, res).catch((error: unknown) => {
          if (error instanceof AppError) req.log.warn({ event: "sign-in-refused" }, "sign-in refused");
          throw error;
        });
        await forgiveAccount(limits, body.email);
        const basketId = req.session.basketId;
        await startSession(req, actor, now);
        if (basketId) await mergeBasket(basketId, actor.id);
        logger.info({ event: "signed-in", userId: actor.id }, "signed in");
        return presentSession(req, config);
      },
    ),
    endpoint(
      { method: "post", path: "/auth/sign-out", summary: "Ends this session.", tag, access: "anyone" },
      ({ req }) => endSession(req),
    ),
    endpoint(
      {
        method: "post",
        path: "/auth/sign-out-everywhere",
        summary: "Ends every other session of this account.",
        tag,
        access: "signed-in",
      },
      ({ actor, req }) => endSessions(actor.id, { except: req.sessionID }),
    ),
    endpoint(
      {
        method: "post",
        path: "/auth/verify-email",
        summary: "Confirms an address by the link of a mail.",
        tag,
        access: "anyone",
        body: VerifyEmail,
      },
      ({ body, now }) => verifyEmail(body.token, now),
    ),
    endpoint(
      {
        method: "post",
        path: "/auth/send-verification",
        summary: "Mails the confirming link again.",
        tag,
        access: "signed-in",
        limit: { name: "send-verification", points: 3, perSeconds: 3600 },
      },
      ({ actor, now }) =>
        inTransaction(async (transaction) => {
          const user = await User.findByPk(actor.id, { transaction, rejectOnEmpty: true });
          if (!user.emailVerifiedAt) await sendVerification(user, config.publicUrl, now, transaction);
        }),
    ),
    endpoint(
      {
        method: "post",
        path: "/auth/request-password-reset",
        summary: "Mails a link to set a new password, where the address has an account.",
        tag,
        access: "anyone",
        body: RequestPasswordReset,
        limit: signInLimits.resetPerAddress,
      },
      async ({ body, now }) => {
        await limits.take(signInLimits.resetPerAccount, body.email.toLowerCase());
        await requestPasswordReset(body.email, config.publicUrl, now);
      },
    ),
    endpoint(
      {
        method: "post",
        path: "/auth/reset-password",
        summary: "Sets a new password by the link of a mail.",
        tag,
        access: "anyone",
        body: ResetPassword,
        limit: signInLimits.resetPerAddress,
      },
      async ({ body, now }) => {
        const { email } = await resetPassword(body, now);
        await forgiveAccount(limits, email);
      },
    ),
    endpoint(
      {
        method: "post",
        path: "/auth/change-password",
        summary: "Sets a new password, given the present one; other sessions end.",
        tag,
        access: "signed-in",
        body: ChangePassword,
        limit: { name: "change-password", points: 10, perSeconds: 900 },
      },
      async ({ actor, body, req, now }) => {
        const user = await User.findByPk(actor.id, { rejectOnEmpty: true });
        if (!(await passwordMatches(body.currentPassword, user.passwordHash))) {
          const detail = "This is not your present password";
          throw new AppError("invalid-request", detail, { errors: [{ pointer: "#/currentPassword", detail }] });
        }
        refuseGuessable(body.newPassword, [user.displayName, ...user.email.split("@")], "#/newPassword");
        const passwordHash = await hashPassword(body.newPassword);
        await inTransaction((transaction) =>
          setPassword(user, passwordHash, { now, keepSession: req.sessionID, transaction }),
        );
      },
    ),
  ];
}
