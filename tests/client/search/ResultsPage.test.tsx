import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { ResultsPage } from "../../../client/features/search/ResultsPage";
import { buildItem, buildSearchAnswer } from "../support/buildSearchAnswer";
import { renderAt } from "../support/renderAt";
import { type Answers, stubApi } from "../support/stubApi";

const need = "/find?kind=idler-wheel&outsideDiameter=44.05+mm&condition=glazed";
const address = () => new URLSearchParams((screen.getByLabelText("address").textContent ?? "").split("?")[1]);

function renderResults(answers: Answers, at = need) {
  const calls = stubApi(answers);
  renderAt(at, { "/find": <ResultsPage />, "/parts/:id": null });
  return calls;
}
const answering = (answer = buildSearchAnswer()): Answers => ({ "/search": () => ({ body: answer }) });

describe("the results", () => {
  it("gives each part its verdict in words, its reason, its coverage and what it costs delivered", async () => {
    const items = [
      buildItem({ title: "Fine wheel", chance: 0.96 }),
      buildItem({ title: "Loose wheel", chance: 0.31, nominalMm: 43.7 }),
    ];
    renderResults(answering(buildSearchAnswer({ items })));
    const row = (await screen.findByRole("link", { name: "Fine wheel" })).closest("li")!;
    expect(row).toHaveTextContent("Sure 96 %");
    expect(row).toHaveTextContent("Reason of Fine wheel.");
    expect(row).toHaveTextContent("2 of 4 sizes checked");
    expect(row).toHaveTextContent("€31.40");
    expect(row).toHaveTextContent("to Germany: €24.00 + €7.40 postage");
    expect(row).toHaveTextContent("leaves in 2 days");
    expect(screen.getByRole("link", { name: "Loose wheel" }).closest("li")).toHaveTextContent("Chancy 31 %");
    expect(
      within(row).getByRole("img", { name: /outside diameter 44.20 mm: accepted from 43.65 to 44.65/ }),
    ).toBeVisible();
  });

  it("has a shape while it looks", () => {
    renderResults({ "/search": () => "never" });
    expect(screen.getByText("Looking for parts")).toBeInTheDocument();
  });

  it("says what rules out the most where nothing fits, and offers to look wider", async () => {
    const miss = {
      ...buildItem({ title: "Tight wheel", chance: 0.01 }),
      failing: { dimension: "bore" as const, reason: "Bore is tight." },
    };
    renderResults(answering(buildSearchAnswer({ items: [], nearMisses: [miss], total: 0 })), `${need}&material=CR`);
    expect(await screen.findByText("No part fits this as it stands")).toBeInTheDocument();
    expect(screen.getByText("One part misses by its bore alone; it is listed below.")).toBeInTheDocument();
    expect(screen.getByText("Bore is tight.")).toBeInTheDocument();
    await userEvent.click(screen.getByRole("link", { name: "not only CR" }));
    expect(address().get("material")).toBeNull();
    expect(address().get("outsideDiameter")).toBe("44.05 mm");
  });

  it("keeps the query when the server fails, and tries again", async () => {
    let tries = 0;
    const busy = { type: "/problems/unavailable", title: "Busy", status: 503, detail: "Idlewright is busy." };
    renderResults({ "/search": () => (++tries === 1 ? { status: 503, body: busy } : { body: buildSearchAnswer() }) });
    expect(await screen.findByRole("alert")).toHaveTextContent("Idlewright is busy.");
    expect(address().get("outsideDiameter")).toBe("44.05 mm");
    await userEvent.click(screen.getByRole("button", { name: "Try again" }));
    expect(await screen.findByRole("link", { name: "Test wheel" })).toBeInTheDocument();
  });

  it("says so when there is no connection", async () => {
    renderResults({ "/search": () => "offline" });
    expect(await screen.findByRole("alert")).toHaveTextContent("No connection");
  });

  it("appends the next page, and says how much is shown", async () => {
    const pages = [
      buildSearchAnswer({ items: [buildItem({ title: "First" })], total: 2, nextCursor: "next" }),
      buildSearchAnswer({ items: [buildItem({ title: "Second" })], total: 2 }),
    ];
    renderResults({ "/search": ({ query }) => ({ body: query.get("cursor") === "next" ? pages[1] : pages[0] }) });
    await userEvent.click(await screen.findByRole("button", { name: "More parts" }));
    expect(await screen.findByRole("link", { name: "Second" })).toBeInTheDocument();
    expect(screen.getByRole("link", { name: "First" })).toBeInTheDocument();
    expect(screen.getByText("2 of 2 parts shown")).toBeInTheDocument();
  });

  it("puts a part in the basket with what it is for, and says so", async () => {
    const lines: Record<string, number> = {};
    const calls = renderResults({
      ...answering(),
      "/basket/lines/Test-wheel": ({ body }) => {
        lines["Test wheel"] = (body as { quantity: number }).quantity;
        return { body: {} };
      },
    });
    await userEvent.click(await screen.findByRole("button", { name: /Put in basket/ }));
    await waitFor(() => expect(lines).toEqual({ "Test wheel": 1 }));
    expect(await screen.findByText("Test wheel is in the basket, 1 of it.")).toBeInTheDocument();
    const put = calls.find(({ method }) => method === "PUT");
    expect(put?.body).toEqual({ quantity: 1, forNeed: "idler wheel, outside diameter 44.05 mm" });
  });

  it("sorts and narrows through the address", async () => {
    const calls = renderResults(answering());
    await userEvent.click(await screen.findByRole("link", { name: "landed price" }));
    expect(address().get("sort")).toBe("price");
    await userEvent.selectOptions(screen.getByLabelText("Offer"), "stocked");
    expect(address().get("offer")).toBe("stocked");
    await waitFor(() => expect(calls.at(-1)?.query.get("offer")).toBe("stocked"));
    await userEvent.click(screen.getByRole("link", { name: "Take out: stocked" }));
    expect(address().get("offer")).toBeNull();
    expect(address().get("sort")).toBe("price");
  });
});

describe("the size rail", () => {
  it("moves the estimate by keyboard, in the address, and asks anew", async () => {
    const calls = renderResults(answering());
    const slider = await screen.findByRole("slider");
    expect(slider).toHaveAttribute("aria-valuetext", "44.15 mm");
    slider.focus();
    await userEvent.keyboard("{ArrowRight}");
    expect(slider).toHaveAttribute("aria-valuetext", "44.20 mm");
    await userEvent.keyboard("{Shift>}{ArrowLeft}{/Shift}");
    expect(slider).toHaveAttribute("aria-valuetext", "43.70 mm");
    await waitFor(() => expect(address().get("estimateMm")).toBe("43.700"));
    await waitFor(() => expect(calls.at(-1)?.query.get("estimateMm")).toBe("43.700"));
    expect(screen.getByRole("link", { name: "Test wheel" })).toBeInTheDocument();

    await userEvent.click(screen.getByRole("button", { name: "Back to what I measured" }));
    expect(address().get("estimateMm")).toBeNull();
  });

  it("goes to the ends of what it shows", async () => {
    renderResults(answering());
    const slider = await screen.findByRole("slider");
    slider.focus();
    await userEvent.keyboard("{Home}");
    expect(slider).toHaveAttribute("aria-valuenow", "42");
    await userEvent.keyboard("{End}");
    expect(slider).toHaveAttribute("aria-valuenow", "46.3");
  });
});
