import { Link } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { RuledHeading } from "../../ui/RuledHeading";
import { HowItWorks } from "./HowItWorks";
import { WorkedExamples } from "./WorkedExamples";

/** Under the strip: how a search goes, in drawings, and ways in for who has nothing to measure. */
export function HomePage() {
  useTitle(null);
  return (
    <div className="page grid gap-x-16 gap-y-2 pb-8">
      <h1 className="mt-8 text-step3">Rubber and wear parts for old record changers and tape recorders, by size</h1>
      <HowItWorks />
      <div className="grid gap-x-16 md:grid-cols-2">
        <WorkedExamples />
        <section className="grid content-start gap-3">
          <RuledHeading className="mt-6">Nothing left to measure?</RuledHeading>
          <p className="max-w-prose">
            Find the mechanism in the <Link to="/families">families</Link>: its plan shows where each wear part sits,
            and the register knows the sizes that other restorers measured there.
          </p>
        </section>
      </div>
    </div>
  );
}
