import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import type { Basket } from "#shared/schemas/basket";
import { BasketPage } from "../../../client/features/basket/BasketPage";
import {
  basketOf,
  belt,
  countries,
  idOf,
  kadeWorks,
  lineOf,
  northMoor,
  parcelOf,
  signedIn,
  signedOut,
  twoParcels,
  wheel,
} from "./fixtures";
import { renderPage } from "./renderPage";
import { held, ok, type Routes, refused, stubApi, unreachable } from "./stubApi";

const routes = (basket: (shipTo: string) => Basket, more: Routes = {}): Routes => ({
  "GET /auth/session": () => ok(signedOut),
  "GET /countries": () => ok(countries),
  "GET /basket": ({ query }) => ok(basket(query.get("shipTo") ?? "")),
  ...more,
});
const put = `PUT /basket/lines/${wheel.id}`;
const quantityField = () => screen.findByLabelText(`Quantity: ${wheel.title}`);
const withinParcel = async (name: string) =>
  within((await screen.findByRole("heading", { name: new RegExp(`from ${name}`) })).closest("section") as HTMLElement);

describe("the basket", () => {
  it("shows each parcel with its lines, postage, tax in words, and the whole", async () => {
    stubApi(routes((to) => twoParcels(2, to)));
    renderPage(<BasketPage />, "/basket");
    const first = await withinParcel("North Moor Rubber");
    expect(first.getByRole("link", { name: wheel.title })).toHaveAttribute("href", `/parts/${wheel.id}`);
    expect(first.getByText(/for: idler wheel, outside diameter 44.05 mm/)).toBeVisible();
    expect(first.getByText("€24.00 each")).toBeVisible();
    expect(first.getByText("of which 19 % tax, €8.85")).toBeVisible();
    expect(first.getByText(/leaves in 2 days/)).toBeVisible();

    const second = await withinParcel("Kade Works");
    expect(second.getByText("no tax collected; import tax may be asked on arrival")).toBeVisible();
    expect(second.getByText("Made to your size:")).toBeVisible();
    expect(second.getByText("loop at 1/4 scale")).toBeVisible();

    expect(screen.getByRole("link", { name: "Check out" })).toHaveAttribute("href", "/checkout");
    expect(await screen.findByText("You sign in before you pay; what lies here is kept.")).toBeVisible();
  });

  it("takes a typed quantity over once, after a pause, and shows what it costs now", async () => {
    const calls = stubApi(routes((to) => twoParcels(1, to), { [put]: () => ok(twoParcels(12)) }));
    renderPage(<BasketPage />, "/basket");
    const field = await quantityField();
    await userEvent.clear(field);
    await userEvent.type(field, "12");
    expect(calls.filter(({ method }) => method === "PUT")).toHaveLength(0);
    expect(await screen.findByText("€288.00", { selector: "p *" })).toBeVisible();
    const puts = calls.filter(({ method }) => method === "PUT");
    expect(puts).toHaveLength(1);
    expect(puts[0]).toMatchObject({ body: { quantity: 12 } });
    expect(puts[0]?.query.get("shipTo")).toBe("DE");
    expect(field).toHaveValue("12");
  });

  it("steps up and down, by buttons and by arrow keys", async () => {
    const calls = stubApi(
      routes((to) => twoParcels(2, to), {
        [put]: ({ body }) => ok(twoParcels((body as { quantity: number }).quantity)),
      }),
    );
    renderPage(<BasketPage />, "/basket");
    const field = await quantityField();
    await userEvent.click(screen.getByRole("button", { name: `One more: ${wheel.title}` }));
    await userEvent.type(field, "{ArrowUp}{Enter}");
    await waitFor(() => expect(calls.filter(({ method }) => method === "PUT").at(-1)?.body).toEqual({ quantity: 4 }));
    await waitFor(() => expect(field).toHaveValue("4"));
    await userEvent.clear(field);
    await userEvent.type(field, "1");
    expect(screen.getByRole("button", { name: `One fewer: ${wheel.title}` })).toBeDisabled();
  });

  it("says beside the field what is wrong with a quantity, keeps it, and holds back the check-out", async () => {
    const calls = stubApi(routes((to) => twoParcels(1, to)));
    renderPage(<BasketPage />, "/basket");
    const field = await quantityField();
    await userEvent.clear(field);
    await userEvent.type(field, "0");
    expect(field).toHaveAccessibleDescription("Take at least one");
    expect(field).toBeInvalid();
    expect(screen.getByRole("button", { name: "Check out" })).toBeDisabled();
    expect(screen.getByRole("button", { name: "Check out" })).toHaveAccessibleDescription(
      /the quantity needs another look/,
    );
    await userEvent.type(field, "{Enter}");
    expect(field).toHaveValue("0");
    expect(calls.filter(({ method }) => method === "PUT")).toHaveLength(0);
  });

  it("keeps a refused quantity as it was typed, in words, and tries it again", async () => {
    let tries = 0;
    stubApi(
      routes((to) => twoParcels(1, to), {
        [put]: () => {
          tries += 1;
          return tries === 1 ? unreachable() : ok(twoParcels(5));
        },
      }),
    );
    renderPage(<BasketPage />, "/basket");
    const field = await quantityField();
    await userEvent.clear(field);
    await userEvent.type(field, "5{Enter}");
    await waitFor(() => expect(field).toHaveAccessibleDescription(/cannot be reached/));
    expect(field).toHaveValue("5");
    await userEvent.click(screen.getByRole("button", { name: "Try again" }));
    await waitFor(() => expect(field).not.toBeInvalid());
    expect(await screen.findByText("€120.00", { selector: "p *" })).toBeVisible();
  });

  it("lets the last of two quick changes stand, whatever is answered first", async () => {
    const first = held<ReturnType<typeof ok>>();
    const asked: number[] = [];
    stubApi(
      routes((to) => twoParcels(1, to), {
        [put]: ({ body }) => {
          const { quantity } = body as { quantity: number };
          asked.push(quantity);
          return asked.length === 1 ? first.promise : ok(twoParcels(quantity));
        },
      }),
    );
    renderPage(<BasketPage />, "/basket");
    const field = await quantityField();
    await userEvent.clear(field);
    await userEvent.type(field, "3{Enter}");
    await waitFor(() => expect(asked).toEqual([3]));
    await userEvent.clear(field);
    await userEvent.type(field, "1{Enter}");
    expect(asked).toEqual([3]);
    first.give(ok(twoParcels(3)));
    await waitFor(() => expect(asked).toEqual([3, 1]));
    await waitFor(() => expect(screen.queryByText("€24.00 each")).toBeNull());
    expect(field).toHaveValue("1");
  });

  it("removes a line, says so where it stood, and puts it back as it was", async () => {
    let now = twoParcels(2);
    const calls = stubApi(
      routes(() => now, {
        [`DELETE /basket/lines/${wheel.id}`]: () => {
          now = basketOf(twoParcels().parcels.slice(1));
          return ok(now);
        },
        [put]: () => {
          now = twoParcels(2);
          return ok(now);
        },
      }),
    );
    renderPage(<BasketPage />, "/basket");
    await userEvent.click(await screen.findByRole("button", { name: `Remove: ${wheel.title}` }));
    const back = await screen.findByRole("button", { name: "Put it back" });
    expect(back).toHaveFocus();
    expect(back).toHaveAccessibleDescription(`Removed ${wheel.title}.`);
    expect(screen.queryByLabelText(`Quantity: ${wheel.title}`)).toBeNull();

    await userEvent.click(back);
    const field = await quantityField();
    expect(field).toHaveValue("2");
    await waitFor(() => expect(field).toHaveFocus());
    expect(screen.queryByRole("button", { name: "Put it back" })).toBeNull();
    expect(calls.find(({ method }) => method === "PUT")?.body).toEqual({
      quantity: 2,
      forNeed: "idler wheel, outside diameter 44.05 mm, glazed",
    });
  });

  it("still offers to put back the last line of an empty basket", async () => {
    let now = basketOf([parcelOf(northMoor, [lineOf(wheel)])]);
    stubApi(
      routes(() => now, {
        [`DELETE /basket/lines/${wheel.id}`]: () => {
          now = basketOf([]);
          return ok(now);
        },
      }),
    );
    renderPage(<BasketPage />, "/basket");
    await userEvent.click(await screen.findByRole("button", { name: `Remove: ${wheel.title}` }));
    expect(await screen.findByText("Nothing lies in the basket")).toBeVisible();
    expect(screen.getByRole("button", { name: "Put it back" })).toBeVisible();
  });

  it("names what keeps it from being bought, and leads there", async () => {
    const basket = (to: string) =>
      basketOf(
        [
          parcelOf(northMoor, [lineOf(wheel, 9, { problem: "Only 7 left: take fewer" })]),
          parcelOf(kadeWorks, [lineOf(belt)], { problem: "Kade Works does not ship to Germany" }),
        ],
        to,
      );
    stubApi(routes(basket, { "GET /auth/session": () => ok(signedIn) }));
    const { container } = renderPage(<BasketPage />, "/basket");
    const button = await screen.findByRole("button", { name: "Check out" });
    expect(button).toBeDisabled();
    expect(button).toHaveAccessibleDescription(/Only 7 left: take fewer.*Kade Works does not ship to Germany/);
    const line = screen.getByRole("link", { name: `${wheel.title}: Only 7 left: take fewer` });
    const place = container.querySelector(line.getAttribute("href") ?? "");
    expect(within(place as HTMLElement).getByText("not in the sums")).toBeVisible();
    expect((await withinParcel("Kade Works")).getByText("not sent there")).toBeVisible();
  });

  it("reckons postage anew for another country and keeps it", async () => {
    const calls = stubApi(routes((to) => twoParcels(to === "NO" ? 3 : 1, to)));
    renderPage(<BasketPage />, "/basket");
    await screen.findByRole("option", { name: "Norway" });
    await userEvent.selectOptions(screen.getByLabelText("Country it is sent to"), "Norway");
    expect(await screen.findByText("All parcels, to Norway")).toBeVisible();
    expect(calls.filter(({ path }) => path === "/basket").map(({ query }) => query.get("shipTo"))).toEqual([
      "DE",
      "NO",
    ]);
    expect(localStorage.getItem("idlewright-ship-to")).toBe("NO");
  });

  it("says what to do next when nothing lies in it", async () => {
    stubApi(routes((to) => basketOf([], to)));
    renderPage(<BasketPage />, "/basket");
    expect(await screen.findByRole("link", { name: "Measure a part" })).toHaveAttribute("href", "/");
    expect(await screen.findByRole("link", { name: "Sign in" })).toHaveAttribute("href", "/sign-in?next=/basket");
  });

  it.each([
    ["busy", () => refused("unavailable"), "The basket could not be fetched"],
    ["offline", unreachable, "No connection"],
  ])("says when it cannot be fetched (%s), and tries again", async (_, fail, title) => {
    let isFailing = true;
    stubApi(routes((to) => twoParcels(1, to), { "GET /basket": () => (isFailing ? fail() : ok(twoParcels())) }));
    renderPage(<BasketPage />, "/basket");
    const alert = await screen.findByRole("alert");
    expect(alert).toHaveTextContent(title);
    expect(alert).toHaveTextContent("What lies in it is kept.");
    isFailing = false;
    await userEvent.click(screen.getByRole("button", { name: "Try again" }));
    expect(await quantityField()).toBeVisible();
  });

  it("tells who comes back from the payment page of the order that waits", async () => {
    sessionStorage.setItem("idlewright-checkout", JSON.stringify({ key: idOf(1), what: "x", orderId: idOf(800) }));
    const { orderOf } = await import("./fixtures");
    stubApi(
      routes((to) => twoParcels(1, to), {
        "GET /auth/session": () => ok(signedIn),
        [`GET /orders/${idOf(800)}`]: () => ok(orderOf()),
      }),
    );
    renderPage(<BasketPage />, "/basket");
    expect(await screen.findByText("Order 26-10007 waits for payment")).toBeVisible();
    expect(screen.getByRole("link", { name: "Pay or cancel it" })).toHaveAttribute("href", `/orders/${idOf(800)}`);
  });
});
