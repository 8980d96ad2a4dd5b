import { lazy, type ReactNode, Suspense } from "react";
import { isBelt } from "../../lib/needParams";
import { MeasuringHelp } from "./MeasuringHelp";
import type { Strip } from "./useStrip";

// What these work out is not needed until something is written; fetched apart, they leave the first page lighter.
const AsNewLine = lazy(async () => ({ default: (await import("./AsNewLine")).AsNewLine }));
const BeltSampleLine = lazy(async () => ({ default: (await import("./BeltSampleLine")).BeltSampleLine }));
const NoSampleLine = lazy(async () => ({ default: (await import("./NoSampleLine")).NoSampleLine }));

/** Below the sentence: what follows from it as it is written, and what helps to write it. */
export function StripNotes({ strip: { values, shown, isMeasured } }: { strip: Strip }) {
  const isWritten = shown.some((name) => values.lengths[name]);
  return (
    <>
      {!isMeasured && (
        <Lazily>
          <NoSampleLine values={values} />
        </Lazily>
      )}
      {isWritten && (
        <Lazily>
          <AsNewLine values={values} shown={shown} />
        </Lazily>
      )}
      {isMeasured && !isWritten && (
        <p className="text-soft">
          Write sizes as you read them: 44.1, 44,1 mm, 1.736 in, 1-47/64, 750 thou. Wear is reckoned in for you.
        </p>
      )}
      {isMeasured && isBelt(values.kind) && (
        <Lazily>
          <BeltSampleLine values={values} />
        </Lazily>
      )}
      {isMeasured && <MeasuringHelp kind={values.kind} shown={shown} />}
    </>
  );
}

/** Keeps the height of a line while it is fetched. */
function Lazily({ children }: { children: ReactNode }) {
  return (
    <div className="min-h-7">
      <Suspense fallback={null}>{children}</Suspense>
    </div>
  );
}
