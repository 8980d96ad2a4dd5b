import type { ServicePoint } from "#shared/schemas/catalogue";

type Spot = { dx: number; dy: number };
const room = 32;

const directions = [
  [0, 0],
  [1, 0],
  [0, 1],
  [-1, 0],
  [0, -1],
  [1, 1],
  [-1, 1],
  [-1, -1],
  [1, -1],
] as const;

/** Where the number of each service point stands, px from its place, so that no two cover each other. */
export function numberPlaces(
  points: readonly Pick<ServicePoint, "id" | "xMm" | "yMm">[],
  scale: number,
): Map<string, Spot> {
  const taken: { x: number; y: number }[] = [];
  const places = new Map<string, Spot>();
  for (const { id, xMm, yMm } of points) {
    const spots = [0, 1, 2, 3].flatMap((ring) =>
      directions.map(([x, y]) => ({ dx: x * room * ring, dy: y * room * ring })),
    );
    const free = spots.find(({ dx, dy }) =>
      taken.every((other) => Math.hypot(xMm * scale + dx - other.x, yMm * scale + dy - other.y) >= room),
    );
    const spot = free ?? { dx: 0, dy: 0 };
    taken.push({ x: xMm * scale + spot.dx, y: yMm * scale + spot.dy });
    places.set(id, spot);
  }
  return places;
}
