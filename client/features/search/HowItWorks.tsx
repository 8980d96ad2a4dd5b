import type { ReactNode } from "react";
import { RuledHeading } from "../../ui/RuledHeading";

const frame = { viewBox: "0 0 240 110", className: "block w-full max-w-72" } as const;

/** Jaws on a worn wheel. */
function Measuring() {
  return (
    <svg {...frame} aria-hidden="true">
      <circle cx="120" cy="66" r="34" fill="var(--color-rubber)" stroke="var(--color-ink)" strokeWidth="1.5" />
      <circle cx="120" cy="66" r="26" fill="var(--color-metal-fill)" stroke="var(--color-ink)" />
      <circle cx="120" cy="66" r="5" fill="var(--color-ground)" stroke="var(--color-ink)" />
      <path d="M62 66H178M120 26V106" stroke="var(--color-soft)" strokeDasharray="10 3 2 3" strokeWidth="0.8" />
      <path
        d="M28 12H212V24H28ZM86 24V92L74 78V24M154 24V92L166 78V24"
        fill="none"
        stroke="var(--color-measured)"
        strokeWidth="2"
      />
      <path
        d="M96 12v5M106 12v5M116 12v5M126 12v5M136 12v5M146 12v5"
        stroke="var(--color-measured)"
        strokeWidth="1.2"
      />
    </svg>
  );
}

/** The outline when new, around what is left. */
function AsNew() {
  return (
    <svg {...frame} aria-hidden="true">
      <circle cx="120" cy="56" r="37" fill="var(--color-rubber)" stroke="var(--color-ink)" strokeWidth="1.5" />
      <circle cx="120" cy="56" r="28" fill="var(--color-metal-fill)" stroke="var(--color-ink)" />
      <circle cx="120" cy="56" r="5" fill="var(--color-ground)" stroke="var(--color-ink)" />
      <circle
        cx="120"
        cy="56"
        r="45"
        fill="none"
        stroke="var(--color-measured)"
        strokeWidth="2"
        strokeDasharray="6 4"
      />
      <path d="M165 56H206M157 56H140" stroke="var(--color-measured)" strokeWidth="1.4" />
      <path d="M165 56l9 -3.5v7ZM157 56l-9 -3.5v7Z" fill="var(--color-measured)" />
    </svg>
  );
}

/** Candidates on the rail, two of them inside the band. */
function Choosing() {
  return (
    <svg {...frame} aria-hidden="true">
      <rect x="76" y="14" width="92" height="66" fill="var(--color-inband-fill)" />
      <rect x="106" y="14" width="30" height="66" fill="var(--color-measured)" opacity="0.22" />
      <path d="M121 8V84" stroke="var(--color-measured)" strokeWidth="2" />
      <path d="M12 84H228" stroke="var(--color-ink)" strokeWidth="1.5" />
      <path
        d={Array.from({ length: 19 }, (_, i) => `M${12 + i * 12} 84v${i % 5 === 0 ? 9 : 5}`).join("")}
        stroke="var(--color-ink)"
      />
      <path d="M88 32h40M20 50h34M146 66h52M114 50h38" stroke="var(--color-ink)" />
      <g fill="var(--color-inband)">
        <circle cx="108" cy="32" r="5" />
        <circle cx="133" cy="50" r="5" />
      </g>
      <path d="M33 46l8 8m0 -8l-8 8M168 62l8 8m0 -8l-8 8" stroke="var(--color-outband)" strokeWidth="2" />
    </svg>
  );
}

const steps: { title: string; words: string; drawing: ReactNode }[] = [
  {
    title: "Measure what is left",
    words: "Write the sizes as you read them, in millimetres, inches or fractions, and how the old part looks.",
    drawing: <Measuring />,
  },
  {
    title: "Its size when new is worked out",
    words:
      "Wear, the instrument and soft rubber are reckoned in. You see the estimate, how far it may be off, and why.",
    drawing: <AsNew />,
  },
  {
    title: "Choose by the chance that it fits",
    words:
      "Every workshop’s part lies on one ruler, drawn to scale, with its fit chance, the reason, and what it costs delivered.",
    drawing: <Choosing />,
  },
];

/** The three steps of a search, each as a drawing with a sentence. */
export function HowItWorks() {
  return (
    <section>
      <RuledHeading className="mt-4">How it goes</RuledHeading>
      <ol className="mt-4 grid gap-x-10 gap-y-8 sm:grid-cols-3">
        {steps.map(({ title, words, drawing }, i) => (
          <li key={title} className="grid content-start gap-2">
            {drawing}
            <h3 className="text-step1">
              <span className="text-soft">{i + 1}</span> {title}
            </h3>
            <p>{words}</p>
          </li>
        ))}
      </ol>
    </section>
  );
}
