import { type MechanismPlan, wheel } from "./MechanismPlan";

export const reelDeck: MechanismPlan = {
  driveTrain:
    "Motor, capstan belt to the flywheel; idlers to the reels. Capstan diameter and flywheel ratio set the speed.",
  map: {
    widthMm: 360,
    heightMm: 300,
    wheels: [
      wheel("supply", "reel", "Supply reel", [95, 95], 92),
      wheel("takeup", "reel", "Take-up reel", [265, 95], 92),
      wheel("motor", "motor", "Motor pulley", [120, 235], 16),
      wheel("flywheel", "flywheel", "Flywheel", [232, 222], 88),
      wheel("capstan", "capstan", "Capstan", [232, 222], 8),
      wheel("pinch", "pinch-roller", "Pinch roller", [232, 207], 22),
      wheel("idler", "idler", "Take-up idler", [248, 159], 42),
      wheel("counter", "pulley", "Counter", [180, 48], 18),
    ],
    belts: [
      { wheels: ["motor", "flywheel"], label: "capstan belt" },
      { wheels: ["supply", "counter"], label: "counter belt" },
    ],
  },
  points: [
    {
      name: "capstan belt",
      kind: "flat-belt",
      note: "Motor to flywheel.",
      at: [172, 250],
      sizes: { insideCircumference: [330, 460, 1], width: [4, 8, 0.5], thickness: [0.6, 1.2, 0.1] },
    },
    {
      name: "pinch roller",
      kind: "pinch-roller",
      note: "Holds the tape on the capstan. Must be true.",
      at: [214, 196],
      sizes: {
        outsideDiameter: [18, 32, 0.1],
        bore: [4, 8, 0.5],
        treadWidth: [8, 14, 0.5],
        overallHeight: [12, 20, 0.5],
      },
    },
    {
      name: "take-up idler",
      kind: "idler-wheel",
      note: "Drives the take-up reel in play.",
      at: [248, 159],
      sizes: {
        outsideDiameter: [36, 46, 0.1],
        bore: [3, 6, 0.5],
        treadWidth: [4, 7, 0.5],
        overallHeight: [9, 14, 0.5],
      },
    },
    {
      name: "rewind idler",
      kind: "idler-wheel",
      note: "Swings to the supply reel.",
      at: [112, 165],
      sizes: {
        outsideDiameter: [22, 30, 0.1],
        bore: [3, 5, 0.5],
        treadWidth: [4, 6, 0.5],
        overallHeight: [8, 12, 0.5],
      },
    },
    {
      name: "counter belt",
      kind: "round-belt",
      note: "Supply reel to counter.",
      at: [134, 62],
      sizes: { insideCircumference: [190, 290, 1], section: [1.2, 2, 0.1] },
    },
    {
      name: "supply brake",
      kind: "brake-pad",
      note: "Felt on the rim of the supply table.",
      at: [48, 132],
      sizes: { length: [12, 20, 0.5], width: [6, 10, 0.5], thickness: [2, 4, 0.1] },
    },
    {
      name: "take-up clutch",
      kind: "clutch-felt",
      note: "Slips so that the tape is not stretched.",
      at: [265, 95],
      sizes: { outsideDiameter: [30, 45, 0.5], insideDiameter: [8, 14, 0.5], thickness: [1.5, 3, 0.1] },
    },
  ],
};
