import type { CSSProperties, ReactNode, SelectHTMLAttributes } from "react";

type Props = SelectHTMLAttributes<HTMLSelectElement> & { label: string; shownText: string; children: ReactNode };

/** A choice that stands as a word in the sentence. `shownText` sets its width where the browser cannot. */
export function StripSelect({ label, shownText, className = "", children, ...rest }: Props) {
  const width = { "--slot-width": `${shownText.length + 1}ch` } as CSSProperties;
  return (
    <select aria-label={label} className={`slot ${className}`} style={width} {...rest}>
      {children}
    </select>
  );
}
