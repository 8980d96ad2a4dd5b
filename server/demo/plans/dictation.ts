import { type MechanismPlan, wheel } from "./MechanismPlan";

export const dictation: MechanismPlan = {
  driveTrain: "Motor, round belt to the turntable; ringed rollers feed the arm.",
  map: {
    widthMm: 220,
    heightMm: 180,
    wheels: [
      wheel("motor", "motor", "Motor", [34, 142], 12),
      wheel("table", "platter", "Turntable", [128, 86], 120),
      wheel("feed", "pulley", "Feed roller", [192, 146], 24),
    ],
    belts: [{ wheels: ["motor", "table"], label: "drive belt" }],
  },
  points: [
    {
      name: "drive belt",
      kind: "round-belt",
      note: "Motor to turntable.",
      at: [62, 126],
      sizes: { insideCircumference: [340, 440, 1], section: [2, 3.2, 0.1] },
    },
    {
      name: "feed ring",
      kind: "drive-ring",
      note: "On the feed roller; two of them.",
      at: [192, 146],
      sizes: { insideDiameter: [16, 24, 0.1], section: [2, 3, 0.1] },
    },
    {
      name: "motor mount",
      kind: "motor-mount",
      note: "Two of them.",
      at: [18, 164],
      sizes: {
        outsideDiameter: [10, 14, 0.5],
        insideDiameter: [3, 5, 0.5],
        grooveDiameter: [7, 9, 0.5],
        grooveWidth: [1, 1.6, 0.1],
        height: [6, 9, 0.5],
      },
    },
  ],
};
