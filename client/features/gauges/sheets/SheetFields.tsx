import { longestBeltMm, stripMm } from "#shared/drawing/sheets/beltRulerSheet";
import { type Paper, papers } from "#shared/drawing/sheets/papers";
import { ringGaugeSizes, ringGaugeSteps } from "#shared/drawing/sheets/ringGaugeSheet";
import { RuledHeading } from "../../../ui/RuledHeading";
import { SelectField } from "../../../ui/SelectField";
import { LengthField } from "../LengthField";
import type { SheetErrors } from "./readSheet";
import { StrobeFields } from "./StrobeFields";
import type { SheetsState } from "./sheetsState";

type Props = { state: SheetsState; errors: SheetErrors; onChange: (change: Partial<SheetsState>) => void };

const paperNames = Object.keys(papers) as Paper[];
const largestSizes = Array.from({ length: ringGaugeSizes.max / 20 }, (_, i) => String(20 * (i + 1)));

function OwnFields({ state, errors, onChange }: Props) {
  switch (state.sheet) {
    case "strobe":
      return <StrobeFields state={state} errors={errors} onChange={onChange} />;
    case "ring-gauge":
      return (
        <>
          <SelectField
            name="largest"
            label="Largest circle, mm"
            value={state.largest}
            onChange={(event) => onChange({ largest: event.target.value })}
            error={errors.largestMm}
          >
            {[...new Set([...largestSizes, state.largest])].map((size) => (
              <option key={size}>{size}</option>
            ))}
          </SelectField>
          <SelectField
            name="step"
            label="Marks each, mm"
            value={state.step}
            onChange={(event) => onChange({ step: ringGaugeSteps.find((one) => one === event.target.value) ?? "1" })}
          >
            {ringGaugeSteps.map((step) => (
              <option key={step}>{step}</option>
            ))}
          </SelectField>
        </>
      );
    case "belt-ruler":
      return (
        <LengthField
          name="longest"
          label="Longest belt, around the inside"
          text={state.longest}
          unit="mm"
          onText={(longest) => onChange({ longest })}
          error={errors.longestMm}
          hint={`Up to ${longestBeltMm} mm; each strip to cut out adds ${2 * stripMm} mm`}
        />
      );
  }
}

/** What the sheet in hand is made of. */
export function SheetFields({ state, errors, onChange }: Props) {
  return (
    <section className="grid gap-4 print:hidden">
      <RuledHeading>The sheet</RuledHeading>
      <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
        <SelectField
          name="paper"
          label="Paper"
          value={state.paper}
          onChange={(event) => onChange({ paper: paperNames.find((one) => one === event.target.value) ?? "a4" })}
        >
          {paperNames.map((paper) => (
            <option key={paper} value={paper}>
              {papers[paper].name}
            </option>
          ))}
        </SelectField>
        <OwnFields state={state} errors={errors} onChange={onChange} />
      </div>
    </section>
  );
}
