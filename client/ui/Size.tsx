import { type SizeUnit, sizeNumber, statedNumbers } from "../lib/formatSize";

type Props = {
  mm: number;
  plusMinusMm?: number | undefined;
  unit: SizeUnit;
  /** The other unit in small text after it. */
  both?: boolean;
};

/** A length in the reader's unit, its tolerance softer, the other unit small. */
export function Size({ mm, plusMinusMm, unit, both = false }: Props) {
  const other = unit === "mm" ? "in" : "mm";
  const [nominal, tolerance] =
    plusMinusMm === undefined ? [sizeNumber(mm, unit), null] : statedNumbers(mm, plusMinusMm, unit);
  return (
    <span className="whitespace-nowrap">
      <span className="font-semibold">{nominal}</span>
      {tolerance !== null && <span className="text-soft"> ±{tolerance}</span>}
      <small className="text-soft">&#8201;{unit}</small>
      {both && (
        <small className="text-soft">
          {" "}
          ({sizeNumber(mm, other)}&#8201;{other})
        </small>
      )}
    </span>
  );
}
