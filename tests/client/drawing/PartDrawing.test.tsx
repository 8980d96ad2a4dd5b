import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { PartDrawing } from "../../../client/ui/drawing/PartDrawing";

const dims = {
  outsideDiameter: { nominalMm: 44.2, plusMinusMm: 0.1 },
  bore: { nominalMm: 4 },
  treadWidth: { nominalMm: 6 },
};

describe("PartDrawing", () => {
  it("is a picture named by the part's size and described by all of them", () => {
    render(<PartDrawing kind="idler-wheel" view="large" dims={dims} asFound={{ outsideDiameter: 43.9 }} width={760} />);
    const drawing = screen.getByRole("img", { name: "Idler wheel, outside diameter 44.2 mm" });
    expect(drawing).toHaveAccessibleDescription(
      "Idler wheel drawn to scale. Stated: outside diameter 44.2 mm plus or minus 0.1, bore 4.0 mm, tread width 6.0 mm. " +
        "Your old part, dashed: outside diameter 43.9 mm. Not stated: overall height.",
    );
  });

  it("writes the sizes with their tolerance, and the user's own", () => {
    render(<PartDrawing kind="idler-wheel" view="large" dims={dims} asFound={{ outsideDiameter: 43.9 }} width={760} />);
    expect(screen.getByText("44.2 ±0.1")).toBeInTheDocument();
    expect(screen.getByText("yours 43.9")).toHaveAttribute("fill", "var(--color-measured)");
  });

  it("speaks inches when asked to", () => {
    render(<PartDrawing kind="idler-wheel" view="row" dims={dims} unit="in" />);
    expect(screen.getByText("1.740")).toBeInTheDocument();
    expect(screen.getByRole("img", { name: "Idler wheel, outside diameter 1.740 in" })).toBeInTheDocument();
  });

  it("takes only colours of the page, so that themes work", () => {
    const { container } = render(<PartDrawing kind="idler-wheel" view="large" dims={dims} width={360} />);
    const paints = [...container.querySelectorAll("svg [fill], svg [stroke]")].flatMap((element) =>
      ["fill", "stroke"].map((name) => element.getAttribute(name)).filter((paint) => paint !== null),
    );
    expect(paints.length).toBeGreaterThan(20);
    for (const paint of paints) expect(paint).toMatch(/^(none|var\(--color-[a-z-]+\)|url\(#.+\))$/);
  });

  it("gives two drawings on a page hatch patterns of their own", () => {
    const { container } = render(
      <>
        <PartDrawing kind="idler-wheel" view="large" dims={dims} width={760} />
        <PartDrawing kind="idler-wheel" view="large" dims={dims} width={760} />
      </>,
    );
    const ids = [...container.querySelectorAll("[id]")].map((element) => element.id);
    expect(ids.length).toBeGreaterThanOrEqual(8);
    expect(new Set(ids).size).toBe(ids.length);
    for (const element of container.querySelectorAll("[fill^='url']")) {
      expect(ids).toContain(element.getAttribute("fill")!.slice(5, -1));
    }
  });

  it("is laid out anew for another width", () => {
    const { container, rerender } = render(<PartDrawing kind="idler-wheel" view="large" dims={dims} width={760} />);
    const box = () => container.querySelector("svg")!.getAttribute("viewBox")!;
    const wide = box();
    rerender(<PartDrawing kind="idler-wheel" view="large" dims={dims} width={360} />);
    expect(box()).toMatch(/^0 0 360 /);
    expect(box()).not.toBe(wide);
  });

  it("shows words that people wrote as words", () => {
    render(<PartDrawing kind="brake-pad" view="row" dims={{ length: { nominalMm: 20 } }} material="<b>felt</b>" />);
    expect(screen.getByRole("img")).toBeInTheDocument();
    expect(document.querySelector("b")).toBeNull();
  });
});
