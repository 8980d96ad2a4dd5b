import { useId, useMemo } from "react";
import type { SpeedInput } from "#shared/domain/driveTrain";
import type { SpeedResult } from "#shared/domain/speed";
import { roundStep } from "../../../lib/axisMarks";
import type { SizeUnit } from "../../../lib/formatSize";
import { useOwnWidth } from "../../../ui/drawing/useOwnWidth";
import { describeTrain } from "./describeTrain";
import { LabelLines } from "./LabelLines";
import { layoutTrain } from "./layoutTrain";
import type { PlacedLabel } from "./placeLabels";
import { TrainDetail } from "./TrainDetail";
import { TrainShapes } from "./TrainShapes";
import { trainLabels } from "./trainLabels";
import { trainSheet } from "./trainSheet";

type Props = { input: SpeedInput; result: SpeedResult; unit: SizeUnit };

/** The drive train drawn to scale from its numbers, with what each of them does to the speed. */
export function TrainDrawing({ input, result, unit }: Props) {
  const [place, width] = useOwnWidth(760);
  const id = useId();
  const { train, sheet } = useMemo(() => {
    const laidOut = layoutTrain(input);
    return { train: laidOut, sheet: trainSheet(laidOut, trainLabels(input, result, laidOut, unit), width) };
  }, [input, result, unit, width]);
  const { plan, placed, details, height } = sheet;
  return (
    <div ref={place} className="gauge-sheet">
      <svg
        role="img"
        aria-labelledby={`${id}-title`}
        aria-describedby={`${id}-desc`}
        viewBox={`0 0 ${width} ${height}`}
        width={width}
        height={height}
        className="block max-w-full"
        fontFamily="inherit"
      >
        <title id={`${id}-title`}>The drive train, to scale</title>
        <desc id={`${id}-desc`}>{describeTrain(input, result, unit)}</desc>
        <TrainShapes train={train} view={plan} cancels={result.cancels} />
        {placed.map(({ at, label }) => (
          <g key={label.field}>
            <Leader at={at} isPale={label.cancels} />
            <LabelLines label={label} x={at.box.left} y={at.box.top + 13} anchor="start" />
          </g>
        ))}
        {details.map((detail) => (
          <TrainDetail key={detail.letter} detail={detail} train={train} cancels={result.cancels} id={id} />
        ))}
        <PlanScale pxPerMm={plan.pxPerMm} unit={unit} y={sheet.scaleY} />
      </svg>
    </div>
  );
}

/** A leader with its arrowhead on the edge that is meant (ISO 129-1). */
function Leader({ at, isPale }: { at: PlacedLabel; isPale: boolean }) {
  const [tip, knee, end] = at.leader;
  const colour = `var(--color-${isPale ? "edge" : "measured"})`;
  const angle = (Math.atan2(knee.y - tip.y, knee.x - tip.x) * 180) / Math.PI;
  return (
    <g>
      <path d={`M${tip.x} ${tip.y}L${knee.x} ${knee.y}H${end.x}`} fill="none" stroke={colour} strokeWidth={1.2} />
      <path d="M0 0L9 -3V3Z" transform={`translate(${tip.x} ${tip.y}) rotate(${angle})`} fill={colour} />
    </g>
  );
}

/** How long a round length is in the plan. */
function PlanScale({ pxPerMm, unit, y }: { pxPerMm: number; unit: SizeUnit; y: number }) {
  const per = unit === "in" ? 25.4 : 1;
  const length = roundStep(36 / pxPerMm / per);
  const width = length * per * pxPerMm;
  return (
    <g>
      <path
        d={`M12 ${y - 4}V${y + 4}M12 ${y}H${12 + width}M${12 + width} ${y - 4}V${y + 4}`}
        stroke="var(--color-soft)"
      />
      <text x={20 + width} y={y + 4} fontSize={12} fontWeight={500} fill="var(--color-soft)">
        {Number(length.toPrecision(3))} {unit}
      </text>
    </g>
  );
}
