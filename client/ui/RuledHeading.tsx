import type { ReactNode } from "react";

type Props = { children: ReactNode; level?: 2 | 3; id?: string; className?: string };

/** A short heading set into a rule, as in the title block of a drawing. */
export function RuledHeading({ children, level = 2, id, className = "" }: Props) {
  const Tag = level === 2 ? "h2" : "h3";
  return (
    <Tag id={id} className={`ruled ${className}`}>
      {children}
    </Tag>
  );
}
