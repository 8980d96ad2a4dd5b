import { rangeFactor } from "#shared/domain/flatSpot";
import { instrumentFacts, instruments } from "#shared/domain/instruments";
import { parseLength } from "#shared/domain/length";
import { permissibleError } from "#shared/domain/permissibleError";
import { roundDecimal } from "#shared/domain/roundDecimal";
import { capitalised } from "../../lib/capitalised";
import { ErrorChart } from "./ErrorChart";
import { GuideSection } from "./GuideSection";
import { InstrumentTable } from "./InstrumentTable";
import { Points } from "./Points";
import { Sources } from "./Sources";

const sizesMm = [4, 44, 600] as const;
const written = ["44.1", "44,1 mm", "1-47/64", "3/16 in", "750 thou"];

/** Where the figures of each instrument come from, those of one source together. */
function sourcesOf(): string[] {
  const bySource = new Map<string, Set<string>>();
  for (const instrument of instruments) {
    for (const size of sizesMm) {
      const { source } = permissibleError(instrument, size);
      bySource.set(source, (bySource.get(source) ?? new Set()).add(instrumentFacts[instrument].name));
    }
  }
  return [...bySource].map(([source, names]) => `${capitalised([...names].join(", "))}: ${source}.`);
}

/** What may be trusted of a reading. */
export function InstrumentsGuide() {
  return (
    <>
      <GuideSection title={`How far they may be off, from ${sizesMm[0]} to ${sizesMm.at(-1)} mm`}>
        <p className="max-w-prose">
          A good one of its sort, used well. What it presses, tilts or stretches comes on top: that is what the guides
          of each kind are about.
        </p>
        <ErrorChart sizesMm={sizesMm} />
        <InstrumentTable sizesMm={sizesMm} />
      </GuideSection>
      <GuideSection title="Before you measure">
        <Points
          points={[
            "Wipe the jaws, close them, and set them to zero, or write down what they show and take it off.",
            "Let part and tool come to the temperature of the room.",
            "Measure something known first: a drill shank or a coin whose size is published.",
            "Hold the jaws square to the part. A tilt only ever adds to an outside size.",
            "Stop at the first touch. Rubber gives way, and then you measure your thumb.",
          ]}
        />
      </GuideSection>
      <GuideSection title="Read three times">
        <p className="max-w-prose">
          Three readings at three places make the mean surer, and show what one cannot: where they spread over more than{" "}
          {roundDecimal(rangeFactor(3), 1)} times the standard uncertainty of one, a wheel is not round.
        </p>
      </GuideSection>
      <GuideSection title="Write it as you read it">
        <p className="max-w-prose">
          In millimetres, inches, fractions or thou; what was understood is shown back. A fraction counts as rounded to
          its last part, a decimal as what the instrument showed.
        </p>
        <table className="max-w-xl text-left">
          <thead className="text-small text-soft">
            <tr>
              <th className="py-1 pr-8 font-semibold whitespace-nowrap">You write</th>
              <th className="py-1 font-semibold">It is read as</th>
            </tr>
          </thead>
          <tbody>
            {written.map((text) => {
              const read = parseLength(text, "mm");
              return (
                <tr key={text} className="border-t border-rule">
                  <th scope="row" className="py-1 pr-8 font-normal whitespace-nowrap text-measured">
                    {text}
                  </th>
                  <td className="py-1">{read.ok ? read.echo : read.problem}</td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </GuideSection>
      <Sources
        sources={[
          ...sourcesOf(),
          "How an error, a step and the scatter of readings become an uncertainty: JCGM 100:2008, 4.2.3, 4.3.7 and F.2.2.1.",
          "How to hold and read them: common practice, no source.",
        ]}
      />
    </>
  );
}
