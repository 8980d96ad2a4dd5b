import { roundDecimal } from "#shared/domain/roundDecimal";
import { barsPerMinuteFor } from "#shared/domain/strobe";
import type { DiscRing } from "#shared/drawing/sheets/discLayout";
import { barsWords, shortNumber, shownWords, signedPercent, speedName } from "#shared/drawing/sheets/strobeWords";
import { RuledHeading } from "../../../ui/RuledHeading";
import { SelectField } from "../../../ui/SelectField";
import { NumberField } from "../NumberField";
import { Readout } from "../Readout";
import { readDrift, ringKey } from "./readDrift";
import type { SheetsState } from "./sheetsState";

type Props = {
  rings: readonly DiscRing[];
  mainsHz: number;
  state: SheetsState;
  onChange: (change: Partial<SheetsState>) => void;
};

function verdict(errorPercent: number, rpm: number): string {
  const off = Math.abs(errorPercent);
  const than = `than ${speedName(rpm)} rpm`;
  if (off < 5e-4) return `Right on ${speedName(rpm)} rpm.`;
  return `${shortNumber(off, off < 0.095 ? 3 : 2)} % ${errorPercent > 0 ? "faster" : "slower"} ${than}.`;
}

/** From the bars that pass a mark to the true speed and its error. */
export function DriftSection({ rings, mainsHz, state, onChange }: Props) {
  const { ring, shown, errors } = readDrift(rings, mainsHz, state);
  if (!ring) return null;
  const percent = barsPerMinuteFor(mainsHz, 1, ring.barsPerFlash);
  return (
    <section className="grid gap-4">
      <RuledHeading>From creeping bars to the true speed</RuledHeading>
      <p className="max-w-prose">
        Lay the disc on the turning platter under its lamp, pick a fixed mark beside it, and count the bars of one ring
        that pass the mark.
      </p>
      <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2">
        <SelectField
          name="ring"
          label="On the ring for"
          value={ringKey(ring)}
          onChange={(event) => onChange({ ring: event.target.value })}
        >
          {rings.map((one) => (
            <option key={ringKey(one)} value={ringKey(one)}>
              {speedName(one.rpm)} rpm: {barsWords(one)}
            </option>
          ))}
        </SelectField>
        <SelectField
          name="way"
          label="The bars creep"
          value={state.way}
          onChange={(event) => onChange({ way: event.target.value === "slow" ? "slow" : "fast" })}
        >
          <option value="fast">forward, with the turning</option>
          <option value="slow">back, against the turning</option>
        </SelectField>
        <NumberField
          name="count"
          label="Bars counted"
          text={state.count}
          onText={(count) => onChange({ count })}
          error={errors.count}
        />
        <NumberField
          name="seconds"
          label="In how many seconds"
          text={state.seconds}
          onText={(seconds) => onChange({ seconds })}
          error={errors.seconds}
        />
      </div>
      <div aria-live="polite" className="grid items-start gap-x-10 gap-y-5 sm:grid-cols-2">
        <Readout label="True speed" value={shown && roundDecimal(shown.rpm, 3)} unit="rpm" look="measured">
          {shown && <p>{verdict(shown.errorPercent, ring.rpm)}</p>}
        </Readout>
        <Readout label="Error" value={shown && signedPercent(shown.errorPercent)}>
          <p>
            This ring stands still at {shownWords(ring)}; {shortNumber(percent, 1)} bars a minute are 1 % from that.
          </p>
        </Readout>
      </div>
      <p className="max-w-prose text-soft">
        Speed = (120 × mains{ring.barsPerFlash > 1 ? ` × ${ring.barsPerFlash}` : ""} + bars forward in a minute) / bars
        of the ring. It is as right as the mains are while you count.
      </p>
    </section>
  );
}
