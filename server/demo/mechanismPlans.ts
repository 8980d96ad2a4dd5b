import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import type { DriveMap } from "#shared/schemas/catalogue";

type Range = readonly [low: number, high: number, step: number];

/** A service point of a plan: where it sits, and between which sizes families differ. */
export type PlannedPoint = {
  name: string;
  kind: PartKind;
  note: string;
  at: readonly [xMm: number, yMm: number];
  sizes: Partial<Record<DimensionName, Range>>;
};
export type MechanismPlan = { driveTrain: string; map: DriveMap; points: readonly PlannedPoint[] };

const wheel = (
  id: string,
  role: DriveMap["wheels"][number]["role"],
  label: string,
  [xMm, yMm]: readonly [number, number],
  diameterMm: number,
): DriveMap["wheels"][number] => ({ id, role, label, xMm, yMm, diameterMm });

const changer: MechanismPlan = {
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

const beltTable: MechanismPlan = {
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

const reelDeck: MechanismPlan = {
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

const cassetteDeck: MechanismPlan = {
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

const wireRecorder: MechanismPlan = {
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

const dictation: MechanismPlan = {
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

const cine: MechanismPlan = {
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

export const mechanismPlans = {
  changer,
  "belt-table": beltTable,
  "reel-deck": reelDeck,
  "cassette-deck": cassetteDeck,
  "wire-recorder": wireRecorder,
  dictation,
  cine,
} as const;
export type PlanName = keyof typeof mechanismPlans;
