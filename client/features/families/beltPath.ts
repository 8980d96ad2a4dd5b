import { beltOutline } from "#shared/domain/beltOutline";
import { beltTangents } from "#shared/domain/beltTangents";
import type { DriveMap } from "#shared/schemas/catalogue";

type Wheel = DriveMap["wheels"][number];

/** The wheels in the order in which a belt around all of them comes by. */
export function inBeltOrder(wheels: readonly Wheel[]): Wheel[] {
  const mean = (of: (wheel: Wheel) => number) => wheels.reduce((sum, wheel) => sum + of(wheel), 0) / wheels.length;
  const [x, y] = [mean(({ xMm }) => xMm), mean(({ yMm }) => yMm)];
  const around = ({ xMm, yMm }: Wheel) => Math.atan2(yMm - y, xMm - x);
  return [...wheels].sort((a, b) => around(a) - around(b));
}

/**
 * The outline of a belt around its wheels, as an SVG path in mm; empty where one wheel lies within another.
 * A sketch for the eye: every wheel is taken as inside the belt, so belts that bend backwards are not shown as they run.
 */
export function beltPath(wheels: readonly Wheel[]): string {
  if (wheels.length < 2) return "";
  const contacts = beltTangents(
    inBeltOrder(wheels).map(({ xMm, yMm, diameterMm }) => ({ x: xMm, y: yMm, radius: diameterMm / 2, turn: 1 })),
  );
  return contacts ? beltOutline(contacts) : "";
}
