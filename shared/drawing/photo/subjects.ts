import type { PartKind } from "#shared/domain/partKinds";
import { isRoundRing } from "../parts/driveRing";
import type { PartSizes } from "../parts/PartSizes";
import type { Camera } from "./camera";
import type { PhotoCanvas } from "./PhotoCanvas";
import { paintBlock } from "./paintBlock";
import { circleLoop, fallenLoop, paintCord } from "./paintLoop";
import { paintCylinder, paintHole, paintShadow, paintSheen } from "./paintSolids";
import { paintSpecks } from "./paintSpecks";

export type SubjectContext = { canvas: PhotoCanvas; body: string; metal: string; paper: string; chance: () => number };
/** What is photographed: how far it reaches over the bench and up, mm, and how it is painted. */
export type Subject = { reach: number; height: number; paint: (camera: Camera) => void };

/** The part as it lies or stands on the bench. */
export function subjectOf(kind: PartKind, sizes: PartSizes, context: SubjectContext): Subject {
  switch (kind) {
    case "idler-wheel":
      return wheel(sizes, context);
    case "pinch-roller":
      return roller(sizes, context);
    case "flat-belt":
      return belt(sizes, context, sizes.or("thickness", 0.8), sizes.or("width", 5), false);
    case "square-belt":
      return belt(sizes, context, sizes.or("section", 2), sizes.or("section", 2), false);
    case "round-belt":
      return belt(sizes, context, sizes.or("section", 2), sizes.or("section", 2), true);
    case "drive-ring":
      return ring(sizes, context);
    case "motor-mount":
      return mount(sizes, context);
    case "brake-pad":
      return pad(sizes, context);
    case "clutch-felt":
      return felt(sizes, context);
  }
}

function wheel(sizes: PartSizes, { canvas, body, metal, paper }: SubjectContext): Subject {
  const outer = sizes.or("outsideDiameter", 44) / 2;
  const bore = sizes.or("bore", outer * 0.18) / 2;
  const tread = sizes.or("treadWidth", outer * 0.26);
  const height = Math.max(sizes.or("overallHeight", tread * 1.6), tread);
  const rim = outer - Math.min(outer * 0.15, (outer - bore) * 0.35);
  const hub = Math.min(bore * 2.2, (bore + rim) / 2);
  const [low, high] = [(height - tread) / 2, (height + tread) / 2];
  const plate = low + tread * 0.62;
  const second = sizes.known("secondTreadDiameter");
  const paint = (camera: Camera) => {
    paintShadow(canvas, camera, outer, high);
    paintCylinder(canvas, camera, { radius: outer, from: low, to: high, colour: body });
    paintHole(canvas, camera, { radius: rim, from: plate, to: high, colour: body }, metal);
    paintCylinder(canvas, camera, { radius: rim * 0.985, from: plate, to: plate, colour: metal });
    paintSheen(canvas, camera, rim * 0.985, plate);
    if (second && second / 2 < rim) {
      const top = plate + tread * 0.9;
      paintCylinder(canvas, camera, { radius: second / 2, from: plate, to: top, colour: body });
      const inner = Math.max(second / 2 - outer * 0.1, hub);
      paintCylinder(canvas, camera, { radius: inner, from: top, to: top, colour: metal });
      paintSheen(canvas, camera, inner, top);
    }
    const end = Math.max(height, second ? plate + tread : 0);
    paintCylinder(canvas, camera, { radius: hub, from: plate, to: end, colour: metal });
    paintHole(canvas, camera, { radius: bore, from: 0, to: end, colour: metal }, paper);
  };
  return { reach: outer, height, paint };
}

function roller(sizes: PartSizes, { canvas, body, metal, paper }: SubjectContext): Subject {
  const outer = sizes.or("outsideDiameter", 12) / 2;
  const bore = sizes.or("bore", outer * 0.4) / 2;
  const tread = sizes.or("treadWidth", outer * 1.6);
  const height = Math.max(sizes.or("overallHeight", tread * 1.1), tread);
  const core = bore + (outer - bore) * 0.4;
  const low = (height - tread) / 2;
  const paint = (camera: Camera) => {
    paintShadow(canvas, camera, outer, height);
    paintCylinder(canvas, camera, { radius: outer, from: low, to: low + tread, colour: body });
    paintCylinder(canvas, camera, { radius: core, from: low + tread, to: height, colour: metal });
    paintSheen(canvas, camera, core, height);
    paintHole(canvas, camera, { radius: bore, from: 0, to: height, colour: metal }, paper);
  };
  return { reach: outer, height, paint };
}

function belt(
  sizes: PartSizes,
  { canvas, body, chance }: SubjectContext,
  thick: number,
  tall: number,
  round: boolean,
): Subject {
  const length = sizes.or("insideCircumference", 300);
  const loop = fallenLoop(length, chance);
  const reach = Math.max(...loop.map((p) => Math.hypot(p.x, p.y)));
  return {
    reach,
    height: tall,
    paint: (camera) => paintCord(canvas, camera, { loop, colour: body, thick, tall, round }),
  };
}

function ring(sizes: PartSizes, context: SubjectContext): Subject {
  const { canvas, body, paper } = context;
  const inner = sizes.or("insideDiameter", 40) / 2;
  const side = sizes.or("section", inner * 0.12);
  if (isRoundRing(sizes)) {
    const loop = circleLoop(inner + side / 2);
    const paint = (camera: Camera) =>
      paintCord(canvas, camera, { loop, colour: body, thick: side, tall: side, round: true });
    return { reach: inner + side, height: side, paint };
  }
  const wide = sizes.or("width", sizes.or("height", side));
  const outer = inner + sizes.or("height", wide);
  return { reach: outer, height: wide, paint: (camera) => paintTube(context, camera, outer, inner, wide, body, paper) };
}

function paintTube(
  { canvas }: SubjectContext,
  camera: Camera,
  outer: number,
  inner: number,
  tall: number,
  colour: string,
  paper: string,
): void {
  paintShadow(canvas, camera, outer, tall);
  paintCylinder(canvas, camera, { radius: outer, from: 0, to: tall, colour });
  paintHole(canvas, camera, { radius: inner, from: 0, to: tall, colour }, paper);
}

function mount(sizes: PartSizes, { canvas, body, paper }: SubjectContext): Subject {
  const outer = sizes.or("outsideDiameter", 15) / 2;
  const inner = sizes.or("insideDiameter", outer * 0.8) / 2;
  const neck = Math.min(Math.max(sizes.or("grooveDiameter", outer + inner) / 2, inner), outer);
  const height = sizes.or("height", outer * 1.2);
  const slot = Math.min(sizes.or("grooveWidth", height * 0.3), height);
  const flange = (height - slot) / 2;
  const paint = (camera: Camera) => {
    paintShadow(canvas, camera, outer, height);
    paintCylinder(canvas, camera, { radius: outer, from: 0, to: flange, colour: body });
    paintCylinder(canvas, camera, { radius: neck, from: flange, to: flange + slot, colour: body, gloss: 0.5 });
    paintCylinder(canvas, camera, { radius: outer, from: flange + slot, to: height, colour: body });
    paintHole(canvas, camera, { radius: inner, from: 0, to: height, colour: body }, paper);
  };
  return { reach: outer, height, paint };
}

function pad(sizes: PartSizes, { canvas, body, chance }: SubjectContext): Subject {
  const [long, wide] = [sizes.or("length", 20), sizes.or("width", 8)];
  const tall = sizes.or("thickness", 3);
  const reach = Math.hypot(long, wide) / 2;
  const paint = (camera: Camera) => {
    paintBlock(canvas, camera, long, wide, tall, body);
    paintSpecks(canvas, camera, body, tall, chance, () => [(chance() - 0.5) * long, (chance() - 0.5) * wide]);
  };
  return { reach, height: tall, paint };
}

function felt(sizes: PartSizes, context: SubjectContext): Subject {
  const { canvas, body, paper, chance } = context;
  const outer = sizes.or("outsideDiameter", 25) / 2;
  const inner = Math.min(sizes.or("insideDiameter", outer * 0.8) / 2, outer * 0.97);
  const tall = sizes.or("thickness", 2);
  const paint = (camera: Camera) => {
    paintTube(context, camera, outer, inner, tall, body, paper);
    paintSpecks(canvas, camera, body, tall, chance, () => {
      const [r, a] = [inner + (outer - inner) * (0.04 + 0.92 * chance()), chance() * Math.PI * 2];
      return [r * Math.cos(a), r * Math.sin(a)];
    });
  };
  return { reach: outer, height: tall, paint };
}
