import { fireEvent, screen, within } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { ORingsPage } from "../../../../client/features/gauges/o-rings/ORingsPage";
import { renderAt } from "../../support/renderAt";

const show = (address = "/gauges/o-rings") => renderAt(address, { "/gauges/o-rings": <ORingsPage /> });
const write = (label: RegExp, value: string) => fireEvent.change(screen.getByLabelText(label), { target: { value } });
// By text, since roles are slow to look for in a page with a large drawing.
const buttonOf = (dash: string) => screen.getByText(dash, { selector: "button" });
const rowOf = (dash: string) => buttonOf(dash).closest("tr")!;
const rail = () => document.querySelector(".gauge-sheet svg")!;
const tickOf = (dash: string) =>
  [...rail().querySelectorAll(".rail-tick")].find((tick) => tick.querySelector("title")?.textContent === dash)!;

describe("ORingsPage", () => {
  it("shows a worked example: ring 214 on a seat of 26 mm, drawn and in numbers", () => {
    show();
    expect(screen.getByText("Ring 214")).toBeVisible();
    expect(
      screen.getByRole("img", { name: /Ring 214, 24\.99 mm inside, stretched by 4\.0 % to 26\.00 mm/ }),
    ).toBeVisible();
    expect(screen.getByRole("img", { name: /4\.0 %; advised from 1 to 5 %/ })).toBeVisible();
    // Section by both ways: 3.53 mm by constant volume and by the curve from memory.
    expect(screen.getByText(/1\.6 % less, by constant volume/)).toBeVisible();
    expect(screen.getByText(/2\.9 % less, 3\.43 mm, by an empirical curve for seals \(from memory\)/)).toBeVisible();
  });

  it("follows what is typed, and keeps the last good picture, greyed, while a field is wrong", () => {
    show();
    write(/^Diameter of the seat/, "42");
    expect(screen.getByText("Ring 223")).toBeVisible();
    write(/^Diameter of the seat/, "40 furlongs");
    expect(screen.getByLabelText(/^Diameter of the seat/)).toBeInvalid();
    expect(screen.getByText("Ring 223")).toBeVisible();
    expect(document.querySelector(".gauge-sheet")).toHaveClass("opacity-40");
  });

  it("says which belts stretch by 8 to 12 %, and when a groove is too small", () => {
    show("/gauges/o-rings?use=belt&path=300+mm&section=3.5+mm&groove=14+mm");
    expect(within(rowOf("237")).getByText(/11\.9 %/)).toHaveClass("text-inband");
    expect(within(rowOf("238")).getByText(/7\.9 %/)).not.toHaveClass("text-inband");
    expect(screen.getByText("Yours is too small")).toBeVisible();
    write(/^Smallest groove/, "14.2");
    expect(screen.getByText("Yours is large enough")).toBeVisible();
  });

  it("lights a mark by its row, and a row by its mark", () => {
    show();
    fireEvent.pointerEnter(rowOf("215"));
    expect(tickOf("215")).toHaveAttribute("data-lit");
    expect(tickOf("214")).not.toHaveAttribute("data-lit");
    fireEvent.pointerLeave(rowOf("215"));
    expect(tickOf("215")).not.toHaveAttribute("data-lit");
    fireEvent.pointerEnter(tickOf("213"));
    expect(rowOf("213")).toHaveAttribute("data-lit");
  });

  it("draws the ring whose number is pressed, on the list or on the rail", () => {
    show();
    fireEvent.click(buttonOf("215"));
    expect(screen.getByText("Ring 215")).toBeVisible();
    expect(buttonOf("215")).toHaveAttribute("aria-pressed", "true");
    expect(screen.getByText("It is loose.")).toBeVisible();
    fireEvent.click(tickOf("120"));
    expect(screen.getByText("Ring 120")).toBeVisible();
  });

  it("leads to a search for the ring that is drawn", () => {
    show();
    expect(screen.getByText("Find this ring")).toHaveAttribute(
      "href",
      "/find?kind=drive-ring&insideDiameter=24.99+mm&section=3.53+mm",
    );
  });

  it("compares with the old ring instead of a seat, where that was measured", () => {
    show("/gauges/o-rings?use=ring&insideDiameter=24.9+mm&section=3.5+mm");
    expect(screen.getByText("0.09 mm larger inside than the old one.")).toBeVisible();
    expect(screen.queryByText("Stretch in place")).toBeNull();
  });
});
