import type { ReactNode } from "react";
import { RuledHeading } from "../../ui/RuledHeading";

type Props = {
  label: string;
  /** The figure; a dash where there is none yet. */
  value: string | null;
  unit?: string;
  /** Blue for what the user measured or worked out, ink for what follows from the machine. */
  look?: "measured" | "plain";
  /** What the figure is, in a sentence or two. */
  children?: ReactNode;
};

/** One large figure under its ruled label. */
export function Readout({ label, value, unit, look = "plain", children }: Props) {
  return (
    <section className="grid gap-1">
      <RuledHeading>{label}</RuledHeading>
      <p className={`text-step3 font-bold tabular-nums ${look === "measured" ? "text-measured" : ""}`}>
        {value ?? "–"}
        {value !== null && unit && <small className="font-normal text-soft">&#8201;{unit}</small>}
      </p>
      {children && <div className="grid max-w-prose gap-1 text-soft">{children}</div>}
    </section>
  );
}
