import { DomainError } from "#shared/domain/DomainError";
import { loopGaugePage } from "./loopGauge";
import { framedPage, type Room } from "./pageFrame";
import type { Paper } from "./papers";
import { line, path, rectangle } from "./paths";
import { printError } from "./printError";
import type { Sheet, SheetItem } from "./Sheet";
import { column, words } from "./words";

export type BeltRulerInput = {
  /** The longest inside circumference to be read, mm. */
  longestMm: number;
  paper: Paper;
};

/** Length of one strip on the paper, mm: a belt laid flat along it is twice as long around. */
export const stripMm = 190;
const stripWidth = 31;
const glueMm = 8;
/** As many strips as one page holds. */
export const longestBeltMm = 2 * stripMm * 5;
export const shortestBeltMm = 50;

/** Marks along one edge of a strip: each is `step` of circumference further, half of that on the paper. */
function scale(strip: number, left: number, bottom: number, side: 1 | -1, step: number, every: number, unitMm: number) {
  const [from, to] = [strip * 2 * stripMm, (strip + 1) * 2 * stripMm];
  const first = Math.ceil(from / (step * unitMm) - 1e-9);
  const last = Math.floor(to / (step * unitMm) + 1e-9);
  const edge = side === 1 ? left : left + stripWidth;
  return Array.from({ length: last - first + 1 }, (_, i): SheetItem[] => {
    const count = first + i;
    const y = bottom - (count * step * unitMm - from) / 2;
    const isNumbered = count % every === 0;
    const length = isNumbered ? 7 : count % (every / 2) === 0 ? 4.5 : 2.6;
    const mark = line(edge, y, edge + side * length, y, { strokeMm: isNumbered ? 0.18 : 0.1 });
    // At the ends of a strip a number keeps clear of the edge, and is written once where two strips meet.
    const [atStart, atEnd] = [y > bottom - 1.5, y < bottom - stripMm + 1.5];
    if (!isNumbered || (atStart && strip > 0)) return [mark];
    const number = words(
      edge + side * 7.8,
      y + (atStart ? -0.7 : atEnd ? 2.5 : 0.9),
      String(Math.round(count * step)),
      {
        sizeMm: 2.5,
        weight: 600,
        anchor: side === 1 ? "start" : "end",
      },
    );
    return [mark, number];
  }).flat();
}

function stripItems(strip: number, count: number, left: number, bottom: number): SheetItem[] {
  const top = bottom - stripMm;
  const joined = strip < count - 1;
  const name = String.fromCharCode(65 + strip);
  const next = String.fromCharCode(66 + strip);
  const head = { sizeMm: 2.3, anchor: "middle" } as const;
  const middle = left + stripWidth / 2;
  return [
    path(rectangle(left, top, stripWidth, stripMm), { strokeMm: 0.12 }),
    ...scale(strip, left, bottom, 1, 2, 10, 1),
    ...scale(strip, left, bottom, -1, 1 / 8, 8, 25.4),
    words(middle + 2.1, bottom - stripMm / 2, `${name} · inside circumference`, { ...head, turnDeg: -90, sizeMm: 2.6 }),
    words(left + 1, top - 1.2, "mm", { sizeMm: 2.3, weight: 600 }),
    words(left + stripWidth - 1, top - 1.2, "in", { sizeMm: 2.3, weight: 600, anchor: "end" }),
    ...(strip === 0
      ? [
          path(rectangle(left, bottom, stripWidth, 1.5)),
          words(middle, bottom + 4, "inside of the fold here", { ...head, weight: 600 }),
        ]
      : [
          path(rectangle(left, bottom, stripWidth, glueMm), { strokeMm: 0.12, isDashed: true }),
          words(middle, bottom + 4.8, `glue under ${String.fromCharCode(64 + strip)}`, head),
        ]),
    ...(joined ? [words(middle, top - 1.2, `${next} goes on here`, head)] : []),
  ];
}

function notes(left: number, top: number, width: number) {
  const half = (width - 6) / 2;
  const columns = [
    column(
      left,
      top,
      half,
      [
        {
          heading: "Use it",
          text:
            "Lay the belt flat and straight along the strip, not stretched, one inner fold against the thick line. Read at the inside of the other fold: " +
            "the scale counts both sides, so it shows the inside circumference at once.",
        },
      ],
      2.5,
    ),
    column(
      left + half + 6,
      top,
      half,
      [
        {
          heading: "Thick belts",
          text: `Where only the outside of the folds can be seen, take off four times the thickness. ${printError([200, 500])} Keep the joints of the strips on their lines.`,
        },
      ],
      2.5,
    ),
  ];
  return { items: columns.flatMap(({ items }) => items), bottom: Math.max(...columns.map(({ bottom }) => bottom)) };
}

/**
 * Strips to cut out and join, numbered in inside circumference, and on a second page circles for round loops.
 *
 * Errors: DomainError on "longestMm" outside `shortestBeltMm` to `longestBeltMm`.
 */
export function beltRulerSheet({ longestMm, paper }: BeltRulerInput): Sheet {
  if (!(longestMm >= shortestBeltMm && longestMm <= longestBeltMm)) {
    throw new DomainError("longestMm", `A belt ruler reads up to 50 to ${longestBeltMm} mm.`);
  }
  const count = Math.ceil(longestMm / (2 * stripMm));
  const draw = (room: Room): SheetItem[] => {
    const width = room.right - room.besideLeft;
    const height = notes(0, 0, width).bottom;
    const bottom = room.top + 4 + stripMm;
    return [
      ...Array.from({ length: count }, (_, i) =>
        stripItems(i, count, room.besideLeft + i * (stripWidth + 1.5), bottom),
      ).flat(),
      ...notes(room.besideLeft, room.bottom - height, width).items,
    ];
  };
  const page = framedPage(paper, "Belt ruler", [{ label: "Belts up to", value: `${count * 2 * stripMm} mm` }], draw);
  return { title: "Belt ruler and loop gauge", fileName: "belt-ruler", pages: [page, loopGaugePage(paper)] };
}
