import { isExact } from "#shared/domain/strobe";
import { textWidth } from "../textWidth";
import { barSteps, type Disc, type DiscRing, layOutDisc } from "./discLayout";
import { framedPage, type Room, roomOf } from "./pageFrame";
import type { Paper } from "./papers";
import { circle, line, path } from "./paths";
import type { Sheet, SheetItem } from "./Sheet";
import { readingParts } from "./strobeReading";
import { barsWords, creepWords, shortNumber, shownWords, speedName } from "./strobeWords";
import { column, words, wordsAround } from "./words";

export type StrobeSheetInput = { mainsHz: number; speeds: readonly number[]; spindleMm: number; paper: Paper };

/** A disc about a centre: its edge to cut, rings with what each shows, and the hole for the spindle. */
function discItems(disc: Disc, cx: number, cy: number): SheetItem[] {
  const { radiusMm, spindleMm, mainsHz, rings } = disc;
  const cross = spindleMm / 2 + 3;
  const hairline = { strokeMm: 0.1 };
  return [
    circle(cx, cy, radiusMm, { strokeMm: 0.2 }),
    ...rings.flatMap((ring) => [path(barSteps(ring, cx, cy)), ...ringLabels(ring, cx, cy)]),
    circle(cx, cy, spindleMm / 2, { strokeMm: 0.2 }),
    line(cx - cross, cy, cx + cross, cy, hairline),
    line(cx, cy - cross, cx, cy + cross, hairline),
    words(cx, cy - spindleMm / 2 - 4.6, `${shortNumber(mainsHz, 2)} Hz`, {
      sizeMm: 4.2,
      weight: 600,
      anchor: "middle",
    }),
    words(cx, cy + spindleMm / 2 + 6, `hole ${shortNumber(spindleMm, 2)} mm`, { sizeMm: 2.5, anchor: "middle" }),
  ];
}

const labelLook = { sizeMm: 2.7, weight: 600 } as const;

function ringLabels(ring: DiscRing, cx: number, cy: number): SheetItem[] {
  const speed = isExact(ring) ? "" : ` · for ${speedName(ring.rpm)}`;
  const label = `${shownWords(ring)} · ${barsWords(ring)}${speed}`;
  const radius = ring.outerMm + 1.2;
  // Twice, so that it can be read from either side, where there is room for two.
  const isRoom = textWidth(label, labelLook.sizeMm, labelLook.weight) < 0.42 * 2 * Math.PI * radius;
  return (isRoom ? [-90, 90] : [-90]).flatMap((deg) => wordsAround(cx, cy, radius, deg, label, labelLook));
}

const rowMm = 4.4;

/** The rings from the outside inwards, a line each. */
function ringTable(rings: readonly DiscRing[], left: number, top: number, width: number): SheetItem[] {
  const columns = [0, 0.115, 0.345, 0.655].map((share) => left + share * width);
  const look = { sizeMm: 2.6 };
  const rows = [
    ["For rpm", "Ring", "stands still at", "At that speed, bars go"],
    ...rings.map((ring) => [
      speedName(ring.rpm),
      `${ring.bars} bars${ring.barsPerFlash > 1 ? ` (by ${ring.barsPerFlash}s)` : ""}`,
      shownWords(ring),
      creepWords(ring),
    ]),
  ];
  return rows.flatMap((cells, row) => {
    const y = top + row * rowMm + 3;
    return [
      ...cells.map((cell, i) =>
        words(columns[i] ?? left, y, cell, { ...look, weight: row === 0 || i === 2 ? 600 : 500 }),
      ),
      line(left, y + 1.2, left + width, y + 1.2, { strokeMm: 0.1, shade: "grey" }),
    ];
  });
}

type Below = { height: number; draw: (top: number) => SheetItem[] };

/** The table beside how to read it, and how high the two are together. */
function below({ mainsHz, speeds, spindleMm }: StrobeSheetInput, room: Room): Below {
  const { rings } = layOutDisc({ mainsHz, speeds, spindleMm, radiusMm: 1e4 });
  const width = room.right - room.besideLeft;
  const tableWidth = width * 0.57;
  const textLeft = room.besideLeft + tableWidth + 5;
  const textWidth = room.right - textLeft;
  const parts = readingParts(mainsHz, rings);
  const notes = (top: number) =>
    column(room.besideLeft, top + (rings.length + 1) * rowMm + 2, tableWidth, parts.left, 2.5);
  const reading = (top: number) => column(textLeft, top, textWidth, parts.right, 2.5);
  return {
    height: Math.max(notes(0).bottom, reading(0).bottom),
    draw: (top) => [...ringTable(rings, room.besideLeft, top, tableWidth), ...notes(top).items, ...reading(top).items],
  };
}

/**
 * The disc of a sheet, as large as the paper allows.
 *
 * Errors: DomainError on "mainsHz", "spindleMm" or "speeds", as layOutDisc.
 */
export function strobeDisc(input: StrobeSheetInput): Disc {
  const { mainsHz, speeds, spindleMm, paper } = input;
  const room = roomOf(paper);
  const radiusMm = Math.min(room.right - room.left, room.bottom - below(input, room).height - room.top - 2) / 2;
  return layOutDisc({ mainsHz, speeds, spindleMm, radiusMm });
}

/** A stroboscope disc with what its rings really show and how to read them. Errors: as strobeDisc. */
export function strobeSheet(input: StrobeSheetInput): Sheet {
  const { mainsHz, paper } = input;
  const disc = strobeDisc(input);
  const room = roomOf(paper);
  const text = below(input, room);
  const mains = `${shortNumber(mainsHz, 2)} Hz`;
  const page = framedPage(paper, "Stroboscope disc", [{ label: "Lamp on mains of", value: mains }], () => [
    ...discItems(disc, (room.left + room.right) / 2, room.top + disc.radiusMm),
    ...text.draw(room.bottom - text.height),
  ]);
  return { title: `Stroboscope disc, ${mains}`, fileName: `stroboscope-${mainsHz}-hz`, pages: [page] };
}
