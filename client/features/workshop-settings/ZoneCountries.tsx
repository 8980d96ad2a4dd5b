import { useState } from "react";
import { countryName } from "#shared/domain/countries";
import { europeanUnion } from "#shared/schemas/countryCodes";
import { announce } from "../../lib/announcements";
import { Button } from "../../ui/Button";
import { fieldId } from "../../ui/fieldParts";
import { SelectField } from "../../ui/SelectField";
import { byCountryName, countriesByName } from "./countriesByName";

type Props = {
  /** The field's name in the form, which the error summary leads to. */
  name: string;
  countries: readonly string[];
  /** Countries of any zone: none of them can be added again. */
  taken: readonly string[];
  error: string | undefined;
  onChange: (countries: string[]) => void;
};

const [union, rest] = ["union", "rest"];

/** The countries of a zone: added one by one, or the many that are left. */
export function ZoneCountries({ name, countries, taken, error, onChange }: Props) {
  const [choice, setChoice] = useState("");
  const left = countriesByName.filter((code) => !taken.includes(code));
  const unionLeft = europeanUnion.filter((code) => left.includes(code));
  const add = () => {
    const added = choice === union ? unionLeft : choice === rest ? left : left.filter((code) => code === choice);
    if (added.length === 0) return;
    onChange([...countries, ...added]);
    announce(added.length === 1 ? `${countryName(added[0] ?? "")} added` : `${added.length} countries added`);
    setChoice("");
  };
  const remove = (code: string) => {
    onChange(countries.filter((one) => one !== code));
    announce(`${countryName(code)} taken out`);
    document.getElementById(fieldId(name))?.focus();
  };
  return (
    <div className="grid gap-3">
      <ul aria-label="Countries of this zone" className="flex max-h-64 flex-wrap gap-2 overflow-y-auto">
        {byCountryName(countries).map((code) => (
          <li key={code} className="flex items-center gap-1 border border-rule pl-3">
            {countryName(code)}
            <Button
              look="quiet"
              className="min-w-8 px-2 no-underline"
              aria-label={`Take out ${countryName(code)}`}
              onClick={() => remove(code)}
            >
              ×
            </Button>
          </li>
        ))}
      </ul>
      <div className="flex items-start gap-3">
        <div className="min-w-0 flex-1">
          <SelectField
            name={name}
            label="Add countries"
            error={error}
            value={choice}
            onChange={({ target }) => setChoice(target.value)}
          >
            <option value="">Choose</option>
            {unionLeft.length > 0 && <option value={union}>The European Union, those left ({unionLeft.length})</option>}
            {left.length > 0 && <option value={rest}>Everywhere else ({left.length})</option>}
            {left.map((code) => (
              <option key={code} value={code}>
                {countryName(code)}
              </option>
            ))}
          </SelectField>
        </div>
        <Button className="mt-[1.875rem]" onClick={add}>
          Add
        </Button>
      </div>
    </div>
  );
}
