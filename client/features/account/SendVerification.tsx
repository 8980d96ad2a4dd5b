import { Button } from "../../ui/Button";
import { FailureNotice } from "../../ui/FailureNotice";
import { useSendVerification } from "./api";

/** Sends the confirming mail again. */
export function SendVerification() {
  const send = useSendVerification();
  return (
    <div className="grid gap-3">
      <p role="status">
        {send.isSuccess
          ? "Sent again. It may take a minute."
          : "No mail? Look among unwanted mail, or have it sent again."}
      </p>
      <Button className="justify-self-start" disabled={send.isPending || send.isSuccess} onClick={() => send.mutate()}>
        Send it again
      </Button>
      {send.isError && <FailureNotice error={send.error} what="The mail could not be sent again" />}
    </div>
  );
}
