import { fitWindow } from "#shared/domain/fitWindow";
import type { Sought } from "../adapters/SearchEngine";
import type { Target } from "./Target";

/** Wider than any size: stands for no limit where a number is needed. */
const farUm = 1_000_000_000;
const clamp = (um: number) => Math.min(Math.max(um, -farUm), farUm);

/**
 * Where an item's sizes must lie for its chance to reach `minChance`: in every dimension, since the whole chance is never
 * more than the least of its factors. Ends are rounded outwards to whole micrometres.
 */
export function soughtBy({ kind, dimensions }: Target, minChance: number): Sought {
  return {
    kind,
    windows: dimensions.map(({ dimension, lowerMm, upperMm, standardUncertaintyMm }) => {
      const window = fitWindow({ lowerMm, upperMm }, standardUncertaintyMm, minChance);
      return {
        dimension,
        lowerUm: clamp(Math.floor(window.lowerMm * 1000)),
        upperUm: clamp(Math.ceil(window.upperMm * 1000)),
        reach: window.reachPerPlusMinus,
      };
    }),
  };
}
