import { createRequire } from "node:module";
import PDFDocument from "pdfkit";
import type { PathItem, Sheet, SheetPage, WordsItem } from "#shared/drawing/sheets/Sheet";

/** PDF's own unit is 1/72 in (ISO 32000-1, 8.3.2.3), and an inch is 25.4 mm. */
const pointsPerMm = 72 / 25.4;
const pt = (mm: number) => mm * pointsPerMm;

const require = createRequire(import.meta.url);
/** Static instances of Work Sans: the variable font's weights do not survive embedding. */
const fontFile = (weight: 500 | 600) =>
  require.resolve(`@fontsource/work-sans/files/work-sans-latin-${weight}-normal.woff`);
const colours = { ink: "#000000", grey: "#5f5f5f" } as const;

function drawPath(doc: PDFKit.PDFDocument, { steps, strokeMm, isDashed, shade }: PathItem) {
  for (const step of steps) {
    if (step[0] === "M") doc.moveTo(pt(step[1]), pt(step[2]));
    else if (step[0] === "L") doc.lineTo(pt(step[1]), pt(step[2]));
    else if (step[0] === "Z") doc.closePath();
    else doc.bezierCurveTo(pt(step[1]), pt(step[2]), pt(step[3]), pt(step[4]), pt(step[5]), pt(step[6]));
  }
  if (strokeMm === undefined) {
    doc.fill(colours[shade]);
    return;
  }
  doc.lineWidth(pt(strokeMm));
  if (isDashed) doc.dash(pt(1.6), { space: pt(1) });
  doc.stroke(colours[shade]);
  if (isDashed) doc.undash();
}

function drawWords(doc: PDFKit.PDFDocument, { x, y, content, sizeMm, weight, anchor, turnDeg, shade }: WordsItem) {
  const options = { lineBreak: false, baseline: "alphabetic", features: ["tnum", "kern", "liga"] } as const;
  doc.font(String(weight)).fontSize(pt(sizeMm)).fillColor(colours[shade]);
  const before = anchor === "start" ? 0 : doc.widthOfString(content, { ...options, features: [...options.features] });
  doc.save();
  if (turnDeg !== 0) doc.rotate(turnDeg, { origin: [pt(x), pt(y)] });
  doc.text(content, pt(x) - (anchor === "middle" ? before / 2 : before), pt(y), {
    ...options,
    features: [...options.features],
  });
  doc.restore();
}

function drawPage(doc: PDFKit.PDFDocument, { widthMm, heightMm, items }: SheetPage) {
  doc.addPage({ size: [pt(widthMm), pt(heightMm)], margin: 0 });
  for (const item of items) {
    if (item.type === "path") drawPath(doc, item);
    else drawWords(doc, item);
  }
}

/**
 * A sheet as a PDF: vectors and embedded type at true size.
 *
 * Error: coordinates are written to 1e-6 point. The same sheet and time give the same bytes.
 */
export function writePdf(sheet: Sheet, now: Date): Promise<Buffer> {
  const doc = new PDFDocument({
    autoFirstPage: false,
    font: fontFile(500),
    pdfVersion: "1.7",
    lang: "en",
    displayTitle: true,
    info: { Title: sheet.title, Author: "Idlewright", CreationDate: now },
  });
  for (const weight of [500, 600] as const) doc.registerFont(String(weight), fontFile(weight));
  // A viewer that honours it prints at true size without being told (ISO 32000-1, 12.2).
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = [];
    doc.on("data", (chunk: Buffer) => chunks.push(chunk));
    doc.on("end", () => resolve(Buffer.concat(chunks)));
    doc.on("error", reject);
    for (const page of sheet.pages) drawPage(doc, page);
    doc.end();
  });
}
