import type { ReactNode } from "react";

type Props = { number: number; title: string; children: ReactNode };

/** A step of the checkout, numbered by a balloon as parts are on a drawing, its heading set into a rule. */
export function Step({ number, title, children }: Props) {
  const id = `step-${number}`;
  return (
    <section aria-labelledby={id} className="grid grid-cols-1 gap-5">
      <h2 id={id} className="flex items-center gap-3 text-step1 font-bold after:h-px after:flex-1 after:bg-rule">
        <span className="grid size-8 place-content-center rounded-full border-2 border-ink text-base tabular-nums">
          {number}
          <span className="sr-only">.</span>
        </span>
        {title}
      </h2>
      <div className="sm:pl-11">{children}</div>
    </section>
  );
}
