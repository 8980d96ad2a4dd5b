import type { ReactNode } from "react";
import { Link } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { GaugeActions } from "./GaugeActions";

type Props = {
  title: string;
  /** What the gauge is for, in one sentence. */
  lead: string;
  /** The picture; it stands first everywhere. */
  board: ReactNode;
  /** Results, beside the picture on a wide page and after it on a phone. */
  side: ReactNode;
  /** Fields and tables, below the picture. */
  children: ReactNode;
};

/** What every gauge has in common: the picture, what follows from it, and the numbers that it is made of. */
export function GaugePage({ title, lead, board, side, children }: Props) {
  useTitle(title);
  return (
    <div className="page pb-12">
      <header className="flex flex-wrap items-end justify-between gap-x-8 gap-y-2 pt-6 pb-5">
        <div>
          <nav aria-label="Where this is" className="text-small print:hidden">
            <Link to="/gauges">Gauge desk</Link>
          </nav>
          <h1>{title}</h1>
          <p className="max-w-prose text-soft">{lead}</p>
        </div>
        <GaugeActions />
      </header>
      <div className="gauge">
        <div className="gauge-board">{board}</div>
        <aside className="gauge-side" aria-label="What follows">
          {side}
        </aside>
        <div className="gauge-below">{children}</div>
      </div>
    </div>
  );
}
