import { isBelt } from "../../lib/needParams";
import { MeasuringHelp } from "./MeasuringHelp";
import type { Strip } from "./useStrip";
import type { StripTools } from "./useStripTools";

type Props = { strip: Strip; tools: StripTools | undefined };

/** Below the sentence: what follows from it as it is written, and what helps to write it. A line keeps its height meanwhile. */
export function StripNotes({ strip: { values, shown, isMeasured }, tools }: Props) {
  const isWritten = shown.some((name) => values.lengths[name]);
  return (
    <>
      {!isMeasured && <div className="min-h-7">{tools && <tools.NoSampleLine values={values} />}</div>}
      {isWritten && <div className="min-h-7">{tools && <tools.AsNewLine values={values} shown={shown} />}</div>}
      {isMeasured && !isWritten && (
        <p className="text-soft">
          Write sizes as you read them: 44.1, 44,1 mm, 1.736 in, 1-47/64, 750 thou. Wear is reckoned in for you.
        </p>
      )}
      {isMeasured && isBelt(values.kind) && (
        <div className="min-h-7">{tools && <tools.BeltSampleLine values={values} />}</div>
      )}
      {isMeasured && <MeasuringHelp kind={values.kind} shown={shown} />}
    </>
  );
}
