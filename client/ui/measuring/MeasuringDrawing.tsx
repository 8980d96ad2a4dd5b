import { type DimensionName, dimensionWords, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { SketchDrawing } from "./SketchDrawing";
import { sketches } from "./sketches";

type Props = { kind: PartKind; dimension: DimensionName; className?: string };

/** A part with the instrument in place and the dimension taken, in the measured blue. Not to scale. */
export function MeasuringDrawing({ kind, dimension, className }: Props) {
  const sketch = sketches[kind][dimension];
  if (!sketch) return null;
  const label = `Measuring the ${dimensionWords[dimension]} of ${articled(kindFacts[kind].name)}`;
  return <SketchDrawing sketch={sketch} label={label} className={className} />;
}

const articled = (name: string) => `${/^[aeiou]/.test(name) ? "an" : "a"} ${name}`;
