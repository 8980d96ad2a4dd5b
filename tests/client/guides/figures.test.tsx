import { fireEvent, screen, within } from "@testing-library/react";
import { describe, expect, it, vi } from "vitest";
import { defaultBand } from "#shared/domain/acceptedBands";
import { checkIn } from "#shared/domain/checkIn";
import { dimensionsOf, kindFacts, partKinds } from "#shared/domain/partKinds";
import { ageRows } from "../../../client/features/guides/ageRows";
import { changeWords } from "../../../client/features/guides/changeWords";
import { coarsestInstrument } from "../../../client/features/guides/coarsestInstrument";
import { exampleSizes } from "../../../client/features/guides/exampleSizes";
import { GuidePage } from "../../../client/features/guides/GuidePage";
import { niceStep } from "../../../client/features/guides/niceStep";
import { workExample } from "../../../client/features/guides/workedExample";
import { capitalised } from "../../../client/lib/capitalised";
import { renderAt } from "../support/renderAt";

// The domain as it is not: a guide that had copied a figure would still show the old one.
vi.mock("#shared/domain/conditionCorrections", () => ({
  conditionCorrection: (role: string, condition: string, sizeMm: number) =>
    role === "rigid" || condition === "sound"
      ? { correctionMm: 0, standardUncertaintyMm: 0 }
      : { correctionMm: sizeMm / 80, standardUncertaintyMm: sizeMm / 400 },
}));
vi.mock("#shared/domain/permissibleError", () => ({
  permissibleError: (instrument: string, sizeMm: number, { inside = false } = {}) => ({
    plusMinusMm: (instrument === "string" ? 3 : 0.07) + sizeMm / 10_000 + (inside ? 0.11 : 0),
    source: `book of ${instrument}`,
  }),
}));
vi.mock("#shared/domain/verdict", async (importOriginal) => ({
  ...(await importOriginal<typeof import("#shared/domain/verdict")>()),
  verdictThresholds: { sure: 0.97, likely: 0.71, chancy: 0.31 },
}));

const open = async (slug: string) => {
  renderAt(`/guides/${slug}`, { "/guides/:slug": <GuidePage notFound={null} /> });
  await screen.findAllByRole("heading", { level: 2 });
};

describe("figures that come from the domain", () => {
  it("shows what each condition does as it is reckoned", async () => {
    await open("conditions");
    const section = within(screen.getByRole("region", { name: "The running diameter of a wheel or roller" }));
    expect(section.getAllByText("+0.55 mm, give or take 0.22 mm")).toHaveLength(4);
    expect(section.getByText("no change")).toBeInTheDocument();
    const belt = within(screen.getByRole("region", { name: "The length of a belt, or the inside of a ring" }));
    expect(belt.getAllByText("+6.8 mm (+1.3 %), give or take 2.7 mm")).toHaveLength(5);
  });

  it("shows what each instrument may be off, with its source", async () => {
    await open("instruments");
    const row = screen.getByRole("row", { name: /^String/ });
    expect(
      within(row)
        .getAllByRole("cell")
        .map(({ textContent }) => textContent),
    ).toEqual(["1", "3.0", "3.0", "3.1"]);
    expect(screen.getByRole("row", { name: /^Digital calliper, ?inside jaws/ })).toHaveTextContent("0.18");
    expect(screen.getByText("Micrometer: book of micrometer.")).toBeInTheDocument();
  });

  it("shows the verdicts with the chances that earn them", async () => {
    await open("fit-chance");
    expect(screen.getByText("97 % or more")).toBeInTheDocument();
    expect(screen.getByText("71 % or more")).toBeInTheDocument();
    expect(screen.getByText("31 % or more")).toBeInTheDocument();
    expect(screen.getByText("less than 31 %")).toBeInTheDocument();
  });

  it("works its example out when it is shown", async () => {
    const { fit, first, diameter } = workExample();
    expect(diameter.asNew.valueMm).toBeCloseTo(43.88 * (1 + 1 / 80), 6);
    await open("fit-chance");
    const steps = screen.getByRole("region", { name: "A worked example" });
    expect(steps).toHaveTextContent(`their difference is P = ${first.chance.toFixed(3)}`);
    expect(steps).toHaveTextContent(`= ${fit.chance.toFixed(3)}, with 2 of 4 sizes checked`);
    expect(steps).toHaveTextContent(fit.reason);
  });

  it.each(partKinds)("shows what the place of a %s accepts, and what is fine enough", async (kind) => {
    await open(
      {
        "flat-belt": "belts",
        "square-belt": "belts",
        "round-belt": "belts",
        "brake-pad": "pads-and-felts",
        "clutch-felt": "pads-and-felts",
      }[kind as string] ?? kind,
    );
    const table = within(screen.getByRole("table", { name: capitalised(kindFacts[kind].name) }));
    const rows = table.getAllByRole("row").slice(1);
    expect(rows).toHaveLength(dimensionsOf(kind).length);
    for (const [at, dimension] of dimensionsOf(kind).entries()) {
      const sizeMm = exampleSizes[kind][dimension]!;
      const { lowerMm, upperMm } = defaultBand(kind, dimension, sizeMm);
      const decimals = (mm: number) => (mm < 100 ? 2 : 0);
      expect(rows[at]).toHaveTextContent(
        `${lowerMm.toFixed(decimals(lowerMm))} to ${upperMm.toFixed(decimals(upperMm))}`,
      );
    }
  });
});

describe("what is said of a part that arrives", () => {
  it("has the guard band that the check-in uses", async () => {
    const part = { nominalMm: 44.4, plusMinusMm: 0.15 };
    const { guardBandMm } = checkIn({ ...part, readingsMm: [44.4], instrument: "digital-caliper" });
    await open("fit-chance");
    const zone = (mm: number) => (44.4 + mm).toFixed(2);
    expect(
      screen.getByRole("img", {
        name: `Conforms from ${zone(guardBandMm - 0.15)} to ${zone(0.15 - guardBandMm)} mm, does not below ${zone(-0.15 - guardBandMm)} or above ${zone(0.15 + guardBandMm)} mm`,
      }),
    ).toBeInTheDocument();
  });
});

describe("the bench of the fit chance", () => {
  it("follows its sliders", async () => {
    await open("fit-chance");
    const bench = within(screen.getByRole("region", { name: "Try it" }));
    fireEvent.change(bench.getByRole("slider", { name: /differs/ }), { target: { value: "0" } });
    expect(bench.getByText(/^Sure/)).toHaveTextContent("Sure over 99 %");
    fireEvent.change(bench.getByRole("slider", { name: /differs/ }), { target: { value: "0.9" } });
    expect(bench.getByText(/^Won’t fit/)).toBeInTheDocument();
    expect(bench.getByText(/is 0\.90 mm too large/)).toBeInTheDocument();
  });

  it("is certain where nothing is uncertain", async () => {
    await open("fit-chance");
    const bench = within(screen.getByRole("region", { name: "Try it" }));
    for (const [name, value] of [
      [/differs/, "0.2"],
      [/needed is known/, "0"],
      [/states/, "0"],
    ] as const) {
      fireEvent.change(bench.getByRole("slider", { name }), { target: { value } });
    }
    expect(bench.getByText(/^Sure/)).toHaveTextContent("over 99 %");
    expect(bench.getByRole("img", { name: /bell curve/ })).toBeInTheDocument();
  });
});

describe("what each condition does", () => {
  it("lists every condition that a size of the sort can be in, sound first", () => {
    expect(ageRows("flat-belt", "insideCircumference", 500).map(({ condition }) => condition)).toEqual([
      "sound",
      "glazed",
      "hardened",
      "flat-spotted",
      "swollen",
      "slack",
    ]);
  });
  it("leaves metal alone", () => {
    expect(ageRows("idler-wheel", "bore", 4)).toEqual([{ condition: "sound", correctionMm: 0, spreadMm: 0 }]);
  });
  it("writes a change with its sign", () => {
    expect(changeWords({ condition: "swollen", correctionMm: -0.3, spreadMm: 0.4 }, 44)).toBe(
      "−0.30 mm, give or take 0.40 mm",
    );
    expect(changeWords({ condition: "glazed", correctionMm: 0, spreadMm: 3.2 }, 540)).toBe("0 mm, give or take 3.2 mm");
  });
});

describe("coarsestInstrument", () => {
  it("asks for more than a rule where the band is narrow, and gives up where nothing is fine enough", () => {
    expect(coarsestInstrument("idler-wheel", "treadWidth", 6)).toBe("steel-rule");
    expect(coarsestInstrument("idler-wheel", "bore", 4)).toBeUndefined();
  });
});

describe("niceStep", () => {
  it.each([
    [0.21, 0.5],
    [0.2, 0.2],
    [1, 1],
    [5.1, 10],
    [33, 50],
  ])("rounds %d up to %d", (least, step) => {
    expect(niceStep(least)).toBeCloseTo(step, 12);
  });
});
