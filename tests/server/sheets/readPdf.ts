import { getDocument, OPS } from "pdfjs-dist/legacy/build/pdf.mjs";

type Matrix = readonly [number, number, number, number, number, number];
type Point = readonly [x: number, y: number];
/** One closed or open piece of a path as it lies on the paper: mm from the top left corner. */
type Piece = { points: Point[]; left: number; right: number; top: number; bottom: number };
export type DrawnPath = { isFilled: boolean; strokeMm: number; pieces: Piece[] };
type ReadPage = { widthMm: number; heightMm: number; paths: DrawnPath[]; text: string };

const mmPerPoint = 25.4 / 72;
/** Numbers that follow each drawing verb of the reader: move, line, curve, quadratic curve, close. */
const verbLengths = [2, 2, 6, 4, 0];

const times = (m: Matrix, n: Matrix): Matrix => [
  m[0] * n[0] + m[2] * n[1],
  m[1] * n[0] + m[3] * n[1],
  m[0] * n[2] + m[2] * n[3],
  m[1] * n[2] + m[3] * n[3],
  m[0] * n[4] + m[2] * n[5] + m[4],
  m[1] * n[4] + m[3] * n[5] + m[5],
];

/** Pieces of a path: where the pen came to a stop, curves by their ends and not their handles. */
function piecesOf(numbers: Float32Array, onPaper: (x: number, y: number) => Point): Piece[] {
  const pieces: Point[][] = [];
  for (let i = 0; i < numbers.length; ) {
    const verb = numbers[i] ?? 4;
    const count = verbLengths[verb] ?? 0;
    const end = i + 1 + count;
    if (verb === 0) pieces.push([]);
    if (count > 0) pieces.at(-1)?.push(onPaper(numbers[end - 2] ?? 0, numbers[end - 1] ?? 0));
    i = end;
  }
  return pieces.map((points) => {
    const [xs, ys] = [points.map(([x]) => x), points.map(([, y]) => y)];
    return { points, left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
  });
}

/**
 * A PDF read back by an independent reader: page sizes, what is drawn from the drawing operators of its content
 * streams with their transformations, and its text.
 */
export async function readPdf(bytes: Buffer): Promise<ReadPage[]> {
  const task = getDocument({ data: new Uint8Array(bytes), useSystemFonts: false, disableFontFace: true, verbosity: 0 });
  const doc = await task.promise;
  const pages: ReadPage[] = [];
  for (let number = 1; number <= doc.numPages; number++) {
    const page = await doc.getPage(number);
    const [left = 0, bottom = 0, right = 0, top = 0] = page.view;
    const { fnArray, argsArray } = await page.getOperatorList();
    const stack: Matrix[] = [];
    let matrix: Matrix = [1, 0, 0, 1, 0, 0];
    let strokeMm = mmPerPoint;
    const paths: DrawnPath[] = [];
    for (const [i, fn] of fnArray.entries()) {
      const args = argsArray[i];
      if (fn === OPS.save) stack.push(matrix);
      else if (fn === OPS.restore) matrix = stack.pop() ?? matrix;
      else if (fn === OPS.transform) matrix = times(matrix, args);
      else if (fn === OPS.setLineWidth) strokeMm = args[0] * mmPerPoint;
      else if (fn === OPS.constructPath) {
        const m = matrix;
        const onPaper = (x: number, y: number): Point => [
          (m[0] * x + m[2] * y + m[4] - left) * mmPerPoint,
          (top - (m[1] * x + m[3] * y + m[5])) * mmPerPoint,
        ];
        const isFilled = args[0] === OPS.fill || args[0] === OPS.eoFill;
        paths.push({ isFilled, strokeMm, pieces: piecesOf(args[1][0], onPaper) });
      }
    }
    const { items } = await page.getTextContent();
    const text = items.map((item) => ("str" in item ? `${item.str}${item.hasEOL ? "\n" : ""}` : "")).join("");
    pages.push({ widthMm: (right - left) * mmPerPoint, heightMm: (top - bottom) * mmPerPoint, paths, text });
  }
  await task.destroy();
  return pages;
}
