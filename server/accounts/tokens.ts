import { createHash, randomBytes } from "node:crypto";
import type { Transaction } from "sequelize";
import { AppError } from "../errors/AppError";
import { UserToken } from "../models/UserToken";

const hour = 3_600_000;

/** How long a link in a mail works. */
export const tokenLife = { "verify-email": 72 * hour, "reset-password": hour } as const;
export type TokenPurpose = keyof typeof tokenLife;

const hashOf = (token: string) => createHash("sha256").update(token).digest();

/** A fresh single-use token of 256 bits; earlier ones for the same purpose stop working. Only its hash is kept. */
export async function issueToken(
  userId: string,
  purpose: TokenPurpose,
  now: Date,
  transaction: Transaction,
): Promise<string> {
  await UserToken.destroy({ where: { userId, purpose }, transaction });
  const token = randomBytes(32).toString("base64url");
  const expiresAt = new Date(now.getTime() + tokenLife[purpose]);
  await UserToken.create({ userId, purpose, tokenHash: hashOf(token), expiresAt }, { transaction });
  return token;
}

/** Uses a token up and gives whose it was. Errors: `not-found` where it is unknown, used or too old. */
export async function spendToken(
  token: string,
  purpose: TokenPurpose,
  now: Date,
  transaction: Transaction,
): Promise<string> {
  const row = await UserToken.findOne({
    where: { tokenHash: hashOf(token), purpose },
    transaction,
    lock: transaction.LOCK.UPDATE,
  });
  if (!row || row.usedAt || row.expiresAt <= now) {
    throw new AppError("not-found", "This link was used already or is too old: ask for a new one");
  }
  await row.update({ usedAt: now }, { transaction });
  return row.userId;
}
