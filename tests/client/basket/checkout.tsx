import { screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import type { PlaceOrder } from "#shared/schemas/order";
import { CheckoutPage } from "../../../client/features/basket/CheckoutPage";
import { countries, home, idOf, signedIn, twoParcels } from "./fixtures";
import { renderPage } from "./renderPage";
import { type Call, ok, type Routes } from "./stubApi";

export const placed = { orderId: idOf(800), number: "26-10007", paymentUrl: "https://pay.example/page" };
export const routes = (more: Routes = {}): Routes => ({
  "GET /auth/session": () => ok(signedIn),
  "GET /countries": () => ok(countries),
  "GET /addresses": () => ok({ items: [home] }),
  "GET /basket": ({ query }) => ok(twoParcels(1, query.get("shipTo") ?? "")),
  "POST /orders": () => ok(placed, 201),
  ...more,
});
export const show = () =>
  renderPage(<CheckoutPage sendVerification={<button type="button">Send it again</button>} />, "/checkout");
export const orderButton = () => screen.findByRole("button", { name: /^Order and pay/ });
export const ordersOf = (calls: readonly Call[]) =>
  calls.filter(({ method, path }) => method === "POST" && path === "/orders").map(({ body }) => body as PlaceOrder);
export const noAddresses: Routes = { "GET /addresses": () => ok({ items: [] }) };

export async function writeAddress(scope: Pick<typeof screen, "getByLabelText">, name = "Bo Lind") {
  await userEvent.type(scope.getByLabelText("Name on the label"), name);
  await userEvent.type(scope.getByLabelText("Street and house"), "Kvarngatan 8");
  await userEvent.type(scope.getByLabelText("Postcode"), "999 99");
  await userEvent.type(scope.getByLabelText("Town"), "Vassborg");
}
