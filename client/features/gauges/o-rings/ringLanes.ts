import type { Range } from "../../../lib/axisMarks";
import type { RingNeed, RingOffer } from "./ringNeed";

/** Rings of one section; `sectionMm` is null for the odd ones (001 to 003 and the 900s), which share a lane. */
export type RingLane = { sectionMm: number | null; rings: RingOffer[] };

const isOdd = ({ dash }: RingOffer) => dash < "004" || dash >= "900";
const most = 3;
/** An odd section counts as near within this share of the one that was asked for. */
const nearSection = 0.2;

/** One lane for each section near the one asked for, thin ones first; all five where none was. */
export function ringLanes({ all, ...need }: RingNeed): RingLane[] {
  const sectionMm = need.isSectionMissed ? undefined : need.sectionMm;
  const sections = [...new Set(all.filter((ring) => !isOdd(ring)).map((ring) => ring.sectionMm))];
  const away = (section: number) => Math.abs(section - (sectionMm ?? section));
  const near = sectionMm === undefined ? sections : sections.sort((a, b) => away(a) - away(b)).slice(0, most);
  const lanes: RingLane[] = near
    .sort((a, b) => a - b)
    .map((section) => ({
      sectionMm: section,
      rings: all.filter((ring) => !isOdd(ring) && ring.sectionMm === section),
    }));
  const odd = all.filter(
    (ring) => isOdd(ring) && (sectionMm === undefined || away(ring.sectionMm) <= nearSection * sectionMm),
  );
  return odd.length > 0 ? [...lanes, { sectionMm: null, rings: odd }] : lanes;
}

/** The stretch of the rail to show: what is advised, and of the section nearest to the need the sizes around it. */
export function ringView({ band, idealMm, rows, picked }: RingNeed, lanes: readonly RingLane[], count: number): Range {
  const lane = lanes.find(({ rings }) => rings.some(({ dash }) => dash === rows[0]?.dash)) ?? lanes[0];
  const away = (ring: RingOffer) => Math.abs(ring.insideDiameterMm - idealMm);
  const around = [...(lane?.rings ?? [])].sort((a, b) => away(a) - away(b)).slice(0, count);
  const sizes = [band.fromMm, band.toMm, ...[...around, picked].map((ring) => ring.insideDiameterMm)];
  const [fromMm, toMm] = [Math.min(...sizes), Math.max(...sizes)];
  const room = 0.07 * (toMm - fromMm);
  return { fromMm: fromMm - room, toMm: toMm + room };
}
