import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { leaveTo } from "../../../client/lib/leaveTo";
import { noAddresses, orderButton, ordersOf, placed, routes, show, writeAddress } from "./checkout";
import { basketOf, home, idOf, lineOf, northMoor, orderOf, parcelOf, wheel } from "./fixtures";
import { held, ok, stubApi, unreachable } from "./stubApi";

vi.mock("../../../client/lib/leaveTo", () => ({ leaveTo: vi.fn() }));

beforeEach(() => vi.mocked(leaveTo).mockClear());

describe("the checkout", () => {
  it("shows everything that is bought, and orders it to the address used last", async () => {
    const calls = stubApi(routes());
    show();
    const button = await screen.findByRole("button", { name: "Order and pay €45.40" });
    expect(button).toHaveAccessibleDescription(
      "You pay on the payment service’s own page; no card details reach Idlewright.",
    );
    expect(screen.getByRole("radio", { name: /Ada Winter/ })).toBeChecked();
    const seller = screen.getAllByRole("link", { name: "who it is by law" });
    expect(seller.map((link) => link.getAttribute("href"))).toEqual([
      "/workshops/north-moor-rubber",
      "/workshops/kade-works",
    ]);
    expect(screen.getByText("Made to your size:")).toBeVisible();
    expect(screen.getByText(/until 14 days after the last parcel is in their hands/)).toBeVisible();
    expect(screen.getByText(/Parts made to your size are excepted/)).toBeVisible();

    await userEvent.click(button);
    await waitFor(() => expect(leaveTo).toHaveBeenCalledWith("https://pay.example/page"));
    const { id: _, ...address } = home;
    expect(ordersOf(calls)).toEqual([
      {
        shippingAddress: address,
        billingAddress: null,
        expectedTotalMinor: 4540,
        currency: "EUR",
        checkoutKey: expect.stringMatching(/^[0-9a-f-]{36}$/),
      },
    ]);
  });

  it("says what is missing in words, above and beside each field, and gives the summary the focus", async () => {
    const calls = stubApi(routes(noAddresses));
    show();
    await userEvent.click(await screen.findByLabelText("The bill goes to another address"));
    const focused: string[] = [];
    document.addEventListener("focusin", ({ target }) => focused.push((target as Element).tagName));
    await userEvent.click(await orderButton());
    const summary = (await screen.findByText("There is a problem")).closest("[role=alert]") as HTMLElement;
    await waitFor(() => expect(summary).toHaveFocus());
    // No field took it on the way: browsers and jsdom differ in which of two wishes comes last.
    expect(focused).not.toContain("INPUT");
    const messages = within(summary)
      .getAllByRole("link")
      .map((link) => link.textContent);
    expect(messages).toContain("Give the town");
    expect(messages).toContain("Give the town, for the bill");
    const [town, billTown] = screen.getAllByLabelText("Town");
    expect(town).toHaveAccessibleDescription("Give the town");
    await userEvent.click(within(summary).getByRole("link", { name: "Give the town, for the bill" }));
    expect(billTown).toHaveFocus();
    expect(ordersOf(calls)).toEqual([]);
  });

  it("carries the autocomplete tokens of a label, for shipping and for the bill", async () => {
    stubApi(routes(noAddresses));
    show();
    await userEvent.click(await screen.findByLabelText("The bill goes to another address"));
    const tokens = [...document.querySelectorAll("[autocomplete]")].map((field) => field.getAttribute("autocomplete"));
    const parts = [
      "name",
      "address-line1",
      "address-line2",
      "postal-code",
      "address-level2",
      "address-level1",
      "country",
    ];
    expect(tokens).toEqual([...parts.map((part) => `shipping ${part}`), ...parts.map((part) => `billing ${part}`)]);
  });

  it("orders to a written address, billed to another", async () => {
    const calls = stubApi(routes());
    show();
    await userEvent.click(await screen.findByRole("radio", { name: "Another address" }));
    await writeAddress(screen);
    await screen.findByRole("option", { name: "Norway" });
    await userEvent.selectOptions(screen.getByLabelText("Country"), "Norway");
    await screen.findByText("All parcels, to Norway");
    await userEvent.click(screen.getByLabelText("The bill goes to another address"));
    await writeAddress(within(screen.getByRole("region", { name: /Who pays/ })), "Lind Repairs");
    await userEvent.click(await orderButton());
    await waitFor(() => expect(leaveTo).toHaveBeenCalled());
    expect(ordersOf(calls)[0]).toMatchObject({
      shippingAddress: { name: "Bo Lind", line2: "", town: "Vassborg", country: "NO" },
      billingAddress: { name: "Lind Repairs", country: "DE" },
    });
  });

  it("sends one order for a double click", async () => {
    const answer = held<ReturnType<typeof ok>>();
    const calls = stubApi(routes({ "POST /orders": () => answer.promise }));
    show();
    await userEvent.dblClick(await orderButton());
    await waitFor(() => expect(ordersOf(calls)).toHaveLength(1));
    expect(await orderButton()).toBeDisabled();
    answer.give(ok(placed, 201));
    await waitFor(() => expect(leaveTo).toHaveBeenCalledTimes(1));
    expect(ordersOf(calls)).toHaveLength(1);
    expect(await orderButton()).toBeDisabled();
  });

  it("keeps the key and what was typed over a reload, and takes a new key for another content", async () => {
    const calls = stubApi(routes({ ...noAddresses, "POST /orders": unreachable }));
    const first = show();
    await orderButton();
    await writeAddress(screen);
    await userEvent.click(await orderButton());
    expect(await screen.findByText("No connection")).toBeVisible();
    first.unmount();

    show();
    expect(await screen.findByLabelText("Town")).toHaveValue("Vassborg");
    await userEvent.click(await orderButton());
    await waitFor(() => expect(ordersOf(calls)).toHaveLength(2));
    await screen.findByText("No connection");
    await userEvent.type(screen.getByLabelText("Town"), " Norra");
    await userEvent.click(await orderButton());
    await waitFor(() => expect(ordersOf(calls)).toHaveLength(3));
    const [a, b, c] = ordersOf(calls).map(({ checkoutKey }) => checkoutKey);
    expect(b).toBe(a);
    expect(c).not.toBe(a);
  });

  it("takes a new key once the order of the old one is settled", async () => {
    let state: "awaiting-payment" | "paid" = "awaiting-payment";
    const calls = stubApi(routes({ [`GET /orders/${placed.orderId}`]: () => ok(orderOf({ state })) }));
    const order = async (times: number) => {
      await userEvent.click(await orderButton());
      await waitFor(() => expect(leaveTo).toHaveBeenCalledTimes(times));
    };
    const first = show();
    await order(1);
    first.unmount();
    const second = show();
    await order(2);
    second.unmount();
    show();
    // It is paid, in another tab, after this page has seen it wait.
    await screen.findByText("Order 26-10007 waits for payment");
    state = "paid";
    await order(3);
    const [a, b, c] = ordersOf(calls).map(({ checkoutKey }) => checkoutKey);
    expect(b).toBe(a);
    expect(c).not.toBe(a);
  });

  it("does not show one account what another one typed", async () => {
    sessionStorage.setItem(
      "idlewright-checkout-draft",
      JSON.stringify({
        userId: idOf(501),
        values: {
          choice: "other",
          shippingAddress: { ...home, name: "Somebody Else" },
          hasOtherBilling: false,
          billingAddress: home,
        },
      }),
    );
    stubApi(routes(noAddresses));
    show();
    expect(await screen.findByLabelText("Name on the label")).toHaveValue("");
    expect(sessionStorage.getItem("idlewright-checkout-draft") ?? "").not.toContain("Somebody Else");
  });

  it("says that nothing can be ordered as it stands", async () => {
    const short = basketOf([parcelOf(northMoor, [lineOf(wheel, 9, { problem: "Only 7 left: take fewer" })])]);
    stubApi(routes({ "GET /basket": () => ok(short) }));
    show();
    const button = await orderButton();
    expect(button).toBeDisabled();
    expect(button).toHaveAccessibleDescription(/cannot be ordered as it stands/);
  });

  it("offers a way on where the basket is empty", async () => {
    stubApi(routes({ "GET /basket": () => ok(basketOf([])) }));
    show();
    expect(await screen.findByText("Nothing lies in the basket")).toBeVisible();
    expect(screen.queryByRole("button", { name: /Order and pay/ })).toBeNull();
  });
});
