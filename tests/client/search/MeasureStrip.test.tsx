import { screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it } from "vitest";
import { StripBar } from "../../../client/features/search/StripBar";
import { renderAt } from "../support/renderAt";
import { stubApi } from "../support/stubApi";

const renderStrip = (address = "/") =>
  renderAt(address, { "/": null, "/find": null, "/parts/:id": null }, <StripBar />);
const address = () => screen.getByLabelText("address").textContent ?? "";
const diameter = () => screen.getByLabelText("outside diameter");

describe("the measure strip", () => {
  beforeEach(() => {
    stubApi({});
  });

  it("shows back what it understood of a fraction, and writes the need into the address", async () => {
    renderStrip();
    await userEvent.type(diameter(), "1-47/64");
    expect(diameter()).toHaveAccessibleDescription(/in = 44\.05 mm/);

    await userEvent.selectOptions(screen.getByLabelText("Condition of the old part"), "glazed");
    await userEvent.type(diameter(), "{Enter}");
    const [path, query] = address().split("?");
    expect(path).toBe("/find");
    expect(Object.fromEntries(new URLSearchParams(query))).toEqual({
      kind: "idler-wheel",
      outsideDiameter: "1-47/64",
      condition: "glazed",
      shipTo: "DE",
    });
  });

  it("refuses nonsense in words beside the field, keeps it, and stays", async () => {
    renderStrip();
    await userEvent.type(diameter(), "about so{Enter}");
    await waitFor(() => expect(diameter()).toHaveAccessibleDescription(/does not begin with a number/));
    expect(diameter()).toBeInvalid();
    expect(diameter()).toHaveValue("about so");
    expect(diameter()).toHaveFocus();
    expect(address()).toBe("/");
  });

  it("adds a size of the kind and puts the cursor there, and takes it out again", async () => {
    renderStrip("/?kind=idler-wheel&outsideDiameter=44.1");
    await userEvent.selectOptions(screen.getByLabelText("Add a size"), "bore");
    expect(screen.getByRole("textbox", { name: "bore" })).toHaveFocus();
    await userEvent.click(screen.getByRole("button", { name: "Leave out bore" }));
    expect(screen.queryByRole("textbox", { name: "bore" })).not.toBeInTheDocument();
  });

  it("offers only conditions that the kind can be in, and drops one that the new kind cannot", async () => {
    renderStrip("/?kind=flat-belt&condition=slack");
    const condition = screen.getByLabelText("Condition of the old part");
    expect(condition).toHaveDisplayValue("slack");
    await userEvent.selectOptions(screen.getByLabelText("Kind of part"), "idler wheel");
    expect(condition).toHaveDisplayValue("sound");
    expect(screen.queryByRole("option", { name: "slack" })).not.toBeInTheDocument();
  });

  it("works out the size when new as it is written, and says why", async () => {
    renderStrip("/?kind=idler-wheel&outsideDiameter=44.05&condition=glazed");
    expect(await screen.findByText(/As new it was about/)).toHaveTextContent("44.15 ± 0.17");
    expect(screen.getByText("Being glazed took about 0.10 mm from the outside diameter")).toBeInTheDocument();
  });

  it("is reached by the slash key from anywhere but a field", async () => {
    renderStrip();
    await userEvent.keyboard("/");
    expect(diameter()).toHaveFocus();
    await userEvent.keyboard("/");
    expect(diameter()).toHaveValue("/");
  });
});
