import { dimensionWords } from "#shared/domain/partKinds";
import type { SearchAnswer } from "#shared/schemas/search";
import { capitalised } from "../../lib/capitalised";
import { roundedSize, type SizeUnit } from "../../lib/formatSize";
import { Button } from "../../ui/Button";
import { RuledHeading } from "../../ui/RuledHeading";
import { rowId } from "./PartRow";
import { SizeRail } from "./SizeRail";
import { useEstimate } from "./useEstimate";

type Props = {
  answer: SearchAnswer;
  unit: SizeUnit;
  needKey: string;
  litId: string | null;
  onLight: (partId: string | null) => void;
};

function pick(partId: string) {
  const row = document.getElementById(rowId(partId));
  row?.scrollIntoView({ block: "center" });
  row?.focus({ preventScroll: true });
}

/** The size rail under its heading, with what its marks mean and the way back to what was measured. */
export function RailSection({ answer, unit, needKey, litId, onLight }: Props) {
  const { movedTo, move, clear } = useEstimate();
  const { rail, need } = answer;
  const along = need.dimensions.find(({ dimension }) => dimension === rail?.dimension);
  if (!rail || !along) return null;
  const fitting = rail.ticks.filter(({ verdict }) => verdict === "sure" || verdict === "likely").length;
  const unitWords = unit === "mm" ? "mm" : "inches";
  return (
    <section className="contents" aria-label="Size rail">
      <RuledHeading className="mt-6">
        <span>
          {capitalised(dimensionWords[rail.dimension])} in {unitWords}: {rail.ticks.length} parts, {fitting} likely to
          fit
        </span>
      </RuledHeading>
      <SizeRail
        rail={rail}
        need={along}
        estimateMm={movedTo ?? along.asNewMm}
        unit={unit}
        needKey={needKey}
        litId={litId}
        onLight={onLight}
        onPick={pick}
        onEstimate={move}
      />
      <p className="text-small text-soft">
        Drag the blue marker, or use the arrow keys on it, to try another size.
        {along.asFoundMm !== null && ` Dotted: as found, ${roundedSize(along.asFoundMm, unit)} ${unit}.`}
        {movedTo !== null && (
          <>
            {" "}
            <Button look="quiet" onClick={clear}>
              Back to what I measured
            </Button>
          </>
        )}
      </p>
    </section>
  );
}
