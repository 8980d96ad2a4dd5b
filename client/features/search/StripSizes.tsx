import { type DimensionName, dimensionWords } from "#shared/domain/partKinds";
import { primaryOf } from "../../lib/needParams";
import { LengthSlot } from "./LengthSlot";
import { StripSelect } from "./StripSelect";
import type { SizesAsRead, Strip } from "./useStrip";

const readings: Partial<Record<DimensionName, string>> = { insideCircumference: "532 mm", outsideDiameter: "44.1 mm" };
const worked: Partial<Record<DimensionName, string>> = {
  insideCircumference: "532 ± 8 mm",
  outsideDiameter: "44 ± 0.5 mm",
};
const exampleOf = (name: DimensionName, isMeasured: boolean) =>
  isMeasured ? (readings[name] ?? "4.0 mm") : (worked[name] ?? "4 ± 0.2 mm");

type Props = {
  strip: Strip;
  isCompact: boolean;
  sizes: SizesAsRead;
  /** Opens the field of a size and puts the cursor there. */
  onFocus: (name: DimensionName) => void;
};

/** The sizes in the sentence, and the way to one more. Where no part is left, those that were worked out. */
export function StripSizes({ strip, isCompact, sizes, onFocus }: Props) {
  const { values, shown, closed, isMeasured } = strip;
  const lead = isMeasured ? " measuring " : " with ";
  const addWords = isMeasured || shown.length > 0 ? "+ size" : "+ size worked out";
  return (
    <>
      {!isCompact && shown.length > 0 && lead}
      {shown.map((name) => (
        <span key={name}>
          {name !== shown[0] || isCompact ? ", " : ""}
          <LengthSlot
            name={name}
            text={values.lengths[name] ?? ""}
            size={sizes[name]?.size}
            problem={sizes[name]?.problem}
            isLeftOut={sizes[name]?.isLeftOut ?? false}
            example={exampleOf(name, isMeasured)}
            isMeasured={isMeasured}
            onText={(text) => strip.setLength(name, text)}
            onRemove={isMeasured && name === primaryOf(values.kind) ? undefined : () => strip.closeSize(name)}
          />
        </span>
      ))}
      {closed.length > 0 && (
        <>
          {", "}
          <StripSelect
            label="Add a size"
            value=""
            shownText={addWords}
            className="slot-soft"
            onChange={(event) => onFocus(event.target.value as DimensionName)}
          >
            <option value="">{addWords}</option>
            {closed.map((name) => (
              <option key={name} value={name}>
                {dimensionWords[name]}
              </option>
            ))}
          </StripSelect>
        </>
      )}
    </>
  );
}
