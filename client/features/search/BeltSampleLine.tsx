import { Link } from "react-router-dom";
import type { NeedValues } from "../../lib/needParams";
import { gaugeAddress } from "./gaugeAddress";

/** A belt is seldom measured along its inside as it stands in the sentence. */
export function BeltSampleLine({ values }: { values: NeedValues }) {
  return (
    <p className="text-soft">
      Measured another way? <Link to={gaugeAddress("belt-sample", values)}>Laid flat, or on a cone</Link>
    </p>
  );
}
