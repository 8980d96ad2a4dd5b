import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import type { ParcelState } from "#shared/domain/parcelState";
import type { ParcelStep } from "#shared/domain/parcelSteps";
import { WorkshopParcelPage } from "../../../client/features/workshop-orders/WorkshopParcelPage";
import { signedIn } from "../basket/fixtures";
import { renderPage } from "../basket/renderPage";
import { held, ok, type Routes, refused, stubApi } from "../basket/stubApi";
import { workshopParcelOf } from "./fixtures";

const path = `/workshop/parcels/${workshopParcelOf().id}`;
const routes = (parcel: () => ReturnType<typeof workshopParcelOf>, more: Routes = {}): Routes => ({
  "GET /auth/session": () => ok(signedIn),
  [`GET ${path}`]: () => ok(parcel()),
  ...more,
});
const show = () =>
  renderPage(<WorkshopParcelPage />, `/workshop/orders/${workshopParcelOf().id}`, "/workshop/orders/:id");
const region = () => within(screen.getByRole("region", { name: "What to do next" }));

describe("a workshop's parcel", () => {
  it("shows what to make and pack, drawn, with its sizes, where it goes and the share", async () => {
    stubApi(routes(workshopParcelOf));
    show();
    expect(await screen.findByRole("heading", { name: "Parcel of order 26-10007" })).toBeVisible();
    const [line] = screen.getAllByRole("listitem");
    expect(within(line!).getByRole("img")).toHaveAccessibleName(/idler wheel/i);
    for (const words of [
      "44.2",
      "±0.1",
      "for: platter idler",
      "made to order; NBR, 45 Shore A",
      "buyer’s size",
      "2 ×",
    ]) {
      expect(line).toHaveTextContent(words);
    }
    expect(screen.getByText("Uferweg 12")).toBeVisible();
    expect(screen.getByText("-€3.84")).toBeVisible();
    expect(screen.getByText("€51.56")).toBeVisible();
    expect(screen.getByText("Paid by the buyer")).toBeVisible();
  });

  it.each([
    ["to-accept", "accept", "Accept it", "core-awaited", "Core awaited"],
    ["core-awaited", "core-received", "The core has come", "core-received", "Core received"],
    ["core-received", "start", "Begin the work", "in-work", "In work"],
    ["in-work", "ready", "It is packed", "ready", "Ready"],
  ] as [ParcelState, ParcelStep, string, ParcelState, string][])(
    "%s is taken on by %s, once, however fast its button is pressed",
    async (state, step, button, then, name) => {
      const answer = held<ReturnType<typeof ok>>();
      let parcel = workshopParcelOf({ state, steps: [step] });
      const calls = stubApi(routes(() => parcel, { [`POST ${path}/${step}`]: () => answer.promise }));
      show();
      await userEvent.dblClick(await screen.findByRole("button", { name: button }));
      parcel = workshopParcelOf({ state: then, steps: ["ready"] });
      answer.give(ok(parcel));
      expect(await region().findByText(name)).toBeVisible();
      // The next step's button lies where the first one was.
      await userEvent.click(screen.getByRole("button", { name: "It is packed" }));
      expect(calls.filter(({ method }) => method === "POST").map((call) => call.path)).toEqual([`${path}/${step}`]);
      expect(screen.getByText(`${name}: order 26-10007`)).toBeInTheDocument();
    },
  );

  it("says why a step was refused, and shows what the parcel is now", async () => {
    let parcel = workshopParcelOf();
    stubApi(
      routes(() => parcel, {
        [`POST ${path}/accept`]: () => {
          parcel = workshopParcelOf({ state: "cancelled", steps: [] });
          return refused("wrong-state", "This parcel is cancelled: it cannot be accepted now");
        },
      }),
    );
    show();
    await userEvent.click(await screen.findByRole("button", { name: "Accept it" }));
    expect(await screen.findByRole("alert")).toHaveTextContent("This parcel is cancelled: it cannot be accepted now");
    expect(await region().findByText("Do not send it.")).toBeVisible();
    expect(screen.queryByRole("button", { name: "Accept it" })).toBeNull();
  });

  it("is dispatched with carrier and number", async () => {
    let parcel = workshopParcelOf({ state: "ready", steps: ["dispatch"] });
    const calls = stubApi(
      routes(() => parcel, {
        [`POST ${path}/dispatch`]: () => {
          parcel = workshopParcelOf({
            state: "dispatched",
            steps: [],
            carrier: "Harbour Post",
            trackingNumber: "HP 12",
            dispatchedAt: "2026-12-02T12:00:00.000Z",
          });
          return ok(parcel);
        },
      }),
    );
    show();
    await userEvent.type(await screen.findByRole("textbox", { name: /^Carrier/ }), "Harbour Post");
    await userEvent.type(screen.getByRole("textbox", { name: /^Tracking number/ }), "HP 12");
    await userEvent.click(screen.getByRole("button", { name: "It has left: tell the buyer" }));
    expect(
      await screen.findByText("It left on 2 December 2026, carried by Harbour Post, tracking number HP 12."),
    ).toBeVisible();
    expect(calls.find(({ method }) => method === "POST")?.body).toEqual({
      carrier: "Harbour Post",
      trackingNumber: "HP 12",
    });
    expect(screen.queryByRole("button", { name: /It has left/ })).toBeNull();
  });

  it("keeps what was typed, with the reason beside its field, where it is too long", async () => {
    const calls = stubApi(routes(() => workshopParcelOf({ state: "ready", steps: ["dispatch"] })));
    show();
    const carrier = await screen.findByRole("textbox", { name: /^Carrier/ });
    await userEvent.click(carrier);
    await userEvent.paste("x".repeat(81));
    await userEvent.click(screen.getByRole("button", { name: "It has left: tell the buyer" }));
    await waitFor(() => expect(carrier).toHaveAccessibleDescription(/Use at most 80 characters/));
    expect(screen.getByRole("alert")).toHaveFocus();
    expect(carrier).toHaveValue("x".repeat(81));
    expect(calls.some(({ method }) => method === "POST")).toBe(false);
  });

  it("leads back to the list where there is no such parcel", async () => {
    stubApi({ [`GET ${path}`]: () => refused("not-found") });
    show();
    expect(await screen.findByText("There is no such parcel of your workshop")).toBeVisible();
  });
});
