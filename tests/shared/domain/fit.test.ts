import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { defaultBand } from "#shared/domain/acceptedBands";
import { DomainError } from "#shared/domain/DomainError";
import { assessFit, type FitInput } from "#shared/domain/fit";
import { dimensionsOf, partKinds } from "#shared/domain/partKinds";
import { verdictOf } from "#shared/domain/verdict";

const need = {
  outsideDiameter: { valueMm: 44.15, standardUncertaintyMm: 0.08 },
  bore: { valueMm: 4, standardUncertaintyMm: 0.01 },
};
const bands = { outsideDiameter: { lowerMm: 43.65, upperMm: 44.65 }, bore: { lowerMm: 3.97, upperMm: 4.05 } };
function fitOf(part: FitInput["part"], changes: Partial<FitInput> = {}) {
  const fit = assessFit({ kind: "idler-wheel", need, bands, part, ...changes });
  if (!fit) throw new Error("nothing was checked");
  return fit;
}

/** Simpson's rule over the normal density: an independent way to the same probability. */
function integrate(mean: number, u: number, lower: number, upper: number): number {
  const [from, to] = [Math.max(lower, mean - 10 * u), Math.min(upper, mean + 10 * u)];
  if (from >= to) return 0;
  const steps = 2000;
  const h = (to - from) / steps;
  const density = (x: number) => Math.exp(-((x - mean) ** 2) / (2 * u * u)) / (u * Math.sqrt(2 * Math.PI));
  let sum = density(from) + density(to);
  for (let i = 1; i < steps; i++) sum += (i % 2 ? 4 : 2) * density(from + i * h);
  return (sum * h) / 3;
}

describe("assessFit", () => {
  it("multiplies the chances of independent dimensions, in canonical order", () => {
    const fit = fitOf({
      bore: { nominalMm: 4, plusMinusMm: 0.02 },
      outsideDiameter: { nominalMm: 44.2, plusMinusMm: 0.1 },
    });
    expect(fit.dimensions.map(({ dimension }) => dimension)).toEqual(["outsideDiameter", "bore"]);
    const [wheel, bore] = fit.dimensions;
    expect(fit.chance).toBe(wheel!.chance * bore!.chance);
    // JCGM 106:2012 7.4 with u^2 = u_need^2 + plusMinus^2 / 3, reckoned by numerical integration.
    expect(wheel!.combinedUncertaintyMm).toBeCloseTo(Math.sqrt(0.08 ** 2 + 0.1 ** 2 / 3), 12);
    expect(wheel!.chance).toBeCloseTo(integrate(44.2, Math.sqrt(0.08 ** 2 + 0.1 ** 2 / 3), 43.65, 44.65), 9);
    expect(bore!.chance).toBeCloseTo(integrate(4, Math.sqrt(0.01 ** 2 + 0.02 ** 2 / 3), 3.97, 4.05), 9);
    expect(wheel!.deviationMm).toBeCloseTo(0.05, 12);
    expect(fit.verdict).toBe("sure");
    expect(fit.coverage).toBe(0.5);
  });

  it("takes the tolerance stated, else by class, else M3 (ISO 3302-1:2014 Table 1: 0.8 mm at 44 mm)", () => {
    const uOf = (size: NonNullable<FitInput["part"]["outsideDiameter"]>) =>
      fitOf({ outsideDiameter: size }, { need: {} }).dimensions[0]!.combinedUncertaintyMm * Math.sqrt(3);
    expect(uOf({ nominalMm: 44, plusMinusMm: 0.1, toleranceClass: "M4" })).toBeCloseTo(0.1, 12);
    expect(uOf({ nominalMm: 44, toleranceClass: "M1" })).toBeCloseTo(0.25, 12);
    expect(uOf({ nominalMm: 44 })).toBeCloseTo(0.8, 12);
    expect(uOf({ nominalMm: 44, plusMinusMm: 0 })).toBe(0);
  });

  it("uses the service point's band, else the default one around the need", () => {
    const part = { bore: { nominalMm: 4, plusMinusMm: 0.02 } };
    expect(fitOf(part).dimensions[0]).toMatchObject(bands.bore);
    expect(fitOf(part, { bands: {} }).dimensions[0]).toMatchObject(defaultBand("idler-wheel", "bore", 4));
  });

  it("checks a dimension known only by its band, against the band's middle and with no uncertainty of the need", () => {
    const [bore] = fitOf({ bore: { nominalMm: 4.03, plusMinusMm: 0 } }, { need: {} }).dimensions;
    expect(bore!.deviationMm).toBeCloseTo(0.02, 12);
    expect(bore!.combinedUncertaintyMm).toBe(0);
    expect(bore!.chance).toBe(1);
  });

  it("counts coverage over what matters, optional dimensions only where they are asked for", () => {
    const stepped = {
      secondTreadDiameter: { nominalMm: 20, plusMinusMm: 0.1 },
      bore: { nominalMm: 4, plusMinusMm: 0.02 },
    };
    expect(fitOf(stepped).coverage).toBe(1 / 4);
    const asked = { ...need, secondTreadDiameter: { valueMm: 20, standardUncertaintyMm: 0.05 } };
    expect(fitOf(stepped, { need: asked }).coverage).toBe(2 / 5);
    expect(fitOf({ bore: { nominalMm: 4, plusMinusMm: 0.02 } }, { need: asked }).coverage).toBe(1 / 5);
  });

  it("is null where nothing can be checked", () => {
    expect(assessFit({ kind: "idler-wheel", need, part: {} })).toBeNull();
    expect(assessFit({ kind: "idler-wheel", need, part: { treadWidth: { nominalMm: 6 } } })).toBeNull();
    expect(assessFit({ kind: "idler-wheel", need: {}, part: { bore: { nominalMm: 4 } } })).toBeNull();
  });

  it.each([
    [1, "sure"],
    [0.9, "sure"],
    [0.8999, "likely"],
    [0.6, "likely"],
    [0.5999, "chancy"],
    [0.2, "chancy"],
    [0.1999, "unfit"],
    [0, "unfit"],
  ] as const)("a chance of %d is %s", (chance, verdict) => expect(verdictOf(chance)).toBe(verdict));

  it("gives the chance that numerical integration gives", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 300, noNaN: true }),
        fc.integer({ min: -2000, max: 2000 }).map((thousandths) => thousandths / 1000),
        fc.double({ min: 0.01, max: 1, noNaN: true }),
        fc.double({ min: 0.01, max: 1, noNaN: true }),
        fc.double({ min: 0, max: 2, noNaN: true }),
        (valueMm, offset, u, plusMinusMm, width) => {
          const nominalMm = valueMm + offset * 0.4;
          const band = { lowerMm: valueMm - width, upperMm: valueMm + width / 2 };
          const fit = assessFit({
            kind: "pinch-roller",
            need: { outsideDiameter: { valueMm, standardUncertaintyMm: u } },
            part: { outsideDiameter: { nominalMm, plusMinusMm } },
            bands: { outsideDiameter: band },
          });
          const expected = integrate(nominalMm, Math.hypot(u, plusMinusMm / Math.sqrt(3)), band.lowerMm, band.upperMm);
          expect(Math.abs(fit!.chance - expected)).toBeLessThan(1e-9);
        },
      ),
      { seed: 12 },
    );
  });

  it("never gains from a wider tolerance when the nominal is in the middle of the band", () => {
    const tolerance = fc.double({ min: 0, max: 3, noNaN: true });
    fc.assert(
      fc.property(tolerance, tolerance, fc.double({ min: 0, max: 1, noNaN: true }), (one, other, u) => {
        const chanceOf = (plusMinusMm: number) =>
          assessFit({
            kind: "idler-wheel",
            need: { outsideDiameter: { valueMm: 44, standardUncertaintyMm: u } },
            part: { outsideDiameter: { nominalMm: 44, plusMinusMm } },
            bands: { outsideDiameter: { lowerMm: 43.5, upperMm: 44.5 } },
          })!.chance;
        expect(chanceOf(Math.max(one, other))).toBeLessThanOrEqual(chanceOf(Math.min(one, other)));
      }),
      { seed: 13 },
    );
  });

  it.each([
    ["need/insideCircumference", { need: { insideCircumference: need.bore } }],
    ["part/width", { part: { width: { nominalMm: 4 } } }],
    ["bands/section", { bands: { section: bands.bore } }],
    ["need/bore/valueMm", { need: { bore: { valueMm: 0, standardUncertaintyMm: 0 } } }],
    ["need/bore/standardUncertaintyMm", { need: { bore: { valueMm: 4, standardUncertaintyMm: -1 } } }],
    ["part/bore/nominalMm", { part: { bore: { nominalMm: Number.NaN } } }],
    ["part/bore/plusMinusMm", { part: { bore: { nominalMm: 4, plusMinusMm: -0.1 } } }],
    ["bands/bore/lowerMm", { bands: { bore: { lowerMm: 4.1, upperMm: 4 } } }],
  ] as const)("refuses at %s", (field, changes) => {
    const ask = () => assessFit({ kind: "idler-wheel", need: {}, part: { bore: { nominalMm: 4 } }, ...changes });
    expect(ask).toThrow(expect.objectContaining({ field }));
    expect(ask).toThrow(DomainError);
  });
});

describe("reasons", () => {
  const sure = { outsideDiameter: { nominalMm: 44.2, plusMinusMm: 0.1 }, bore: { nominalMm: 4.01, plusMinusMm: 0.01 } };
  const rest = { treadWidth: { nominalMm: 6, plusMinusMm: 0.1 }, overallHeight: { nominalMm: 20, plusMinusMm: 0.1 } };

  it("says that all is well, and what was not measured", () => {
    expect(fitOf(sure).reason).toBe(
      "Both sizes sit well inside what is accepted. Not measured: tread width and overall height.",
    );
    const whole = {
      ...need,
      treadWidth: { valueMm: 6, standardUncertaintyMm: 0.03 },
      overallHeight: { valueMm: 20, standardUncertaintyMm: 0.03 },
    };
    expect(fitOf({ ...sure, ...rest }, { need: whole }).reason).toBe("All 4 sizes sit well inside what is accepted.");
    expect(fitOf(sure, { need: whole }).reason).toContain(
      "Not stated by the workshop: tread width and overall height.",
    );
  });
  it("names what limits it, the worst first", () => {
    const fit = fitOf({
      outsideDiameter: { nominalMm: 44.9, plusMinusMm: 0.3 },
      bore: { nominalMm: 3.94, plusMinusMm: 0.02 },
    });
    expect(fit.verdict).toBe("unfit");
    expect(fit.dimensions[1]!.reason).toBe("bore is 0.06 mm tight for a 4.00 mm spindle");
    expect(fit.reason).toMatch(
      /^Bore is 0\.06 mm tight for a 4\.00 mm spindle, and outside diameter is 0\.75 mm too large\. Not measured/,
    );
  });
  it.each([
    ["is right", { nominalMm: 44.15, plusMinusMm: 0.1 }, "outside diameter is just what is needed"],
    [
      "is small",
      { nominalMm: 43.9, plusMinusMm: 0.1 },
      "outside diameter is 0.25 mm small, well inside what is accepted",
    ],
    [
      "is near the limit",
      { nominalMm: 43.7, plusMinusMm: 0.1 },
      "outside diameter is 0.45 mm small, near the limit of what is accepted",
    ],
    ["is outside", { nominalMm: 43.5, plusMinusMm: 0.1 }, "outside diameter is 0.65 mm too small"],
    [
      "is loosely made",
      { nominalMm: 44.15 },
      "outside diameter is just what is needed, but known only to ± 0.94 mm where 1.00 mm in all is accepted",
    ],
  ] as const)("where the wheel %s", (_how, outsideDiameter, reason) => {
    expect(fitOf({ outsideDiameter }).dimensions[0]!.reason).toBe(reason);
  });
  it("speaks of belts as tight or loose", () => {
    const reasonOf = (nominalMm: number) =>
      assessFit({
        kind: "round-belt",
        need: { insideCircumference: { valueMm: 600, standardUncertaintyMm: 2 } },
        part: { insideCircumference: { nominalMm, plusMinusMm: 2 } },
      })!.reason;
    expect(reasonOf(570)).toMatch(/^Inside circumference is 30\.00 mm too tight for the 600\.00 mm needed\./);
    expect(reasonOf(630)).toContain("too loose");
  });
  it("measures against the band where no need is known, or where band and need disagree", () => {
    const tooLarge = "outside diameter is 0.35 mm too large for what is accepted here";
    const part = { outsideDiameter: { nominalMm: 45, plusMinusMm: 0.1 } };
    expect(fitOf(part, { need: {} }).dimensions[0]!.reason).toBe(tooLarge);
    const larger = { outsideDiameter: { valueMm: 45.5, standardUncertaintyMm: 0.1 } };
    expect(fitOf(part, { need: larger }).dimensions[0]!.reason).toBe(tooLarge);
  });
  it("says which is least certain where each size is well but all together are not", () => {
    const tight = {
      outsideDiameter: { nominalMm: 43.85, plusMinusMm: 0.18 },
      bore: { nominalMm: 4, plusMinusMm: 0.03 },
    };
    const fit = fitOf(tight);
    expect(fit.dimensions.every(({ chance }) => chance >= 0.9)).toBe(true);
    expect(fit.verdict).toBe("likely");
    expect(fit.reason).toContain("Both sizes are inside what is accepted; the bore is the least certain.");
  });
});

describe("defaultBand", () => {
  it("holds the need inside a positive band for every dimension of every kind", () => {
    for (const kind of partKinds) {
      for (const dimension of dimensionsOf(kind)) {
        for (const valueMm of [0.2, 1, 4, 44, 600]) {
          const { lowerMm, upperMm } = defaultBand(kind, dimension, valueMm);
          expect(lowerMm).toBeGreaterThan(0);
          expect(lowerMm).toBeLessThan(valueMm);
          expect(upperMm).toBeGreaterThan(valueMm);
        }
      }
    }
  });
  it("gives a wheel half a millimetre either way, a belt a share of its length", () => {
    expect(defaultBand("idler-wheel", "outsideDiameter", 44.15)).toEqual({ lowerMm: 43.65, upperMm: 44.65 });
    const belt = defaultBand("flat-belt", "insideCircumference", 600);
    expect([belt.lowerMm, belt.upperMm]).toEqual([585, 609]);
  });
  it("refuses a dimension that is not of the kind, and a size of zero", () => {
    expect(() => defaultBand("flat-belt", "bore", 4)).toThrow(expect.objectContaining({ field: "dimension" }));
    expect(() => defaultBand("flat-belt", "width", 0)).toThrow(expect.objectContaining({ field: "valueMm" }));
  });
});
