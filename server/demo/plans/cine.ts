import { type MechanismPlan, wheel } from "./MechanismPlan";

export const cine: MechanismPlan = {
  driveTrain: "Motor, drive belt to the shutter shaft; belts to both spools.",
  map: {
    widthMm: 220,
    heightMm: 300,
    wheels: [
      wheel("feedspool", "reel", "Feed spool", [96, 62], 84),
      wheel("takeup", "reel", "Take-up spool", [120, 240], 84),
      wheel("shaft", "pulley", "Shutter shaft", [120, 150], 40),
      wheel("motor", "motor", "Motor", [190, 168], 16),
    ],
    belts: [
      { wheels: ["motor", "shaft"], label: "drive belt" },
      { wheels: ["shaft", "takeup"], label: "take-up belt" },
    ],
  },
  points: [
    {
      name: "drive belt",
      kind: "round-belt",
      note: "Motor to shutter shaft.",
      at: [160, 184],
      sizes: { insideCircumference: [210, 270, 1], section: [3, 4.5, 0.1] },
    },
    {
      name: "take-up belt",
      kind: "round-belt",
      note: "Shaft to take-up spool.",
      at: [86, 196],
      sizes: { insideCircumference: [330, 410, 1], section: [2.5, 4, 0.1] },
    },
    {
      name: "inching ring",
      kind: "drive-ring",
      note: "On the inching knob's roller.",
      at: [150, 128],
      sizes: { insideDiameter: [20, 30, 0.1], section: [2.5, 4, 0.1] },
    },
    {
      name: "spool clutch",
      kind: "clutch-felt",
      note: "Lets the full spool slip.",
      at: [120, 240],
      sizes: { outsideDiameter: [20, 30, 0.5], insideDiameter: [6, 9, 0.5], thickness: [1.5, 2.5, 0.1] },
    },
  ],
};
