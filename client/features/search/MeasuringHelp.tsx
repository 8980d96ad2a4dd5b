import { lazy, Suspense, useState } from "react";
import type { DimensionName, PartKind } from "#shared/domain/partKinds";

// Pictures and words for every kind: fetched when somebody wants to see them.
const HowToMeasure = lazy(async () => ({
  default: (await import("../../ui/measuring/HowToMeasure")).HowToMeasure,
}));

// For as long as the site stays open, whichever page of it.
let wasOpen = false;

/** How the sizes in the sentence are measured, behind a few words; as open or closed as it was last left. */
export function MeasuringHelp({ kind, shown }: { kind: PartKind; shown: readonly DimensionName[] }) {
  const [isOpen, setOpen] = useState(wasOpen);
  return (
    <details
      open={isOpen}
      onToggle={(event) => {
        wasOpen = event.currentTarget.open;
        setOpen(wasOpen);
      }}
    >
      <summary className="inline-flex min-h-6 cursor-pointer items-center underline underline-offset-4 marker:content-none">
        How to measure it
      </summary>
      {isOpen && (
        <div className="py-3">
          <Suspense fallback={<p className="min-h-80 text-soft">Fetching the pictures</p>}>
            <HowToMeasure kind={kind} dimensions={shown} />
          </Suspense>
        </div>
      )}
    </details>
  );
}
