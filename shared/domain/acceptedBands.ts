import { DomainError } from "./DomainError";
import { traitsOf } from "./dimensionTraits";
import type { DimensionName, PartKind } from "./partKinds";

/** What a service point accepts of one dimension, in mm, ends included. */
export type AcceptedBand = { lowerMm: number; upperMm: number };

/** How far below and above the need a size may lie: the larger of a fixed part in mm and a share of the need. */
type Allowance = { below: number; above: number; shareBelow: number; shareAbove: number };
const within = (mm: number): Allowance => ({ below: mm, above: mm, shareBelow: 0, shareAbove: 0 });
const between = (below: number, above: number): Allowance => ({ below, above, shareBelow: 0, shareAbove: 0 });
const share = (shareBelow: number, shareAbove: number, mm = 0): Allowance => ({
  below: mm,
  above: mm,
  shareBelow,
  shareAbove,
});

const belt = {
  insideCircumference: share(0.025, 0.015),
  width: share(0.1, 0.1, 0.4),
  thickness: share(0.2, 0.2, 0.15),
  section: share(0.1, 0.1, 0.2),
};

/**
 * Common practice, no source: what such mechanisms take as a rule. A bore has to run on its spindle; running diameters have
 * the travel of their arm; belts and rings stretch; the remaining sizes only have to find room.
 */
const allowances: Record<PartKind, Partial<Record<DimensionName, Allowance>>> = {
  "idler-wheel": {
    outsideDiameter: within(0.5),
    bore: between(0.04, 0.06),
    treadWidth: within(1),
    overallHeight: within(0.8),
    secondTreadDiameter: within(0.3),
  },
  "pinch-roller": {
    outsideDiameter: within(0.4),
    bore: between(0.04, 0.06),
    treadWidth: within(1),
    overallHeight: within(0.8),
  },
  "flat-belt": belt,
  "square-belt": belt,
  "round-belt": belt,
  "drive-ring": {
    insideDiameter: share(0.04, 0.02),
    section: share(0.1, 0.1, 0.2),
    width: share(0.1, 0.1, 0.4),
    height: share(0.1, 0.1, 0.4),
  },
  "motor-mount": {
    outsideDiameter: within(0.8),
    insideDiameter: within(0.4),
    grooveDiameter: within(0.5),
    grooveWidth: between(0.3, 0.5),
    height: within(1),
  },
  "brake-pad": { length: within(1.5), width: within(1), thickness: within(0.5) },
  "clutch-felt": { outsideDiameter: within(1), insideDiameter: between(0.4, 1), thickness: within(0.4) },
};
/** No default reaches further than this share of the need, so that small parts are not all alike. */
const widestShare = 0.25;

/**
 * The band taken for a dimension where no service point's own band is known, around what is needed (as new), in mm.
 * Errors: DomainError on "dimension" (not of the kind) or "valueMm". Source: common practice, no source.
 */
export function defaultBand(kind: PartKind, dimension: DimensionName, valueMm: number): AcceptedBand {
  traitsOf(kind, dimension);
  if (!(valueMm > 0) || !Number.isFinite(valueMm)) throw new DomainError("valueMm", "A size is more than zero.");
  const { below, above, shareBelow, shareAbove } = allowances[kind][dimension] ?? within(0.5);
  const most = widestShare * valueMm;
  return {
    lowerMm: valueMm - Math.min(Math.max(below, shareBelow * valueMm), most),
    upperMm: valueMm + Math.min(Math.max(above, shareAbove * valueMm), most),
  };
}
