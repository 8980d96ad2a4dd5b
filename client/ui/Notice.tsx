import type { ReactNode } from "react";
import { Button } from "./Button";

type Props = {
  title: string;
  children?: ReactNode;
  /** `wrong` is announced at once; `quiet` says that a list is empty. */
  tone?: "wrong" | "quiet";
  onRetry?: (() => void) | undefined;
};

/** What happened, what was kept, and what to do next. */
export function Notice({ title, children, tone = "quiet", onRetry }: Props) {
  const wrong = tone === "wrong";
  return (
    <div
      role={wrong ? "alert" : "status"}
      className={`grid max-w-prose justify-items-start gap-3 border-l-4 bg-sheet px-5 py-4 ${wrong ? "border-outband" : "border-rule"}`}
    >
      <p className="text-step1 font-semibold">{title}</p>
      {children && <div className="grid gap-2">{children}</div>}
      {onRetry && <Button onClick={onRetry}>Try again</Button>}
    </div>
  );
}
