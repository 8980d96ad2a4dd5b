import { DomainError } from "#shared/domain/DomainError";
import { parseLength } from "#shared/domain/length";
import { readSpeeds } from "#shared/domain/readSpeeds";
import { beltRulerSheet } from "#shared/drawing/sheets/beltRulerSheet";
import type { DiscRing } from "#shared/drawing/sheets/discLayout";
import { ringGaugeSheet } from "#shared/drawing/sheets/ringGaugeSheet";
import type { Sheet } from "#shared/drawing/sheets/Sheet";
import { strobeDisc, strobeSheet } from "#shared/drawing/sheets/strobeSheet";
import { readPlainNumber } from "../readPlainNumber";
import { type SheetsState, speedsText } from "./sheetsState";

/** A sheet as it will be printed, its rings where it is a disc, and where its PDF is. */
export type DrawnSheet = { sheet: Sheet; rings: readonly DiscRing[]; mainsHz: number; href: string };
export type SheetErrors = Readonly<Record<string, string>>;

/** A length in mm; one that cannot be read is refused with no words, since its field says why. */
function lengthOf(field: string, text: string): number {
  const parsed = parseLength(text, "mm");
  if (!parsed.ok) throw new DomainError(field, text.trim() === "" ? "Give a length here." : "");
  return parsed.mm;
}

function numberOf(field: string, text: string): number {
  const value = readPlainNumber(text);
  if (value === null) throw new DomainError(field, text.trim() === "" ? "Give a number here." : "");
  return value;
}

const address = (kind: SheetsState["sheet"], asked: Record<string, string | number>) =>
  `/api/v1/gauges/sheets/${kind}?${new URLSearchParams(Object.entries(asked).map(([name, value]) => [name, String(value)]))}`;

function draw(state: SheetsState): DrawnSheet {
  const { sheet: kind, paper, mains } = state;
  const none = { rings: [], mainsHz: 0 };
  switch (kind) {
    case "strobe": {
      const mainsHz = mains === "other" ? numberOf("mainsHz", state.mainsHz) : Number(mains);
      const spindleMm = lengthOf("spindleMm", state.spindle);
      const speeds = speedsText(state);
      const input = { mainsHz, speeds: readSpeeds(speeds), spindleMm, paper };
      const href = address(kind, { mainsHz, speeds, spindleMm, paper });
      return { sheet: strobeSheet(input), rings: strobeDisc(input).rings, mainsHz, href };
    }
    case "ring-gauge": {
      const largestMm = Number(state.largest);
      const sheet = ringGaugeSheet({ largestMm, stepMm: Number(state.step), paper });
      return { ...none, sheet, href: address(kind, { largestMm, stepMm: state.step, paper }) };
    }
    case "belt-ruler": {
      const longestMm = lengthOf("longestMm", state.longest);
      return { ...none, sheet: beltRulerSheet({ longestMm, paper }), href: address(kind, { longestMm, paper }) };
    }
  }
}

/** The sheet that the state asks for, or what keeps it from being drawn, by field. */
export function readSheet(state: SheetsState): { drawn: DrawnSheet | null; errors: SheetErrors } {
  try {
    return { drawn: draw(state), errors: {} };
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    return { drawn: null, errors: { [error.field]: error.words } };
  }
}
