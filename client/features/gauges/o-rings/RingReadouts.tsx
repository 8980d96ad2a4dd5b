import { classBPlusMinusMm, stretchAdvice } from "#shared/domain/oRingStretch";
import { stretchPercentOf } from "#shared/domain/oRings";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { LinkButton } from "../../../ui/LinkButton";
import { Readout } from "../Readout";
import { percentText } from "./percentText";
import { RingSize } from "./RingSize";
import type { RingNeed } from "./ringNeed";
import { StretchScale } from "./StretchScale";

const oldOne = (mm: number, unit: SizeUnit) =>
  `${roundedSize(Math.abs(mm), unit)} ${unit} ${mm < 0 ? "smaller" : "larger"}`;

/** What follows from the ring that is drawn. */
export function RingReadouts({ need, unit }: { need: RingNeed; unit: SizeUnit }) {
  const { picked, onSeat, use, seatMm } = need;
  const { insideDiameterMm, insideDiameterTolMm, sectionMm, sectionTolMm } = picked;
  const other = unit === "mm" ? "in" : "mm";
  const search = new URLSearchParams({
    kind: "drive-ring",
    insideDiameter: `${insideDiameterMm.toFixed(2)} mm`,
    section: `${sectionMm.toFixed(2)} mm`,
  });
  return (
    <>
      <Readout label={`Ring ${picked.dash}`} value={roundedSize(insideDiameterMm, unit)} unit={`${unit} inside`}>
        <p>
          ±{roundedSize(insideDiameterTolMm, unit)} {unit} ({roundedSize(insideDiameterMm, other)} {other}); ISO 3601-1
          class B would allow ±{roundedSize(classBPlusMinusMm(insideDiameterMm), unit)}.
        </p>
        <p>
          Section <RingSize mm={sectionMm} plusMinusMm={sectionTolMm} unit={unit} both />
        </p>
        {use === "ring" && <p>{oldOne(insideDiameterMm - seatMm, unit)} inside than the old one.</p>}
      </Readout>
      {use !== "ring" && <Stretch need={need} />}
      {use !== "ring" && onSeat.stretchPercent > 0 && (
        <Readout label="Section left" value={roundedSize(onSeat.sectionMm, unit)} unit={unit}>
          <p>
            {onSeat.lossPercent.toFixed(1)} % less, by constant volume: what grows longer grows thinner. This is what is
            drawn.
          </p>
          {onSeat.empiricalLossPercent !== null && (
            <p>
              {onSeat.empiricalLossPercent.toFixed(1)} % less,{" "}
              {roundedSize(sectionMm * (1 - onSeat.empiricalLossPercent / 100), unit)} {unit}, by an empirical curve for
              seals (from memory). The two differ by about one point.
            </p>
          )}
        </Readout>
      )}
      {use === "seat" && onSeat.stretchPercent > 0 && (
        <Readout label="Over the ring" value={roundedSize(seatMm + 2 * onSeat.sectionMm, unit)} unit={unit}>
          <p>The outside diameter once it is on its seat, which sets the speed if the ring is driven on its rim.</p>
        </Readout>
      )}
      {use === "belt" && <Grooves need={need} unit={unit} />}
      <LinkButton look="primary" to={`/find?${search}`} className="print:hidden">
        Find this ring
      </LinkButton>
    </>
  );
}

function Stretch({ need }: { need: RingNeed }) {
  const { onSeat, use, picked, seatMm } = need;
  const percent = onSeat.stretchPercent;
  const [least, most] = [1, -1].map((way) =>
    percentText(stretchPercentOf(picked.insideDiameterMm + way * picked.insideDiameterTolMm, seatMm)),
  );
  const advice = use === "belt" ? stretchAdvice.belt : stretchAdvice.seat;
  const [from, to] = use === "belt" ? [4, 16] : [-2, 8];
  const place =
    percent <= 0
      ? "It is loose."
      : percent < advice.min
        ? "Too little."
        : percent > advice.max
          ? "Too much."
          : "Inside.";
  return (
    <Readout label="Stretch in place" value={percentText(percent)} unit="%">
      <StretchScale percent={percent} advice={advice} from={from} to={to} />
      <p>
        From {least} to {most} % over the ring’s tolerance.
      </p>
      <p>
        <strong className={place === "Inside." ? "text-inband" : "text-outband"}>{place}</strong>{" "}
        {use === "belt"
          ? "8 to 12 % of the inside diameter is advised for an O-ring as a drive belt."
          : "1 to 5 % is advised for an O-ring on a seat, ideally 2 %; while it is being put on, about 50 % does no harm."}{" "}
        (Published O-ring design guidance.)
      </p>
    </Readout>
  );
}

function Grooves({ need, unit }: { need: RingNeed; unit: SizeUnit }) {
  const leastMm = stretchAdvice.grooveSections * need.picked.sectionMm;
  const isTooSmall = need.grooveMm !== undefined && need.grooveMm < leastMm;
  return (
    <Readout label="Smallest groove" value={roundedSize(leastMm, unit)} unit={unit}>
      <p>At its bottom a groove is at least four sections across (published O-ring design guidance).</p>
      {need.grooveMm !== undefined && (
        <p>
          <strong className={isTooSmall ? "text-outband" : "text-inband"}>
            {isTooSmall ? "Yours is too small" : "Yours is large enough"}
          </strong>
          , {roundedSize(need.grooveMm, unit)} {unit}.{isTooSmall && " Take a thinner ring."}
        </p>
      )}
    </Readout>
  );
}
