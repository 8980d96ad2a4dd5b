import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { KitDrawing } from "../../../client/ui/drawing/KitDrawing";

const lines = [
  { label: "platter idler", kind: "idler-wheel" as const, dims: { outsideDiameter: { nominalMm: 44.2 } } },
  { label: "<b>grease</b>", quantity: 2 },
];

describe("KitDrawing", () => {
  it("names its lines and describes every part", () => {
    render(<KitDrawing lines={lines} />);
    const drawing = screen.getByRole("img", { name: "Kit of 2 lines" });
    expect(drawing).toHaveAccessibleDescription(expect.stringContaining("outside diameter 44.2 mm"));
    expect(screen.getByText("platter idler")).toBeInTheDocument();
    expect(screen.getByText("Not drawn: 2 × <b>grease</b>")).toBeInTheDocument();
  });
});
