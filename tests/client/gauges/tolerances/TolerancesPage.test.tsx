import { fireEvent, screen, within } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { TolerancesPage } from "../../../../client/features/gauges/tolerances/TolerancesPage";
import { renderAt } from "../../support/renderAt";

const show = (address = "/gauges/tolerances") => renderAt(address, { "/gauges/tolerances": <TolerancesPage /> });
const write = (label: RegExp, value: string) => fireEvent.change(screen.getByLabelText(label), { target: { value } });
const rowOf = (name: string) => screen.getByText(name, { selector: "tbody th" }).closest("tr")!;

describe("TolerancesPage", () => {
  it("shows a worked example: a wheel of 44.1 mm, four classes and what is usually accepted", () => {
    show();
    expect(within(rowOf("M3")).getByText("0.80")).toBeVisible();
    expect(within(rowOf("M3")).getByText("Likely 72 %")).toBeVisible();
    expect(within(rowOf("M1")).getByText("Sure over 99 %")).toBeVisible();
    expect(screen.getByText("43.60 to 44.60")).toBeVisible();
    expect(screen.getByText("50 times life size")).toBeInTheDocument();
    expect(screen.getByText(/over 40 up to and including 63 mm/)).toBeVisible();
  });

  it("follows what is typed, and keeps the last good picture, greyed, while a field is wrong", () => {
    show();
    write(/^Size as stated/, "1 in");
    expect(within(rowOf("M3")).getByText("0.60")).toBeVisible();
    write(/^Size as stated/, "a lot");
    expect(screen.getByLabelText(/^Size as stated/)).toBeInvalid();
    expect(within(rowOf("M3")).getByText("0.60")).toBeVisible();
    expect(document.querySelector(".gauge-sheet")).toHaveClass("opacity-40");
  });

  it("tells fixed from closure, in numbers and by the mould", () => {
    show();
    expect(screen.getByRole("img", { name: /^Fixed: both ends/ })).toBeVisible();
    write(/^In the mould/, "closure");
    expect(screen.getByRole("img", { name: /^Closure: the size runs across the split/ })).toBeVisible();
    expect(within(rowOf("M3")).getByText("1.30")).toBeVisible();
  });

  it("tells of the step at 160 mm: M2 fixed 0.70, then 0.81", () => {
    show();
    expect(within(rowOf("at 160 mm")).getByText("0.70")).toBeVisible();
    expect(within(rowOf("at 161 mm")).getByText("0.81")).toBeVisible();
  });

  it("leads to a search for what is needed, with its unit", () => {
    show();
    write(/^Size that is needed/, "44.2");
    expect(screen.getByText("Find such parts")).toHaveAttribute(
      "href",
      "/find?kind=idler-wheel&outsideDiameter=44.2+mm",
    );
    write(/^What it is/, "");
    expect(screen.queryByText("Find such parts")).toBeNull();
    expect(screen.queryByText("Usually accepted")).toBeNull();
  });

  it("compares a reading with a stated hardness, and says when the scale is wrong for it", () => {
    show();
    expect(screen.getByText(/50 Shore A stands for 45 to 55/)).toBeVisible();
    write(/^Your reading/, "57");
    expect(screen.getByText("57 lies outside.")).toBeVisible();
    write(/^Hardness as stated/, "93");
    write(/^Your reading/, "94");
    expect(screen.getByText("94 lies inside.")).toBeVisible();
    expect(screen.getByText(/read it on D/)).toBeVisible();
    write(/^Your reading/, "140");
    expect(screen.getByLabelText(/^Your reading/)).toBeInvalid();
  });
});
