import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import {
  type DimensionName,
  dimensionsOf,
  dimensionWords,
  kindFacts,
  type PartKind,
  partKinds,
} from "#shared/domain/partKinds";
import { cautions } from "../../../client/ui/measuring/cautions";
import { HowToMeasure } from "../../../client/ui/measuring/HowToMeasure";
import { MeasuringDrawing } from "../../../client/ui/measuring/MeasuringDrawing";
import { measuringWords } from "../../../client/ui/measuring/measuringWords";
import { letterWidth, type Sketch, sketchBox } from "../../../client/ui/measuring/Sketch";
import { sketches } from "../../../client/ui/measuring/sketches";

const all = partKinds.flatMap((kind) => dimensionsOf(kind).map((dimension) => ({ kind, dimension })));
const sketchOf = (kind: PartKind, dimension: DimensionName): Sketch => sketches[kind][dimension] ?? [];

describe.each(all)("the $dimension of a $kind", ({ kind, dimension }) => {
  it("has a drawing that says what it shows", () => {
    render(<MeasuringDrawing kind={kind} dimension={dimension} />);
    const name = new RegExp(`^Measuring the ${dimensionWords[dimension]} of an? ${kindFacts[kind].name}$`);
    expect(screen.getByRole("img", { name })).toBeInTheDocument();
  });

  it("shows the part, what measures it, and one letter in measured blue", () => {
    const looks = sketchOf(kind, dimension).map(({ look }) => look);
    expect(looks.filter((look) => look === "letter")).toHaveLength(1);
    expect(looks.some((look) => /^(rubber|metal|felt)/.test(look))).toBe(true);
    expect(looks.some((look) => look === "tool" || look === "loop")).toBe(true);
    expect(looks).toContain("arrow");
    render(<MeasuringDrawing kind={kind} dimension={dimension} />);
    expect(document.querySelector("svg text")).toHaveAttribute("fill", "var(--color-measured)");
  });

  it("keeps its letter inside the box", () => {
    const letter = sketchOf(kind, dimension).find((mark) => mark.look === "letter");
    if (letter?.look !== "letter") throw new Error("no letter");
    const half = letterWidth(letter.words, letter.isDiameter) / 2;
    expect(letter.x - half).toBeGreaterThan(0);
    expect(letter.x + half).toBeLessThan(sketchBox.width);
    expect(letter.y).toBeGreaterThan(10);
    expect(letter.y).toBeLessThan(sketchBox.height - 7);
  });

  it("has a step in words", () => {
    expect(measuringWords[kind].steps[dimension]).toMatch(/^[A-Z].{10,}\.$/);
  });
});

describe.each(partKinds)("measuring the %s", (kind) => {
  it("draws and tells nothing that the kind has not", () => {
    expect(Object.keys(sketches[kind]).sort()).toEqual([...dimensionsOf(kind)].sort());
    expect(Object.keys(measuringWords[kind].steps).sort()).toEqual([...dimensionsOf(kind)].sort());
  });

  it("names mistakes, and that the machine is to be unplugged first", () => {
    expect(measuringWords[kind].mistakes.length).toBeGreaterThanOrEqual(3);
    expect(measuringWords[kind].cautions[0]).toBe("power");
  });

  it("tells all of it in one block", () => {
    render(<HowToMeasure kind={kind} />);
    expect(screen.getAllByRole("img")).toHaveLength(dimensionsOf(kind).length);
    for (const mistake of measuringWords[kind].mistakes) expect(screen.getByText(mistake)).toBeInTheDocument();
    for (const name of measuringWords[kind].cautions) expect(screen.getByText(cautions[name])).toBeInTheDocument();
    expect(screen.getByText("Common practice, no source.")).toBeInTheDocument();
  });
});

describe("HowToMeasure", () => {
  it("shows only the sizes that are asked for, in their order", () => {
    render(<HowToMeasure kind="idler-wheel" dimensions={["bore", "outsideDiameter"]} />);
    expect(screen.getAllByRole("img").map((picture) => picture.getAttribute("aria-label"))).toEqual([
      "Measuring the bore of an idler wheel",
      "Measuring the outside diameter of an idler wheel",
    ]);
  });

  it("takes only colours of the page, and hatches of its own for each drawing", () => {
    const { container } = render(<HowToMeasure kind="motor-mount" />);
    const paints = [...container.querySelectorAll("svg [fill], svg [stroke]")].flatMap((element) =>
      ["fill", "stroke"].map((name) => element.getAttribute(name)).filter((paint) => paint !== null),
    );
    for (const paint of paints) expect(paint).toMatch(/^(none|var\(--color-[a-z-]+\)|url\(#.+\))$/);
    const ids = [...container.querySelectorAll("[id]")].map(({ id }) => id);
    expect(ids.length).toBeGreaterThan(5);
    expect(new Set(ids).size).toBe(ids.length);
  });
});
