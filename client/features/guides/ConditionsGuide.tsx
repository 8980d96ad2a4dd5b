import { Link } from "react-router-dom";
import { estimateAsNew } from "#shared/domain/asNew";
import { conditionFacts, conditions } from "#shared/domain/conditions";
import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { capitalised } from "../../lib/capitalised";
import { AgeChart } from "./AgeChart";
import { exampleSizes } from "./exampleSizes";
import { GuideSection } from "./GuideSection";
import { Points } from "./Points";
import { Sources } from "./Sources";

type Shown = { title: string; kind: PartKind; dimension: DimensionName; words: string };
const shown: readonly Shown[] = [
  {
    title: "The running diameter of a wheel or roller",
    kind: "idler-wheel",
    dimension: "outsideDiameter",
    words: "A running face wears and shrinks. Oil makes it grow, but only the thin tyre, not the wheel.",
  },
  {
    title: "The length of a belt, or the inside of a ring",
    kind: "flat-belt",
    dimension: "insideCircumference",
    words: "Belts lengthen in use, and so do rings on their hubs. Hard ones have shrunk a little.",
  },
  {
    title: "The section of a belt or ring",
    kind: "round-belt",
    dimension: "section",
    words: "What it gains in length it loses in section.",
  },
  {
    title: "The thickness of a pad or felt",
    kind: "brake-pad",
    dimension: "thickness",
    words: "The face that rubs is worn away.",
  },
  {
    title: "Other sizes of the soft part",
    kind: "motor-mount",
    dimension: "outsideDiameter",
    words: "Nothing rubs here: the rubber only swells or shrinks.",
  },
];

const round = { kind: "idler-wheel", dimension: "outsideDiameter", instrument: "digital-caliper" } as const;

/** How to tell each condition, and what it does to each sort of size. */
export function ConditionsGuide() {
  const flat = estimateAsNew({ ...round, readingsMm: [43.55, 43.95, 44], condition: "flat-spotted" });
  return (
    <>
      <GuideSection title="How to tell">
        <dl className="grid max-w-prose gap-x-6 gap-y-1 sm:grid-cols-[8rem_1fr]">
          {conditions.map((condition) => (
            <div key={condition} className="contents">
              <dt className="font-semibold">{capitalised(conditionFacts[condition].name)}</dt>
              <dd>{conditionFacts[condition].sign}</dd>
            </div>
          ))}
        </dl>
        <p className="max-w-prose">
          What age took is put back, and what it may have taken more or less counts in the uncertainty. Choose the
          condition that is plainest; between two, take the one with the wider range.
        </p>
      </GuideSection>
      <div className="grid gap-x-12 lg:grid-cols-2">
        {shown.map(({ title, kind, dimension, words }) => (
          <GuideSection key={title} title={title}>
            <p className="max-w-prose">{words}</p>
            <AgeChart kind={kind} dimension={dimension} sizeMm={exampleSizes[kind][dimension] ?? 10} />
          </GuideSection>
        ))}
        <GuideSection title="Metal does not age with the rubber">
          <p className="max-w-prose">
            Bore and overall height are metal or bush: they are taken as they were read, whatever the rubber looks like.
          </p>
        </GuideSection>
      </div>
      <div className="grid gap-x-12 lg:grid-cols-2">
        <GuideSection title="A flat spot">
          <p className="max-w-prose">
            A wheel that was parked against its shaft has a dent. Three readings round it show that, where they differ
            by more than measuring explains. Its size when new is then reckoned from the highest reading. For example:
          </p>
          <Points points={flat.basis} />
        </GuideSection>
        <GuideSection title="Melted or missing">
          <p className="max-w-prose">
            Nothing is left to measure. Work a belt out <Link to="/gauges/belt-route">from its pulleys</Link>, or look
            under <Link to="/families">the mechanism family</Link>, whose service points may be on the register.
          </p>
        </GuideSection>
      </div>
      <Sources
        sources={[
          "All corrections and their ranges: common practice, no source. Every estimate says where one was used.",
          "How ranges add up: JCGM 100:2008, 5.1.2.",
        ]}
      />
    </>
  );
}
