import { beltRuns } from "./beltRuns";
import { platterMargin, type Train, type TrainBelt, type Wheel } from "./layoutTrain";
import type { Point } from "./placeLabels";
import { centreLines, toPx, type View } from "./trainView";

const ink = { stroke: "var(--color-ink)", strokeWidth: 1.2 };
const setting = { stroke: "var(--color-measured)", strokeWidth: 2.2 };

/** Both straight runs and both arcs of an open belt, along its middle. */
function beltPath(belt: TrainBelt, view: View): string {
  const [r1, r2] = [belt.from, belt.to].map(({ r }) => (r + belt.thickness / 2) * view.pxPerMm) as [number, number];
  const [[upperStart, upperEnd], [lowerStart, lowerEnd]] = beltRuns(belt);
  const at = (point: Point) => {
    const { x, y } = toPx(view, point);
    return `${x.toFixed(2)} ${y.toFixed(2)}`;
  };
  // The larger wheel is wrapped by more than half.
  const [onTo, onFrom] = r2 > r1 ? [1, 0] : [0, 1];
  return `M${at(lowerEnd)}A${r2} ${r2} 0 ${onTo} 0 ${at(upperEnd)}L${at(upperStart)}A${r1} ${r1} 0 ${onFrom} 0 ${at(lowerStart)}Z`;
}

function WheelShape({ wheel, view, isPale }: { wheel: Wheel; view: View; isPale: boolean }) {
  const { x, y } = toPx(view, wheel);
  const r = wheel.r * view.pxPerMm;
  const sets = wheel.field !== undefined && !isPale;
  if (wheel.look === "rim") {
    const ring = (radius: number) =>
      `M${x - radius} ${y}a${radius} ${radius} 0 1 0 ${2 * radius} 0a${radius} ${radius} 0 1 0 ${-2 * radius} 0Z`;
    return (
      <>
        <path d={ring(r * platterMargin) + ring(r)} fillRule="evenodd" fill="var(--color-metal-fill)" {...ink} />
        <circle cx={x} cy={y} r={r} fill="none" {...setting} />
      </>
    );
  }
  if (isPale || wheel.look === "presumed") {
    return (
      <circle
        cx={x}
        cy={y}
        r={r}
        fill={isPale ? "var(--color-rule)" : "none"}
        fillOpacity={0.45}
        stroke="var(--color-edge)"
        strokeDasharray="5 4"
      />
    );
  }
  const isRubber = wheel.look === "rubber";
  return (
    <>
      <circle
        cx={x}
        cy={y}
        r={r}
        fill={`var(--color-${isRubber ? "rubber" : "metal-fill"})`}
        {...(sets ? setting : ink)}
      />
      {isRubber && r > 10 && <circle cx={x} cy={y} r={r * 0.74} fill="var(--color-metal-fill)" {...ink} />}
    </>
  );
}

function CentreLines({ wheel, view }: { wheel: Wheel; view: View }) {
  const d = centreLines(wheel, view).map(([from, to]) => `M${from.x} ${from.y}L${to.x} ${to.y}`);
  return <path d={d.join("")} stroke="var(--color-soft)" strokeWidth={0.9} strokeDasharray="10 3 2 3" />;
}

/** The wheels, belts and tape of a drive at one scale. */
export function TrainShapes({ train, view, cancels }: { train: Train; view: View; cancels: readonly string[] }) {
  const { wheels, belts, tape } = train;
  return (
    <>
      {wheels.map((wheel) => (
        <WheelShape
          key={`${wheel.field ?? "roller"}`}
          wheel={wheel}
          view={view}
          isPale={wheel.field !== undefined && cancels.includes(wheel.field)}
        />
      ))}
      {wheels.map((wheel) => (
        <CentreLines key={`${wheel.field ?? "roller"}`} wheel={wheel} view={view} />
      ))}
      {belts.map((belt) => {
        const width = Math.max(2, belt.thickness * view.pxPerMm);
        const d = beltPath(belt, view);
        return (
          <g key={belt.field} fill="none">
            <path d={d} stroke="var(--color-ink)" strokeWidth={width + 1.4} />
            <path d={d} stroke="var(--color-rubber)" strokeWidth={width} />
          </g>
        );
      })}
      {tape && <Tape tape={tape} view={view} />}
    </>
  );
}

function Tape({ tape, view }: { tape: NonNullable<Train["tape"]>; view: View }) {
  const [from, to] = [toPx(view, { x: tape.left, y: tape.y }), toPx(view, { x: tape.right, y: tape.y })];
  return (
    <g stroke="var(--color-ink)" fill="var(--color-ink)">
      <path d={`M${from.x} ${from.y}H${to.x - 8}`} strokeWidth={2} />
      <path d={`M${to.x} ${to.y}l-10 -4v8Z`} stroke="none" />
    </g>
  );
}
