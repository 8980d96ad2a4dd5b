import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { Link, useLocation } from "react-router-dom";
import { ResetPassword, shortestPassword } from "#shared/schemas/session";
import { useTitle } from "../../lib/useTitle";
import { LinkButton } from "../../ui/LinkButton";
import { Notice } from "../../ui/Notice";
import { AccountForm } from "./AccountForm";
import { useResetPassword } from "./api";
import { PasswordField } from "./PasswordField";

const NewPasswordOnly = ResetPassword.pick({ newPassword: true });

/** Opened from the mail, with its token behind the hash. */
export function ResetPasswordPage() {
  useTitle("Set a new password");
  const token = useLocation().hash.slice(1);
  const reset = useResetPassword();
  const form = useForm<{ newPassword: string }>({
    shouldFocusError: false,
    resolver: zodResolver(NewPasswordOnly),
    defaultValues: { newPassword: "" },
  });
  if (!token) {
    return (
      <div className="page grid gap-6 py-10">
        <h1>Set a new password</h1>
        <Notice title="This link is not complete">
          <p>
            Open it again from the mail, or <Link to="/forgot-password">have another sent</Link>.
          </p>
        </Notice>
      </div>
    );
  }
  return (
    <div className="page grid gap-8 py-10">
      <h1>Set a new password</h1>
      {reset.isSuccess ? (
        <Notice title="The new password is set">
          <p>Everybody who was signed in to this account has been signed out.</p>
          <LinkButton to="/sign-in" look="primary">
            Sign in
          </LinkButton>
        </Notice>
      ) : (
        <AccountForm
          form={form}
          onSubmit={async ({ newPassword }) => reset.mutateAsync({ token, newPassword })}
          action="Set it"
        >
          <PasswordField
            label="New password"
            autoComplete="new-password"
            hint={`At least ${shortestPassword} characters.`}
            error={form.formState.errors.newPassword?.message}
            {...form.register("newPassword")}
          />
        </AccountForm>
      )}
    </div>
  );
}
