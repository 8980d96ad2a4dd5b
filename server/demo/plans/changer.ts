import { type MechanismPlan, wheel } from "./MechanismPlan";

export const changer: MechanismPlan = {
  driveTrain:
    "Motor step, platter idler, inside of the platter rim. The idler's diameter cancels: the step sets the speed.",
  map: {
    widthMm: 330,
    heightMm: 270,
    wheels: [
      wheel("platter", "platter", "Platter", [150, 135], 254),
      wheel("motor", "motor", "Motor", [251, 66], 12),
      wheel("idler", "idler", "Platter idler", [240, 92], 44),
      wheel("clutch", "clutch", "Cycle gear", [95, 190], 56),
    ],
    belts: [],
  },
  points: [
    {
      name: "platter idler",
      kind: "idler-wheel",
      note: "Carries the motor step to the rim.",
      at: [240, 92],
      sizes: {
        outsideDiameter: [40, 52, 0.05],
        bore: [3, 6, 0.5],
        treadWidth: [5, 8, 0.5],
        overallHeight: [10, 15, 0.5],
      },
    },
    {
      name: "motor mount",
      kind: "motor-mount",
      note: "Three of them. Replace all at once.",
      at: [278, 40],
      sizes: {
        outsideDiameter: [12, 18, 0.5],
        insideDiameter: [4, 6, 0.5],
        grooveDiameter: [8, 11, 0.5],
        grooveWidth: [1.2, 2, 0.1],
        height: [8, 12, 0.5],
      },
    },
    {
      name: "trip clutch",
      kind: "clutch-felt",
      note: "Slips when a record is lifted too early.",
      at: [95, 190],
      sizes: { outsideDiameter: [18, 28, 0.5], insideDiameter: [6, 10, 0.5], thickness: [1, 2.5, 0.1] },
    },
    {
      name: "cycle drive ring",
      kind: "drive-ring",
      note: "Turns the cycle gear against the hub of the platter.",
      at: [122, 165],
      sizes: { insideDiameter: [14, 22, 0.1], section: [2, 3.5, 0.1] },
    },
    {
      name: "stop brake",
      kind: "brake-pad",
      note: "Holds the platter still at the end.",
      at: [62, 62],
      sizes: { length: [10, 16, 0.5], width: [5, 9, 0.5], thickness: [2, 4, 0.1] },
    },
  ],
};
