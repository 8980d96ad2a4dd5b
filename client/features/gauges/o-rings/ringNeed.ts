import { defaultBand } from "#shared/domain/acceptedBands";
import { DomainError } from "#shared/domain/DomainError";
import { parseLength } from "#shared/domain/length";
import { type OnSeat, oRingOnSeat, oRingsForPath, stretchAdvice } from "#shared/domain/oRingStretch";
import { type NearORing, nearestORings, oRingLimits, stretchPercentOf } from "#shared/domain/oRings";
import { type ORingSize, oRingTable } from "#shared/domain/oRingTable";
import type { Range } from "../../../lib/axisMarks";
import type { SizeUnit } from "../../../lib/formatSize";
import type { ORingState, RingUse } from "./oRingState";

/** A standard ring as it lies towards the need; `stretchPercent` is that on the need's own seat or path. */
export type RingOffer = ORingSize & { stretchPercent: number; isInside: boolean };
export type RingNeed = {
  use: RingUse;
  /** The circle that the ring is stretched to: seat, path / pi, or the measured inside diameter. */
  seatMm: number;
  /** Inside diameters that are advised, and the best of them. */
  band: Range;
  idealMm: number;
  sectionMm: number | undefined;
  /** No standard ring of about that section comes near: the rings of every section are shown. */
  isSectionMissed: boolean;
  grooveMm: number | undefined;
  /** All standard rings, in the order of their numbers. */
  all: RingOffer[];
  /** The nearest ones, nearest first. */
  rows: RingOffer[];
  picked: RingOffer;
  onSeat: OnSeat;
};
export type RingErrors = Partial<Record<"size" | "section" | "groove", string>>;

const nearDiameter = 0.25;

/** What is wanted of the inside diameter for this use. Sources beside `stretchAdvice` and `defaultBand`. */
function wanted(use: RingUse, sizeMm: number): Pick<RingNeed, "seatMm" | "band" | "idealMm"> {
  if (use === "belt") {
    const { min, ideal, max } = oRingsForPath(sizeMm);
    return { seatMm: sizeMm / Math.PI, band: { fromMm: min, toMm: max }, idealMm: ideal };
  }
  if (use === "ring") {
    const { lowerMm, upperMm } = defaultBand("drive-ring", "insideDiameter", sizeMm);
    return { seatMm: sizeMm, band: { fromMm: lowerMm, toMm: upperMm }, idealMm: sizeMm };
  }
  const at = (percent: number) => sizeMm / (1 + percent / 100);
  const { min, ideal, max } = stretchAdvice.seat;
  return { seatMm: sizeMm, band: { fromMm: at(max), toMm: at(min) }, idealMm: at(ideal) };
}

/** The nearest rings; with a section only those of about the right diameter, since few diameters have an odd section. */
function nearRings(insideDiameterMm: number, sectionMm: number | undefined): NearORing[] {
  const { sizes } = nearestORings({ insideDiameterMm, sectionMm, limit: oRingLimits.most });
  const isNear = (size: NearORing) => Math.abs(size.differenceMm) <= nearDiameter * insideDiameterMm;
  return (sectionMm === undefined ? sizes : sizes.filter(isNear)).slice(0, oRingLimits.usual);
}

function readLength(text: string, unit: SizeUnit, most: number): { mm?: number; error?: string } {
  const read = parseLength(text, unit);
  if (!read.ok) return { error: read.problem };
  if (!(read.mm >= 0.01 && read.mm <= most)) return { error: `From 0.01 up to ${most} mm.` };
  return { mm: read.mm };
}

/** From what was written to the rings that answer it; `need` is null while a field is wrong, and `errors` says which. */
export function ringNeed(state: ORingState, unit: SizeUnit): { need: RingNeed | null; errors: RingErrors } {
  const { use } = state;
  const mostMm = oRingLimits.insideDiameterMm * (use === "belt" ? 3 : 1);
  const size = readLength(state.sizes[use], unit, mostMm);
  const section = state.section.trim() ? readLength(state.section, unit, oRingLimits.sectionMm) : {};
  const groove = use === "belt" && state.groove.trim() ? readLength(state.groove, unit, mostMm) : {};
  const errors: RingErrors = {
    ...(size.error && { size: size.error }),
    ...(section.error && { section: section.error }),
    ...(groove.error && { groove: groove.error }),
  };
  if (size.mm === undefined || Object.keys(errors).length > 0) return { need: null, errors };

  try {
    const want = wanted(use, size.mm);
    const offer = (ring: ORingSize): RingOffer => ({
      ...ring,
      stretchPercent: stretchPercentOf(ring.insideDiameterMm, want.seatMm),
      isInside: ring.insideDiameterMm >= want.band.fromMm && ring.insideDiameterMm <= want.band.toMm,
    });
    const all = oRingTable.map(offer);
    const near = nearRings(want.idealMm, section.mm);
    const isSectionMissed = near.length === 0;
    const rows = (isSectionMissed ? nearRings(want.idealMm, undefined) : near).map(offer);
    const picked = all.find(({ dash }) => dash === state.pick) ?? rows.find(({ isInside }) => isInside) ?? rows[0]!;
    if (!rows.some(({ dash }) => dash === picked.dash)) rows.push(picked);
    const { insideDiameterMm, sectionMm } = picked;
    const onSeat = oRingOnSeat({ insideDiameterMm, sectionMm, seatMm: want.seatMm });
    const asked = { sectionMm: section.mm, isSectionMissed, grooveMm: groove.mm };
    return { need: { use, ...want, ...asked, all, rows, picked, onSeat }, errors };
  } catch (error) {
    if (error instanceof DomainError) return { need: null, errors: { size: error.words } };
    throw error;
  }
}
