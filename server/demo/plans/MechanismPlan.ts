import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import type { DriveMap } from "#shared/schemas/catalogue";

type Range = readonly [low: number, high: number, step: number];

/** A service point of a plan: where it sits, and between which sizes families differ. */
export type PlannedPoint = {
  name: string;
  kind: PartKind;
  note: string;
  at: readonly [xMm: number, yMm: number];
  sizes: Partial<Record<DimensionName, Range>>;
};
export type MechanismPlan = { driveTrain: string; map: DriveMap; points: readonly PlannedPoint[] };

/** A round thing on the plan of a drive. */
export const wheel = (
  id: string,
  role: DriveMap["wheels"][number]["role"],
  label: string,
  [xMm, yMm]: readonly [number, number],
  diameterMm: number,
): DriveMap["wheels"][number] => ({ id, role, label, xMm, yMm, diameterMm });
