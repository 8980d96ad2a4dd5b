import { type ComponentProps, useState } from "react";
import { Button } from "../../ui/Button";
import { TextField } from "../../ui/TextField";

type Props = Omit<ComponentProps<typeof TextField>, "type" | "autoComplete"> & {
  autoComplete: "current-password" | "new-password";
};

/** A password that can be shown; password managers and pasting work. */
export function PasswordField(props: Props) {
  const [shown, setShown] = useState(false);
  return (
    <div className="grid gap-1">
      <TextField {...props} type={shown ? "text" : "password"} spellCheck={false} autoCapitalize="none" />
      <Button look="quiet" className="justify-self-start" aria-pressed={shown} onClick={() => setShown(!shown)}>
        {shown ? "Hide the password" : "Show the password"}
      </Button>
    </div>
  );
}
