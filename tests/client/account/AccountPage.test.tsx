import { screen, waitFor } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import type { Role } from "#shared/schemas/session";
import { AccountPage } from "../../../client/features/account/AccountPage";
import { signedIn } from "../basket/fixtures";
import { renderPage } from "../basket/renderPage";
import { ok, stubApi } from "../basket/stubApi";

const showFor = (role: Role) => {
  stubApi({
    "GET /auth/session": () => ok({ ...signedIn, user: signedIn.user && { ...signedIn.user, role } }),
  });
  renderPage(<AccountPage />, "/account");
};

describe("the account page", () => {
  it("leads the owner of a workshop to its parcels", async () => {
    showFor("workshop");
    expect(await screen.findByRole("link", { name: "Parcels to send" })).toHaveAttribute("href", "/workshop/orders");
  });

  it("speaks of no workshop to a restorer", async () => {
    showFor("restorer");
    await waitFor(() => expect(screen.getByRole("link", { name: "Your orders" })).toBeVisible());
    expect(screen.queryByText("Your workshop")).toBeNull();
  });
});
