import { beltRuns } from "./beltRuns";
import { platterMargin, type Train } from "./layoutTrain";
import type { LineObstacle, Obstacle } from "./placeLabels";
import { centreLines, toPx, type View } from "./trainView";

/** What words should keep off. Ink can be read on metal, though not at its best, and not on rubber. */
const costs = { metal: 30, rubber: 500, presumed: 0, rim: 0, belt: 200, centre: 45 } as const;

export function wheelObstacles({ wheels }: Train, plan: View): Obstacle[] {
  return wheels.flatMap((wheel) => {
    const at = { ...toPx(plan, wheel), r: wheel.r * plan.pxPerMm, cost: costs[wheel.look] };
    return wheel.look === "rim" ? [at, { ...at, r: at.r * platterMargin }] : [at];
  });
}

/** Belts, tape and centre lines. */
export function lineObstacles({ wheels, belts, tape }: Train, plan: View): LineObstacle[] {
  const tapes = tape
    ? [
        [
          { x: tape.left, y: tape.y },
          { x: tape.right, y: tape.y },
        ] as const,
      ]
    : [];
  const runs = [...belts.flatMap(beltRuns), ...tapes].map(([from, to]) => [toPx(plan, from), toPx(plan, to)] as const);
  const crosses = wheels.flatMap((wheel) => centreLines(wheel, plan));
  return [
    ...runs.map((line) => ({ line, cost: costs.belt })),
    ...crosses.map((line) => ({ line, cost: costs.centre })),
  ];
}
