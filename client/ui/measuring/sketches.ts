import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { driveRing, flatBelt, roundBelt, squareBelt } from "./beltSketches";
import { brakePad, clutchFelt, motorMount } from "./mountSketches";
import type { Sketch } from "./Sketch";
import { idlerWheel, pinchRoller } from "./wheelSketches";

/** The picture of measuring each dimension of each kind. */
export const sketches: Record<PartKind, Partial<Record<DimensionName, Sketch>>> = {
  "idler-wheel": idlerWheel,
  "pinch-roller": pinchRoller,
  "flat-belt": flatBelt,
  "square-belt": squareBelt,
  "round-belt": roundBelt,
  "drive-ring": driveRing,
  "motor-mount": motorMount,
  "brake-pad": brakePad,
  "clutch-felt": clutchFelt,
};
