import type { SignUp } from "#shared/schemas/session";
import { hashPassword, refuseGuessable } from "../accounts/passwords";
import { issueToken } from "../accounts/tokens";
import { audit } from "../audit";
import { inTransaction } from "../db/inTransaction";
import { User } from "../models/User";
import { queueMail } from "./queueMail";

/**
 * Opens an account and mails the link that confirms its address. An address that has an account already gets a mail
 * that says so, and the caller is answered the same, so that nobody learns who has an account here.
 */
export async function signUp(input: SignUp, publicUrl: string, now: Date): Promise<void> {
  const { email, displayName, password } = input;
  refuseGuessable(password, [displayName, ...email.split("@")], "#/password");
  const passwordHash = await hashPassword(password);
  await inTransaction(async (transaction) => {
    const [user] = await User.bulkCreate([{ email, displayName, passwordHash }], {
      ignoreDuplicates: true,
      returning: true,
      transaction,
    });
    const owner = await User.findOne({ where: { email }, transaction });
    if (!owner) return;
    if (owner.id !== user?.id) {
      const day = now.toISOString().slice(0, 10);
      await queueMail(
        {
          cause: `address-in-use:${owner.id}:${day}`,
          template: "address-in-use",
          recipient: owner.email,
          payload: { displayName: owner.displayName, url: `${publicUrl}/reset-password` },
        },
        transaction,
      );
      return;
    }
    await sendVerification(owner, publicUrl, now, transaction);
    await audit({ actorId: owner.id, action: "signed-up", subjectType: "user", subjectId: owner.id }, transaction);
  });
}

type Transaction = Parameters<Parameters<typeof inTransaction>[0]>[0];

/** Mails a fresh link that confirms the address of an account. */
export async function sendVerification(
  user: User,
  publicUrl: string,
  now: Date,
  transaction: Transaction,
): Promise<void> {
  const token = await issueToken(user.id, "verify-email", now, transaction);
  await queueMail(
    {
      cause: `verify-email:${user.id}:${token.slice(0, 8)}`,
      template: "verify-email",
      recipient: user.email,
      payload: { displayName: user.displayName, url: `${publicUrl}/verify-email#${token}` },
    },
    transaction,
  );
}
