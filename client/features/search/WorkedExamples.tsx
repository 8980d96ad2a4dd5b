import { Link } from "react-router-dom";
import { RuledHeading } from "../../ui/RuledHeading";

const examples = [
  {
    words: "A glazed idler wheel, 1-47/64 in across, 4.00 mm bore",
    to: "/find?kind=idler-wheel&outsideDiameter=1-47%2F64+in&bore=4.00+mm&condition=glazed",
  },
  {
    words: "A slack flat belt, 540 mm around the inside, 5.0 mm wide",
    to: "/find?kind=flat-belt&insideCircumference=540.0+mm&width=5.0+mm&condition=slack",
  },
  {
    words: "A hardened pinch roller, 12.8 mm across, 2.00 mm bore",
    to: "/find?kind=pinch-roller&outsideDiameter=12.80+mm&bore=2.00+mm&condition=hardened",
  },
];

/** Searches to follow: what was measured, in words. */
export function WorkedExamples() {
  return (
    <section className="grid content-start gap-3">
      <RuledHeading className="mt-6">Worked examples</RuledHeading>
      <ul className="grid gap-1">
        {examples.map(({ words, to }) => (
          <li key={to}>
            <Link to={to} className="inline-flex min-h-8 items-center">
              {words}
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
