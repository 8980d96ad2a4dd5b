import { zodResolver } from "@hookform/resolvers/zod";
import { useQuery } from "@tanstack/react-query";
import { useForm } from "react-hook-form";
import { Link, useNavigate, useSearchParams } from "react-router-dom";
import { SignIn } from "#shared/schemas/session";
import { sessionQuery } from "../../lib/session";
import { useTitle } from "../../lib/useTitle";
import { TextField } from "../../ui/TextField";
import { AccountForm } from "./AccountForm";
import { useSignIn } from "./api";
import { DemoAccounts } from "./DemoAccounts";
import { nextPage, withNext } from "./nextPage";
import { PasswordField } from "./PasswordField";

export function SignInPage() {
  useTitle("Sign in");
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const signIn = useSignIn();
  const { data: session } = useQuery(sessionQuery);
  const form = useForm<SignIn>({
    shouldFocusError: false,
    resolver: zodResolver(SignIn),
    defaultValues: { email: "", password: "" },
  });
  const { errors } = form.formState;

  const onSubmit = async (values: SignIn) => {
    await signIn.mutateAsync(values);
    await navigate(nextPage(search), { replace: true });
  };

  return (
    <div className="page grid gap-8 py-10">
      <h1>Sign in</h1>
      <AccountForm form={form} onSubmit={onSubmit} action="Sign in">
        <TextField
          label="E-mail address"
          type="email"
          autoComplete="username"
          error={errors.email?.message}
          {...form.register("email")}
        />
        <PasswordField
          label="Password"
          autoComplete="current-password"
          error={errors.password?.message}
          {...form.register("password")}
        />
      </AccountForm>
      <p>
        <Link to={withNext("/sign-up", search)}>Open an account</Link> or{" "}
        <Link to="/forgot-password">set a new password</Link>.
      </p>
      {session?.demoAccounts && (
        <DemoAccounts
          accounts={session.demoAccounts}
          onChoose={({ email, password }) => {
            form.setValue("email", email, { shouldValidate: true });
            form.setValue("password", password, { shouldValidate: true });
          }}
        />
      )}
    </div>
  );
}
