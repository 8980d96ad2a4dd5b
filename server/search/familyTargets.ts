import { dimensionsOf, type PartKind } from "#shared/domain/partKinds";
import type { NeedDimension } from "#shared/schemas/need";
import type { FamilyRegister, RegisterPoint } from "./familyRegister";
import { againstRegister, contradicts, inBandOf, registerDimension } from "./needDimension";
import { type Target, targetOf } from "./Target";

/** Sizes in the canonical order of their kind. */
export const inOrder = (kind: PartKind, sizes: readonly NeedDimension[]): NeedDimension[] =>
  dimensionsOf(kind).flatMap((name) => sizes.find(({ dimension }) => dimension === name) ?? []);

/** What a service point takes: what was measured, in its bands, and the sizes of its register that were not. */
export function targetAt(point: RegisterPoint, measured: readonly NeedDimension[], familyName: string): Target {
  const of = { pointName: point.name, familyName };
  const own = measured.map((size) => {
    const register = point.sizes[size.dimension];
    return register ? inBandOf(size, register, of) : size;
  });
  const further = dimensionsOf(point.kind).flatMap((dimension) => {
    const register = point.sizes[dimension];
    const isMeasured = measured.some((size) => size.dimension === dimension);
    return register && !isMeasured ? [registerDimension(dimension, register, of)] : [];
  });
  return targetOf(point.kind, { id: point.id, name: point.name }, inOrder(point.kind, [...own, ...further]));
}

/** How far what was measured lies from a service point, in widths of its bands: to tell which of several is meant. */
function distanceFrom(point: RegisterPoint, measured: readonly NeedDimension[]): number {
  return measured.reduce((sum, { dimension, asNewMm }) => {
    const size = point.sizes[dimension];
    return size ? sum + Math.abs(asNewMm - size.nominalMm) / Math.max(size.upperMm - size.lowerMm, 0.001) : sum;
  }, 0);
}

/**
 * One target for each service point of the kind that what was measured does not speak against, the nearest first; else one
 * by what was measured alone, with a warning in `basis`; none where nothing is known of the kind.
 */
export function targetsOf(
  kind: PartKind,
  measured: readonly NeedDimension[],
  family: Pick<FamilyRegister, "name" | "points"> | null,
): Target[] {
  const points = (family?.points ?? [])
    .filter((point) => point.kind === kind)
    .map((point) => ({ point, distance: distanceFrom(point, measured) }))
    .sort((a, b) => a.distance - b.distance)
    .map(({ point }) => point);
  const against = (point: RegisterPoint, size: NeedDimension) => {
    const register = point.sizes[size.dimension];
    return register && contradicts(size, register) ? register : null;
  };
  const possible = points.filter((point) => !measured.some((size) => against(point, size)));
  const targets = family ? possible.map((point) => targetAt(point, measured, family.name)) : [];
  const known = targets.filter(({ dimensions }) => dimensions.length > 0);
  if (known.length > 0 || measured.length === 0) return known;

  const nearest = points[0];
  const warned = measured.map((size) => {
    const register = nearest && against(nearest, size);
    if (!register || !family) return size;
    return againstRegister(size, register, { pointName: nearest.name, familyName: family.name });
  });
  return [targetOf(kind, null, inOrder(kind, warned))];
}
