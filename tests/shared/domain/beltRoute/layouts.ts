import type { BeltRouteInput, BeltWrap, Pulley } from "#shared/domain/beltRoute";

/** A pulley; inside unless it is said. */
export const pulley = (x: number, y: number, diameter: number, wrap: BeltWrap = "inside"): Pulley => ({
  x,
  y,
  diameter,
  wrap,
});

/** A question with pulleys alone: a belt without thickness, not stretched. */
export const route = (pulleys: readonly Pulley[], thickness = 0, min = 0, max = min): BeltRouteInput => ({
  pulleys,
  thickness,
  stretchPercent: { min, max },
});

/** Layouts that close, with back pulleys and without: drawn by hand for these tests. */
export const layouts: Record<string, Pulley[]> = {
  "four inside": [pulley(0, 0, 30), pulley(150, 10, 50), pulley(140, 120, 24), pulley(10, 100, 60)],
  "one on the back": [pulley(0, 0, 11), pulley(74, -24, 16, "back"), pulley(168, -2, 84), pulley(78, 88, 28)],
  "two and an idler": [pulley(0, 0, 12), pulley(70, -35, 20, "back"), pulley(180, 0, 150)],
  "five inside, three on the back": [
    pulley(0, 0, 40),
    pulley(60, 24, 14, "back"),
    pulley(120, -6, 30),
    pulley(200, 20, 24),
    pulley(150, 60, 18, "back"),
    pulley(190, 110, 44),
    pulley(80, 88, 16, "back"),
    pulley(10, 120, 26),
  ],
};
