import type { ReactNode } from "react";

type Props = { summary: ReactNode; children: ReactNode; open?: boolean; className?: string };

/** Words that open to more words. */
export function Disclosure({ summary, children, open, className = "" }: Props) {
  return (
    <details open={open} className={className}>
      <summary className="inline-flex min-h-6 cursor-pointer items-center underline underline-offset-4 marker:content-none">
        {summary}
      </summary>
      <div className="mt-2">{children}</div>
    </details>
  );
}
