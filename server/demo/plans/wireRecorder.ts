import { type MechanismPlan, wheel } from "./MechanismPlan";

export const wireRecorder: MechanismPlan = {
  driveTrain: "Motor step, drive idler, take-up drum. Head and drum oscillate by a cam.",
  map: {
    widthMm: 250,
    heightMm: 200,
    wheels: [
      wheel("motor", "motor", "Motor", [72, 152], 14),
      wheel("idler", "idler", "Drive idler", [101, 134], 54),
      wheel("drum", "reel", "Take-up drum", [166, 92], 100),
      wheel("spool", "reel", "Supply spool", [52, 62], 70),
    ],
    belts: [],
  },
  points: [
    {
      name: "drive idler",
      kind: "idler-wheel",
      note: "Between motor and drum.",
      at: [101, 134],
      sizes: {
        outsideDiameter: [50, 60, 0.1],
        bore: [5, 8, 0.5],
        treadWidth: [6, 9, 0.5],
        overallHeight: [12, 18, 0.5],
      },
    },
    {
      name: "rewind wheel",
      kind: "idler-wheel",
      note: "Drives the spool back.",
      at: [70, 106],
      sizes: {
        outsideDiameter: [34, 42, 0.1],
        bore: [4, 6, 0.5],
        treadWidth: [5, 7, 0.5],
        overallHeight: [10, 14, 0.5],
      },
    },
    {
      name: "spool brake",
      kind: "brake-pad",
      note: "Cork block on the spool flange.",
      at: [24, 30],
      sizes: { length: [14, 22, 0.5], width: [7, 11, 0.5], thickness: [3, 6, 0.1] },
    },
  ],
};
