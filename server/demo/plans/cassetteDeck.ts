import { type MechanismPlan, wheel } from "./MechanismPlan";

export const cassetteDeck: MechanismPlan = {
  driveTrain: "Motor, main belt to the flywheel; a tyred idler between the reels.",
  map: {
    widthMm: 160,
    heightMm: 130,
    wheels: [
      wheel("motor", "motor", "Motor", [25, 100], 10),
      wheel("flywheel", "flywheel", "Flywheel", [96, 92], 52),
      wheel("capstan", "capstan", "Capstan", [96, 92], 3),
      wheel("idler", "idler", "Reel idler", [80, 42], 16),
      wheel("supply", "reel", "Supply", [52, 32], 22),
      wheel("takeup", "reel", "Take-up", [110, 32], 22),
    ],
    belts: [{ wheels: ["motor", "flywheel"], label: "main belt" }],
  },
  points: [
    {
      name: "main belt",
      kind: "square-belt",
      note: "Motor to flywheel.",
      at: [58, 112],
      sizes: { insideCircumference: [180, 270, 1], section: [1, 1.6, 0.1] },
    },
    {
      name: "reel idler tyre",
      kind: "drive-ring",
      note: "Pressed on the idler hub.",
      at: [80, 42],
      sizes: { insideDiameter: [8, 13, 0.1], section: [1.5, 2.5, 0.1] },
    },
    {
      name: "pinch roller",
      kind: "pinch-roller",
      note: "Small, with a plastic or brass bush.",
      at: [110, 70],
      sizes: { outsideDiameter: [8, 14, 0.1], bore: [2, 3, 0.5], treadWidth: [6, 9, 0.5], overallHeight: [8, 12, 0.5] },
    },
    {
      name: "counter belt",
      kind: "square-belt",
      note: "Take-up to counter.",
      at: [134, 18],
      sizes: { insideCircumference: [90, 140, 1], section: [0.8, 1.2, 0.1] },
    },
  ],
};
