import { screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import type { WorkshopParcelSummary } from "#shared/schemas/workshopParcel";
import { WorkshopOrdersPage } from "../../../client/features/workshop-orders/WorkshopOrdersPage";
import { idOf } from "../basket/fixtures";
import { renderPage } from "../basket/renderPage";
import { ok, refused, stubApi, unreachable } from "../basket/stubApi";
import { workshopParcelOf } from "./fixtures";

const row = (n: number, more: Partial<WorkshopParcelSummary> = {}): WorkshopParcelSummary => ({
  ...workshopParcelOf(),
  id: idOf(n),
  orderNumber: `26-${n}`,
  ...more,
});
const list = (items: WorkshopParcelSummary[], counts = {}, nextCursor: string | null = null) =>
  ok({ items, counts, nextCursor });
const show = (query = "") => renderPage(<WorkshopOrdersPage />, `/workshop/orders${query}`, "/workshop/orders");

beforeEach(() => {
  vi.useFakeTimers({ toFake: ["Date"] });
  vi.setSystemTime(new Date("2026-12-02T12:00:00.000Z"));
});
afterEach(() => {
  vi.useRealTimers();
});

describe("a workshop's parcels", () => {
  it("stand in rows: whose, what to do next, what is in it, by when it leaves", async () => {
    stubApi({
      "GET /workshop/parcels": () =>
        list([row(1), row(2, { state: "in-work", leavesBy: "2026-12-01T12:00:00.000Z", pieces: 1 })]),
    });
    show();
    const [first, late] = await screen.findAllByRole("listitem");
    expect(within(first!).getByRole("link", { name: "26-1" })).toHaveAttribute("href", `/workshop/orders/${idOf(1)}`);
    for (const words of [
      "Ada Winter",
      "Neuwarden, Germany",
      "To accept",
      "then accept it",
      "Leaves by 3 December 2026",
      "2 pieces",
    ]) {
      expect(first).toHaveTextContent(words);
    }
    expect(late).toHaveTextContent("Late: was to leave by 1 December 2026");
  });

  it("count the time of a re-mould from its core", async () => {
    stubApi({ "GET /workshop/parcels": () => list([row(1, { state: "core-awaited", leavesInDays: 18 })]) });
    show();
    expect(await screen.findByText("Leaves within 18 days of the core’s arrival")).toBeVisible();
  });

  it("are shown by state, which the address names", async () => {
    const calls = stubApi({
      "GET /workshop/parcels": ({ query }) =>
        list([row(query.get("state") === "ready" ? 7 : 1)], { "to-accept": 2, ready: 1, closed: 4 }),
    });
    show();
    const states = within(await screen.findByRole("navigation", { name: "Parcels by state" }));
    expect(states.getAllByRole("link").map((link) => link.textContent)).toEqual([
      "Still to leave 3",
      "To accept 2",
      "Ready 1",
      "Closed 4",
    ]);
    expect(states.getByRole("link", { current: "page" })).toHaveTextContent("Still to leave");
    await userEvent.click(states.getByRole("link", { name: "Ready 1" }));
    expect(await screen.findByRole("link", { name: "26-7" })).toBeVisible();
    expect(calls.at(-1)?.query.get("state")).toBe("ready");
    expect(screen.getByRole("link", { current: "page" })).toHaveTextContent("Ready");
  });

  it("come page by page", async () => {
    stubApi({
      "GET /workshop/parcels": ({ query }) =>
        query.get("cursor") === "next" ? list([row(3)]) : list([row(1), row(2)], {}, "next"),
    });
    show();
    await userEvent.click(await screen.findByRole("button", { name: "More parcels" }));
    expect(await screen.findByRole("link", { name: "26-3" })).toBeVisible();
    expect(screen.getAllByRole("listitem")).toHaveLength(3);
  });

  it("say so where there are none", async () => {
    stubApi({ "GET /workshop/parcels": () => list([]) });
    show();
    expect(await screen.findByText("Nothing waits to be sent")).toBeVisible();
  });

  it("say what failed, and are fetched again", async () => {
    let fails = true;
    stubApi({ "GET /workshop/parcels": () => (fails ? unreachable() : list([row(1)])) });
    show();
    expect(await screen.findByRole("alert")).toHaveTextContent("Your workshop’s parcels could not be fetched");
    fails = false;
    await userEvent.click(screen.getByRole("button", { name: "Try again" }));
    expect(await screen.findByRole("link", { name: "26-1" })).toBeVisible();
  });

  it("lead somebody without a workshop to their own orders", async () => {
    stubApi({ "GET /workshop/parcels": () => refused("not-allowed") });
    show();
    expect(await screen.findByText("This page is for workshops")).toBeVisible();
    expect(screen.getByRole("link", { name: "Your orders" })).toHaveAttribute("href", "/orders");
  });
});
