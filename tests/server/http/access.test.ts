import { randomUUID } from "node:crypto";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Endpoint } from "#server/http/endpoint";
import { endpointsOf } from "#server/routes/endpointsOf";
import { type Role, roles } from "#shared/schemas/session";
import { buildUser, buildWorkshop, testPassword } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { type Visitor, visitor } from "#tests/support/visitor";
import { accessMatrix } from "./accessMatrix";

let site: TestSite;
let endpoints: Endpoint[];
const people = new Map<string, Visitor>();

beforeAll(async () => {
  site = await startTestSite();
  endpoints = endpointsOf(site.services);
  people.set("nobody", await visitor(site));
  for (const role of roles) {
    const user = await buildUser({ role });
    if (role === "workshop") await buildWorkshop({ ownerId: user.id });
    const person = await visitor(site);
    await person.signIn(user.email, testPassword);
    people.set(role, person);
  }
});
afterAll(() => site.close());

const nameOf = ({ method, path }: Endpoint) => `${method} ${path}`;

/** The role that a call is for, where it is for one. */
const onlyFor = (endpoint: Endpoint): Role | undefined => roles.find((role) => role === accessMatrix[nameOf(endpoint)]);

/** Calls an endpoint with an address that nobody has, and with an empty body. */
async function statusFor(who: string, { method, path }: Endpoint): Promise<number> {
  const person = people.get(who);
  if (!person) throw new Error(`nobody is called ${who}`);
  const to = path.replaceAll(/:(id|partId)/g, () => randomUUID()).replaceAll(":slug", "nothing-here");
  const res = await (method === "get" ? person.get(to) : person[method](to));
  return res.status;
}

describe("who may call what", () => {
  it("is written down for every call, and for no other", () => {
    expect(endpoints.map(nameOf).sort()).toEqual(Object.keys(accessMatrix).sort());
  });

  // Signing out would end the session that the others are tried with.
  const triable = () => endpoints.filter((endpoint) => nameOf(endpoint) !== "post /auth/sign-out");

  it("holds for somebody who is not signed in", async () => {
    for (const endpoint of triable()) {
      const status = await statusFor("nobody", endpoint);
      const name = nameOf(endpoint);
      if (accessMatrix[name] !== "open") expect(status, name).toBe(401);
      else expect([401, 403], name).not.toContain(status);
      expect(status, name).toBeLessThan(500);
    }
  });

  it.each(roles)("holds for a %s, who reaches nothing that is not theirs", async (role) => {
    for (const endpoint of triable()) {
      const name = nameOf(endpoint);
      const status = await statusFor(role, endpoint);
      if (onlyFor(endpoint) && onlyFor(endpoint) !== role) {
        expect(status, name).toBe(403);
        continue;
      }
      expect([401, 403], name).not.toContain(status);
      if (/:id|:slug/.test(endpoint.path)) expect(status, name).toBe(404);
      expect(status, name).toBeLessThan(500);
    }
  });

  it("asks for the token of the page on every call that is not a read", async () => {
    for (const endpoint of endpoints.filter(({ method, pure }) => method !== "get" && !pure)) {
      const to = `/api/v1${endpoint.path.replaceAll(/:(id|partId)/g, () => randomUUID())}`;
      const method = endpoint.method as "post" | "put" | "delete";
      const res = await people
        .get(onlyFor(endpoint) ?? "restorer")
        ?.agent[method](to)
        .send({});
      expect(res?.status, nameOf(endpoint)).toBe(403);
      expect(res?.body.type, nameOf(endpoint)).toBe("/problems/stale-page");
    }
  });
});
