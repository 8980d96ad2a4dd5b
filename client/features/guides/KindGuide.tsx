import { dimensionsOf, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { capitalised } from "../../lib/capitalised";
import { cautions } from "../../ui/measuring/cautions";
import { MeasuringSteps } from "../../ui/measuring/MeasuringSteps";
import { measuringWords } from "../../ui/measuring/measuringWords";
import { GuideSection } from "./GuideSection";
import { HowFine } from "./HowFine";
import type { GuideEntry } from "./measuringGuides";
import { Points } from "./Points";
import { WhereNext } from "./WhereNext";

/** How to measure the parts of one kind, or of a few that are measured alike. */
export function KindGuide({ guide: { kinds } }: { guide: GuideEntry }) {
  const several = kinds.length > 1;
  const mistakes = new Set(kinds.flatMap((kind) => measuringWords[kind].mistakes));
  const minded = new Set(kinds.flatMap((kind) => measuringWords[kind].cautions));
  return (
    <>
      {kinds.map((kind) => (
        <GuideSection key={kind} title={several ? capitalised(kindFacts[kind].name) : "The sizes, one by one"}>
          <Sizes kind={kind} />
        </GuideSection>
      ))}
      <div className="grid gap-x-12 lg:grid-cols-2">
        <GuideSection title="Common mistakes">
          <Points points={[...mistakes]} />
        </GuideSection>
        <GuideSection title="Mind">
          <Points points={[...minded].map((name) => cautions[name])} />
        </GuideSection>
      </div>
      <GuideSection title="How fine it has to be">
        <p className="max-w-prose">
          What such places usually accept, for a part of a usual size, and the coarsest instrument with which one
          reading of a sound part can still lead to “sure”. The bands are common practice, no source; where the register
          of a mechanism family knows better, its bands are used.
        </p>
        {kinds.map((kind) => (
          <HowFine key={kind} kind={kind} />
        ))}
      </GuideSection>
      <WhereNext kinds={kinds} />
      <p className="mt-6 text-small text-soft">How to measure: common practice, no source.</p>
    </>
  );
}

function Sizes({ kind }: { kind: PartKind }) {
  return (
    <>
      <p className="max-w-prose">{measuringWords[kind].how}</p>
      <MeasuringSteps kind={kind} dimensions={dimensionsOf(kind)} />
    </>
  );
}
