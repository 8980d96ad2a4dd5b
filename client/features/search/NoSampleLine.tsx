import { Link } from "react-router-dom";
import { dimensionWords } from "#shared/domain/partKinds";
import { isBelt, type NeedValues, primaryOf } from "../../lib/needParams";
import { gaugeAddress } from "./gaugeAddress";

/** What helps where no part is left to measure. */
export function NoSampleLine({ values }: { values: NeedValues }) {
  const { kind, family } = values;
  if (isBelt(kind)) {
    return (
      <p className="text-soft">
        No sample: <Link to={gaugeAddress("belt-route", values)}>work it out from the pulleys</Link>
        {!family && ", or choose the mechanism: its register gives the sizes"}.
      </p>
    );
  }
  return (
    <p className="text-soft">
      No sample: {family ? "the register of " : "choose the mechanism, and "}
      <Link to={family ? `/families/${family}` : "/families"}>{family ? "its mechanism" : "its register"}</Link> gives
      the sizes; the <Link to="/guides">guides</Link> say where else the {dimensionWords[primaryOf(kind)]} can be found.
    </p>
  );
}
