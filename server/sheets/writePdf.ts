import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import PDFDocument from "pdfkit";
import type { PathItem, Sheet, SheetPage, WordsItem } from "#shared/drawing/sheets/Sheet";
import { sfntOfWoff } from "./sfntOfWoff";

/** PDF's own unit is 1/72 in (ISO 32000-1, 8.3.2.3), and an inch is 25.4 mm. */
const pointsPerMm = 72 / 25.4;
const pt = (mm: number) => mm * pointsPerMm;

const require = createRequire(import.meta.url);
/** Static instances of Work Sans: the weights of the variable font do not survive embedding. */
const fontFiles = {
  500: require.resolve("@fontsource/work-sans/files/work-sans-latin-500-normal.woff"),
  600: require.resolve("@fontsource/work-sans/files/work-sans-latin-600-normal.woff"),
};
const readFont = (weight: 500 | 600) => sfntOfWoff(readFileSync(fontFiles[weight]));
let fonts: { 500: Buffer; 600: Buffer } | undefined;

const typeset: PDFKit.Mixins.TextOptions = {
  lineBreak: false,
  baseline: "alphabetic",
  features: ["tnum", "kern", "liga"],
};

const colours = { ink: "#000000", grey: "#5f5f5f" } as const;

function drawPath(doc: PDFKit.PDFDocument, { steps, strokeMm, isDashed, shade }: PathItem) {
  for (const step of steps) {
    if (step[0] === "Z") doc.closePath();
    else if (step[0] === "C") {
      const [, x1, y1, x2, y2, x, y] = step;
      doc.bezierCurveTo(pt(x1), pt(y1), pt(x2), pt(y2), pt(x), pt(y));
    } else {
      const [verb, x, y] = step;
      if (verb === "M") doc.moveTo(pt(x), pt(y));
      else doc.lineTo(pt(x), pt(y));
    }
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
  doc.font(String(weight)).fontSize(pt(sizeMm)).fillColor(colours[shade]);
  const before = anchor === "start" ? 0 : doc.widthOfString(content, typeset);
  doc.save();
  if (turnDeg !== 0) doc.rotate(turnDeg, { origin: [pt(x), pt(y)] });
  doc.text(content, pt(x) - (anchor === "middle" ? before / 2 : before), pt(y), typeset);
  doc.restore();
}

function drawPage(doc: PDFKit.PDFDocument, { widthMm, heightMm, items }: SheetPage) {
  doc.addPage({ size: [pt(widthMm), pt(heightMm)], margin: 0 });
  for (const item of items) {
    if (item.type === "path") drawPath(doc, item);
    else drawWords(doc, item);
  }
}

/** Asks viewers to print without scaling (ISO 32000-1, table 150); pdfkit has no option for it. */
function askForTrueSize(doc: PDFKit.PDFDocument) {
  const { _root: root } = doc as unknown as {
    _root: { data: { ViewerPreferences: { data: Record<string, string> } } };
  };
  root.data.ViewerPreferences.data.PrintScaling = "None";
}

/**
 * A sheet as a PDF: vectors and embedded type at true size.
 *
 * Error: coordinates are written to 1e-6 point. The same sheet and time give the same bytes.
 */
export function writePdf(sheet: Sheet, now: Date): Promise<Buffer> {
  fonts ??= { 500: readFont(500), 600: readFont(600) };
  const doc = new PDFDocument({
    autoFirstPage: false,
    // None but the two below.
    font: "",
    pdfVersion: "1.7",
    lang: "en",
    displayTitle: true,
    info: { Title: sheet.title, Author: "Idlewright", Creator: "Idlewright", CreationDate: now },
  });
  doc.registerFont("500", fonts[500]).registerFont("600", fonts[600]);
  askForTrueSize(doc);
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = [];
    doc.on("data", (chunk: Buffer) => chunks.push(chunk));
    doc.on("end", () => resolve(Buffer.concat(chunks)));
    doc.on("error", reject);
    for (const page of sheet.pages) drawPage(doc, page);
    doc.end();
  });
}
