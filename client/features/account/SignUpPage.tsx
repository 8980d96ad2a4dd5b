import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { Link, useNavigate, useSearchParams } from "react-router-dom";
import { SignUp, shortestPassword } from "#shared/schemas/session";
import { ApiProblem } from "../../lib/ApiProblem";
import { useTitle } from "../../lib/useTitle";
import { TextField } from "../../ui/TextField";
import { AccountForm } from "./AccountForm";
import { useSignIn, useSignUp } from "./api";
import { withNext } from "./nextPage";
import { PasswordField } from "./PasswordField";

export function SignUpPage() {
  useTitle("Open an account");
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const signUp = useSignUp();
  const signIn = useSignIn();
  const form = useForm<SignUp>({
    shouldFocusError: false,
    resolver: zodResolver(SignUp),
    defaultValues: { email: "", password: "", displayName: "" },
  });
  const { errors } = form.formState;

  const onSubmit = async (values: SignUp) => {
    await signUp.mutateAsync(values);
    // An address that had an account already keeps its old password: its owner is told by mail, nobody is told here.
    await signIn.mutateAsync({ email: values.email, password: values.password }).catch((error: unknown) => {
      if (!(error instanceof ApiProblem)) throw error;
    });
    await navigate(withNext("/check-your-mail", search), { replace: true, state: { email: values.email } });
  };

  return (
    <div className="page grid gap-8 py-10">
      <div className="grid gap-2">
        <h1>Open an account</h1>
        <p className="max-w-prose text-soft">
          Looking and measuring need none. Buying does, so that your parcels and your measurements find you.
        </p>
      </div>
      <AccountForm form={form} onSubmit={onSubmit} action="Open the account">
        <TextField
          label="Name that others see"
          autoComplete="nickname"
          error={errors.displayName?.message}
          {...form.register("displayName")}
        />
        <TextField
          label="E-mail address"
          type="email"
          autoComplete="username"
          hint="We send a link there to confirm it."
          error={errors.email?.message}
          {...form.register("email")}
        />
        <PasswordField
          label="Password"
          autoComplete="new-password"
          hint={`At least ${shortestPassword} characters. A few words in a row are easy to keep and hard to guess.`}
          error={errors.password?.message}
          {...form.register("password")}
        />
      </AccountForm>
      <p>
        Have one already? <Link to={withNext("/sign-in", search)}>Sign in</Link>.
      </p>
    </div>
  );
}
