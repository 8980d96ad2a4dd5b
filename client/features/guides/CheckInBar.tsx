import { checkIn } from "#shared/domain/checkIn";
import { roundDecimal } from "#shared/domain/roundDecimal";
import { useOwnWidth } from "../../ui/drawing/useOwnWidth";
import { offered } from "./workedExample";

const part = offered.outsideDiameter;
const two = (mm: number) => roundDecimal(mm, 2);

/** What a reading of the part of the worked example would say when it arrives: the zones to scale along the ruler. */
export function CheckInBar() {
  const [place, width] = useOwnWidth(560);
  const { nominalMm, plusMinusMm } = part;
  const { guardBandMm } = checkIn({ ...part, readingsMm: [nominalMm], instrument: "digital-caliper" });
  const half = (plusMinusMm + guardBandMm) * 1.5;
  const xOf = (off: number) => width / 2 + (off / half) * (width / 2);
  const sure = Math.max(plusMinusMm - guardBandMm, 0);
  const limits = [-plusMinusMm, plusMinusMm];
  const [conforms, not] = [xOf(sure) - xOf(-sure), xOf(-plusMinusMm - guardBandMm)];
  return (
    <div className="grid gap-2">
      <div ref={place} className="border border-rule bg-sheet print:break-inside-avoid">
        <svg
          width={width}
          height="96"
          viewBox={`0 0 ${width} 96`}
          className="block max-w-full"
          role="img"
          aria-label={`Conforms from ${two(nominalMm - sure)} to ${two(nominalMm + sure)} mm, does not below ${two(nominalMm - plusMinusMm - guardBandMm)} or above ${two(nominalMm + plusMinusMm + guardBandMm)} mm`}
          fontSize="13"
        >
          <rect x={xOf(-sure)} y="30" width={conforms} height="34" fill="var(--color-inband-fill)" />
          {limits.map((limit) => (
            <path
              key={limit}
              d={guardHatch(xOf(limit - guardBandMm), xOf(limit + guardBandMm))}
              stroke="var(--color-soft)"
              fill="none"
            />
          ))}
          <path
            d={`M0 64H${width}${[...limits, 0].map((off) => `M${xOf(off)} ${off === 0 ? 64 : 24}V70`).join("")}`}
            stroke="var(--color-ink)"
            strokeWidth="1.4"
            fill="none"
          />
          <g textAnchor="middle" fontWeight="600">
            <text x={xOf(0)} y="52" fill="var(--color-inband)">
              conforms
            </text>
            <text x={not / 2} y="52" fill="var(--color-outband)">
              does not
            </text>
            <text x={width - not / 2} y="52" fill="var(--color-outband)">
              does not
            </text>
          </g>
          <g textAnchor="middle" fill="var(--color-soft)">
            {[...limits, 0].map((off) => (
              <text key={off} x={xOf(off)} y="87">
                {two(nominalMm + off)}
              </text>
            ))}
            {limits.map((limit) => (
              <text key={limit} x={xOf(limit)} y="18">
                cannot be told
              </text>
            ))}
          </g>
        </svg>
      </div>
      <p className="text-small text-soft">
        The part of the worked example, read once with a digital calliper: the hatched guard bands reach{" "}
        {two(guardBandMm)} mm to either side of the stated limits.
      </p>
    </div>
  );
}

/** Slanted lines between two x, from y = 30 to 64. */
function guardHatch(from: number, to: number): string {
  const count = Math.max(Math.floor((to - from) / 7), 1);
  const step = (to - from) / count;
  return Array.from({ length: count }, (_, i) => `M${from + i * step} 64l${step} -34`).join("");
}
