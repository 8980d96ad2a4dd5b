import { Link } from "react-router-dom";
import { kindFacts, type PartKind } from "#shared/domain/partKinds";
import { GuideSection } from "./GuideSection";

type Way = { to: string; words: string };

const belts: readonly Way[] = [
  { to: "/gauges/belt-route", words: "No belt left: work it out from its pulleys" },
  { to: "/gauges/belt-sample", words: "From readings of an old belt to its size when new" },
  { to: "/gauges/sheets", words: "Print a belt ruler at true size" },
];
const wheels: readonly Way[] = [{ to: "/gauges/speed", words: "Which of its sizes set the speed, and which cancel" }];
const gauges: Record<PartKind, readonly Way[]> = {
  "idler-wheel": wheels,
  "pinch-roller": [],
  "flat-belt": belts,
  "square-belt": belts,
  "round-belt": belts,
  "drive-ring": [{ to: "/gauges/o-rings", words: "The nearest standard O-ring, and what stretching does to it" }],
  "motor-mount": [],
  "brake-pad": [],
  "clutch-felt": [],
};

/** What to do with the sizes once they are taken. */
export function WhereNext({ kinds }: { kinds: readonly PartKind[] }) {
  const ways = [
    ...kinds.map((kind) => ({ to: `/find?kind=${kind}`, words: `Search for ${kindFacts[kind].plural}` })),
    ...new Set(kinds.flatMap((kind) => gauges[kind])),
    { to: "/guides/conditions", words: "What its condition does to these sizes" },
    { to: "/gauges/tolerances", words: "What a stated tolerance class means at a size" },
  ];
  return (
    <GuideSection title="Where next">
      <ul className="grid gap-x-10 sm:grid-cols-2">
        {ways.map(({ to, words }) => (
          <li key={to}>
            <Link to={to} className="inline-flex min-h-8 items-center py-1">
              {words}
            </Link>
          </li>
        ))}
      </ul>
    </GuideSection>
  );
}
