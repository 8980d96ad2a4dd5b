import request from "supertest";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { endpointsOf } from "#server/routes/endpointsOf";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

describe("health", () => {
  it("says that the process is up and that the database is ready", async () => {
    await request(site.url).get("/healthz").expect(200, { status: "up" });
    await request(site.url).get("/readyz").expect(200, { status: "ready" });
  });
});

describe("the description", () => {
  it("is OpenAPI 3.1 and names every call that is served", async () => {
    const { body } = await request(site.url).get("/api/v1/openapi.json").expect(200);
    expect(body.openapi).toMatch(/^3\.1\./);
    for (const { method, path } of endpointsOf(site.services)) {
      const described = body.paths[`/api/v1${path.replaceAll(/:(\w+)/g, "{$1}")}`]?.[method];
      expect(described?.summary, `${method} ${path}`).toBeTruthy();
    }
    const search = body.paths["/api/v1/search"].get.parameters.map(({ name }: { name: string }) => name);
    expect(search).toEqual(
      expect.arrayContaining(["kind", "outsideDiameter", "bore", "instrument", "condition", "minChance"]),
    );
  });

  it("can be read as a page", async () => {
    const res = await request(site.url).get("/api/docs").expect(200);
    expect(res.type).toBe("text/html");
    expect(res.text).toContain("GET /api/v1/search");
  });
});

describe("problems", () => {
  it.each([
    ["an address that is not there", "/api/v1/nothing", 404],
    ["an id that is none", "/api/v1/parts/not-an-id", 404],
    ["a bad escape in the address", "/api/v1/parts/%E0%A4%A", 400],
  ])("answers %s as problem+json", async (_what, path, status) => {
    const res = await request(site.url).get(path);
    expect(res.status).toBe(status);
    expect(res.type).toBe("application/problem+json");
    expect(res.body).toMatchObject({ status, type: expect.stringMatching(/^\/problems\//), title: expect.any(String) });
    expect(res.headers["x-request-id"]).toMatch(/^[0-9a-f-]{36}$/);
  });

  it.each([
    ["JSON that breaks off", "application/json", '{"email":', 400],
    ["JSON that is no object", "application/json", '"text"', 400],
    ["a body that is too large", "application/json", JSON.stringify({ email: "x".repeat(200_000) }), 413],
    ["no fields at all", "application/json", "{}", 422],
    ["fields of wrong types", "application/json", '{"email":{"$gt":""},"password":["x"]}', 422],
    ["a poisoned prototype", "application/json", '{"__proto__":{"role":"administrator"},"constructor":1}', 422],
  ])("answers %s without falling over", async (_what, type, body, status) => {
    const someone = await visitor(site);
    const res = await someone.raw("/auth/sign-in").set("Content-Type", type).send(body);
    expect(res.status).toBe(status);
    expect(res.type).toBe("application/problem+json");
    expect(JSON.stringify(res.body)).not.toMatch(/\bat .*\.ts|node_modules/);
  });

  it("names the fields of a 422 by JSON pointers", async () => {
    const someone = await visitor(site);
    const res = await someone.post("/auth/sign-up", { email: "no address", password: "short" });
    expect(res.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      "#/displayName",
      "#/email",
      "#/password",
    ]);
  });

  it("answers a wrong method with 405 and what is allowed", async () => {
    const someone = await visitor(site);
    const res = await someone.put("/search");
    expect(res.status).toBe(405);
    expect(res.headers.allow).toBe("GET");
  });
});

describe("compression", () => {
  it("makes long answers shorter", async () => {
    const description = await request(site.url).get("/api/v1/openapi.json").set("Accept-Encoding", "br, gzip");
    expect(description.headers["content-encoding"]).toBe("br");
  });
});

describe("headers", () => {
  it("ASVS 3.4: allow nothing from elsewhere, no framing, no sniffing, and say nothing of the software", async () => {
    const { headers } = await request(site.url).get("/api/v1/auth/session");
    const policy = headers["content-security-policy"] ?? "";
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).toContain("script-src 'self'");
    expect(policy).not.toContain("unsafe");
    expect(headers["x-content-type-options"]).toBe("nosniff");
    expect(headers["cross-origin-resource-policy"]).toBe("same-origin");
    expect(headers["referrer-policy"]).toBe("strict-origin-when-cross-origin");
    expect(headers["cache-control"]).toBe("no-store");
    expect(headers["x-powered-by"]).toBeUndefined();
    expect(headers["access-control-allow-origin"]).toBeUndefined();
  });
});
