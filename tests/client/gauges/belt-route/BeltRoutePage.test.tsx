import { fireEvent, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { BeltRoutePage } from "../../../../client/features/gauges/belt-route/BeltRoutePage";
import { renderAt } from "../../support/renderAt";

const two = "?pulley=Motor+0+0+20&pulley=Platter+100+0+20&kind=flat-belt&thickness=1+mm&stretch=0-0";
const open = (query = two) =>
  renderAt(`/gauges/belt-route${query}`, { "/gauges/belt-route": <BeltRoutePage />, "/find": <p>Results</p> });
const address = () => decodeURIComponent(screen.getByLabelText("address").textContent ?? "").replaceAll("+", " ");
const figures = () => within(screen.getByRole("complementary", { name: "What follows" }));
/** Two equal pulleys: twice their distance and once round one, along the middle of a 1 mm belt. */
const lengthOf = (apart: number, diameter = 20) => (2 * apart + Math.PI * (diameter + 1)).toFixed(1);

describe("the belt route gauge", () => {
  it("shows a worked example when the address says nothing", () => {
    open("");
    expect(figures().getByText("559.7")).toBeVisible();
    expect(figures().getByText("524.3 to 539.7")).toBeVisible();
    expect(screen.getByRole("button", { name: /^Flywheel: x 168/ })).toBeVisible();
  });

  it("reads the address, and what it cannot read is the example's", () => {
    open();
    expect(figures().getByText(lengthOf(100))).toBeVisible();
    expect(screen.getByLabelText("Name of pulley 2")).toHaveValue("Platter");
  });
  it("takes no half of a belt", () => {
    open("?pulley=Motor+0+0+20&pulley=Platter+x+0+20");
    expect(screen.getByLabelText("Name of pulley 4")).toHaveValue("Take-up");
  });

  it("moves a pulley by the arrow keys: 1 mm, 10 with Shift, a tenth with Alt, and says what comes of it", async () => {
    const user = userEvent.setup();
    open();
    screen.getByRole("button", { name: /^Platter:/ }).focus();
    await user.keyboard("{ArrowRight}");
    expect(figures().getByText(lengthOf(101))).toBeVisible();
    await user.keyboard("{Shift>}{ArrowRight}{/Shift}");
    expect(figures().getByText(lengthOf(111))).toBeVisible();
    await user.keyboard("{Alt>}{ArrowLeft}{/Alt}");
    expect(screen.getByLabelText("x of Platter, mm")).toHaveValue("110.9");
    expect(figures().getByText(lengthOf(110.9))).toBeVisible();
    const place = "Platter at 110.9, 0, 20 mm across.";
    expect(await screen.findByText(new RegExp(`^${place} ${lengthOf(110.9)} mm in place`))).toBeInTheDocument();
    await waitFor(() => expect(address()).toContain("pulley=Platter 110.9 0 20&"));
  });

  it("sets the diameter of the chosen pulley by the handle on its rim", async () => {
    const user = userEvent.setup();
    open();
    await user.click(screen.getByRole("button", { name: /^Motor:/ }));
    const rim = screen.getByRole("slider", { name: "Diameter of Motor" });
    rim.focus();
    await user.keyboard("{ArrowUp}");
    expect(rim).toHaveAttribute("aria-valuenow", "21");
    expect(screen.getByLabelText("Diameter of Motor, mm")).toHaveValue("21");
  });

  it("drags a pulley with the pointer, drawn once a frame", async () => {
    open();
    const platter = screen.getByRole("button", { name: /^Platter:/ });
    fireEvent.pointerDown(platter, { button: 0, clientX: 400, clientY: 200, pointerId: 1 });
    fireEvent.pointerMove(platter, { clientX: 420, clientY: 200, pointerId: 1 });
    fireEvent.pointerMove(platter, { clientX: 460, clientY: 200, pointerId: 1 });
    fireEvent.pointerUp(platter, { pointerId: 1 });
    const x = Number((screen.getByLabelText("x of Platter, mm") as HTMLInputElement).value);
    expect(x).toBeGreaterThan(105);
    expect(screen.getByRole("button", { name: /^Platter:/ })).toHaveAccessibleName(
      `Platter: x ${x.toFixed(2)} mm, y 0.00 mm, 20.00 mm across`,
    );
    expect(figures().getByText(lengthOf(x))).toBeVisible();
  });

  it("takes any format of a length, and keeps the last good picture while one is wrong", async () => {
    const user = userEvent.setup();
    open();
    const x = screen.getByLabelText("x of Platter, mm");
    await user.clear(x);
    await user.type(x, "-4 in");
    expect(figures().getByText(lengthOf(101.6))).toBeVisible();
    await user.clear(x);
    await user.type(x, "90 ells");
    expect(x).toBeInvalid();
    expect(figures().getByText(lengthOf(90))).toBeVisible();
    expect(x).toHaveAccessibleDescription(/ells.* is not a unit/);
    await user.clear(x);
    await user.type(x, "0");
    expect(figures().getByText("Pulleys 1 and 2 overlap. Move them apart or make one smaller.")).toBeVisible();
  });

  it("names the pulley that overlaps or is not touched, and closes again when it is mended", async () => {
    const user = userEvent.setup();
    open("");
    const y = screen.getByLabelText("y of Idler, mm");
    await user.clear(y);
    await user.type(y, "-60");
    expect(figures().getByText(/^The belt does not touch Idler \(2\)\. Move it/)).toBeVisible();
    expect(figures().queryByRole("link", { name: "Find this belt" })).toBeNull();
    await user.selectOptions(screen.getByLabelText("Side of the belt on Idler"), "inside");
    expect(figures().queryByText(/does not touch/)).toBeNull();
    expect(figures().getByRole("link", { name: "Find this belt" })).toBeVisible();
  });

  it("adds a pulley that the belt touches, removes it, puts it back", async () => {
    const user = userEvent.setup();
    open();
    await user.click(screen.getByRole("button", { name: "Add a pulley" }));
    expect(screen.getAllByRole("listitem")).toHaveLength(3);
    expect(figures().getByRole("link", { name: "Find this belt" })).toBeVisible();
    await user.type(screen.getByLabelText("Name of pulley 2"), "Guide");
    await user.click(screen.getByRole("button", { name: "Remove Guide" }));
    expect(screen.getAllByRole("listitem")).toHaveLength(2);
    for (const button of screen.getAllByRole("button", { name: /^Remove/ })) expect(button).toBeDisabled();
    await user.click(screen.getByRole("button", { name: "Put it back" }));
    expect(screen.getByLabelText("Name of pulley 2")).toHaveValue("Guide");
  });

  it("changes the order in which the belt comes by", async () => {
    const user = userEvent.setup();
    open();
    await user.click(screen.getByRole("button", { name: "Motor later" }));
    expect(screen.getByLabelText("Name of pulley 1")).toHaveValue("Platter");
    expect(screen.getByRole("button", { name: "Motor later" })).toBeDisabled();
    await waitFor(() => expect(address()).toMatch(/pulley=Platter .*pulley=Motor /));
  });

  it("hands the length on to the search as worked out, with all that the search knew", async () => {
    const user = userEvent.setup();
    open(`${two.replace("0-0", "3-6")}&width=4+mm&family=test-family&shipTo=NO&unit=mm`);
    const link = figures().getByRole("link", { name: "Find this belt" });
    const query = new URL(link.getAttribute("href") ?? "", "http://idlewright.example").searchParams;
    const pitch = 200 + Math.PI * 21;
    const [low, high] = [pitch / 1.06 - Math.PI, pitch / 1.03 - Math.PI];
    expect(Object.fromEntries(query)).toEqual({
      kind: "flat-belt",
      insideCircumference: `${((low + high) / 2).toFixed(1)} ± ${((high - low) / 2).toFixed(1)} mm`,
      width: "4 ± 0.2 mm",
      thickness: "1 ± 0.1 mm",
      condition: "missing",
      family: "test-family",
      shipTo: "NO",
      unit: "mm",
    });
    await user.click(link);
    expect(screen.getByText("Results")).toBeVisible();
  });

  it("takes what the search knew of the belt, written in any of its ways", () => {
    open(`${two.replace("1+mm", "1.2+%C2%B1+0.1+mm")}&width=4.1+mm;+3.9+mm`);
    expect(screen.getByLabelText("Thickness")).toHaveValue("1.2 mm");
    expect(screen.getByLabelText("Width")).toHaveValue("4 mm");
  });

  it("offers the published stretches of round belts with their sources, an O-ring's counted on its inside", async () => {
    const user = userEvent.setup();
    open();
    await user.selectOptions(screen.getByLabelText("Kind"), "round-belt");
    await user.selectOptions(screen.getByLabelText("Stretch in place"), "O-ring as a belt, 8 to 12 %");
    expect(screen.getByText(/Published O-ring design guidance/)).toBeVisible();
    const inner = 200 + Math.PI * 20;
    expect(figures().getByText(`${(inner / 1.12).toFixed(1)} to ${(inner / 1.08).toFixed(1)}`)).toBeVisible();
    await user.selectOptions(screen.getByLabelText("Stretch in place"), "Polyurethane 92A, 7.5 %");
    expect(screen.getByLabelText("At most, %")).toHaveValue("7.5");
    await user.clear(screen.getByLabelText("At most, %"));
    await user.type(screen.getByLabelText("At most, %"), "2");
    expect(screen.getByText("The largest stretch must not be less than the smallest.")).toBeVisible();
  });
});
