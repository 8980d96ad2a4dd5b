import type { Condition } from "./conditions";
import type { WearRole } from "./dimensionTraits";

/**
 * What a condition has taken from (or added to) a size, to be put back: a fixed part in mm and a share of the size, each
 * with its standard uncertainty.
 *
 * Source: common practice, no source. Every figure here is a product decision and is shown to people as such.
 */
export type ConditionCorrection = { mm: number; share: number; uncertaintyMm: number; uncertaintyShare: number };

const fixed = (mm: number, uncertaintyMm: number): ConditionCorrection => ({
  mm,
  share: 0,
  uncertaintyMm,
  uncertaintyShare: 0,
});
const inShare = (share: number, uncertaintyShare: number): ConditionCorrection => ({
  mm: 0,
  share,
  uncertaintyMm: 0,
  uncertaintyShare,
});

const table: Record<Exclude<WearRole, "rigid">, Partial<Record<Condition, ConditionCorrection>>> = {
  // Running faces lose about a tenth to glazing and hardening; a swollen tyre is only a thin part of the wheel.
  tread: {
    glazed: fixed(0.1, 0.08),
    hardened: fixed(0.15, 0.1),
    "flat-spotted": fixed(0.05, 0.08),
    swollen: fixed(-0.3, 0.2),
  },
  // Belts lengthen in use; hard ones have shrunk a little; oil makes rubber grow by a percent or two.
  loop: {
    glazed: inShare(0, 0.003),
    hardened: inShare(0.003, 0.005),
    "flat-spotted": inShare(0, 0.003),
    swollen: inShare(-0.015, 0.01),
    slack: inShare(-0.03, 0.015),
  },
  // What a belt gains in length it loses in section.
  section: {
    glazed: fixed(0.02, 0.02),
    hardened: inShare(0.01, 0.01),
    "flat-spotted": fixed(0.1, 0.08),
    swollen: inShare(-0.02, 0.015),
    slack: inShare(0.015, 0.01),
  },
  face: { glazed: fixed(0.1, 0.1), hardened: fixed(0.1, 0.15), swollen: inShare(-0.02, 0.02) },
  body: {
    glazed: fixed(0, 0.02),
    hardened: inShare(0.005, 0.005),
    "flat-spotted": fixed(0, 0.02),
    swollen: inShare(-0.015, 0.01),
  },
};

/**
 * The correction to add to an as-found size, in mm with its standard uncertainty. Sound parts and metal get none.
 * Fixed parts never exceed a tenth of the size, so that small parts keep a sensible size.
 */
export function conditionCorrection(
  role: WearRole,
  condition: Condition,
  sizeMm: number,
): { correctionMm: number; standardUncertaintyMm: number } {
  const row = role === "rigid" ? undefined : table[role][condition];
  if (!row) return { correctionMm: 0, standardUncertaintyMm: 0 };
  const most = sizeMm / 10;
  return {
    correctionMm: Math.sign(row.mm) * Math.min(Math.abs(row.mm), most) + row.share * sizeMm,
    standardUncertaintyMm: Math.min(row.uncertaintyMm, most) + row.uncertaintyShare * sizeMm,
  };
}
