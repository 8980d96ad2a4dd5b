import { type DimensionName, dimensionNames, kindFacts, type PartKind } from "#shared/domain/partKinds";
import type { SizeWindow } from "../adapters/SearchEngine";
import type { Statement } from "../db/Statement";

/** Where a dimension stands in the size arrays of measured_items, counted from 1. */
const placeOf = (dimension: DimensionName) => dimensionNames.indexOf(dimension) + 1;

export const nominalOf = (dimension: DimensionName) => `i.nominals_um[${placeOf(dimension)}]`;
export const halfWidthOf = (dimension: DimensionName) => `i.half_widths_um[${placeOf(dimension)}]`;

/** Whether the item `i` states the window's dimension and lies in the window; null where it does not state it. */
export function inWindow({ dimension, lowerUm, upperUm, reach }: SizeWindow, statement: Statement): string {
  const [nominal, halfWidth, by] = [nominalOf(dimension), halfWidthOf(dimension), `${statement.param(reach)}::float8`];
  return `(${nominal} + ${by} * ${halfWidth} >= ${statement.param(lowerUm)}::float8
    AND ${nominal} - ${by} * ${halfWidth} <= ${statement.param(upperUm)}::float8)`;
}

/** A window speaks only about items that state its dimension; the others it lets pass. */
export const letsPass = (window: SizeWindow, statement: Statement) => `${inWindow(window, statement)} IS NOT FALSE`;

/** Items along one dimension: a FROM with items as `i`, the column of the size, and the conditions that come with it. */
export type Along = { from: string; column: string; where: string };

/**
 * The index that runs along a dimension of a kind: that of the items themselves for the primary one, which every item
 * states, else that of all sizes.
 */
export function along(kind: PartKind, dimension: DimensionName, statement: Statement): Along {
  const kindName = statement.param(kind);
  if (dimension === kindFacts[kind].primary) {
    return { from: "measured_items i", column: "i.primary_um", where: `i.kind = ${kindName}` };
  }
  return {
    from: "measured_dimensions d JOIN measured_items i ON i.id = d.item_id",
    column: "d.nominal_um",
    where: `d.kind = ${kindName} AND d.dimension = ${statement.param(dimension)}`,
  };
}
