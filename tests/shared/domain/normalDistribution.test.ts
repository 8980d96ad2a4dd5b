import { describe, expect, it } from "vitest";
import { normalCdf, normalQuantile } from "#shared/domain/normalDistribution";

const digits = (value: number, expected: number) => Math.abs(value / expected - 1);

describe("normalCdf", () => {
  // Reckoned with 50 digits by an independent arbitrary-precision library.
  it.each([
    [-37, 5.725571222524577e-300],
    [-30, 4.906713927148187e-198],
    [-20, 2.7536241186062337e-89],
    [-12, 1.776482112077679e-33],
    [-8, 6.220960574271784e-16],
    [-6, 9.86587645037698e-10],
    [-5, 2.866515718791939e-7],
    [-3, 0.0013498980316300946],
    [-2.5, 0.006209665325776135],
    [-1.96, 0.024997895148220435],
    [-1.75, 0.04005915686381709],
    [-1.7, 0.04456546275854304],
    [-1.65, 0.0494714680336481],
    [-1.5, 0.06680720126885807],
    [-1, 0.15865525393145705],
    [-0.5, 0.3085375387259869],
    [-0.1, 0.460172162722971],
    [-1e-9, 0.49999999960105773],
  ])("keeps its digits in the lower tail: Phi(%d)", (z, p) => {
    expect(digits(normalCdf(z), p)).toBeLessThan(1e-12);
    expect(Math.abs(normalCdf(-z) - (1 - p))).toBeLessThan(4e-16);
  });

  it("is the area under the density, by Simpson's rule from below", () => {
    const density = (x: number) => Math.exp((-x * x) / 2) / Math.sqrt(2 * Math.PI);
    const half = 1 / 256;
    let area = normalCdf(-8);
    for (let z = -8; z < 8; z += 2 * half) {
      area += (half / 3) * (density(z) + 4 * density(z + half) + density(z + 2 * half));
      expect(Math.abs(normalCdf(z + 2 * half) - area)).toBeLessThan(1e-11);
    }
  });

  it("never falls, from one end of the doubles to the other", () => {
    let last = 0;
    for (let z = -41; z <= 41; z += 1 / 512) {
      expect(normalCdf(z)).toBeGreaterThanOrEqual(last);
      last = normalCdf(z);
    }
    const ends = [-Infinity, -1e308, -40, 0, -0, 5e-324, 40, 1e308, Infinity].map(normalCdf);
    expect(ends).toEqual([0, 0, 0, 0.5, 0.5, 0.5, 1, 1, 1]);
  });
});

describe("normalQuantile", () => {
  it("undoes the distribution function over three hundred powers of ten", () => {
    for (let exponent = -307; exponent < -0.3; exponent += 0.37) {
      const p = 10 ** exponent;
      // An error of z shows in p multiplied by the density over p, which is nearly |z| in the tail.
      expect(digits(normalCdf(normalQuantile(p)), p)).toBeLessThan(1e-12);
    }
  });
  it("mirrors, and ends in infinity", () => {
    for (const p of [1 / 64, 0.125, 0.25, 0.375]) expect(normalQuantile(1 - p)).toBe(-normalQuantile(p));
    expect(Math.abs(normalQuantile(0.5))).toBeLessThan(1e-15);
    expect([normalQuantile(0), normalQuantile(1)]).toEqual([-Infinity, Infinity]);
    expect(Math.abs(normalQuantile(5e-324) + 38.4674)).toBeLessThan(0.2);
  });
});
