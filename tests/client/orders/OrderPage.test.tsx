import { act, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import type { Order } from "#shared/schemas/order";
import { OrderPage } from "../../../client/features/orders/OrderPage";
import { leaveTo } from "../../../client/lib/leaveTo";
import { belt, idOf, orderOf, signedIn, wheel } from "../basket/fixtures";
import { renderPage } from "../basket/renderPage";
import { ok, type Routes, refused, stubApi, unreachable } from "../basket/stubApi";

vi.mock("../../../client/lib/leaveTo", () => ({ leaveTo: vi.fn() }));

const id = idOf(800);
const paid = () => orderOf({ state: "paid", holdUntil: null, can: { pay: false, cancel: false } });
const routes = (order: () => Order, more: Routes = {}): Routes => ({
  "GET /auth/session": () => ok(signedIn),
  [`GET /orders/${id}`]: () => ok(order()),
  ...more,
});
const show = (query = "") => renderPage(<OrderPage />, `/orders/${id}${query}`, "/orders/:id");
const status = () => within(screen.getByRole("region", { name: "Where it stands" }));

beforeEach(() => {
  vi.mocked(leaveTo).mockClear();
  vi.useFakeTimers({
    toFake: ["Date", "setTimeout", "clearTimeout", "setInterval", "clearInterval"],
    shouldAdvanceTime: true,
  });
  vi.setSystemTime(new Date("2026-12-01T12:35:00.000Z"));
});
afterEach(() => {
  vi.useRealTimers();
});
const pass = (ms: number) => act(() => vi.advanceTimersByTimeAsync(ms));

describe("an order that waits for payment", () => {
  it("says until when it is held, and leads to the payment page", async () => {
    stubApi(
      routes(orderOf, {
        [`POST /orders/${id}/pay`]: () => ok({ orderId: id, number: "26-10007", paymentUrl: "https://pay.example/p" }),
      }),
    );
    show();
    expect(await screen.findByText("Waiting for payment")).toBeVisible();
    expect(
      status().getByText(/^Held for you until \d\d:05 .+: pay now, or the parts go back on sale\.$/),
    ).toBeVisible();
    await userEvent.click(screen.getByRole("button", { name: "Pay now" }));
    await waitFor(() => expect(leaveTo).toHaveBeenCalledWith("https://pay.example/p"));
    expect(screen.getByRole("button", { name: "Pay now" })).toBeDisabled();
  });

  it("says why the payment page could not be opened", async () => {
    stubApi(
      routes(orderOf, { [`POST /orders/${id}/pay`]: () => refused("payment-unreachable", "Nothing was charged.") }),
    );
    show();
    await userEvent.click(await screen.findByRole("button", { name: "Pay now" }));
    expect(await screen.findByRole("alert")).toHaveTextContent("Nothing was charged.");
    expect(screen.getByRole("button", { name: "Pay now" })).toBeEnabled();
  });

  it("tells who left the payment page that nothing was charged", async () => {
    stubApi(routes(orderOf));
    show("?left=1");
    expect(await screen.findByText(/You left without paying: nothing was charged/)).toBeVisible();
  });

  it("says when the time to pay is over", async () => {
    vi.setSystemTime(new Date("2026-12-01T13:06:00.000Z"));
    stubApi(routes(() => orderOf({ can: { pay: false, cancel: true } })));
    show();
    expect(await screen.findByText(/The time to pay is over/)).toBeVisible();
    expect(screen.queryByRole("button", { name: "Pay now" })).toBeNull();
  });

  it("looks every two seconds for the payment's word, and says when it has come", async () => {
    let order = orderOf();
    const calls = stubApi(routes(() => order));
    const { queryClient } = show("?paid=1");
    queryClient.setQueryData(["basket", "DE"], {});
    expect(await screen.findByText("Waiting for the payment service’s word")).toBeVisible();
    expect(screen.queryByRole("button", { name: "Pay now" })).toBeNull();
    const looks = () => calls.filter(({ path }) => path === `/orders/${id}`).length;
    const before = looks();
    await pass(2_050);
    expect(looks()).toBe(before + 1);
    await pass(2_050);
    expect(looks()).toBe(before + 2);

    order = paid();
    await pass(2_050);
    expect(status().getByText("Paid")).toBeVisible();
    expect(status().getByRole("status")).toHaveTextContent("Each workshop was told");
    expect(queryClient.getQueryState(["basket", "DE"])?.isInvalidated).toBe(true);
    const after = looks();
    await pass(40_000);
    expect(looks()).toBe(after);
  });

  it("stops looking so often after a minute, and looks again when asked to", async () => {
    let order = orderOf();
    const calls = stubApi(routes(() => order));
    show("?paid=1");
    await screen.findByText("Waiting for the payment service’s word");
    await pass(60_100);
    expect(screen.getByText(/No word from the payment service yet/)).toBeVisible();
    const before = calls.length;
    await pass(10_000);
    expect(calls.length).toBe(before);
    order = paid();
    await userEvent.click(screen.getByRole("button", { name: "Look again" }));
    await waitFor(() => expect(status().getByText("Paid")).toBeVisible());
  });

  it("is cancelled after one question that names what is let go", async () => {
    let order = orderOf();
    const calls = stubApi(
      routes(() => order, {
        [`POST /orders/${id}/cancel`]: () => {
          order = orderOf({ state: "cancelled", holdUntil: null, can: { pay: false, cancel: false } });
          return ok(order);
        },
      }),
    );
    show();
    await userEvent.click(await screen.findByRole("button", { name: "Cancel this order" }));
    const dialog = within(screen.getByRole("dialog", { name: "Cancel order 26-10007?" }));
    expect(dialog.getAllByRole("listitem").map((item) => item.textContent)).toEqual([
      `1 × ${wheel.title}, North Moor Rubber`,
      `1 × ${belt.title}, Kade Works`,
    ]);
    await userEvent.click(dialog.getByRole("button", { name: "Keep it" }));
    expect(screen.queryByRole("dialog")).toBeNull();
    expect(calls.some(({ method }) => method === "POST")).toBe(false);

    await userEvent.click(screen.getByRole("button", { name: "Cancel this order" }));
    await userEvent.click(screen.getByRole("button", { name: "Cancel the order" }));
    expect(await screen.findByText("Cancelled")).toBeVisible();
    expect(screen.queryByRole("dialog")).toBeNull();
  });

  it("says why it could not be cancelled, and shows what it is now", async () => {
    let order = orderOf();
    stubApi(
      routes(() => order, {
        [`POST /orders/${id}/cancel`]: () => {
          order = paid();
          return refused("wrong-state", "This order is paid: it cannot be cancelled here");
        },
      }),
    );
    show();
    await userEvent.click(await screen.findByRole("button", { name: "Cancel this order" }));
    await userEvent.click(screen.getByRole("button", { name: "Cancel the order" }));
    await waitFor(() => expect(status().getByText("Paid")).toBeVisible());
  });
});

describe("an order that was paid", () => {
  it("shows each parcel's way, what was bought, who sold it, and how to withdraw", async () => {
    const order = paid();
    order.parcels[0]!.state = "dispatched";
    order.parcels[1]!.state = "declined";
    stubApi(routes(() => order));
    show();
    const first = within((await screen.findByRole("heading", { name: /from North Moor Rubber/ })).closest("section")!);
    expect(first.getByText("Dispatched").closest("li")).toHaveAttribute("aria-current", "step");
    expect(first.getByText("It is on its way to you.")).toBeVisible();
    expect(first.getByRole("img")).toHaveAccessibleName(/idler wheel/i);
    expect(first.getByText("North Moor Rubber Ltd")).toBeVisible();
    expect(first.getByText(/Quay 3, 1234 Vassborg, Sweden/)).toBeVisible();
    expect(first.getByRole("link", { name: "post@north-moor-rubber.example" })).toBeVisible();
    expect(first.getByRole("link", { name: "+46 70 000 00 00" })).toHaveAttribute("href", "tel:+46700000000");
    expect(first.getByText("Register no. 000000-0000")).toBeVisible();

    const second = within(screen.getByRole("heading", { name: /from Kade Works/ }).closest("section")!);
    expect(second.getByText("Declined.")).toBeVisible();
    expect(second.queryByRole("list", { name: "Its way" })).toBeNull();
    expect(screen.getByText(/until 14 days after the last parcel is in their hands/)).toBeVisible();
    expect(screen.getByText(/name order 26-10007/)).toBeVisible();
    expect(screen.getByText("Order placed; the parts are held for you")).toBeVisible();
    expect(screen.queryByRole("button", { name: /Pay|Cancel/ })).toBeNull();
  });

  it("says how a parcel that has left travels", async () => {
    const order = paid();
    Object.assign(order.parcels[0]!, {
      state: "dispatched",
      dispatchedAt: "2026-12-02T12:00:00.000Z",
      carrier: "Harbour Post",
      trackingNumber: "HP 12",
    });
    Object.assign(order.parcels[1]!, { state: "dispatched", dispatchedAt: "2026-12-02T12:00:00.000Z" });
    stubApi(routes(() => order));
    show();
    expect(
      await screen.findByText("Left on 2 December 2026, carried by Harbour Post, tracking number HP 12."),
    ).toBeVisible();
    expect(screen.getByText("Left on 2 December 2026.")).toBeVisible();
  });

  it("says by when a parcel leaves, but not while its core is awaited", async () => {
    const order = paid();
    order.parcels[1]!.state = "core-awaited";
    stubApi(routes(() => order));
    show();
    const said = (name: RegExp) => screen.getByRole("heading", { name }).closest("section");
    await screen.findByRole("heading", { name: /from Kade Works/ });
    expect(said(/from North Moor Rubber/)).toHaveTextContent("leaves by 3 December 2026");
    expect(said(/from Kade Works/)).not.toHaveTextContent("leaves by");
  });

  it("says what was given back", async () => {
    stubApi(routes(() => ({ ...paid(), refundedMinor: 900 })));
    show();
    expect(await screen.findByText(/€9.00 was given back to the card it came from/)).toBeVisible();
    expect(screen.getByText("Given back")).toBeVisible();
  });

  it("ends the checkout that it came from", async () => {
    sessionStorage.setItem("idlewright-checkout", JSON.stringify({ key: idOf(1), what: "x", orderId: id }));
    sessionStorage.setItem("idlewright-checkout-draft", JSON.stringify({ userId: idOf(500), values: {} }));
    stubApi(routes(paid));
    show();
    await screen.findByText("Paid");
    expect(sessionStorage).toHaveLength(0);
  });
});

describe("an order that cannot be shown", () => {
  it("is said not to be there", async () => {
    stubApi({ [`GET /orders/${id}`]: () => refused("not-found") });
    show();
    expect(await screen.findByText("There is no such order of yours")).toBeVisible();
  });

  it("is tried again when it could not be fetched", async () => {
    let isFailing = true;
    stubApi({ [`GET /orders/${id}`]: () => (isFailing ? unreachable() : ok(paid())) });
    show();
    expect(await screen.findByRole("alert")).toHaveTextContent("No connection");
    isFailing = false;
    await userEvent.click(screen.getByRole("button", { name: "Try again" }));
    expect(await screen.findByText("Paid")).toBeVisible();
  });
});
