import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { ChangePassword, shortestPassword } from "#shared/schemas/session";
import { AccountForm } from "./AccountForm";
import { useChangePassword } from "./api";
import { PasswordField } from "./PasswordField";

const empty = { currentPassword: "", newPassword: "" };

export function ChangePasswordForm() {
  const change = useChangePassword();
  const form = useForm<ChangePassword>({
    shouldFocusError: false,
    resolver: zodResolver(ChangePassword),
    defaultValues: empty,
  });
  const { errors } = form.formState;
  const onSubmit = async (values: ChangePassword) => {
    await change.mutateAsync(values);
    form.reset(empty);
  };
  return (
    <>
      <AccountForm form={form} onSubmit={onSubmit} action="Change the password">
        <PasswordField
          label="Present password"
          autoComplete="current-password"
          error={errors.currentPassword?.message}
          {...form.register("currentPassword")}
        />
        <PasswordField
          label="New password"
          autoComplete="new-password"
          hint={`At least ${shortestPassword} characters. Other places where you are signed in are signed out.`}
          error={errors.newPassword?.message}
          {...form.register("newPassword")}
        />
      </AccountForm>
      <p role="status">{change.isSuccess && "The password is changed. A mail tells you so."}</p>
    </>
  );
}
