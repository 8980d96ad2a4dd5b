import { type DimensionName, dimensionWords, type PartKind } from "#shared/domain/partKinds";
import { capitalised } from "../../lib/capitalised";
import { MeasuringDrawing } from "./MeasuringDrawing";
import { measuringWords } from "./measuringWords";

type Props = { kind: PartKind; dimensions: readonly DimensionName[] };

/** One picture and one step for each dimension. */
export function MeasuringSteps({ kind, dimensions }: Props) {
  return (
    <ol className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,13rem),1fr))] gap-x-6 gap-y-5">
      {dimensions.map((dimension) => (
        <li
          key={dimension}
          className="grid grid-cols-[10rem_1fr] content-start gap-x-4 gap-y-1 sm:grid-cols-1 print:break-inside-avoid"
        >
          <MeasuringDrawing
            kind={kind}
            dimension={dimension}
            className="h-auto w-full max-w-60 border border-rule bg-sheet"
          />
          <p>
            <span className="font-semibold">{capitalised(dimensionWords[dimension])}.</span>{" "}
            {measuringWords[kind].steps[dimension]}
          </p>
        </li>
      ))}
    </ol>
  );
}
