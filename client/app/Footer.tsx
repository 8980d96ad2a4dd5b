import { Link } from "react-router-dom";
import { RuledHeading } from "../ui/RuledHeading";
import { ThemeSwitch } from "./ThemeSwitch";

export function Footer() {
  return (
    <footer className="mt-16 border-t border-rule bg-sheet print:hidden">
      <div className="page grid gap-x-12 gap-y-8 py-8 text-small text-soft md:grid-cols-[3fr_2fr]">
        <section className="grid content-start gap-2">
          <RuledHeading>Mind</RuledHeading>
          <p className="max-w-prose">
            Unplug the machine and let it discharge before you open it: mains motors and valve chassis can kill. Mains
            work is for a licensed person under your local codes. Keep hands and sleeves away from spinning parts, air
            the room of solvent vapour, and keep tarred rubber and grinding dust off skin and out of lungs.
          </p>
          <p className="max-w-prose">Sizes and chances are aids: check on the machine before you close it up.</p>
        </section>
        <section className="grid content-start gap-2">
          <RuledHeading>How sizes are worked out</RuledHeading>
          <p className="max-w-prose">
            Measuring uncertainty follows JCGM 100, fit chance JCGM 106, rubber tolerances ISO 3302-1. What age does to
            rubber is common practice without a published source, and is marked so wherever it is used.
          </p>
          <p className="flex flex-wrap gap-x-5 gap-y-1">
            <Link to="/guides" className="inline-flex min-h-6 items-center">
              Guides
            </Link>
            <Link to="/guides/fit-chance" className="inline-flex min-h-6 items-center">
              The working in full, with sources
            </Link>
            <a href="/api/docs" className="inline-flex min-h-6 items-center">
              For programs
            </a>
          </p>
          <ThemeSwitch />
        </section>
      </div>
    </footer>
  );
}
