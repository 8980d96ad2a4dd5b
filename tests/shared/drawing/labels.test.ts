import { describe, expect, it } from "vitest";
import { drawPart } from "#shared/drawing/drawPart";
import { extremeParts } from "./extremeParts";
import { findCollisions } from "./findCollisions";

const sheets = [
  { sheet: "row", options: { view: "row" } },
  { sheet: "desk", options: { view: "large" } },
  { sheet: "phone", options: { view: "large", width: 360 } },
  { sheet: "narrowest phone, inches", options: { view: "large", width: 288, unit: "in" } },
  { sheet: "row in inches at a shared scale", options: { view: "row", unit: "in", pxPerMm: 0.4, sectionPxPerMm: 1 } },
] as const;

describe.each(sheets)("labels on a $sheet", ({ options }) => {
  it.each(extremeParts)("meet nothing: $name", ({ kind, dims, asFound }) => {
    const scene = drawPart({ kind, dims, asFound, ...options });
    expect(findCollisions(scene)).toEqual([]);
  });
});
