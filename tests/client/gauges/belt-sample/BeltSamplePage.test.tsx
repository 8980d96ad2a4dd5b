import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { MemoryRouter } from "react-router-dom";
import { beforeEach, describe, expect, it } from "vitest";
import { estimateAsNew } from "#shared/domain/asNew";
import { estimateBeltSample } from "#shared/domain/beltSample";
import { parseSize } from "#shared/domain/parseSize";
import { sizeAsNew } from "#shared/domain/sizeAsNew";
import { BeltSamplePage } from "../../../../client/features/gauges/belt-sample/BeltSamplePage";

const open = (search = "") =>
  render(
    <MemoryRouter initialEntries={[`/gauges/belt-sample${search}`]}>
      <BeltSamplePage />
    </MemoryRouter>,
  );
const readout = (label: string) => screen.getByRole("heading", { name: label }).closest("section")!;
const found = () => new URL(screen.getByRole("link", { name: "Find this belt" }).getAttribute("href")!, "http://x");
/** The standard uncertainty that the search makes of what is handed over, as reckoned by the domain itself. */
function asSearched() {
  const params = found().searchParams;
  const size = parseSize(params.get("insideCircumference")!, "mm");
  if (!size.ok) throw new Error(size.problem);
  const circumstances = { instrument: "steel-rule", condition: "slack" } as const;
  return sizeAsNew(size, { kind: "flat-belt", dimension: "insideCircumference", ...circumstances }).asNew;
}

const flat = "?method=lay-flat-inside&readings=215+mm&instrument=steel-rule&condition=slack";

describe("the belt sample gauge", () => {
  beforeEach(() => localStorage.clear());

  it("opens on a worked example, never on an empty board", () => {
    open();
    expect(screen.getByRole("radio", { name: /Laid flat, inside/ })).toBeChecked();
    expect(readout("As found")).toHaveTextContent("523.33");
    expect(readout("As new")).toHaveTextContent("507.63");
    expect(screen.getByRole("img", { name: /Laid flat, the inside was 261.67 mm as found/ })).toBeInTheDocument();
  });

  it("offers five ways to choose from by keyboard, and says what a reading is", async () => {
    const user = userEvent.setup();
    open(`${flat}&thickness=2+mm`);
    expect(screen.getAllByRole("radio")).toHaveLength(5);
    screen.getByRole("radio", { name: /Laid flat, inside/ }).focus();
    await user.keyboard("{ArrowDown}");
    expect(screen.getByRole("radio", { name: /Laid flat, over all/ })).toBeChecked();
    // C = 2 (F - 2 t) = 2 (215 - 4).
    expect(readout("As found")).toHaveTextContent("422.00");
    expect(screen.getByRole("heading", { name: "Length over the folds" })).toBeInTheDocument();
  });

  it("follows the readings, adds them and leaves them out, and shows mean and scatter", async () => {
    const user = userEvent.setup();
    open(flat);
    expect(screen.getByText(/how much it scatters is not known/)).toBeInTheDocument();
    await user.click(screen.getByRole("button", { name: "Add a reading" }));
    await user.type(screen.getByRole("textbox", { name: "Reading 2" }), "217");
    expect(screen.getByText(/^Mean of 2:/)).toHaveTextContent(
      "Mean of 2: 216.00 mm, from 215.00 to 217.00, standard deviation 1.41",
    );
    expect(readout("As found")).toHaveTextContent("432.00");
    await user.click(screen.getByRole("button", { name: "Leave out reading 1" }));
    expect(readout("As found")).toHaveTextContent("434.00");
  });

  it("takes a list of readings that is pasted into one field apart", async () => {
    const user = userEvent.setup();
    open(flat);
    const field = screen.getByRole("textbox", { name: "Reading" });
    await user.clear(field);
    await user.click(field);
    await user.paste("215; 216 mm; 8 1/2 in");
    expect(screen.getAllByRole("textbox", { name: /^Reading \d$/ })).toHaveLength(3);
    expect(screen.getByText(/^Mean of 3:/)).toBeInTheDocument();
  });

  it("keeps the last good picture while a field is wrong, with the reason beside it", async () => {
    const user = userEvent.setup();
    open(flat);
    const field = screen.getByRole("textbox", { name: "Reading" });
    await user.clear(field);
    expect(field).toHaveAccessibleDescription("Write a reading, like 262 mm.");
    expect(readout("As found")).toHaveTextContent("430.00");
    expect(screen.getByRole("status")).toHaveTextContent("not of these readings");
  });

  it("asks for the thickness where it enters, and refuses one that the fold cannot hold", async () => {
    const user = userEvent.setup();
    open("?method=outside-circumference&readings=430+mm");
    const thickness = screen.getByRole("textbox", { name: "Thickness" });
    expect(thickness).toHaveAccessibleDescription(/needs the belt's thickness/);
    expect(screen.getByRole("status")).toHaveTextContent("not of these readings");
    expect(screen.queryByRole("link", { name: "Find this belt" })).not.toBeInTheDocument();
    await user.type(thickness, "49");
    expect(readout("As found")).toHaveTextContent("122.12");
    await user.clear(thickness);
    await user.type(thickness, "51");
    expect(thickness).toHaveAccessibleDescription(/from 0 to 50 mm/);
  });

  it("hands the size over as worked out, so that the search reckons with just its uncertainty", () => {
    open(`${flat}&width=5+mm&thickness=0.8&family=some-family&shipTo=FR`);
    const params = found().searchParams;
    expect(found().pathname).toBe("/find");
    expect(Object.fromEntries(params)).toMatchObject({
      kind: "flat-belt",
      width: "5 mm",
      thickness: "0.8 mm",
      instrument: "steel-rule",
      condition: "slack",
      family: "some-family",
      shipTo: "FR",
    });
    const { asNew } = estimateBeltSample({
      method: "lay-flat-inside",
      readingsMm: [215],
      thicknessMm: 0.8,
      instrument: "steel-rule",
      condition: "slack",
    });
    const searched = asSearched();
    expect(Math.abs(searched.valueMm - asNew.insideCircumferenceMm)).toBeLessThanOrEqual(0.005);
    expect(Math.abs(searched.standardUncertaintyMm - asNew.standardUncertaintyMm)).toBeLessThan(0.004);
  });

  it("hands readings of the circumference over as they are, to the same end", () => {
    open(
      "?kind=round-belt&insideCircumference=523%3B+524+mm&section=3+mm&instrument=steel-rule&condition=slack&unit=mm",
    );
    expect(screen.getByRole("radio", { name: /Along the inside/ })).toBeChecked();
    const params = found().searchParams;
    expect(params.get("insideCircumference")).toBe("523 mm; 524 mm");
    expect(params.get("section")).toBe("3 mm");
    expect(params.has("width")).toBe(false);
    const { asNew } = estimateAsNew({
      kind: "round-belt",
      dimension: "insideCircumference",
      readingsMm: [523, 524],
      instrument: "steel-rule",
      condition: "slack",
    });
    expect(asSearched()).toEqual(asNew);
    expect(readout("As new")).toHaveTextContent(asNew.valueMm.toFixed(2));
  });

  it("tells where the uncertainty comes from, the largest share first, adding up to the whole", () => {
    open(`${flat.replace("lay-flat-inside", "lay-flat-outside").replace("slack", "sound")}&thickness=3+mm`);
    const table = screen.getByRole("table", { name: /Budget of the uncertainty/ });
    const rows = within(table).getAllByRole("row").slice(1);
    expect(rows[0]).toHaveTextContent("Thickness");
    expect(rows[0]).toHaveTextContent("taken as measured with a steel rule");
    const shares = rows.map((row) => Number.parseInt(within(row).getAllByRole("cell")[1]!.textContent ?? "", 10) || 0);
    expect(shares).toEqual([...shares].sort((a, b) => b - a));
    expect(Math.abs(shares.reduce((a, b) => a + b, 0) - 100)).toBeLessThanOrEqual(rows.length);
  });

  it("falls back to the example for what cannot be read in the address", () => {
    open("?method=by-eye&kind=idler-wheel&readings=;;&condition=melted&instrument=thumb&shipTo=nowhere");
    expect(screen.getByRole("radio", { name: /Laid flat, inside/ })).toBeChecked();
    expect(screen.getByRole("combobox", { name: "Kind" })).toHaveDisplayValue("flat belt");
    expect(screen.getByRole("combobox", { name: "Condition" })).toHaveDisplayValue("slack");
    expect(readout("As found")).toHaveTextContent("523.33");
  });

  it("keeps what was written when the unit changes, and shows inches first", async () => {
    const user = userEvent.setup();
    open(flat.replace("215+mm", "215"));
    await user.selectOptions(screen.getByRole("combobox", { name: "Sizes without a unit are in" }), "in");
    expect(screen.getByRole("textbox", { name: "Reading" })).toHaveValue("215 mm");
    expect(readout("As found")).toHaveTextContent("16.929");
  });
});
