import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, expect, it } from "vitest";
import type { WorkshopSettingsPage as Answer, WorkshopSettings } from "#shared/schemas/workshopSettings";
import { WorkshopSettingsPage } from "../../../client/features/workshop-settings/WorkshopSettingsPage";
import { renderPage } from "../basket/renderPage";
import { type Call, ok, type Routes, refused, stubApi } from "../basket/stubApi";

const page: Answer = {
  workshop: { slug: "test-works", name: "Test Works", state: "admitted" },
  currency: "EUR",
  settings: {
    about: "Wheels.",
    dispatchDays: 3,
    returnsTerms: "Within 14 days.",
    zones: [{ zone: "Near", countries: ["DE", "NO"], baseMinor: 490, perItemMinor: 60, freeOverMinor: 15000 }],
    taxRegistrations: [{ country: "DE", number: "DE-1", ratePercent: 19 }],
    version: "2026-12-01T10:00:00.000Z",
  },
};
let calls: Call[];
const open = async (put: Routes[string] = ({ body }) => ok({ ...page, settings: body })) => {
  calls = stubApi({
    "GET /auth/session": () => ok({ user: null, csrfToken: "token" }),
    "GET /workshop/settings": () => ok(page),
    "PUT /workshop/settings": put,
  });
  renderPage(<WorkshopSettingsPage />, "/workshop/settings");
  await screen.findByLabelText("About your workshop");
};
const keep = () => userEvent.click(screen.getByRole("button", { name: "Keep the settings" }));
const sent = () => calls.filter(({ method }) => method === "PUT").map(({ body }) => body as WorkshopSettings);
const rows = () =>
  within(screen.getByRole("table"))
    .getAllByRole("row")
    .slice(1)
    .map((row) => row.textContent);
const fill = async (label: string, text: string) => {
  await userEvent.clear(screen.getByLabelText(label));
  await userEvent.type(screen.getByLabelText(label), text);
};

beforeEach(() => {
  calls = [];
});

it("says what buyers in each country pay, and follows what is typed", async () => {
  await open();
  expect(rows()).toEqual([
    "Germany19 % tax inside the price; free from €150.00€5.50€6.70",
    "Norwayno tax collected; free from €150.00€5.50€6.70",
  ]);
  await fill("A parcel, EUR", "6,4");
  await userEvent.clear(screen.getByLabelText("Free from, EUR"));
  expect(rows()).toEqual(["Germany19 % tax inside the price€7.00€8.20", "Norwayno tax collected€7.00€8.20"]);
});

it("keeps the whole form, with a zone more, and the version that it was read with", async () => {
  await open();
  await fill("Days until what is in stock leaves", "0");
  await userEvent.click(screen.getByRole("button", { name: "Add a zone" }));
  const zone = within(screen.getByRole("group", { name: "Zone 2" }));
  await userEvent.type(zone.getByLabelText("Name of the zone"), "Far");
  await userEvent.type(zone.getByLabelText("A parcel, EUR"), "12");
  await userEvent.type(zone.getByLabelText("Each part, EUR"), "0.50");
  const countries = zone.getByLabelText("Add countries");
  expect(within(countries).queryByRole("option", { name: "Germany" })).toBeNull();
  await userEvent.selectOptions(countries, "Japan");
  await userEvent.click(zone.getByRole("button", { name: "Add" }));
  await keep();
  expect(await screen.findByRole("link", { name: "See your page" })).toHaveAttribute("href", "/workshops/test-works");
  expect(sent()).toEqual([
    {
      ...page.settings,
      dispatchDays: 0,
      zones: [
        ...page.settings.zones,
        { zone: "Far", countries: ["JP"], baseMinor: 1200, perItemMinor: 50, freeOverMinor: null },
      ],
    },
  ]);
});

it("takes a country and a registration out, and adds what is left of the Union at once", async () => {
  await open();
  await userEvent.click(screen.getByRole("button", { name: "Take out Norway" }));
  await userEvent.click(screen.getByRole("button", { name: "Take out registration 1" }));
  await userEvent.selectOptions(
    screen.getByLabelText("Add countries"),
    screen.getByRole("option", { name: "The European Union, those left (26)" }),
  );
  await userEvent.click(screen.getByRole("button", { name: "Add" }));
  await keep();
  await waitFor(() => expect(sent()).toHaveLength(1));
  expect(sent()[0]?.zones[0]?.countries).toHaveLength(27);
  expect(sent()[0]?.taxRegistrations).toEqual([]);
});

it("says what is wrong beside each field and in a summary that takes the focus, and loses nothing", async () => {
  await open();
  await fill("A parcel, EUR", "a lot");
  await fill("Rate, %", "60");
  await keep();
  const summary = await screen.findByRole("alert");
  expect(summary).toHaveFocus();
  expect(screen.getByLabelText("A parcel, EUR")).toHaveValue("a lot");
  expect(screen.getByLabelText("A parcel, EUR")).toHaveAccessibleDescription("Write an amount like 4.90");
  expect(screen.getByLabelText("Rate, %")).toHaveAccessibleDescription(/from 0 to 50/);
  await userEvent.click(within(summary).getByRole("link", { name: "Write an amount like 4.90, for zone 1" }));
  expect(screen.getByLabelText("A parcel, EUR")).toHaveFocus();
  expect(sent()).toEqual([]);
});

it("refuses to be without a zone, and leads to where one is added", async () => {
  await open();
  await userEvent.click(screen.getByRole("button", { name: "Take out zone 1" }));
  const add = screen.getByRole("button", { name: "Add a zone" });
  expect(add).toHaveFocus();
  await keep();
  const summary = await screen.findByRole("alert");
  await userEvent.click(within(summary).getByRole("link", { name: /^Add at least one zone/ }));
  expect(add).toHaveFocus();
  expect(add).toHaveAccessibleDescription(/^Add at least one zone/);
  expect(sent()).toEqual([]);
});

it("puts what the server refuses beside its field", async () => {
  await open(() =>
    refused("invalid-request", undefined, [{ pointer: "#/zones/0/zone", detail: "Another zone has this name" }]),
  );
  await keep();
  await screen.findByRole("alert");
  expect(screen.getByLabelText("Name of the zone")).toHaveAccessibleDescription("Another zone has this name");
});

it("writes nothing over where another tab was first, and keeps what was typed", async () => {
  await open(() => refused("changed-meanwhile"));
  await fill("About your workshop", "Belts.");
  await keep();
  expect(await screen.findByRole("alert")).toHaveTextContent("changed in another place since you opened them");
  expect(screen.getByLabelText("About your workshop")).toHaveValue("Belts.");
});
