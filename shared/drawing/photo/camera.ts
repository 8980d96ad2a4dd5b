import type { Point } from "../Scene";

/** A camera that looks down on the bench at a slant, without perspective. */
export type Camera = {
  /** px to the mm, along the picture's width. */
  pxPerMm: number;
  /** Where the bench's origin lies in the picture, px. */
  centre: Point;
  /** By how much the subject is turned on the bench, radians. */
  turn: number;
};

/** Sine and cosine of the camera's height, about 52 degrees over the bench. */
export const foreshortening = 0.79;
export const rise = 0.61;

/** Where a point of the bench (mm; x to the right, y towards the viewer, z up) lies in the picture, px. */
export function project({ pxPerMm, centre, turn }: Camera, x: number, y: number, z: number): Point {
  const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
  const [across, near] = [x * cos - y * sin, x * sin + y * cos];
  return { x: centre.x + across * pxPerMm, y: centre.y + (near * foreshortening - z * rise) * pxPerMm };
}
