import type { SizeUnit } from "./formatSize";

export type Range = { fromMm: number; toMm: number };

/** A round step (1, 2 or 5 times a power of ten) of at least this size. */
export function roundStep(atLeast: number): number {
  const power = 10 ** Math.floor(Math.log10(atLeast));
  return power * ([1, 2, 5, 10].find((times) => times * power >= atLeast * (1 - 1e-9)) ?? 10);
}

export type AxisMark = { mm: number; label: string | null };

/** Marks of a ruler in mm or inches: labelled ones at least `room` px apart, five or ten parts between them. */
export function axisMarks({ fromMm, toMm }: Range, width: number, unit: SizeUnit, room = 64): AxisMark[] {
  const perUnit = unit === "in" ? 25.4 : 1;
  const span = (toMm - fromMm) / perUnit;
  if (!(span > 0) || !(width > 0)) return [];
  const step = roundStep((span / width) * room);
  const lead = Math.round(step / 10 ** Math.floor(Math.log10(step) + 1e-9));
  const parts = lead === 2 ? 4 : lead === 1 ? 10 : 5;
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  const marks: AxisMark[] = [];
  const small = step / parts;
  for (let i = Math.ceil(fromMm / perUnit / small); i * small <= toMm / perUnit; i++) {
    marks.push({ mm: i * small * perUnit, label: i % parts === 0 ? (i * small).toFixed(decimals) : null });
  }
  return marks;
}
