import { useId } from "react";
import { axisMarks } from "../../../lib/axisMarks";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { chanceWords } from "../../../ui/verdictWords";
import { Hatches } from "../Hatches";
import type { ClassesAt } from "./classesAt";
import { magnificationFor, magnificationWords } from "./magnification";

const side = 10;
const partTop = 34;
const partHeight = 52;
const laneTop = partTop + partHeight + 14;
const laneHeight = 48;

/** The edge of the part, magnified, and how far each class lets it lie; behind them the band that is accepted. */
export function ClassBars({ result, unit, width }: { result: ClassesAt; unit: SizeUnit; width: number }) {
  const id = useId();
  const { nominalMm, classes, band, isInside } = result;
  const reach = Math.max(
    ...classes.map(({ plusMinusMm }) => plusMinusMm),
    ...(band ? [nominalMm - band.lowerMm, band.upperMm - nominalMm].map(Math.abs) : []),
  );
  // A band far from the part may not crowd the classes out of the picture.
  const halfMm = Math.min(reach, 3 * classes[3]!.plusMinusMm) * 1.06;
  const { times, pxPerMm } = magnificationFor(2 * halfMm, width - 2 * side);
  const middle = width / 2;
  const xOf = (mm: number) => middle + (mm - nominalMm) * pxPerMm;
  const clamp = (x: number) => Math.min(Math.max(x, 0), width);
  const view = { fromMm: nominalMm - middle / pxPerMm, toMm: nominalMm + middle / pxPerMm };
  const axis = laneTop + classes.length * laneHeight + 4;
  const bandX = band && [clamp(xOf(band.lowerMm)), clamp(xOf(band.upperMm))];

  return (
    <svg width={width} height={axis + 30} className="block" aria-hidden="true">
      <Hatches id={id} />
      {bandX && (
        <>
          <rect
            x={bandX[0]}
            y={laneTop - 6}
            width={bandX[1]! - bandX[0]!}
            height={axis - laneTop + 6}
            fill="var(--color-inband-fill)"
          />
          <path
            d={bandX.map((x) => `M${x} ${laneTop - 6}V${axis}`).join("")}
            stroke="var(--color-inband)"
            strokeDasharray="3 3"
          />
        </>
      )}
      <rect x={isInside ? middle : 0} y={partTop} width={middle} height={partHeight} fill={`url(#${id}-rubber)`} />
      <path
        d={`M${isInside ? width : 0} ${partTop}H${middle}V${partTop + partHeight}H${isInside ? width : 0}`}
        fill="none"
        stroke="var(--color-ink)"
        strokeWidth={1.8}
      />
      <path d={`M${middle} ${partTop + partHeight}V${axis}`} stroke="var(--color-measured)" strokeWidth={1.8} />
      <text x={middle} y={partTop - 12} textAnchor="middle" fontSize={14} fontWeight={650} fill="var(--color-measured)">
        edge at {roundedSize(nominalMm, unit)} {unit}
      </text>
      <text
        x={isInside ? 14 : width - 14}
        y={partTop + partHeight / 2 + 4.5}
        textAnchor={isInside ? "start" : "end"}
        fontSize={13.3}
        fill="var(--color-soft)"
      >
        {magnificationWords(times)}
      </text>
      {classes.map(({ name, plusMinusMm, chance }, i) => {
        const y = laneTop + i * laneHeight;
        const [from, to] = [xOf(nominalMm - plusMinusMm), xOf(nominalMm + plusMinusMm)];
        return (
          <g key={name} transform={`translate(0 ${y})`}>
            <text x={side} y={13} fontSize={13.3} fill="var(--color-ink)">
              <tspan fontWeight={700}>{name}</tspan> ±{roundedSize(plusMinusMm, unit)}
            </text>
            {chance !== null && (
              <text x={width - side} y={13} textAnchor="end" fontSize={13.3} fill="var(--color-ink)">
                {chanceWords(chance)} inside
              </text>
            )}
            <rect
              x={from}
              y={20}
              width={to - from}
              height={13}
              fill="var(--color-sheet)"
              stroke="var(--color-ink)"
              strokeWidth={1.4}
            />
            {band &&
              [
                [from, Math.min(to, xOf(band.lowerMm))],
                [Math.max(from, xOf(band.upperMm)), to],
              ].map(([a = 0, b = 0]) =>
                b > a + 0.5 ? (
                  <rect
                    key={a}
                    x={a}
                    y={20}
                    width={b - a}
                    height={13}
                    fill={`url(#${id}-out)`}
                    stroke="var(--color-outband)"
                    strokeWidth={1.4}
                  />
                ) : null,
              )}
            <path d={`M${middle} 20v13`} stroke="var(--color-measured)" strokeWidth={1.8} />
          </g>
        );
      })}
      <defs>
        <pattern id={`${id}-out`} width={5} height={5} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <path d="M0 0V5" stroke="var(--color-outband)" strokeWidth={1.6} />
        </pattern>
      </defs>
      <path d={`M0 ${axis + 0.5}H${width}`} stroke="var(--color-ink)" />
      {axisMarks(view, width, unit).map(({ mm, label }) => (
        <g key={mm} transform={`translate(${xOf(mm).toFixed(1)} ${axis})`}>
          <path d={`M0 0V${label ? 7 : 4}`} stroke="var(--color-ink)" strokeWidth={label ? 1.2 : 0.8} />
          {label && xOf(mm) > 18 && xOf(mm) < width - 18 && (
            <text y={21} textAnchor="middle" fontSize={13} fill="var(--color-ink)">
              {label}
            </text>
          )}
        </g>
      ))}
    </svg>
  );
}
