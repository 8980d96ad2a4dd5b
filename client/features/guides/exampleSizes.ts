import type { DimensionName, PartKind } from "#shared/domain/partKinds";

/** A part of a usual size of each kind, mm: examples of ours, no particular part. */
export const exampleSizes: Record<PartKind, Partial<Record<DimensionName, number>>> = {
  "idler-wheel": { outsideDiameter: 44, bore: 4, treadWidth: 6, overallHeight: 12, secondTreadDiameter: 20 },
  "pinch-roller": { outsideDiameter: 12.8, bore: 2, treadWidth: 9, overallHeight: 12 },
  "flat-belt": { insideCircumference: 540, width: 5, thickness: 0.8 },
  "square-belt": { insideCircumference: 300, section: 2 },
  "round-belt": { insideCircumference: 250, section: 3 },
  "drive-ring": { insideDiameter: 60, section: 4, width: 4, height: 3 },
  "motor-mount": { outsideDiameter: 16, insideDiameter: 6, grooveDiameter: 10, grooveWidth: 2, height: 9 },
  "brake-pad": { length: 20, width: 8, thickness: 4 },
  "clutch-felt": { outsideDiameter: 25, insideDiameter: 9, thickness: 2 },
};
