import { Link } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { RuledHeading } from "../../ui/RuledHeading";
import { DeskDrawing } from "./desk/DeskDrawing";
import type { DeskDrawingName } from "./desk/deskDrawings";

const gauges: { name: DeskDrawingName; title: string; words: string }[] = [
  { name: "belt-route", title: "Belt route", words: "No belt left? Lay out the pulleys that it ran over." },
  {
    name: "belt-sample",
    title: "Belt sample",
    words: "From an old belt, laid flat or around something, to its size as new.",
  },
  {
    name: "speed",
    title: "Speed",
    words: "What a drive turns at, which sizes set it, and what the other mains would need.",
  },
  {
    name: "tolerances",
    title: "Tolerances",
    words: "What a moulder’s class means for a size, and whether that is accepted.",
  },
  {
    name: "o-rings",
    title: "O-ring sizes",
    words: "The standard ring that serves as a tyre or a belt, and its section once stretched.",
  },
  {
    name: "sheets",
    title: "Sheets to print",
    words: "Rings, belt rulers and stroboscope discs in life size, each with a bar to check the printer.",
  },
];

const guides = [
  { to: "/guides", title: "All guides", words: "How each part is measured, and what becomes of the sizes." },
  { to: "/guides/fit-chance", title: "The chance that a part fits", words: "How it is worked out, with sources." },
];

/** The gauges, each by a drawing of what it is about. */
export function GaugeDeskPage() {
  useTitle("Gauge desk");
  return (
    <div className="page pb-12">
      <header className="grid gap-1 pt-6 pb-5">
        <h1>Gauge desk</h1>
        <p className="max-w-prose text-soft">Six gauges that work on what you measured. They need no account.</p>
      </header>
      <RuledHeading>Gauges</RuledHeading>
      <ul className="grid gap-x-10 sm:grid-cols-2 lg:grid-cols-3">
        {gauges.map(({ name, title, words }) => (
          <li key={name} className="border-b border-rule">
            <Link
              to={`/gauges/${name}`}
              className="group grid grid-cols-[8.5rem_1fr] items-center gap-x-4 gap-y-3 py-4 no-underline sm:grid-cols-1 sm:py-5"
            >
              <DeskDrawing name={name} />
              <span>
                <span className="block text-step1 font-bold group-hover:underline">{title}</span>
                <span className="text-soft">{words}</span>
              </span>
            </Link>
          </li>
        ))}
      </ul>
      <RuledHeading className="mt-10">Guides</RuledHeading>
      <ul>
        {guides.map(({ to, title, words }) => (
          <li key={to} className="grid gap-x-8 border-b border-rule py-2 sm:grid-cols-[16rem_1fr] sm:items-baseline">
            <Link to={to} className="inline-flex min-h-11 items-center justify-self-start font-semibold">
              {title}
            </Link>
            <p className="text-soft">{words}</p>
          </li>
        ))}
      </ul>
      <p className="mt-8 max-w-prose text-small text-soft">
        The gauges are aids: check on the machine before closing it up.
      </p>
    </div>
  );
}
