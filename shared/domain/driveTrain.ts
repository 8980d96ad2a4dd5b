import { DomainError } from "./DomainError";
import type { Motor } from "./motorSpeed";
import type { NominalSpeed } from "./nominalSpeeds";
import { requireWithin } from "./requireWithin";
import { speedBounds } from "./speedBounds";

type CapstanStage = { driver: number; driven: number; beltThickness?: number };
/** A drive as it was measured: the motor, diameters and thicknesses in mm, and the speed wanted, if any. */
export type SpeedInput = Motor & { target?: NominalSpeed } & (
    | { drive: "rim"; stepDiameter: number; rimDiameter: number; idlerDiameter?: number }
    | {
        /** The motor's step drives the large tread, the small tread drives the rim. */
        drive: "stepped-idler";
        stepDiameter: number;
        idlerLargeDiameter: number;
        idlerSmallDiameter: number;
        rimDiameter: number;
      }
    | { drive: "belt"; pulleyDiameter: number; drivenDiameter: number; beltThickness: number }
    | { drive: "capstan"; stages: readonly CapstanStage[]; capstanDiameter: number }
  );

/** One size of the drive: `field` is its path in the input. */
export type DriveSize = { field: string; mm: number };
/** One shaft turning the next, by touch (thickness 0) or by belt. Pitch diameters are the metal's plus the thickness. */
export type DriveStage = { driver: DriveSize; driven: DriveSize; thickness: DriveSize };

function diameter(field: string, mm: number): DriveSize {
  requireWithin(field, mm, ...speedBounds.diameterMm);
  return { field, mm };
}

function stage(driver: DriveSize, driven: DriveSize, field = "", mm = 0): DriveStage {
  if (mm !== 0) requireWithin(field, mm, ...speedBounds.thicknessMm);
  return { driver, driven, thickness: { field, mm } };
}

export type DriveTrain = { stages: DriveStage[]; capstan?: DriveSize; cancels: string[] };

/**
 * The stages from the motor to the platter or the capstan, the capstan itself, and the sizes that cancel.
 *
 * A plain idler cancels whatever its size, since the tread that the step turns is the tread that turns the rim.
 * Limits: diameters 0.1 to 5000 mm, thickness 0 to 50 mm, 1 to 8 stages; else DomainError on the field.
 */
export function driveTrain(input: SpeedInput): DriveTrain {
  switch (input.drive) {
    case "rim": {
      const { idlerDiameter } = input;
      if (idlerDiameter !== undefined) diameter("idlerDiameter", idlerDiameter);
      const [step, rim] = [diameter("stepDiameter", input.stepDiameter), diameter("rimDiameter", input.rimDiameter)];
      return { stages: [stage(step, rim)], cancels: ["idlerDiameter"] };
    }
    case "stepped-idler": {
      const step = diameter("stepDiameter", input.stepDiameter);
      const large = diameter("idlerLargeDiameter", input.idlerLargeDiameter);
      const small = diameter("idlerSmallDiameter", input.idlerSmallDiameter);
      return { stages: [stage(step, large), stage(small, diameter("rimDiameter", input.rimDiameter))], cancels: [] };
    }
    case "belt": {
      const pulley = diameter("pulleyDiameter", input.pulleyDiameter);
      const driven = diameter("drivenDiameter", input.drivenDiameter);
      return { stages: [stage(pulley, driven, "beltThickness", input.beltThickness)], cancels: [] };
    }
    case "capstan": {
      requireWithin("stages", input.stages.length, ...speedBounds.stages, "stages");
      const stages = input.stages.map(({ driver, driven, beltThickness }, i) => {
        const at = (name: string) => `stages/${i}/${name}`;
        const turned = diameter(at("driven"), driven);
        return stage(diameter(at("driver"), driver), turned, at("beltThickness"), beltThickness);
      });
      return { stages, capstan: diameter("capstanDiameter", input.capstanDiameter), cancels: [] };
    }
    default:
      throw new DomainError("drive", "Choose a rim drive, a stepped idler, a belt or a capstan.");
  }
}
