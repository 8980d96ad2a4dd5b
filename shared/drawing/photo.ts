import type { PartKind } from "#shared/domain/partKinds";
import { PartSizes, type StatedDimensions } from "./parts/PartSizes";
import { foreshortening, rise } from "./photo/camera";
import { PhotoCanvas } from "./photo/PhotoCanvas";
import { benchLooks, paintBench, paintVignette } from "./photo/paintBench";
import { paintRule } from "./photo/paintRule";
import { bodyColour, metalColours } from "./photo/photoColours";
import { seededChance } from "./photo/seededChance";
import { subjectOf } from "./photo/subjects";
import { tint } from "./photo/tint";

export type DemoPhotoRequest = {
  kind: PartKind;
  dims: StatedDimensions;
  material?: string | undefined;
  /** Any whole number; the same seed gives the same picture. It picks one of four benches. */
  seed: number;
  /** By how much the part is turned on the bench, degrees. */
  angle?: number | undefined;
};

const picture = { width: 960, height: 720 };
/** Room for the part over the rule, px. */
const room = { width: 620, height: 430, middle: 300 };

/**
 * A picture for the demonstration, as SVG of 960 by 720 px: the part on a bench beside a steel rule, to scale.
 * It is drawn from the part's own numbers and photographs nothing.
 */
export function drawDemoPhoto({ kind, dims, material, seed, angle = 0 }: DemoPhotoRequest): string {
  const chance = seededChance(seed);
  const look = Math.abs(Math.trunc(seed)) % benchLooks.length;
  const bench = benchLooks[look]!;
  const canvas = new PhotoCanvas();
  paintBench(canvas, bench, picture.width, picture.height, chance);

  const subject = subjectOf(kind, new PartSizes(dims, {}), {
    canvas,
    body: bodyColour(kind, material, look),
    metal: metalColours[Math.floor(chance() * metalColours.length)]!,
    paper: tint(bench.ground, 0.9),
    chance,
  });
  const tall = subject.reach * 2 * foreshortening + subject.height * rise;
  const pxPerMm = Math.min(room.width / (subject.reach * 2), room.height / tall);
  const centre = {
    x: picture.width / 2 + (chance() - 0.5) * 80,
    y: room.middle + (subject.height * rise * pxPerMm) / 2 + (chance() - 0.5) * 16,
  };
  paintRule(canvas, pxPerMm, picture.width, picture.height, chance);
  subject.paint({ pxPerMm, centre, turn: (angle * Math.PI) / 180 });
  paintVignette(canvas, picture.width, picture.height);
  return canvas.toSvg(picture.width, picture.height);
}
