import { spendToken } from "../accounts/tokens";
import { audit } from "../audit";
import { inTransaction } from "../db/inTransaction";
import { User } from "../models/User";

/** Confirms the address of an account by the link of a mail. */
export function verifyEmail(token: string, now: Date): Promise<void> {
  return inTransaction(async (transaction) => {
    const userId = await spendToken(token, "verify-email", now, transaction);
    await User.update({ emailVerifiedAt: now }, { where: { id: userId }, transaction });
    await audit({ actorId: userId, action: "verified-email", subjectType: "user", subjectId: userId }, transaction);
  });
}
