import { roundDecimal } from "#shared/domain/roundDecimal";
import { roundedSize, type SizeUnit, sizeNumber } from "../../../lib/formatSize";
import { LinkButton } from "../../../ui/LinkButton";
import { RuledHeading } from "../../../ui/RuledHeading";
import { Readout } from "../Readout";
import type { BeltState } from "./beltState";
import { findAddress, type Solved, withNames } from "./solveState";

type Props = { state: BeltState; solved: Solved; unit: SizeUnit };

/** A length of a belt: tenths of a millimetre say all that can be known of it. */
const beltLength = (mm: number, unit: SizeUnit) => (unit === "in" ? roundedSize(mm, unit) : roundDecimal(mm, 1));

/** What follows from the route: its length, the belt to buy and where, and what to mind. */
export function BeltResults({ state, solved, unit }: Props) {
  const { route, buyMm, thicknessMm, refusal } = solved;
  const other = unit === "mm" ? "in" : "mm";
  const { min, max } = state.stretch;
  const percent = min === max ? min : `${min} to ${max}`;
  const range = (mm: { min: number; max: number }, in_: SizeUnit) => {
    const [from, to] = [beltLength(mm.min, in_), beltLength(mm.max, in_)];
    return from === to ? from : `${from} to ${to}`;
  };
  return (
    <>
      <Readout label="Length in place" value={route && beltLength(route.pitchLengthMm, unit)} unit={unit}>
        {thicknessMm !== null && (
          <p>
            along the middle of a {sizeNumber(thicknessMm, unit)} {unit} belt
          </p>
        )}
      </Readout>
      <Readout
        label="Belt to buy, inside circumference"
        value={buyMm && range(buyMm, unit)}
        unit={unit}
        look="measured"
      >
        <p>
          relaxed, for {percent} % stretch in place
          {state.isInsideStretch ? ", counted on the inside" : ""}
          {buyMm && ` (${range(buyMm, other)} ${other})`}
        </p>
      </Readout>
      {buyMm && (
        <LinkButton look="primary" to={findAddress(state, buyMm, unit)} className="print:hidden">
          Find this belt
        </LinkButton>
      )}
      <section className="belt-mind grid gap-2">
        <RuledHeading>Mind</RuledHeading>
        {refusal && <p className="font-semibold text-outband">{refusal.words}</p>}
        {!route && !refusal && <p className="font-semibold text-outband">The belt waits for its numbers below.</p>}
        {route?.warnings.map(({ words }) => (
          <p key={words}>{withNames(words, state.pulleys)}</p>
        ))}
        {route && route.warnings.length === 0 && <p>Nothing stands out on this route.</p>}
        {route && <p className="text-soft">{turnWords(state, route.isCrossed)}</p>}
        <p className="text-soft">
          Pulleys measured by hand move the length by about as much as they are wrong. Check on the machine, unplugged,
          before closing it up.
        </p>
      </section>
    </>
  );
}

function turnWords({ pulleys }: BeltState, isCrossed: boolean): string {
  const backs = pulleys.flatMap(({ wrap, name }, i) => (wrap === "back" ? [name.trim() || `pulley ${i + 1}`] : []));
  if (backs.length === 0) return "All pulleys turn the same way.";
  if (isCrossed) return `The belt is crossed: ${backs.join(", ")} and the others turn opposite ways.`;
  return `The belt lies with its back on ${backs.join(", ")}: turning against the others.`;
}
