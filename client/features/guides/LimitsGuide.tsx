import { Link } from "react-router-dom";
import { shoreASpring } from "#shared/domain/hardness";
import { roundDecimal } from "#shared/domain/roundDecimal";
import { beltAfterSet } from "#shared/domain/rubberSet";
import { exampleSizes } from "./exampleSizes";
import { GuideSection } from "./GuideSection";
import { PointOnBelt } from "./PointOnBelt";
import { SetRange } from "./SetRange";
import { Sources } from "./Sources";
import { workExample } from "./workedExample";

const shoreA = 60;
const stretchPercent = 5;
const sets = [5, 40] as const;
const percent = (chance: number) => `${roundDecimal(chance * 100, 0)}\u00a0%`;

/** Where the numbers end, and what to do there. */
export function LimitsGuide() {
  const { depthMm } = shoreASpring(shoreA);
  const thicknessMm = exampleSizes["flat-belt"].thickness ?? 1;
  const relaxedMm = exampleSizes["flat-belt"].insideCircumference ?? 500;
  const lengths = sets.map((setPercent) => beltAfterSet({ relaxedMm, stretchPercent, setPercent }).relaxedMm);
  const { first, second, fit } = workExample();
  const [apart, together] = [Math.max(first.chance + second.chance - 1, 0), Math.min(first.chance, second.chance)];
  return (
    <>
      <div className="grid gap-x-12 lg:grid-cols-2">
        <GuideSection title="How hard a thin part is">
          <PointOnBelt depthMm={depthMm} thicknessMm={thicknessMm} />
          <p className="max-w-prose">
            At Shore A {shoreA} the point of the gauge stands {roundDecimal(depthMm, 1)} mm deep in the rubber. A belt
            is {thicknessMm} mm thick: the point feels the table. ISO 48-4 asks for 6 mm of rubber or for another scale.
            What a thin or curved part shows is an apparent hardness; it only tells whether one part is harder than
            another.
          </p>
        </GuideSection>
        <GuideSection title="How far an old belt has set">
          <SetRange relaxedMm={relaxedMm} lengthsMm={lengths} />
          <p className="max-w-prose">
            Rubber does not give back all of its stretch. Of {stretchPercent} % stretch it may keep {sets[0]} % or{" "}
            {sets[1]} %: a belt that was {relaxedMm} mm when new is then found with {roundDecimal(lengths[0] ?? 0, 1)}{" "}
            or {roundDecimal(lengths[1] ?? 0, 1)} mm. Nobody sees which. The path over{" "}
            <Link to="/gauges/belt-route">its pulleys</Link> has not set: where you can measure that, trust it more.
          </p>
        </GuideSection>
        <GuideSection title="What the corrections are worth">
          <p className="max-w-prose">
            No published table says what ageing takes from an idler or a belt. The{" "}
            <Link to="/guides/conditions">corrections</Link> are our own, common practice without a source, and each has
            a wide range for that reason. So have the bands that a place accepts, where the register does not know them.
          </p>
        </GuideSection>
        <GuideSection title="Whether sizes go together">
          <p className="max-w-prose">
            The chances of several sizes are multiplied as if they had nothing to do with each other. They may: a mould
            cut large is large everywhere. In the worked example the product is {percent(fit.chance)}; if the two sizes
            always failed together it would be {percent(together)}, if never together {percent(apart)}.
          </p>
        </GuideSection>
        <GuideSection title="How it grips">
          <p className="max-w-prose">
            A wheel of the right size may still slip. Friction depends on the compound, its age, oil and dust, and
            cannot be seen from a size. Material and hardness are stated where the workshop knows them; what other
            restorers report of the part tells more.
          </p>
        </GuideSection>
        <GuideSection title="What its maker drew">
          <p className="max-w-prose">
            Makers’ drawings are mostly lost, and the machine in front of you may have been changed. Everything here is
            reckoned back from worn parts. Where several restorers measured the same service point, their common size is
            on the register of <Link to="/families">its family</Link>.
          </p>
        </GuideSection>
        <GuideSection title="What to do about it">
          <p className="max-w-prose">
            Measure what has not aged: hubs, pulleys, spindles, the travel of the arm. Check on the machine before you
            close it up, and say how it went: that is how the register learns.
          </p>
        </GuideSection>
      </div>
      <Sources
        sources={[
          "Hardness: ISO 48-4:2018, choice of scale and 6 mm thickness. Spring and travel of the gauge: from memory.",
          "Set: the definition of ISO 2285, from memory. The two amounts of set are examples, common practice, no source.",
          "The two ends for sizes that go together: bounds of Fréchet, from memory.",
        ]}
      />
    </>
  );
}
