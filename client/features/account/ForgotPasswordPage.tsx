import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { RequestPasswordReset } from "#shared/schemas/session";
import { useTitle } from "../../lib/useTitle";
import { Notice } from "../../ui/Notice";
import { TextField } from "../../ui/TextField";
import { AccountForm } from "./AccountForm";
import { useRequestReset } from "./api";

export function ForgotPasswordPage() {
  useTitle("Set a new password");
  const request = useRequestReset();
  const form = useForm<RequestPasswordReset>({
    shouldFocusError: false,
    resolver: zodResolver(RequestPasswordReset),
    defaultValues: { email: "" },
  });
  return (
    <div className="page grid gap-8 py-10">
      <h1>Set a new password</h1>
      {request.isSuccess ? (
        <Notice title="Look in your mail">
          <p>If this address has an account, a link is on its way. It works for one hour, once.</p>
        </Notice>
      ) : (
        <AccountForm form={form} onSubmit={async (values) => request.mutateAsync(values)} action="Send me a link">
          <TextField
            label="E-mail address"
            type="email"
            autoComplete="username"
            error={form.formState.errors.email?.message}
            {...form.register("email")}
          />
        </AccountForm>
      )}
    </div>
  );
}
