import type { Response } from "supertest";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { sheetRoutes } from "#server/routes/sheets";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { type Visitor, visitor } from "#tests/support/visitor";
import { readPdf } from "./readPdf";

let site: TestSite;
let someone: Visitor;
beforeAll(async () => {
  site = await startTestSite();
  someone = await visitor(site);
});
afterAll(() => site.close());

const get = (path: string) => someone.get(`/gauges/sheets/${path}`).buffer(true).parse(bytesOf);
/** Keeps the body of an answer as it came. */
function bytesOf(res: Response, done: (error: Error | null, body: Buffer) => void) {
  const chunks: Buffer[] = [];
  res.on("data", (chunk: Buffer) => chunks.push(chunk));
  res.on("end", () => done(null, Buffer.concat(chunks)));
}
const refusal = async (path: string) => {
  const res = await someone.get(`/gauges/sheets/${path}`);
  expect(res.type, path).toBe("application/problem+json");
  expect(res.status, path).toBe(422);
  return res.body.errors.map(({ pointer }: { pointer: string }) => pointer);
};

describe("the calls of the sheets", () => {
  it.each([
    ["strobe?mainsHz=50", "stroboscope-50-hz.pdf", 1],
    ["strobe?mainsHz=60&speeds=33%201/3,45&spindleMm=6&paper=letter", "stroboscope-60-hz.pdf", 1],
    ["ring-gauge", "ring-gauge.pdf", 2],
    ["ring-gauge?largestMm=60&stepMm=2&paper=letter", "ring-gauge.pdf", 2],
    ["belt-ruler?longestMm=1900", "belt-ruler.pdf", 2],
  ])("answers %s with a PDF to look at", async (path, name, pages) => {
    const res = await get(path);
    expect(res.status).toBe(200);
    expect(res.headers["content-type"]).toBe("application/pdf");
    expect(res.headers["content-disposition"]).toBe(`inline; filename="${name}"`);
    expect((await readPdf(res.body)).length).toBe(pages);
  });

  it("draws the rings that were asked for", async () => {
    const [page] = await readPdf((await get("strobe?mainsHz=60&speeds=33 1/3,80&paper=letter")).body);
    const rings = page?.paths.filter(({ isFilled, pieces }) => isFilled && pieces.length > 1);
    expect(rings?.map(({ pieces }) => pieces.length)).toEqual([216, 90]);
    expect(page?.text).toContain("80 rpm, exact");
  });

  it.each([
    ["strobe", ["#/mainsHz"]],
    ["strobe?mainsHz=9", ["#/mainsHz"]],
    ["strobe?mainsHz=1e308", ["#/mainsHz"]],
    ["strobe?mainsHz=NaN", ["#/mainsHz"]],
    ["strobe?mainsHz=50&mainsHz=60", ["#/mainsHz"]],
    ["strobe?mainsHz=50&speeds=", ["#/speeds"]],
    ["strobe?mainsHz=50&speeds=45,fast", ["#/speeds"]],
    ["strobe?mainsHz=50&speeds=45/0", ["#/speeds"]],
    ["strobe?mainsHz=50&speeds=1", ["#/speeds"]],
    ["strobe?mainsHz=50&speeds=1001", ["#/speeds"]],
    ["strobe?mainsHz=50&speeds=40,41,42,43,44,45,46", ["#/speeds"]],
    [`strobe?mainsHz=50&speeds=${"9".repeat(99)}`, ["#/speeds"]],
    [`strobe?mainsHz=50&speeds=${"9".repeat(101)}`, ["#/speeds"]],
    ["strobe?mainsHz=50&spindleMm=0", ["#/spindleMm"]],
    ["strobe?mainsHz=50&spindleMm=41", ["#/spindleMm"]],
    ["strobe?mainsHz=50&spindleMm=-7.2&paper=a3", ["#/paper"]],
    ["strobe?mainsHz=x&paper=A4", ["#/mainsHz", "#/paper"]],
    ["ring-gauge?largestMm=185", ["#/largestMm"]],
    ["ring-gauge?largestMm=190", ["#/largestMm"]],
    ["ring-gauge?stepMm=0", ["#/stepMm"]],
    ["belt-ruler?longestMm=1901", ["#/longestMm"]],
    ["belt-ruler?longestMm=0", ["#/longestMm"]],
    ["belt-ruler?longestMm=5e-324", ["#/longestMm"]],
  ])("refuses %s and points to what is wrong", async (path, pointers) => {
    expect((await refusal(path)).sort()).toEqual(pointers);
  });

  it("are described as files", async () => {
    const { body } = await someone.agent.get("/api/v1/openapi.json").expect(200);
    const { responses, parameters } = body.paths["/api/v1/gauges/sheets/strobe"].get;
    expect(Object.keys(responses["200"].content)).toEqual(["application/pdf"]);
    expect(parameters.map(({ name }: { name: string }) => name)).toEqual(["mainsHz", "speeds", "spindleMm", "paper"]);
    expect(parameters.map(({ required }: { required?: boolean }) => required ?? false)).toEqual([
      true,
      false,
      false,
      false,
    ]);
  });

  it("are limited to sixty a minute from one address", () => {
    const limits = sheetRoutes().map(({ limit }) => limit);
    expect(limits.length).toBe(3);
    for (const limit of limits) expect(limit).toEqual({ name: "sheets", points: 60, perSeconds: 60, by: "address" });
  });
});
