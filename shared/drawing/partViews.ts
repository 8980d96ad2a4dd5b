import type { PartKind } from "#shared/domain/partKinds";
import type { PartView } from "./layout/PartView";
import { type BeltKind, type BeltScale, beltViews } from "./parts/belt";
import { driveRingViews } from "./parts/driveRing";
import { idlerWheelViews } from "./parts/idlerWheel";
import { motorMountViews } from "./parts/motorMount";
import type { PartSizes } from "./parts/PartSizes";
import { brakePadViews, clutchFeltViews } from "./parts/pads";
import { pinchRollerViews } from "./parts/pinchRoller";
import { roundBelow } from "./roundBelow";
import type { MaterialLook } from "./Scene";

export type ViewRequest = {
  kind: PartKind;
  sizes: PartSizes;
  large: boolean;
  material: MaterialLook;
  /** Room for a magnified cross-section, px across. */
  sectionRoom: number;
  /** A fixed scale for cross-sections of belts, px to the mm, so that rows can be compared. */
  sectionPxPerMm?: number | undefined;
};

/** A cross-section whose smaller side shows at least this large needs no magnifying, px. */
const plainEnough = 26;
/** A loop thinner than this is a single line, px. */
const thinnestLoop = 2.5;

/** The views that show a part of this kind at this scale. */
export function partViews(request: ViewRequest, pxPerMm: number): PartView[] {
  const { kind, sizes, large, material } = request;
  switch (kind) {
    case "idler-wheel":
      return idlerWheelViews(sizes, large);
    case "pinch-roller":
      return pinchRollerViews(sizes, large);
    case "flat-belt":
    case "square-belt":
    case "round-belt":
      return beltViews(kind, sizes, large, material, beltScale(request, kind, pxPerMm));
    case "drive-ring":
      return driveRingViews(sizes, large, material, large ? ringScale(request, pxPerMm) : undefined);
    case "motor-mount":
      return motorMountViews(sizes, large, material);
    case "brake-pad":
      return brakePadViews(sizes, large, material);
    case "clutch-felt":
      return clutchFeltViews(sizes, large, material);
  }
}

function beltScale(request: ViewRequest, kind: BeltKind, pxPerMm: number): BeltScale {
  const { sizes, large, sectionPxPerMm, sectionRoom } = request;
  const across = beltSection(kind, sizes);
  const thick = kind === "flat-belt" ? sizes.or("thickness", 0.8) : across;
  const hairline = thick * pxPerMm < thinnestLoop;
  if (large) return { ...magnify(across, sectionRoom, pxPerMm, "the loop"), hairline };
  const scale = sectionPxPerMm ?? sectionScaleFor(across, sectionRoom);
  return { magnification: scale / pxPerMm, caption: undefined, hairline };
}

/** The larger side of a belt's cross-section, mm. */
export function beltSection(kind: BeltKind, sizes: PartSizes): number {
  if (kind !== "flat-belt") return sizes.or("section", 2);
  return Math.max(sizes.or("width", 5), sizes.or("thickness", 0.8));
}

/** A round number of px to the mm at which a cross-section this wide (mm) fits `room` (px). */
export function sectionScaleFor(across: number, room: number): number {
  return Math.min(12, roundBelow(room / across));
}

function ringScale(request: ViewRequest, pxPerMm: number): BeltScale | undefined {
  const { sizes, sectionRoom } = request;
  const inner = sizes.or("insideDiameter", 40);
  const sides = (["section", "width", "height"] as const)
    .map((name) => sizes.known(name))
    .filter((v) => v !== undefined);
  const known = sides.length > 0 ? sides : [inner * 0.06];
  if (Math.min(...known) * pxPerMm >= plainEnough) return undefined;
  const scale = magnify(Math.max(...known), sectionRoom, pxPerMm, "the ring");
  return scale.magnification > 1 ? scale : undefined;
}

function magnify(across: number, room: number, pxPerMm: number, what: string): BeltScale {
  const times = Math.max(1, roundBelow(room / (across * pxPerMm)));
  return { magnification: times, caption: times > 1 ? `section, drawn ${times} × ${what}` : "section" };
}
