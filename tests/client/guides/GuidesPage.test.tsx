import { screen, within } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { partKinds } from "#shared/domain/partKinds";
import { AppRoutes } from "../../../client/app/AppRoutes";
import { GuidePage } from "../../../client/features/guides/GuidePage";
import { GuidesPage } from "../../../client/features/guides/GuidesPage";
import { guides } from "../../../client/features/guides/guides";
import { renderAt } from "../support/renderAt";
import { stubApi } from "../support/stubApi";

const pages = { "/guides": <GuidesPage />, "/guides/:slug": <GuidePage notFound={<h1>Not found</h1>} /> };
const levels = () => screen.getAllByRole("heading").map(({ tagName }) => Number(tagName.slice(1)));

function expectInOrder(found: readonly number[]) {
  expect(found[0]).toBe(1);
  expect(found.filter((level) => level === 1)).toHaveLength(1);
  for (const [at, level] of found.entries()) expect(level).toBeLessThanOrEqual((found[at - 1] ?? 0) + 1);
}

describe("the index of the guides", () => {
  it("leads to every guide, each with a picture", () => {
    renderAt("/guides", pages);
    const links = within(screen.getAllByRole("list")[0]?.parentElement?.parentElement ?? document.body);
    for (const { slug, title } of guides) {
      const link = links.getByRole("link", { name: title });
      expect(link).toHaveAttribute("href", `/guides/${slug}`);
      expect(link.closest("li")?.querySelector("svg path")).not.toBeNull();
    }
    expectInOrder(levels());
  });

  it("has a guide to every kind, and no address twice", () => {
    expect(guides.flatMap(({ kinds }) => kinds)).toEqual(expect.arrayContaining([...partKinds]));
    expect(new Set(guides.map(({ slug }) => slug)).size).toBe(guides.length);
  });
});

describe.each(guides)("the guide $slug", ({ slug, title }) => {
  it("opens at its address with its headings in order", async () => {
    renderAt(`/guides/${slug}`, pages);
    expect(screen.getByRole("heading", { level: 1, name: title })).toBeInTheDocument();
    expect((await screen.findAllByRole("heading", { level: 2 })).length).toBeGreaterThanOrEqual(2);
    expectInOrder(levels());
    expect(document.title).toBe(`${title} · Idlewright`);
  });

  it("leads on to places that there are", async () => {
    renderAt(`/guides/${slug}`, pages);
    await screen.findAllByRole("heading", { level: 2 });
    const known = new Set(["/guides", "/families", "/find", ...guides.map((guide) => `/guides/${guide.slug}`)]);
    for (const gauge of ["belt-route", "belt-sample", "speed", "tolerances", "o-rings", "sheets"]) {
      known.add(`/gauges/${gauge}`);
    }
    const links = screen.getAllByRole<HTMLAnchorElement>("link");
    expect(links.length).toBeGreaterThanOrEqual(2);
    for (const link of links) expect(known).toContain(new URL(link.href).pathname);
  });
});

describe("other addresses", () => {
  it("says so where there is no guide of that name", () => {
    renderAt("/guides/nothing", pages);
    expect(screen.getByRole("heading", { name: "Not found" })).toBeInTheDocument();
  });

  it("leads from the former address of the working to its guide", async () => {
    stubApi({});
    renderAt("/working", { "*": <AppRoutes /> });
    expect(await screen.findByRole("heading", { level: 1, name: /fit chance/ })).toBeInTheDocument();
    expect(screen.getByLabelText("address")).toHaveTextContent("/guides/fit-chance");
  });
});
