import { useQuery } from "@tanstack/react-query";
import { type FormEvent, type ReactNode, useEffect, useRef } from "react";
import { flushSync } from "react-dom";
import { useLocation, useNavigate } from "react-router-dom";
import { type Condition, conditionFacts, conditionsFor } from "#shared/domain/conditions";
import { countryName } from "#shared/domain/countries";
import { type Instrument, instrumentFacts, instruments } from "#shared/domain/instruments";
import { type DimensionName, kindFacts, type PartKind, partKinds } from "#shared/domain/partKinds";
import { countriesQuery, familiesQuery } from "../../lib/catalogue";
import { offerStrip } from "../../lib/focusStrip";
import { isBelt, type NeedValues, needParams, primaryOf } from "../../lib/needParams";
import { keepShipTo } from "../../lib/preferences";
import { Button } from "../../ui/Button";
import { slotId } from "./LengthSlot";
import { StripNotes } from "./StripNotes";
import { StripSelect } from "./StripSelect";
import { StripSizes } from "./StripSizes";
import { useSlashKey } from "./useSlashKey";
import { sizesAsRead, useStrip } from "./useStrip";
import { useStripTools } from "./useStripTools";

export type StripLook = "large" | "plain" | "compact";

type Props = {
  initial: NeedValues;
  look: StripLook;
  /** Where the need is taken: the results, or the part that is being looked at. */
  action: string;
  submitWords: string;
  /** Stands after the button: "back to 34 parts". */
  aside?: ReactNode;
};

const article = (words: string) => (/^[aeiou]/.test(words) ? "an" : "a");

/** The need as one sentence. Enter searches; all of it goes into the address. A plain GET form underneath. */
export function MeasureStrip({ initial, look, action, submitWords, aside }: Props) {
  const strip = useStrip(initial);
  const { values, shown, isMeasured } = strip;
  const { kind, condition, instrument, family, shipTo } = values;
  const families = useQuery(familiesQuery).data?.items ?? [];
  const countries = useQuery(countriesQuery).data?.items ?? [];
  const navigate = useNavigate();
  const location = useLocation();
  const form = useRef<HTMLFormElement>(null);
  const { tools, fetchTools } = useStripTools(
    !isMeasured || isBelt(kind) || shown.some((name) => values.lengths[name]),
  );
  const sizes = sizesAsRead(values, tools);
  const large = look === "large";

  const focusSize = (name: DimensionName) => {
    flushSync(() => strip.openSize(name));
    const field = document.getElementById(slotId(name));
    field?.focus();
    field?.scrollIntoView({ block: "center" });
  };
  useSlashKey(() => focusSize(primaryOf(kind)));
  const latestFocus = useRef(focusSize);
  latestFocus.current = focusSize;
  useEffect(() => offerStrip((name) => latestFocus.current(name)), []);

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    const asRead = sizesAsRead(values, tools ?? (await fetchTools()));
    const asksBeside = family || values.q || shown.some((name) => values.lengths[name] && !asRead[name]?.isLeftOut);
    const wrong = shown.find((name) => asRead[name]?.problem || (asRead[name]?.isLeftOut && !asksBeside));
    if (wrong) {
      const field = document.getElementById(slotId(wrong));
      field?.focus();
      field?.dispatchEvent(new Event("invalid"));
      return;
    }
    keepShipTo(shipTo);
    const lengths = Object.fromEntries(shown.map((name) => [name, values.lengths[name]]));
    void navigate(`${action}?${needParams({ ...values, lengths })}`, {
      state: location.pathname === action ? location.state : null,
    });
  };

  const familyName = families.find(({ slug }) => slug === family)?.name ?? family;
  return (
    <search className="block border-b border-rule bg-sheet print:hidden">
      <form
        ref={form}
        action={action}
        method="get"
        onFocus={tools ? undefined : () => void fetchTools()}
        onSubmit={(event) => void submit(event)}
        className={`page strip strip-${look}`}
        noValidate
      >
        <div className="strip-sentence">
          {look !== "compact" && `I need ${article(kindFacts[kind].name)} `}
          <StripSelect
            label="Kind of part"
            name="kind"
            value={kind}
            shownText={kindFacts[kind].name}
            onChange={(event) => strip.setKind(event.target.value as PartKind)}
          >
            {partKinds.map((name) => (
              <option key={name} value={name}>
                {kindFacts[name].name}
              </option>
            ))}
          </StripSelect>
          <StripSizes strip={strip} isCompact={look === "compact"} sizes={sizes} onFocus={focusSize} />
          {isMeasured && (
            <>
              {look === "compact" ? ", " : " taken with a "}
              <StripSelect
                label="Measured with"
                name="instrument"
                value={instrument}
                shownText={instrumentFacts[instrument].name}
                onChange={(event) => strip.set({ instrument: event.target.value as Instrument })}
              >
                {instruments.map((name) => (
                  <option key={name} value={name}>
                    {instrumentFacts[name].name}
                  </option>
                ))}
              </StripSelect>
            </>
          )}
          {look === "compact" ? ", " : isMeasured ? ". It was " : ". It is "}
          <StripSelect
            label="Condition of the old part"
            name="condition"
            value={condition}
            shownText={conditionFacts[condition].name}
            onChange={(event) => strip.setCondition(event.target.value as Condition)}
          >
            {conditionsFor(kind).map((name) => (
              <option key={name} value={name}>
                {conditionFacts[name].name}
              </option>
            ))}
          </StripSelect>
          {", from "}
          <StripSelect
            label="Mechanism family"
            name="family"
            value={family}
            shownText={family ? familyName : "any mechanism"}
            className={family ? "" : "slot-soft"}
            onChange={(event) => strip.set({ family: event.target.value })}
          >
            <option value="">any mechanism</option>
            {family && !families.some(({ slug }) => slug === family) && <option value={family}>{family}</option>}
            {families.map(({ slug, name }) => (
              <option key={slug} value={slug}>
                {name}
              </option>
            ))}
          </StripSelect>
          {", to "}
          <StripSelect
            label="Country that it is sent to"
            name="shipTo"
            value={shipTo}
            shownText={countryName(shipTo)}
            onChange={(event) => strip.set({ shipTo: event.target.value })}
          >
            {!countries.some(({ code }) => code === shipTo) && <option value={shipTo}>{countryName(shipTo)}</option>}
            {countries.map(({ code, name }) => (
              <option key={code} value={code}>
                {name}
              </option>
            ))}
          </StripSelect>
          {". "}
          {values.unit === "in" && <input type="hidden" name="unit" value="in" />}
          <Button type="submit" look="primary" className="strip-submit">
            {submitWords}
          </Button>
        </div>
        {aside}
        <div className={`strip-notes ${look === "compact" ? "hidden" : ""}`}>
          <StripNotes strip={strip} tools={tools} />
          <label className="flex items-baseline gap-x-2 whitespace-nowrap text-soft">
            Or words
            <input
              type="search"
              name="q"
              value={values.q}
              maxLength={120}
              placeholder={large ? "a maker, a model, a kind of wheel" : ""}
              className="slot-words"
              onChange={(event) => strip.set({ q: event.target.value })}
            />
          </label>
        </div>
      </form>
    </search>
  );
}
