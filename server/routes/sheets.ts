import { readSpeeds } from "#shared/domain/readSpeeds";
import { beltRulerSheet } from "#shared/drawing/sheets/beltRulerSheet";
import { ringGaugeSheet } from "#shared/drawing/sheets/ringGaugeSheet";
import type { Sheet } from "#shared/drawing/sheets/Sheet";
import { strobeSheet } from "#shared/drawing/sheets/strobeSheet";
import { BeltRulerRequest, RingGaugeRequest, StrobeSheetRequest } from "#shared/schemas/gauges/sheets";
import { type Endpoint, type FileAnswer, fileEndpoint, type Limit } from "../http/endpoint";
import { inWords } from "../http/gauge";
import { writePdf } from "../sheets/writePdf";

/** A sheet takes a hundred times as long as a sum. */
const limit: Limit = { name: "sheets", points: 60, perSeconds: 60, by: "address" };
const common = { method: "get", tag: "Gauges", access: "anyone", limit, file: "application/pdf" } as const;

/** Draws a sheet and gives its PDF; what cannot be drawn is a 422 that points to the field. */
async function pdfOf(draw: () => Sheet, now: Date): Promise<FileAnswer> {
  const sheet = await inWords(draw);
  return { name: `${sheet.fileName}.pdf`, content: await writePdf(sheet, now) };
}

/** Sheets to print at true size, as PDF. */
export function sheetRoutes(): Endpoint[] {
  return [
    fileEndpoint(
      {
        ...common,
        path: "/gauges/sheets/strobe",
        summary: "A stroboscope disc for a mains frequency, with what each of its rings really shows.",
        query: StrobeSheetRequest,
      },
      ({ query: { speeds, ...rest }, now }) => pdfOf(() => strobeSheet({ ...rest, speeds: readSpeeds(speeds) }), now),
    ),
    fileEndpoint(
      {
        ...common,
        path: "/gauges/sheets/ring-gauge",
        summary: "Circles to lay a wheel or a ring on, and tapered rules for bores.",
        query: RingGaugeRequest,
      },
      ({ query: { stepMm, ...rest }, now }) => pdfOf(() => ringGaugeSheet({ ...rest, stepMm: Number(stepMm) }), now),
    ),
    fileEndpoint(
      {
        ...common,
        path: "/gauges/sheets/belt-ruler",
        summary: "A ruler that shows the inside circumference of a belt laid flat, and circles for round loops.",
        query: BeltRulerRequest,
      },
      ({ query, now }) => pdfOf(() => beltRulerSheet(query), now),
    ),
  ];
}
