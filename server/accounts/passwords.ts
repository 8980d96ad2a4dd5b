import { hash, verify } from "@node-rs/argon2";
import { dictionary } from "@zxcvbn-ts/language-common";
import { AppError } from "../errors/AppError";

/** argon2id, the package default, above the least set of the OWASP Password Storage Cheat Sheet (47104 KiB, 1 pass). */
const cost = { memoryCost: 47_104, timeCost: 2, parallelism: 1 };

/** Hashing at once, so that a burst of sign-ins does not take all memory and both cores. */
const lanes = 2;
let running = 0;
const waiting: (() => void)[] = [];

async function inLane<T>(work: () => Promise<T>): Promise<T> {
  if (running >= lanes) await new Promise<void>((resume) => waiting.push(resume));
  else running++;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else running--;
  }
}

/** The same password typed on another keyboard is the same text (NIST SP 800-63B-4: NFKC; nothing cut or folded). */
const canonical = (password: string) => password.normalize("NFKC");

export const hashPassword = (password: string): Promise<string> => inLane(() => hash(canonical(password), cost));

let decoy: Promise<string> | undefined;

/** Whether the password is right. Without a hash to compare, the same time is spent and the answer is no. */
export async function passwordMatches(password: string, passwordHash: string | null): Promise<boolean> {
  decoy ??= hashPassword("nobody has this password");
  const known = passwordHash ?? (await decoy);
  const right = await inLane(() => verify(known, canonical(password)));
  return right && passwordHash !== null;
}

const common = new Set<string>(dictionary["passwords-common"]);

/** One short word repeated, or a run that everybody knows, reaches any length without being hard to guess. */
function isRepetition(text: string): boolean {
  return /^(.{1,8}?)\1+.{0,7}$/u.test(text);
}

/**
 * Refuses a password that is often used, that repeats itself, or that is made of the person's own name or address.
 * Errors: `invalid-request` naming the field and saying why.
 */
export function refuseGuessable(password: string, about: readonly string[], pointer: string): void {
  const text = canonical(password).toLowerCase();
  const bare = text.replaceAll(/[\s\d\p{P}\p{S}]+/gu, "");
  const own = about.map((word) => word.toLowerCase()).filter((word) => word.length >= 4);
  const detail =
    common.has(text) || common.has(bare)
      ? "This password is on lists of often used ones: choose another"
      : isRepetition(text)
        ? "This password repeats itself: choose another"
        : own.some((word) => text.replaceAll(word, "").length < 8)
          ? "This password is made of your own name or address: choose another"
          : null;
  if (detail) throw new AppError("invalid-request", detail, { errors: [{ pointer, detail }] });
}
