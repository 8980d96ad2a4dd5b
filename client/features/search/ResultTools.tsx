import type { ReactNode } from "react";
import { Link, useSearchParams } from "react-router-dom";
import type { SizeUnit } from "../../lib/formatSize";
import { keepUnit } from "../../lib/preferences";
import { withUnit } from "../../lib/withUnit";
import { Disclosure } from "../../ui/Disclosure";
import { offerNames } from "../../ui/offerWords";
import { materials, offerTypes } from "./filterNames";
import { appliedFilters, materialName, sorts, withParam } from "./resultParams";

type ChoiceProps = { to: URLSearchParams; isCurrent: boolean; onClick?: () => void; children: ReactNode };

/** A link that changes the address in place; the one in force is bold and says so. */
function Choice({ to, isCurrent, onClick, children }: ChoiceProps) {
  return (
    <Link
      to={`?${to}`}
      replace
      preventScrollReset
      onClick={onClick}
      aria-current={isCurrent ? "true" : undefined}
      className="inline-flex min-h-8 items-center px-1 no-underline hover:underline aria-[current]:font-bold"
    >
      {children}
    </Link>
  );
}

export function SortChoices() {
  const [params] = useSearchParams();
  const sort = params.get("sort") ?? "fit";
  return (
    <nav aria-label="Order" className="flex flex-wrap items-center gap-x-3">
      <span className="text-soft">First</span>
      {sorts.map(({ value, words }) => (
        <Choice key={value} to={withParam(params, "sort", value === "fit" ? "" : value)} isCurrent={sort === value}>
          {words}
        </Choice>
      ))}
    </nav>
  );
}

export function UnitChoices({ unit }: { unit: SizeUnit }) {
  const [params] = useSearchParams();
  return (
    <nav aria-label="Unit" className="flex items-center gap-x-2">
      {(["mm", "in"] as const).map((one) => (
        <Choice key={one} to={withUnit(params, unit, one)} isCurrent={one === unit} onClick={() => keepUnit(one)}>
          {one}
        </Choice>
      ))}
    </nav>
  );
}

type PickProps = { name: string; words: string; options: readonly { value: string; words: string }[] };

function Pick({ name, words, options }: PickProps) {
  const [params, setParams] = useSearchParams();
  return (
    <label className="grid gap-1">
      <span className="text-small text-soft">{words}</span>
      <select
        className="input"
        value={params.get(name) ?? ""}
        onChange={(event) => setParams(withParam(params, name, event.target.value), { replace: true })}
      >
        <option value="">any</option>
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.words}
          </option>
        ))}
      </select>
    </label>
  );
}

const chances = [
  { value: "0.9", words: "sure: 90 % or more" },
  { value: "0.6", words: "likely: 60 % or more" },
  { value: "0.2", words: "chancy: 20 % or more" },
];

/** Ways to narrow the list down, folded away; those in force stay in sight and go one by one. */
export function Narrow() {
  const [params] = useSearchParams();
  const applied = appliedFilters(params);
  return (
    <div className="flex flex-wrap items-baseline gap-x-4 gap-y-2">
      <Disclosure summary="narrow down">
        <div className="grid max-w-2xl gap-4 pb-3 sm:grid-cols-3">
          <Pick
            name="offer"
            words="Offer"
            options={offerTypes.map((one) => ({ value: one, words: offerNames[one] }))}
          />
          <Pick
            name="material"
            words="Material"
            options={materials.map((one) => ({ value: one, words: materialName(one) }))}
          />
          <Pick name="minChance" words="Fit chance" options={chances} />
        </div>
      </Disclosure>
      {applied.length > 0 && (
        <ul className="flex flex-wrap gap-x-4 gap-y-1">
          {applied.map(({ name, words }) => (
            <li key={name}>
              <Link
                to={`?${withParam(params, name, "")}`}
                replace
                className="inline-flex min-h-6 items-center gap-1.5"
                aria-label={`Take out: ${words}`}
              >
                only {words}
                <svg width="9" height="9" viewBox="0 0 10 10" aria-hidden="true">
                  <path d="M1 1L9 9M9 1L1 9" stroke="currentColor" strokeWidth="1.6" />
                </svg>
              </Link>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
