import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { leaveTo } from "../../../client/lib/leaveTo";
import { noAddresses, orderButton, ordersOf, placed, routes, show, writeAddress } from "./checkout";
import { basketOf, lineOf, northMoor, parcelOf, wheel } from "./fixtures";
import { ok, type Routes, refused, stubApi } from "./stubApi";

vi.mock("../../../client/lib/leaveTo", () => ({ leaveTo: vi.fn() }));
beforeEach(() => vi.mocked(leaveTo).mockClear());

describe("a refused checkout", () => {
  const refusal = async (answer: () => ReturnType<typeof ok>, more: Routes = {}) => {
    const calls = stubApi(routes({ ...noAddresses, "POST /orders": answer, ...more }));
    show();
    await orderButton();
    await writeAddress(screen);
    await userEvent.click(await orderButton());
    const alert = await screen.findByRole("alert");
    await waitFor(() => expect(alert).toHaveFocus());
    expect(screen.getByLabelText("Town")).toHaveValue("Vassborg");
    expect(leaveTo).not.toHaveBeenCalled();
    return { alert, calls };
  };

  it("shows what has changed with the total, and the new total on the button", async () => {
    let price = 2400;
    const basket = () =>
      basketOf([
        parcelOf(northMoor, [lineOf({ ...wheel, priceMinor: price }, 1)], {
          shippingMinor: price === 2400 ? 740 : 800,
        }),
      ]);
    const { alert } = await refusal(
      () => {
        price = 2650;
        return refused("total-changed", "It is now €34.50");
      },
      { "GET /basket": () => ok(basket()) },
    );
    expect(alert).toHaveTextContent("The total has changed: nothing was ordered");
    expect(alert).toHaveTextContent(`${wheel.title} is €26.50 each now; it was €24.00`);
    expect(alert).toHaveTextContent("Postage from North Moor Rubber is €8.00 now; it was €7.40");
    expect(screen.getByRole("button", { name: "Order and pay €34.50" })).toBeEnabled();
  });

  it("names the lines of which not enough is left, with the way to them", async () => {
    const { alert } = await refusal(() =>
      refused("out-of-stock", "", [{ pointer: `#/lines/${wheel.id}`, detail: "Only 2 left: take fewer" }]),
    );
    expect(alert).toHaveTextContent("Not enough is left: nothing was ordered");
    expect(within(alert).getByRole("link", { name: `${wheel.title}: Only 2 left: take fewer` })).toHaveAttribute(
      "href",
      `/basket#line-${wheel.id}`,
    );
  });

  it.each([
    ["not-shipped-there", "One parcel cannot go there", "/basket"],
    ["payment-unreachable", "nothing was charged", null],
    ["not-signed-in", "Your session has ended: nothing was ordered", "/sign-in?next=/checkout"],
    ["wrong-state", "Nothing was ordered", null],
  ] as const)("says in words: %s", async (name, words, link) => {
    const { alert } = await refusal(() => refused(name, "The reason that the server gives"));
    expect(alert).toHaveTextContent(words);
    if (link) expect(within(alert).getByRole("link")).toHaveAttribute("href", link);
  });

  it("goes on with the same order when the payment service answers again", async () => {
    let tries = 0;
    const { calls } = await refusal(() => {
      tries += 1;
      return tries === 1 ? refused("payment-unreachable") : ok(placed, 201);
    });
    await userEvent.click(await orderButton());
    await waitFor(() => expect(leaveTo).toHaveBeenCalledTimes(1));
    const [a, b] = ordersOf(calls).map(({ checkoutKey }) => checkoutKey);
    expect(b).toBe(a);
  });

  it("takes a new key after an order that could not be made", async () => {
    let tries = 0;
    const { calls } = await refusal(() => {
      tries += 1;
      return tries === 1 ? refused("wrong-state", "This order is cancelled") : ok(placed, 201);
    });
    await userEvent.click(await orderButton());
    await waitFor(() => expect(ordersOf(calls)).toHaveLength(2));
    const [a, b] = ordersOf(calls).map(({ checkoutKey }) => checkoutKey);
    expect(b).not.toBe(a);
  });

  it("has the confirming mail sent again where the address is not confirmed", async () => {
    const { alert } = await refusal(() => refused("verify-first", "Open the link in the mail we sent you"));
    expect(alert).toHaveTextContent("Confirm your e-mail address first");
    expect(within(alert).getByRole("button", { name: "Send it again" })).toBeVisible();
  });

  it("puts what the server refuses of the form beside its field", async () => {
    const { alert } = await refusal(() =>
      refused("invalid-request", "", [{ pointer: "#/shippingAddress/postcode", detail: "Use at most 20 characters" }]),
    );
    expect(alert).toHaveTextContent("There is a problem");
    expect(screen.getByLabelText("Postcode")).toHaveAccessibleDescription("Use at most 20 characters");
  });
});
