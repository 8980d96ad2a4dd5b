import { type DimensionName, dimensionsOf, type PartKind } from "#shared/domain/partKinds";
import { cautions } from "./cautions";
import { MeasuringSteps } from "./MeasuringSteps";
import { measuringWords } from "./measuringWords";

type Props = {
  kind: PartKind;
  /** Those to show, in this order; all of the kind where left out. */
  dimensions?: readonly DimensionName[];
};

/** How to measure a part in short: pictures, steps, common mistakes, cautions. Without headings, so that it fits anywhere. */
export function HowToMeasure({ kind, dimensions = dimensionsOf(kind) }: Props) {
  const words = measuringWords[kind];
  return (
    <div className="grid gap-4">
      <p className="max-w-prose">{words.how}</p>
      <MeasuringSteps kind={kind} dimensions={dimensions} />
      <div className="grid gap-x-8 gap-y-4 md:grid-cols-2">
        <Points title="Common mistakes" points={words.mistakes} />
        <Points title="Mind" points={words.cautions.map((name) => cautions[name])} />
      </div>
      <p className="text-small text-soft">Common practice, no source.</p>
    </div>
  );
}

function Points({ title, points }: { title: string; points: readonly string[] }) {
  return (
    <div className="grid content-start gap-1">
      <p className="font-semibold">{title}</p>
      <ul className="grid list-disc gap-1 pl-5 marker:text-soft">
        {points.map((point) => (
          <li key={point}>{point}</li>
        ))}
      </ul>
    </div>
  );
}
