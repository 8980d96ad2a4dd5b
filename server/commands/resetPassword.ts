import type { ResetPassword } from "#shared/schemas/session";
import { endSessions } from "../accounts/endSessions";
import { hashPassword, refuseGuessable } from "../accounts/passwords";
import { issueToken, spendToken } from "../accounts/tokens";
import { audit } from "../audit";
import { inTransaction } from "../db/inTransaction";
import { User } from "../models/User";
import { queueMail } from "./queueMail";

/** Mails a link to set a new password, where the address has an account; says nothing either way. */
export function requestPasswordReset(email: string, publicUrl: string, now: Date): Promise<void> {
  return inTransaction(async (transaction) => {
    const user = await User.findOne({ where: { email }, transaction });
    if (!user || user.disabledAt) return;
    const token = await issueToken(user.id, "reset-password", now, transaction);
    await queueMail(
      {
        cause: `reset-password:${user.id}:${token.slice(0, 8)}`,
        template: "reset-password",
        recipient: user.email,
        // Behind the hash, so that the token reaches no server log and no other site.
        payload: { displayName: user.displayName, url: `${publicUrl}/reset-password#${token}` },
      },
      transaction,
    );
  });
}

/** Sets a new password by the link of a mail, ends every session, has the owner told, and gives who it was. */
export async function resetPassword({ token, newPassword }: ResetPassword, now: Date): Promise<User> {
  const passwordHash = await hashPassword(newPassword);
  return inTransaction(async (transaction) => {
    const userId = await spendToken(token, "reset-password", now, transaction);
    const user = await User.findByPk(userId, { transaction, rejectOnEmpty: true });
    refuseGuessable(newPassword, [user.displayName, ...user.email.split("@")], "#/newPassword");
    await setPassword(user, passwordHash, { now, keepSession: null, transaction });
    // Whoever reads the mail holds the address.
    if (!user.emailVerifiedAt) await user.update({ emailVerifiedAt: now }, { transaction });
    return user;
  });
}

type Transaction = Parameters<Parameters<typeof inTransaction>[0]>[0];

/** Writes a new hash, ends the other sessions and has the owner told by mail. */
export async function setPassword(
  user: User,
  passwordHash: string,
  { now, keepSession, transaction }: { now: Date; keepSession: string | null; transaction: Transaction },
): Promise<void> {
  await user.update({ passwordHash }, { transaction });
  await endSessions(user.id, { except: keepSession, transaction });
  await audit({ actorId: user.id, action: "changed-password", subjectType: "user", subjectId: user.id }, transaction);
  await queueMail(
    {
      cause: `password-changed:${user.id}:${now.toISOString()}`,
      template: "password-changed",
      recipient: user.email,
      payload: { displayName: user.displayName },
    },
    transaction,
  );
}
