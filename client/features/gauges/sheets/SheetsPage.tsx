import { useCallback, useMemo } from "react";
import { GaugePage } from "../GaugePage";
import { useGaugeState } from "../useGaugeState";
import { useLastGood } from "../useLastGood";
import { Cautions } from "./Cautions";
import { DriftSection } from "./DriftSection";
import { PrintIt } from "./PrintIt";
import { RingsTable } from "./RingsTable";
import { readSheet } from "./readSheet";
import { SheetChooser } from "./SheetChooser";
import { SheetFields } from "./SheetFields";
import { SheetPictures } from "./SheetPictures";
import { example, type SheetsState, sheetsCodec } from "./sheetsState";

/** Sheets to print at true size, shown as they will come out of the printer, and what a stroboscope's drift means. */
export function SheetsPage() {
  const [state, setState] = useGaugeState<SheetsState>(sheetsCodec);
  const { drawn, errors } = useMemo(() => readSheet(state), [state]);
  const { good: lastGood, isStale } = useLastGood(drawn);
  // An address may come with what cannot be drawn: the example stands in, greyed, until it is mended.
  const good = lastGood ?? readSheet({ ...example, sheet: state.sheet }).drawn;
  const change = useCallback((part: Partial<SheetsState>) => setState((now) => ({ ...now, ...part })), [setState]);

  return (
    <GaugePage
      title="Sheets to print"
      lead="Gauges on paper, at true size, with bars on every page to check your printer by."
      board={
        <>
          <SheetChooser sheet={state.sheet} onSheet={(sheet) => change({ sheet })} />
          {good && (
            <>
              <div className={isStale ? "opacity-40" : ""}>
                <SheetPictures sheet={good.sheet} rings={good.rings} />
              </div>
              <p className="pt-2 text-small text-soft">A picture of it, not to scale. True to size: print the PDF.</p>
            </>
          )}
          {isStale && (
            <p role="status" className="pt-2 font-semibold text-outband">
              The picture and the figures are not of this sheet: mend the field that says so below.
            </p>
          )}
        </>
      }
      side={
        good && (
          <>
            <PrintIt href={isStale ? null : good.href} />
            {good.rings.length > 0 && <RingsTable rings={good.rings} />}
            <Cautions sheet={state.sheet} />
          </>
        )
      }
    >
      <div className="grid gap-8">
        <SheetFields state={state} errors={errors} onChange={change} />
        {good && good.rings.length > 0 && (
          <DriftSection rings={good.rings} mainsHz={good.mainsHz} state={state} onChange={change} />
        )}
      </div>
    </GaugePage>
  );
}
