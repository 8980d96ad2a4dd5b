import { screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it } from "vitest";
import { StripBar } from "../../../client/features/search/StripBar";
import { renderAt } from "../support/renderAt";
import { stubApi } from "../support/stubApi";

async function renderStrip(address = "/") {
  renderAt(address, { "/": null, "/find": null, "/parts/:id": null }, <StripBar />);
  await screen.findByLabelText("Kind of part");
}

const address = () => screen.getByLabelText("address").textContent ?? "";
const query = () => Object.fromEntries(new URLSearchParams(address().split("?")[1]));
const diameter = () => screen.getByLabelText("outside diameter");
const choose = (label: string, option: string) => userEvent.selectOptions(screen.getByLabelText(label), option);
const hrefOf = (name: string | RegExp) => screen.findByRole("link", { name }).then((link) => link.getAttribute("href"));

beforeEach(() => {
  stubApi({});
});

describe("the measure strip", () => {
  it("shows back what it understood of a fraction, and writes the need into the address", async () => {
    await renderStrip();
    await userEvent.type(diameter(), "1-47/64");
    expect(diameter()).toHaveAccessibleDescription(/in = 44\.05 mm/);

    await userEvent.selectOptions(screen.getByLabelText("Condition of the old part"), "glazed");
    await userEvent.type(diameter(), "{Enter}");
    await waitFor(() => expect(address()).toMatch(/^\/find\?/));
    expect(query()).toEqual({
      kind: "idler-wheel",
      outsideDiameter: "1-47/64",
      condition: "glazed",
      shipTo: "DE",
    });
  });

  it("refuses nonsense in words beside the field, keeps it, and stays", async () => {
    await renderStrip();
    await userEvent.type(diameter(), "about so{Enter}");
    await waitFor(() => expect(diameter()).toHaveAccessibleDescription(/does not begin with a number/));
    expect(diameter()).toBeInvalid();
    expect(diameter()).toHaveValue("about so");
    expect(diameter()).toHaveFocus();
    expect(address()).toBe("/");
  });

  it("adds a size of the kind and puts the cursor there, and takes it out again", async () => {
    await renderStrip("/?kind=idler-wheel&outsideDiameter=44.1");
    await userEvent.selectOptions(screen.getByLabelText("Add a size"), "bore");
    expect(screen.getByRole("textbox", { name: "bore" })).toHaveFocus();
    await userEvent.click(screen.getByRole("button", { name: "Leave out bore" }));
    expect(screen.queryByRole("textbox", { name: "bore" })).not.toBeInTheDocument();
  });

  it("offers only conditions that the kind can be in, and drops one that the new kind cannot", async () => {
    await renderStrip("/?kind=flat-belt&condition=slack");
    const condition = screen.getByLabelText("Condition of the old part");
    expect(condition).toHaveDisplayValue("slack");
    await userEvent.selectOptions(screen.getByLabelText("Kind of part"), "idler wheel");
    expect(condition).toHaveDisplayValue("sound");
    expect(screen.queryByRole("option", { name: "slack" })).not.toBeInTheDocument();
  });

  it("works out the size when new as it is written, and says why", async () => {
    await renderStrip("/?kind=idler-wheel&outsideDiameter=44.05&condition=glazed");
    expect(await screen.findByText(/As new it was about/)).toHaveTextContent("44.15 ± 0.17");
    expect(screen.getByText("Being glazed took about 0.10 mm from the outside diameter")).toBeInTheDocument();
  });

  it("is reached by the slash key from anywhere but a field", async () => {
    await renderStrip();
    await userEvent.keyboard("/");
    expect(diameter()).toHaveFocus();
    await userEvent.keyboard("/");
    expect(diameter()).toHaveValue("/");
  });
});

describe("several readings of a size", () => {
  it("are written one after another, and shown back as their mean", async () => {
    await renderStrip();
    await userEvent.type(diameter(), "44.1");
    await userEvent.click(screen.getByRole("button", { name: "+ reading of the outside diameter" }));
    expect(diameter()).toHaveFocus();
    await userEvent.keyboard("44.0; 44.2");
    expect(diameter()).toHaveValue("44.1; 44.0; 44.2");
    expect(diameter()).toHaveAccessibleDescription("3 readings, mean 44.10 mm");
    await userEvent.keyboard("{Enter}");
    await waitFor(() => expect(query().outsideDiameter).toBe("44.1; 44.0; 44.2"));
  });

  it("name the one that cannot be read", async () => {
    await renderStrip();
    await userEvent.type(diameter(), "44.1; x{Enter}");
    await waitFor(() => expect(diameter()).toHaveAccessibleDescription(/Reading 2: “x”/));
    expect(address()).toBe("/");
  });

  it("say so where they show a flat spot", async () => {
    await renderStrip("/?kind=idler-wheel&outsideDiameter=44.00;+43.70;+44.00");
    expect(await screen.findByText("Flat spot: the readings differ by 0.30 mm")).toBeInTheDocument();
    expect(screen.getByText(/As new it was about/)).toHaveTextContent("44.00");
  });
});

describe("a part that is gone", () => {
  const belt = "/?kind=flat-belt&insideCircumference=540&width=5.0+mm&family=lean-deck&shipTo=NO";

  it("leads a belt to its pulleys, with all that is known of it but its length", async () => {
    await renderStrip(belt);
    await choose("Condition of the old part", "missing");
    expect(screen.queryByLabelText("inside circumference")).not.toBeInTheDocument();
    const [path, params] = ((await hrefOf("work it out from the pulleys")) ?? "").split("?");
    expect(path).toBe("/gauges/belt-route");
    expect(Object.fromEntries(new URLSearchParams(params))).toEqual({
      kind: "flat-belt",
      width: "5.0 mm",
      family: "lean-deck",
      shipTo: "NO",
      unit: "mm",
    });
  });

  it("takes its readings back when it turns up again", async () => {
    await renderStrip(belt);
    await choose("Condition of the old part", "melted");
    expect(screen.queryByLabelText("width")).not.toBeInTheDocument();
    await choose("Condition of the old part", "slack");
    expect(screen.getByLabelText("width")).toHaveValue("5.0 mm");
    expect(screen.getByLabelText("inside circumference")).toHaveValue("540");
  });

  it("leads a wheel to the register of its mechanism, and to what else helps", async () => {
    await renderStrip("/?kind=idler-wheel&condition=missing&family=lean-deck");
    expect(await hrefOf("its mechanism")).toBe("/families/lean-deck");
    expect(await hrefOf("guides")).toBe("/guides");
    expect(screen.queryByText("How to measure it")).not.toBeInTheDocument();
  });

  it("is searched by a size that was worked out, which stands in the sentence and can be changed", async () => {
    await renderStrip("/?kind=flat-belt&insideCircumference=532+%C2%B1+8+mm&condition=missing");
    const length = screen.getByLabelText("inside circumference");
    expect(length).toHaveValue("532 ± 8 mm");
    expect(length.parentElement).toHaveTextContent("worked out as");
    expect(length).not.toBeInvalid();
    expect(await screen.findByText(/taken as it stands, without correction/)).toBeInTheDocument();
    await userEvent.clear(length);
    await userEvent.type(length, "530 +- 6{Enter}");
    await waitFor(() =>
      expect(query()).toEqual({
        kind: "flat-belt",
        insideCircumference: "530 +- 6",
        condition: "missing",
        shipTo: "DE",
      }),
    );
    expect(screen.getByLabelText("inside circumference")).toHaveAccessibleDescription("530 ± 6 mm");
  });

  it("takes no reading, says how to write what was worked out, and stays where nothing else is asked", async () => {
    await renderStrip("/?kind=flat-belt&condition=missing");
    await choose("Add a size", "width");
    const width = screen.getByLabelText("width");
    expect(width).toHaveFocus();
    await userEvent.type(width, "5.0");
    expect(width).toHaveAccessibleDescription(/Not searched until a ± says how far it may be off, as in 4 ± 0.2 mm/);
    await userEvent.keyboard("{Enter}");
    expect(width).toHaveFocus();
    expect(address()).toBe("/?kind=flat-belt&condition=missing");
    await userEvent.type(width, " ± 0.3{Enter}");
    await waitFor(() => expect(query().width).toBe("5.0 ± 0.3"));
  });

  it("keeps a reading that came with a worked-out size, and says that it is not searched", async () => {
    const address = "/find?kind=flat-belt&insideCircumference=532+%C2%B1+8+mm&thickness=1.2+mm&condition=missing";
    await renderStrip(address);
    const thickness = screen.getByLabelText("thickness");
    expect(thickness).toHaveValue("1.2 mm");
    expect(thickness).not.toBeInvalid();
    expect(thickness).toHaveAccessibleDescription(/Not searched until/);
    await choose("Condition of the old part", "missing");
    await userEvent.click(screen.getByRole("button", { name: "Find" }));
    await waitFor(() => expect(query().shipTo).toBe("DE"));
    expect(query().thickness).toBe("1.2 mm");
  });
});

describe("help with measuring", () => {
  it("shows how the sizes in the sentence are measured, and follows them", async () => {
    await renderStrip();
    await userEvent.click(screen.getByText("How to measure it"));
    expect(await screen.findByText("Common mistakes")).toBeInTheDocument();
    expect(screen.getByText("Outside diameter.")).toBeInTheDocument();
    expect(screen.queryByText("Bore.")).not.toBeInTheDocument();
    await choose("Add a size", "bore");
    expect(screen.getByText("Bore.")).toBeInTheDocument();
    await choose("Kind of part", "flat belt");
    expect(screen.getByText("Inside circumference.")).toBeInTheDocument();
  });

  it("offers other ways to measure a belt, and takes along what was read", async () => {
    await renderStrip(
      "/?kind=square-belt&insideCircumference=540;+541&section=2.0&condition=slack&instrument=steel-rule",
    );
    const [path, params] = ((await hrefOf("Laid flat, or on a cone")) ?? "").split("?");
    expect(path).toBe("/gauges/belt-sample");
    expect(Object.fromEntries(new URLSearchParams(params))).toEqual({
      kind: "square-belt",
      insideCircumference: "540; 541",
      section: "2.0",
      instrument: "steel-rule",
      condition: "slack",
      shipTo: "DE",
      unit: "mm",
    });
  });
});
