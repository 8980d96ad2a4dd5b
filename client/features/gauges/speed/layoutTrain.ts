import type { SpeedInput } from "#shared/domain/driveTrain";

/** What a wheel is drawn as: a rim is an open ring, `presumed` is there but nothing says how large. */
type WheelLook = "metal" | "rubber" | "rim" | "presumed";
export type Wheel = {
  x: number;
  y: number;
  r: number;
  look: WheelLook;
  /** The size that is its diameter, by its path in the computation; none for what no size was given of. */
  field?: string;
  /** Its shaft among those whose speed is worked out, the motor's being 0; none for an idler that cancels. */
  shaft?: number;
};
export type TrainBelt = { from: Wheel; to: Wheel; thickness: number; field: string };
/** Wheels in mm, as seen along the shafts; y downwards. */
export type Train = { wheels: Wheel[]; belts: TrainBelt[]; tape?: { y: number; left: number; right: number } };

type At = { x: number; y: number };
const along = ({ x, y }: At, degrees: number, distance: number): At => {
  const angle = (degrees * Math.PI) / 180;
  return { x: x + Math.cos(angle) * distance, y: y + Math.sin(angle) * distance };
};

type RimDrive = Extract<SpeedInput, { drive: "rim" | "stepped-idler" }>;

/** Inside the platter's rim where there is room, as in most machines; else outside it. */
function layOutRim(input: RimDrive): Train {
  const step = input.stepDiameter / 2;
  const rim = input.rimDiameter / 2;
  const plain = input.drive === "rim";
  const guessed = Math.max(rim * 0.16, step * 2);
  const driving = plain ? (input.idlerDiameter ?? guessed * 2) / 2 : input.idlerSmallDiameter / 2;
  const turned = plain ? driving : input.idlerLargeDiameter / 2;
  const centre = { x: 0, y: 0 };
  const fitsInside = turned < rim * 0.42 && step < rim * 0.25 && driving < rim * 0.42;
  const idler = along(centre, fitsInside ? 155 : 180, fitsInside ? rim - driving : rim + driving);
  const motor = along(idler, fitsInside ? -12 : 180, turned + step);
  const motorStep: Wheel = { ...motor, r: step, look: "metal", field: "stepDiameter", shaft: 0 };
  const platter: Wheel = { ...centre, r: rim, look: "rim", field: "rimDiameter", shaft: plain ? 1 : 2 };
  if (plain) {
    const look = input.idlerDiameter === undefined ? "presumed" : "rubber";
    return { wheels: [platter, { ...idler, r: driving, look, field: "idlerDiameter" }, motorStep], belts: [] };
  }
  const tread = (field: string, r: number): Wheel => ({ ...idler, r, look: "rubber", field, shaft: 1 });
  const treads = [tread("idlerLargeDiameter", turned), tread("idlerSmallDiameter", driving)];
  treads.sort((one, other) => other.r - one.r);
  // The larger tread lies below the rim that the smaller one runs in.
  return { wheels: [treads[0]!, platter, treads[1]!, motorStep], belts: [] };
}

function layOutBelt(input: Extract<SpeedInput, { drive: "belt" }>): Train {
  const [from, to] = [input.pulleyDiameter / 2, input.drivenDiameter / 2];
  const thickness = input.beltThickness;
  const apart = from + to + 2 * thickness + 0.3 * Math.max(from, to);
  const driver: Wheel = { x: -apart, y: 0, r: from, look: "metal", field: "pulleyDiameter", shaft: 0 };
  const driven: Wheel = { x: 0, y: 0, r: to, look: "metal", field: "drivenDiameter", shaft: 1 };
  return { wheels: [driven, driver], belts: [{ from: driver, to: driven, thickness, field: "beltThickness" }] };
}

function layOutCapstan({ stages, capstanDiameter }: Extract<SpeedInput, { drive: "capstan" }>): Train {
  const wheels: Wheel[] = [];
  const belts: TrainBelt[] = [];
  let at: At = { x: 0, y: 0 };
  let before = 0;
  for (const [i, { driver, driven, beltThickness: thickness = 0 }] of stages.entries()) {
    const [from, to] = [driver / 2, driven / 2];
    // A belt may be as long as it needs to keep its wheels clear; wheels that touch stand where they must.
    const clear = Math.max(from, before) + to + 2 * thickness + 0.25 * Math.max(from, to);
    const apart = thickness > 0 ? clear : from + to;
    const next = along(at, stages.length < 3 ? 0 : i % 2 === 0 ? -28 : 28, apart);
    const one: Wheel = { ...at, r: from, look: "metal", field: `stages/${i}/driver`, shaft: i };
    const other: Wheel = { ...next, r: to, look: "metal", field: `stages/${i}/driven`, shaft: i + 1 };
    wheels.push(one, other);
    if (thickness > 0) belts.push({ from: one, to: other, thickness, field: `stages/${i}/beltThickness` });
    [at, before] = [next, to];
  }
  const r = capstanDiameter / 2;
  const reach = Math.max(before, r * 4) * 1.25;
  const y = at.y - r;
  const roller: Wheel = { x: at.x, y: y - 2.2 * r, r: 2.2 * r, look: "presumed" };
  wheels.sort((one, other) => other.r - one.r);
  wheels.push(roller, { ...at, r, look: "metal", field: "capstanDiameter", shaft: stages.length });
  return { wheels, belts, tape: { y, left: at.x - reach, right: at.x + reach } };
}

/** Where the wheels of a drive stand, drawn to scale; distances between shafts are not measured and suit the sheet. */
export function layoutTrain(input: SpeedInput): Train {
  switch (input.drive) {
    case "rim":
    case "stepped-idler":
      return layOutRim(input);
    case "belt":
      return layOutBelt(input);
    case "capstan":
      return layOutCapstan(input);
  }
}

export type TrainBox = { left: number; top: number; right: number; bottom: number };

/** The platter is a little larger than its rim. */
export const platterMargin = 1.05;

export function boxOfTrain({ wheels, belts, tape }: Train): TrainBox {
  const thickest = Math.max(0, ...belts.map(({ thickness }) => thickness));
  const reach = ({ r, look }: Wheel) => (look === "rim" ? r * platterMargin : r + thickest);
  return {
    left: Math.min(...wheels.map((wheel) => wheel.x - reach(wheel)), tape?.left ?? Infinity),
    right: Math.max(...wheels.map((wheel) => wheel.x + reach(wheel)), tape?.right ?? -Infinity),
    top: Math.min(...wheels.map((wheel) => wheel.y - reach(wheel))),
    bottom: Math.max(...wheels.map((wheel) => wheel.y + reach(wheel))),
  };
}
