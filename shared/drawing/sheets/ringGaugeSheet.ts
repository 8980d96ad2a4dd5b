import { DomainError } from "#shared/domain/DomainError";
import { boreGaugePage } from "./boreGauge";
import { framedPage, roomOf } from "./pageFrame";
import type { Paper } from "./papers";
import { arc, circle, line, onCircle } from "./paths";
import { printError } from "./printError";
import type { Sheet, SheetItem } from "./Sheet";
import { column, words } from "./words";

/** Diameter of the largest circle, mm. */
export const ringGaugeSizes = { min: 20, max: 180 };
/** Diameters between the fine marks, mm, as they are chosen. */
export const ringGaugeSteps = ["1", "2", "5"] as const;

export type RingGaugeInput = {
  /** Diameter of the largest circle, mm: whole tens. */
  largestMm: number;
  /** Diameters between the fine marks, mm. */
  stepMm: number;
  paper: Paper;
};

const labelMm = 2.5;
/** Where a circle is parted for its number, degrees. */
const labelAt = [-45, 135] as const;

/** A circle of a diameter, parted in two places for its number. */
function numberedCircle(cx: number, cy: number, diameter: number): SheetItem[] {
  const radius = diameter / 2;
  const label = String(diameter);
  const gap = (((label.length * 0.62 + 0.5) * labelMm) / 2 / radius) * (180 / Math.PI);
  const [first, second] = labelAt;
  const pen = { strokeMm: 0.25 };
  return [
    arc(cx, cy, radius, first + gap, second - gap, pen),
    arc(cx, cy, radius, second + gap, first + 360 - gap, pen),
    ...labelAt.map((deg) => {
      const [x, y] = onCircle(cx, cy, radius, deg);
      return words(x, y + labelMm * 0.35, label, { sizeMm: labelMm, weight: 600, anchor: "middle" });
    }),
  ];
}

/** Short arcs across the four arms of the cross, so that between two circles a diameter is read as on a rule. */
const fineMarks = (cx: number, cy: number, diameter: number, halfMm: number): SheetItem[] => {
  const half = Math.min(40, (halfMm / (diameter / 2)) * (180 / Math.PI));
  return [0, 90, 180, 270].map((deg) => arc(cx, cy, diameter / 2, deg - half, deg + half, { strokeMm: 0.1 }));
};

/** Circles each 10 mm of diameter with their numbers, thin ones each 5 mm, and marks at every step between. */
function gaugeItems({ largestMm, stepMm }: RingGaugeInput, cx: number, cy: number): SheetItem[] {
  const reach = largestMm / 2;
  const arm = { strokeMm: 0.1 };
  const diameters = Array.from({ length: Math.floor(largestMm / stepMm) + 1 }, (_, i) => i * stepMm);
  return [
    line(cx - reach, cy, cx + reach, cy, arm),
    line(cx, cy - reach, cx, cy + reach, arm),
    ...diameters
      .filter((diameter) => diameter >= 5 && diameter % 5 !== 0)
      .flatMap((diameter) => fineMarks(cx, cy, diameter, 1.5)),
    ...Array.from({ length: Math.floor(largestMm / 5) }, (_, i) => 5 * (i + 1)).flatMap((diameter) =>
      diameter % 10 === 0
        ? numberedCircle(cx, cy, diameter)
        : [circle(cx, cy, diameter / 2, { strokeMm: 0.12, shade: "grey" }), ...fineMarks(cx, cy, diameter, 2.6)],
    ),
  ];
}

const notes = (stepMm: number) => ({
  left: [
    {
      heading: "Use it",
      text:
        "Lay the wheel, ring or cap in the middle, flat, and look straight down. Shift it until the same mark shows at both ends of an arm, " +
        "then do the same on the other arm. The number is the diameter in millimetres.",
    },
  ],
  right: [
    {
      heading: "What it can tell",
      text:
        `Numbered circles are 10 mm apart, thin ones 5 mm, marks ${stepMm} mm, all as diameters. ${printError([10, 100])} ` +
        "Take it to find a size; order by a calliper.",
    },
  ],
});

/**
 * Circles to lay a wheel or a ring on, and on a second page two tapered rules for bores.
 *
 * Errors: DomainError on "largestMm" outside `ringGaugeSizes` or no whole ten.
 */
export function ringGaugeSheet(input: RingGaugeInput): Sheet {
  const { largestMm, stepMm, paper } = input;
  if (!(largestMm >= ringGaugeSizes.min && largestMm <= ringGaugeSizes.max) || largestMm % 10 !== 0) {
    throw new DomainError("largestMm", "The largest circle is 20 to 180 mm, in whole tens.");
  }
  const room = roomOf(paper);
  const [left, width] = [room.besideLeft, (room.right - room.besideLeft - 6) / 2];
  const { left: use, right: tells } = notes(stepMm);
  const draw = (top: number) => [column(left, top, width, use), column(left + width + 6, top, width, tells)];
  const height = Math.max(...draw(0).map(({ bottom }) => bottom));
  const cy = room.top + largestMm / 2 + 3;
  const page = framedPage(paper, "Ring gauge", [{ label: "Marks each", value: `${stepMm} mm` }], () => [
    ...gaugeItems(input, (room.left + room.right) / 2, cy),
    ...draw(room.bottom - height).flatMap(({ items }) => items),
  ]);
  return { title: "Ring gauge and bore gauge", fileName: "ring-gauge", pages: [page, boreGaugePage(paper)] };
}
