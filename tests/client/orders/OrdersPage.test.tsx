import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import type { OrderSummary } from "#shared/schemas/order";
import { OrdersPage } from "../../../client/features/orders/OrdersPage";
import { idOf, signedIn } from "../basket/fixtures";
import { renderPage } from "../basket/renderPage";
import { ok, type Routes, refused, stubApi, unreachable } from "../basket/stubApi";

const summary = (n: number, more: Partial<OrderSummary> = {}): OrderSummary => ({
  id: idOf(n),
  number: `26-${n}`,
  state: "paid",
  createdAt: "2026-12-01T12:00:00.000Z",
  totalMinor: 3140,
  currency: "EUR",
  workshops: ["North Moor Rubber", "Kade Works"],
  titles: ["Platter idler", "Flat belt", "Ring", "Mount", "Pad"],
  ...more,
});
const routes = (orders: Routes["GET /orders"]): Routes => ({
  "GET /auth/session": () => ok(signedIn),
  ...(orders ? { "GET /orders": orders } : {}),
});

describe("own orders", () => {
  it("stand in rows: number, day, state in words, what, from whom, how much", async () => {
    stubApi(routes(() => ok({ items: [summary(1), summary(2, { state: "expired" })], nextCursor: null })));
    renderPage(<OrdersPage />, "/orders");
    const [row, expired] = await screen.findAllByRole("listitem");
    const first = within(row as HTMLElement);
    expect(first.getByRole("link", { name: "26-1" })).toHaveAttribute("href", `/orders/${idOf(1)}`);
    expect(row).toHaveTextContent("1 December 2026");
    expect(row).toHaveTextContent("Paid");
    expect(row).toHaveTextContent("Platter idler; Flat belt; Ring; and 2 more");
    expect(row).toHaveTextContent("North Moor Rubber, Kade Works");
    expect(row).toHaveTextContent("€31.40");
    expect(expired).toHaveTextContent("Not paid in time");
  });

  it("come page by page", async () => {
    stubApi(
      routes(({ query }) =>
        query.get("cursor") === "next"
          ? ok({ items: [summary(3)], nextCursor: null })
          : ok({ items: [summary(1), summary(2)], nextCursor: "next" }),
      ),
    );
    renderPage(<OrdersPage />, "/orders");
    await userEvent.click(await screen.findByRole("button", { name: "More orders" }));
    expect(await screen.findByRole("link", { name: "26-3" })).toBeVisible();
    expect(screen.getAllByRole("listitem")).toHaveLength(3);
    expect(screen.queryByRole("button", { name: "More orders" })).toBeNull();
  });

  it("say what to do where there are none", async () => {
    stubApi(routes(() => ok({ items: [], nextCursor: null })));
    renderPage(<OrdersPage />, "/orders");
    await waitFor(() => expect(screen.queryByText("Fetching your orders")).toBeNull());
    expect(screen.getByText("You have ordered nothing yet")).toBeVisible();
    expect(screen.getByRole("link", { name: "Measure a part" })).toHaveAttribute("href", "/");
  });

  it.each([
    ["refused", () => refused("unavailable"), "Your orders could not be fetched"],
    ["offline", unreachable, "No connection"],
  ])("say when they cannot be fetched (%s), and are tried again", async (_, fail, words) => {
    let isFailing = true;
    stubApi(routes(() => (isFailing ? fail() : ok({ items: [summary(1)], nextCursor: null }))));
    renderPage(<OrdersPage />, "/orders");
    expect(await screen.findByRole("alert")).toHaveTextContent(words);
    isFailing = false;
    await userEvent.click(screen.getByRole("button", { name: "Try again" }));
    expect(await screen.findByRole("link", { name: "26-1" })).toBeVisible();
  });
});
