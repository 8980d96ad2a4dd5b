/** exp(-z²/2)/sqrt(2 pi): z in two parts, so that the rounding of a large z² is not blown up (Cody's device). */
function density(z: number): number {
  const coarse = Math.round(z * 16) / 16;
  const rest = ((z - coarse) * (z + coarse)) / 2;
  return (Math.exp((-coarse * coarse) / 2) * Math.exp(-rest)) / Math.sqrt(2 * Math.PI);
}

/** Up to here the sum is used, from here the fraction, which needs fewer than 100 steps and cancels nothing. */
const seam = 1.7;

/** z + z³/3 + z⁵/(3·5) + ..., the area from 0 to z over the density. */
function areaOverDensity(z: number): number {
  let [term, sum] = [z, z];
  for (let odd = 3; Math.abs(term) > 1e-17 * Math.abs(sum); odd += 2) {
    term *= (z * z) / odd;
    sum += term;
  }
  return sum;
}

/** 1/(z + 1/(z + 2/(z + 3/(z + ...)))), the area above z over the density. */
function tailOverDensity(z: number): number {
  let fraction = z;
  for (let step = Math.ceil(18 + 320 / (z * z)); step > 0; step--) fraction = z + step / fraction;
  return 1 / fraction;
}

/**
 * Standard normal distribution function: the probability of a value up to z.
 *
 * Error:  below 1e-14, relative in the lower tail too, down to z = -37.5 where doubles begin to lose their digits.
 * Source: the series and continued fraction of the error function, NIST Digital Library of Mathematical Functions 7.6.2 and
 *         7.9.1, with erfc(z) = 2 Phi(-sqrt(2) z). Written out since the packages that know both functions weigh 14 kB
 *         (gzip), more than all the rest of the computation, and are no better in the tail.
 */
export function normalCdf(z: number): number {
  if (Math.abs(z) < seam) return 0.5 + density(z) * areaOverDensity(z);
  if (z > 40) return 1;
  if (z < -40) return 0;
  const tail = density(z) * tailOverDensity(Math.abs(z));
  return z < 0 ? tail : 1 - tail;
}

/**
 * The z that a standard normal value stays below with probability p; infinite for 0 and 1, NaN outside.
 *
 * Error:  below 1e-13 for p from 1e-307; 0.2 below that, where doubles lose their digits.
 * Source: Newton's method on ln Phi, which is concave, from sqrt(-2 ln p) that lies beyond: so each step comes nearer.
 */
export function normalQuantile(p: number): number {
  if (p > 0.5) return -normalQuantile(1 - p);
  let z = -Math.sqrt(-2 * Math.log(p));
  for (let turn = 0; turn < 8; turn++) {
    const below = normalCdf(z);
    if (below > 0) z += (Math.log(p / below) * below) / density(z);
  }
  return z;
}
