import { Link } from "react-router-dom";
import { assumedClass } from "#shared/domain/partTolerance";
import { CheckInBar } from "./CheckInBar";
import { FitBench } from "./FitBench";
import { ChanceFormula, CombinedFormula } from "./Formula";
import { GuideSection } from "./GuideSection";
import { Sources } from "./Sources";
import { VerdictLines } from "./VerdictLines";
import { WorkedExample } from "./WorkedExample";

const sources = [
  "JCGM 100:2008, Guide to the expression of uncertainty in measurement, 4.2, 4.3 and 5.1: what an instrument, its scale, repeated readings and soft rubber contribute.",
  "JCGM 106:2012, The role of measurement uncertainty in conformity assessment, 7.3 and 7.4: the chance that a part lies inside what is accepted.",
  `ISO 3302-1:2014, Rubber, tolerances for products, Table 1: classes M1 to M4, used where a workshop states a class, and ${assumedClass} where it states none.`,
  "ISO 14253-1: deciding with an uncertainty whether what arrived is as stated.",
];

/** From two sizes and their uncertainties to a chance. */
export function FitChanceGuide() {
  return (
    <>
      <GuideSection title="Try it">
        <p className="max-w-prose">
          Nobody knows exactly how large the part is, nor how large it has to be. The curve shows where the difference
          may lie; the chance is what of it falls inside the band that the place accepts.
        </p>
        <FitBench />
      </GuideSection>
      <GuideSection title="The sum">
        <p className="max-w-prose">
          L and U are the ends of the accepted band, y the workshop’s nominal, t its tolerance, and u how far the two
          sizes together may be off. Φ is the normal distribution function.
        </p>
        <CombinedFormula />
        <ChanceFormula />
      </GuideSection>
      <GuideSection title="A worked example">
        <WorkedExample />
      </GuideSection>
      <div className="grid gap-x-12 lg:grid-cols-2">
        <GuideSection title="Several sizes">
          <p className="max-w-prose">
            The chances of the sizes are multiplied, as if they were independent. Sizes that were not checked count for
            nothing, so the number checked stands beside every verdict.
          </p>
          <VerdictLines />
        </GuideSection>
        <GuideSection title="What the place accepts">
          <p className="max-w-prose">
            Where the register of a mechanism family knows the band that a service point accepts, that band is used.
            Else the usual one for the kind and size is taken: common practice, no source. The guide of each kind shows
            them.
          </p>
        </GuideSection>
        <GuideSection title="Order of the results" id="order">
          <p className="max-w-prose">
            Best fit puts the highest chance first, landed price the lowest price with postage to your country, soonest
            the fewest days until the part leaves its workshop. Nobody can pay to stand higher.
          </p>
        </GuideSection>
        <GuideSection title="When it arrives">
          <p className="max-w-prose">
            Measure it again. It conforms where your mean lies inside the stated limits by more than your uncertainty
            explains, and does not where it lies as far outside. In between it cannot be told with this instrument, and
            nobody is blamed for that.
          </p>
          <CheckInBar />
          <p>
            <Link to="/guides/limits">What cannot be known</Link>
          </p>
        </GuideSection>
      </div>
      <Sources sources={sources} />
    </>
  );
}
