import { Link } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { RuledHeading } from "../../ui/RuledHeading";
import { VerdictShape } from "../../ui/VerdictMark";
import { verdictColour, verdictWords } from "../../ui/verdictWords";
import { Conditions } from "./Conditions";
import { Instruments } from "./Instruments";

const verdictLines = [
  { verdict: "sure", words: "90 % or more" },
  { verdict: "likely", words: "60 % or more" },
  { verdict: "chancy", words: "20 % or more" },
  { verdict: "unfit", words: "less than 20 %" },
] as const;

const sources = [
  "JCGM 100:2008, Guide to the expression of uncertainty in measurement: combining what an instrument, its scale, repeated readings and soft rubber contribute.",
  "JCGM 106:2012, The role of measurement uncertainty in conformity assessment, 7.3 and 7.4: the chance that a part lies inside what is accepted.",
  "ISO 3302-1, Rubber, tolerances for products, dimensional tolerances: classes M1 to M4, used where a workshop states a class, and M3 where it states none.",
  "ISO 48-4, Rubber, indentation hardness by the durometer method: Shore A.",
  "ISO 129-1 and ISO 128-3: how the drawings are dimensioned and hatched.",
];

/** How sizes and chances are worked out, and from what. */
export function WorkingPage() {
  useTitle("How sizes are worked out");
  return (
    <article className="page grid max-w-5xl gap-2 pb-8">
      <h1 className="pt-8">How sizes are worked out</h1>
      <p className="max-w-prose text-step1 text-soft">
        A worn part does not have the size that is needed. Four steps lead from your calliper to a chance that a part
        fits.
      </p>

      <RuledHeading className="mt-6">1. What you measured</RuledHeading>
      <p className="max-w-prose">
        A length is read as people write it, in millimetres, inches, fractions or thou, and shown back to you. A
        fraction counts as rounded to its last part, a decimal as what the instrument showed. The instrument’s
        permissible error, its scale, the scatter of several readings and the give of rubber under the jaws together
        make the uncertainty (JCGM 100).
      </p>
      <Instruments />

      <RuledHeading className="mt-6">2. Its size when new</RuledHeading>
      <p className="max-w-prose">
        What age took is put back, with an uncertainty of its own. These corrections are common practice without a
        published source; every estimate says where they were used. Metal is not corrected.
      </p>
      <Conditions />

      <RuledHeading className="mt-6">3. What the place accepts</RuledHeading>
      <p className="max-w-prose">
        Where the register of a mechanism family knows the band that a service point accepts, that band is used. Else
        the usual one for the kind and size is taken: common practice, no source.
      </p>

      <RuledHeading className="mt-6">4. The chance that it fits</RuledHeading>
      <p className="max-w-prose">
        For each size that you measured and the workshop states, the probability that the part lies inside the band,
        given both uncertainties (JCGM 106). The chances of the sizes are multiplied. Sizes that were not checked count
        for nothing, so the number checked stands beside every verdict.
      </p>
      <ul className="grid gap-1">
        {verdictLines.map(({ verdict, words }) => (
          <li key={verdict} className="flex items-center gap-3">
            <svg width="16" height="16" viewBox="-8 -8 16 16" className={verdictColour[verdict]} aria-hidden="true">
              <VerdictShape verdict={verdict} />
            </svg>
            <span className={`min-w-20 font-bold ${verdictColour[verdict]}`}>{verdictWords[verdict]}</span>
            {words}
          </li>
        ))}
      </ul>

      <RuledHeading className="mt-6">Order of the results</RuledHeading>
      <p className="max-w-prose">
        Best fit puts the highest chance first, landed price the lowest price with postage to your country, soonest the
        fewest days until the part leaves its workshop. Nobody can pay to stand higher.
      </p>

      <RuledHeading className="mt-6">Sources</RuledHeading>
      <ul className="grid max-w-prose gap-2">
        {sources.map((source) => (
          <li key={source}>{source}</li>
        ))}
      </ul>
      <p className="mt-4">
        <Link to="/">To the sentence</Link>
      </p>
    </article>
  );
}
