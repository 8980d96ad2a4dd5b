import { Link } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { RuledHeading } from "../../ui/RuledHeading";
import { GuideMark } from "./GuideMark";
import { groupTitles, guides } from "./guides";

/** Every guide with a picture of what it is about. */
export function GuidesPage() {
  useTitle("Guides");
  return (
    <div className="page pb-8">
      <header className="grid gap-2 pt-8">
        <h1>Guides</h1>
        <p className="max-w-prose text-step1 text-soft">
          How to take the sizes of a worn part, and what becomes of them: every figure here is the one that the search
          uses.
        </p>
      </header>
      {(["measuring", "working"] as const).map((group) => (
        <section key={group}>
          <RuledHeading className="mt-8">{groupTitles[group]}</RuledHeading>
          <ul className="mt-2 grid gap-x-12 md:grid-cols-2">
            {guides
              .filter((guide) => guide.group === group)
              .map((guide) => (
                <li
                  key={guide.slug}
                  className="grid grid-cols-[6.5rem_1fr] items-center gap-x-5 border-b border-rule py-3 sm:grid-cols-[8.5rem_1fr]"
                >
                  <GuideMark guide={guide} />
                  <div>
                    <h3 className="text-step1">
                      <Link to={`/guides/${guide.slug}`} className="inline-flex min-h-8 items-center">
                        {guide.title}
                      </Link>
                    </h3>
                    <p>{guide.summary}</p>
                  </div>
                </li>
              ))}
          </ul>
        </section>
      ))}
      <p className="mt-8 max-w-prose text-small text-soft">
        The drawings are dimensioned as in ISO 129-1 and hatched as in ISO 128-3. Those of measuring are not to scale.
      </p>
    </div>
  );
}
