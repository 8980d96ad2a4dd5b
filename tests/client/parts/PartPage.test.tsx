import { screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import type { PartPage as Answer } from "#shared/schemas/catalogue";
import { PartPage } from "../../../client/features/parts/PartPage";
import { StripBar } from "../../../client/features/search/StripBar";
import { buildItem, buildSearchAnswer } from "../support/buildSearchAnswer";
import { renderAt } from "../support/renderAt";
import { type Answers, stubApi } from "../support/stubApi";

function buildPage(change: Partial<Answer> = {}): Answer {
  const { part, workshop, fit, evidence, landedMinor, shippingMinor, currency } = buildItem();
  return {
    part,
    workshop,
    fit,
    evidence,
    landedMinor,
    shippingMinor,
    currency,
    description: "Ground between centres.",
    trader: {
      legalName: "Test Works AS",
      address: ["Storgata 1", "0101 Testby"],
      email: "post@example.org",
      phone: "+00 555 0100",
      registration: null,
    },
    photos: [],
    fitClaims: [],
    need: buildSearchAnswer().need,
    madeToSize: false,
    ...change,
  };
}

function renderPart(answers: Answers, search = "?kind=idler-wheel&outsideDiameter=44.05+mm&condition=glazed") {
  const calls = stubApi(answers);
  renderAt(`/parts/one${search}`, { "/parts/:id": <PartPage /> }, <StripBar />);
  return calls;
}

describe("the page of a part", () => {
  it("says how surely it fits, in words, and size by size", async () => {
    renderPart({ "/parts/one": () => ({ body: buildPage() }) });
    expect(await screen.findByRole("heading", { level: 1, name: "Test wheel" })).toBeInTheDocument();
    expect(screen.getByText("Sure, 96 %")).toBeInTheDocument();
    expect(screen.getByText("too small below 43.65")).toBeInTheDocument();
    expect(screen.getByText("too large above 44.65")).toBeInTheDocument();
    expect(screen.getByText(/Sold by a trader: Test Works AS/)).toHaveTextContent("14 days from delivery");
  });

  it("leads from a size that was not measured to its field in the sentence, and asks anew", async () => {
    const calls = renderPart({ "/parts/one": () => ({ body: buildPage() }) });
    await userEvent.click(await screen.findByRole("button", { name: "measure it" }));
    const bore = screen.getByLabelText("bore");
    expect(bore).toHaveFocus();
    await userEvent.type(bore, "4.02 mm{Enter}");
    const asked = () => calls.filter(({ path }) => path === "/parts/one").map(({ query }) => query.get("bore"));
    await waitFor(() => expect(asked()).toEqual([null, "4.02 mm"]), { timeout: 5000 });
    expect(screen.getByLabelText("address")).toHaveTextContent(/^\/parts\/one\?/);
  });

  it("says that a part made to size cannot be sent back on a change of mind", async () => {
    renderPart({ "/parts/one": () => ({ body: buildPage({ madeToSize: true }) }) });
    expect(await screen.findByText(/Sold by a trader/)).toHaveTextContent(
      "made to your size, so it cannot be sent back",
    );
  });

  it("says where a workshop does not post to", async () => {
    renderPart({ "/parts/one": () => ({ body: buildPage({ landedMinor: null, shippingMinor: null }) }) });
    expect(await screen.findByText("This workshop does not post to Germany.")).toBeInTheDocument();
    expect(screen.getByText("€24.00")).toBeInTheDocument();
  });

  it("offers other parts of the size where this one is gone", async () => {
    const problem = { type: "/problems/not-found", title: "There is nothing here", status: 404, detail: "Nothing." };
    renderPart({ "/parts/one": () => ({ status: 404, body: problem }) });
    expect(await screen.findByText("This part is not offered any more")).toBeInTheDocument();
    const others = screen.getByRole("link", { name: "Look for others" });
    expect(others).toHaveAttribute("href", expect.stringContaining("/find?kind=idler-wheel&outsideDiameter=44.05+mm"));
  });

  it("begins the sentence with the kind of the part where nothing was measured", async () => {
    const page = buildPage({ fit: null, need: { ...buildSearchAnswer().need, kind: null, dimensions: [] } });
    page.part = { ...page.part, kind: "pinch-roller" };
    renderPart({ "/parts/one": () => ({ body: page }) }, "");
    await screen.findByRole("heading", { level: 1 });
    await waitFor(() => expect(screen.getByLabelText("Kind of part")).toHaveDisplayValue("pinch roller"));
  });
});
