import { z } from "zod";
import { Id } from "./common";

export const roles = ["restorer", "workshop", "administrator"] as const;
export const Role = z.enum(roles);
export type Role = z.infer<typeof Role>;

export const shortestPassword = 15;
export const longestPassword = 200;

const Email = z
  .string()
  .trim()
  .max(254, "That address is too long")
  .pipe(z.email("Give an address like name@example.org"));

/** Counted in code points after NFKC, never cut or folded (NIST SP 800-63B-4). */
export const NewPassword = z
  .string()
  .refine(
    (text) => [...text.normalize("NFKC")].length >= shortestPassword,
    `Use at least ${shortestPassword} characters`,
  )
  .refine((text) => [...text.normalize("NFKC")].length <= longestPassword, `Use at most ${longestPassword} characters`);

export const SignUp = z.object({
  email: Email,
  password: NewPassword,
  displayName: z
    .string()
    .trim()
    .min(1, "Give the name that others will see")
    .max(60, "Use at most 60 characters")
    .regex(/^[^\p{Cc}\p{Cf}]*$/u, "Use letters and numbers on one line"),
});
export type SignUp = z.infer<typeof SignUp>;

export const SignIn = z.object({
  email: z.string().trim().min(1, "Give your e-mail address").max(254),
  password: z.string().min(1, "Give your password").max(1000),
});
export type SignIn = z.infer<typeof SignIn>;

export const SessionUser = z.object({ id: Id, email: z.string(), displayName: z.string(), role: Role });
export type SessionUser = z.infer<typeof SessionUser>;

export const Session = z.object({
  user: SessionUser.extend({ emailVerified: z.boolean() }).nullable(),
  csrfToken: z.string(),
  /** Accounts to try, in demo mode only. */
  demoAccounts: z.array(z.object({ email: z.string(), password: z.string(), who: z.string() })).optional(),
});
export type Session = z.infer<typeof Session>;

const Token = z.string().regex(/^[A-Za-z0-9_-]{43}$/, "This link is not complete: open it again from the mail");

/** What sign-up answers, whether or not the address had an account. */
export const SignedUp = z.object({ email: z.string() });

export const VerifyEmail = z.object({ token: Token });
export const RequestPasswordReset = z.object({ email: Email });
export type RequestPasswordReset = z.infer<typeof RequestPasswordReset>;
export const ResetPassword = z.object({ token: Token, newPassword: NewPassword });
export type ResetPassword = z.infer<typeof ResetPassword>;
export const ChangePassword = z.object({
  currentPassword: z.string().min(1, "Give your present password").max(1000),
  newPassword: NewPassword,
});
export type ChangePassword = z.infer<typeof ChangePassword>;
