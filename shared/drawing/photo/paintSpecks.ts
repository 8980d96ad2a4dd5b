import { type Camera, project } from "./camera";
import { f, type PhotoCanvas } from "./PhotoCanvas";
import { tint } from "./tint";

/** Fibres of felt or grains of cork on a top face `height` mm over the bench; `place` picks a spot on it, mm. */
export function paintSpecks(
  canvas: PhotoCanvas,
  camera: Camera,
  colour: string,
  height: number,
  chance: () => number,
  place: () => readonly [number, number],
): void {
  const strands: [string[], string[]] = [[], []];
  for (let i = 0; i < 260; i++) {
    const [x, y] = place();
    const at = project(camera, x, y, height);
    const [angle, long] = [chance() * Math.PI, 2 + chance() * 7];
    strands[i % 2]!.push(`M${f(at.x)} ${f(at.y)}l${f(Math.cos(angle) * long)} ${f(Math.sin(angle) * long * 0.8)}`);
  }
  for (const [i, factor] of [0.62, 1.4].entries()) {
    canvas.add(
      `<path d="${strands[i]!.join("")}" stroke="${tint(colour, factor)}" stroke-width="1.1" opacity="0.5" fill="none"/>`,
    );
  }
}
