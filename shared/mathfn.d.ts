/** The package brings no types of its own. */
declare module "mathfn/functions/erf.js" {
  export function erfc(x: number): number;
  /** Throws a RangeError outside [0, 2]. */
  export function invErfc(p: number): number;
}
