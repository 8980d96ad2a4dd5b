import type { ReactNode } from "react";

export type TitleCell = { label: string; value: ReactNode /** The sum of the others. */; whole?: boolean };

/** Figures in ruled cells, as in the title block of a drawing. */
export function TitleBlock({ cells, className = "" }: { cells: readonly TitleCell[]; className?: string }) {
  return (
    <dl className={`grid grid-cols-2 overflow-hidden border border-rule sm:flex print:break-inside-avoid ${className}`}>
      {cells.map(({ label, value, whole }) => (
        <div
          key={label}
          className={`-mr-px -mb-px flex flex-col border-r border-b border-rule px-3 py-2 last:odd:col-span-2 sm:grow ${whole ? "sm:min-w-36 sm:text-right" : "sm:basis-0"}`}
        >
          <dt className="text-small text-soft">{label}</dt>
          <dd className={whole ? "text-step1 font-bold" : ""}>{value}</dd>
        </div>
      ))}
    </dl>
  );
}
