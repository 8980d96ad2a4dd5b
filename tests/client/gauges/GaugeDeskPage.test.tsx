import { render, screen } from "@testing-library/react";
import { MemoryRouter } from "react-router-dom";
import { expect, it } from "vitest";
import { GaugeDeskPage } from "../../../client/features/gauges/GaugeDeskPage";

it("leads to six gauges, each drawn, and to the guides", () => {
  render(
    <MemoryRouter>
      <GaugeDeskPage />
    </MemoryRouter>,
  );
  const links = screen.getAllByRole("link");
  expect(links.map((link) => link.getAttribute("href"))).toEqual([
    ...["belt-route", "belt-sample", "speed", "tolerances", "o-rings", "sheets"].map((name) => `/gauges/${name}`),
    "/guides",
    "/guides/fit-chance",
  ]);
  for (const link of links.slice(0, 6)) expect(link.querySelector("svg")).toBeInTheDocument();
});
