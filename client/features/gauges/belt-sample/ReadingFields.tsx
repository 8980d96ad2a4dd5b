import { roundDecimal } from "#shared/domain/roundDecimal";
import { sizeLimits } from "#shared/domain/writtenSize";
import type { SizeUnit } from "../../../lib/formatSize";
import { Button } from "../../../ui/Button";
import { RuledHeading } from "../../../ui/RuledHeading";
import { LengthField } from "../LengthField";
import { type BeltSampleState, partReadings } from "./beltSampleState";
import { methodWords } from "./methodWords";
import type { Sample, SampleErrors } from "./readSample";

type Props = {
  state: BeltSampleState;
  sample: Sample | null;
  errors: SampleErrors;
  onReadings: (readings: readonly string[]) => void;
};

const most = sizeLimits.readings;

/** As many readings as were taken, each in a field of its own, with their mean and scatter below. */
export function ReadingFields({ state, sample, errors, onReadings }: Props) {
  const { readings, unit, method } = state;
  const { reading, hint } = methodWords[method];
  // A reading has no identity but its place.
  const rows = readings.map((text, i) => ({ name: `readings.${i}`, text, i }));
  // A list that was pasted into one field becomes a field each.
  const write = (i: number, text: string) =>
    onReadings(
      readings
        .flatMap((other, j) => (j !== i ? [other] : text.includes(";") ? partReadings(text) : [text]))
        .slice(0, most),
    );
  return (
    <section className="grid gap-4">
      <RuledHeading>{reading}</RuledHeading>
      <p className="max-w-prose text-soft">
        {hint} Read it again at another place: several readings say more than one.
      </p>
      <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
        {rows.map(({ name, text, i }) => (
          <div key={name} className="grid grid-cols-[minmax(0,1fr)_auto] items-start gap-x-2">
            <LengthField
              name={name}
              label={readings.length === 1 ? "Reading" : `Reading ${i + 1}`}
              text={text}
              unit={unit}
              error={errors[name]}
              onText={(next) => write(i, next)}
            />
            {readings.length > 1 && (
              <Button
                look="quiet"
                className="mt-9 print:hidden"
                aria-label={`Leave out reading ${i + 1}`}
                onClick={() => onReadings(readings.filter((_, j) => j !== i))}
              >
                Leave out
              </Button>
            )}
          </div>
        ))}
      </div>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        {readings.length < most && (
          <Button className="print:hidden" onClick={() => onReadings([...readings, ""])}>
            Add a reading
          </Button>
        )}
        {sample && <Spread sample={sample} unit={unit} />}
      </div>
    </section>
  );
}

function Spread({ sample, unit }: { sample: Sample; unit: SizeUnit }) {
  const { readingsMm } = sample.input;
  const show = (mm: number, more = 0) => roundDecimal(unit === "in" ? mm / 25.4 : mm, (unit === "in" ? 3 : 2) + more);
  if (readingsMm.length === 1) {
    return <p className="text-soft">One reading: how much it scatters is not known and not counted.</p>;
  }
  return (
    <p className="tabular-nums" aria-live="polite">
      Mean of {readingsMm.length}: <strong className="text-measured">{show(sample.meanMm)}</strong>
      <span className="text-soft">
        {" "}
        {unit}, from {show(Math.min(...readingsMm))} to {show(Math.max(...readingsMm))}, standard deviation{" "}
        {show(sample.scatterMm, unit === "in" ? 1 : 0)}
      </span>
    </p>
  );
}
