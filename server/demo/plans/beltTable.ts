import { type MechanismPlan, wheel } from "./MechanismPlan";

export const beltTable: MechanismPlan = {
  driveTrain: "Motor pulley, flat belt, sub-platter. Pulley and belt thickness together set the speed.",
  map: {
    widthMm: 330,
    heightMm: 270,
    wheels: [
      wheel("subplatter", "platter", "Sub-platter", [150, 135], 165),
      wheel("motor", "motor", "Motor pulley", [282, 50], 14),
    ],
    belts: [{ wheels: ["motor", "subplatter"], label: "platter belt" }],
  },
  points: [
    {
      name: "platter belt",
      kind: "flat-belt",
      note: "Drawn over motor pulley and sub-platter.",
      at: [236, 74],
      sizes: { insideCircumference: [560, 640, 1], width: [4, 6, 0.5], thickness: [0.8, 1.2, 0.1] },
    },
    {
      name: "motor mount",
      kind: "motor-mount",
      note: "Keeps the hum of the motor from the plinth.",
      at: [300, 28],
      sizes: {
        outsideDiameter: [14, 20, 0.5],
        insideDiameter: [5, 7, 0.5],
        grooveDiameter: [10, 13, 0.5],
        grooveWidth: [1.5, 2.5, 0.1],
        height: [9, 13, 0.5],
      },
    },
  ],
};
