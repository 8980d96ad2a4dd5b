import { type ReactNode, useId } from "react";
import { RuledHeading } from "../../ui/RuledHeading";

type Props = { title: ReactNode; children: ReactNode; level?: 2 | 3; id?: string };

/** A part of a guide under its heading. */
export function GuideSection({ title, children, level = 2, id }: Props) {
  const own = useId();
  return (
    <section aria-labelledby={id ?? own} className="grid grid-cols-[minmax(0,1fr)] content-start gap-3">
      <RuledHeading id={id ?? own} level={level} className={level === 2 ? "mt-8 scroll-mt-24" : "mt-3"}>
        {title}
      </RuledHeading>
      {children}
    </section>
  );
}
