import request, { type Test } from "supertest";
import type { TestSite } from "#tests/support/testSite";

type Json = null | boolean | number | string | readonly Json[] | { readonly [name: string]: Json | undefined };
export type Body = { readonly [name: string]: Json | undefined };

/** A good question for every call of the gauge desk, and more than one where the call has several forms. */
export const goodBodies = {
  length: [{ text: '1-47/64"', defaultUnit: "mm" }],
  "belt-route": [
    {
      pulleys: [
        { x: 0, y: 0, diameter: 12, wrap: "inside" },
        { x: 70, y: -35, diameter: 20, wrap: "back" },
        { x: 180, y: 0, diameter: 150, wrap: "inside" },
      ],
      thickness: 1.2,
      stretchPercent: { min: 4, max: 8 },
    },
  ],
  "belt-sample": [
    {
      method: "lay-flat-outside",
      readingsMm: [214.5, 215, 215.5],
      thicknessMm: 1.2,
      instrument: "steel-rule",
      condition: "slack",
    },
  ],
  "as-new": [
    {
      kind: "idler-wheel",
      dimension: "outsideDiameter",
      readingsMm: [44.08, 44.1, 44.12],
      instrument: "digital-caliper",
      condition: "glazed",
    },
  ],
  speed: [
    {
      drive: "rim",
      mainsHz: 50,
      poles: 4,
      slipPercent: 4,
      stepDiameter: 5.9,
      rimDiameter: 260,
      idlerDiameter: 40,
      target: "33 1/3",
    },
    {
      drive: "stepped-idler",
      mainsHz: 50,
      poles: 4,
      slipPercent: 4,
      stepDiameter: 8,
      idlerLargeDiameter: 50,
      idlerSmallDiameter: 25,
      rimDiameter: 200,
    },
    {
      drive: "belt",
      mainsHz: 60,
      poles: 24,
      slipPercent: 0,
      pulleyDiameter: 14.2,
      drivenDiameter: 162,
      beltThickness: 0.8,
    },
    {
      drive: "capstan",
      mainsHz: 50,
      poles: 4,
      slipPercent: 5,
      stages: [{ driver: 12, driven: 80, beltThickness: 0.6 }],
      capstanDiameter: 8,
      target: "3 3/4",
    },
  ],
  strobe: [{ mainsHz: 50, rpm: 45 }],
  conformance: [{ estimateMm: 70.3, standardUncertaintyMm: 0.15, lowerMm: 69.5, upperMm: 70.5 }],
  "check-in": [
    { readingsMm: [44.02, 44.05], instrument: "digital-caliper", nominalMm: 44, plusMinusMm: 0.2, guardFactor: 2 },
    { readingsMm: [44.02], standardUncertaintyMm: 0.02, nominalMm: 44, plusMinusMm: 0.2 },
  ],
  consensus: [{ valuesMm: [44.1, 44.12, 44.08, 44.11, 46.9] }],
  fit: [
    {
      kind: "idler-wheel",
      need: {
        outsideDiameter: { valueMm: 44.2, standardUncertaintyMm: 0.1 },
        bore: { valueMm: 4, standardUncertaintyMm: 0.02 },
      },
      part: {
        outsideDiameter: { nominalMm: 44.3, plusMinusMm: 0.1 },
        bore: { nominalMm: 4, toleranceClass: "M1" },
      },
      bands: { bore: { lowerMm: 3.96, upperMm: 4.06 } },
    },
  ],
  "basket-plan": [
    {
      needs: [{ id: "idler", quantity: 1 }],
      workshops: [{ id: "A", shippingBaseMinor: 500, shippingPerItemMinor: 50, dispatchDays: 3 }],
      offers: [{ id: "one", workshopId: "A", priceMinor: 1200, stock: 4, covers: [{ needId: "idler", chance: 0.9 }] }],
      minimumChance: 0.6,
    },
  ],
} satisfies Record<string, readonly Body[]>;
export type CallName = keyof typeof goodBodies;
export const callNames = Object.keys(goodBodies) as CallName[];

export const goodQueries = {
  "rubber-tolerance": { class: "M2", nominalMm: "75", dimension: "fixed" },
  "o-rings": { insideDiameterMm: "24.9", sectionMm: "3.5", limit: "5" },
};

const address = (name: string) => `/api/v1/gauges/${name}`;

/** Asks a gauge; a text is sent as it is, as JSON. Nobody is signed in and no token is sent. */
export function ask(site: TestSite, name: string, body: object | string): Test {
  return request(site.url).post(address(name)).type("application/json").send(body);
}

/** Asks a gauge that is read; `query` may be the text after the question mark. */
export function read(site: TestSite, name: string, query: Record<string, string> | string): Test {
  return request(site.url).get(address(name)).query(query);
}

type Answer = { status: number; type: string; body: unknown };
type Refusal = { status: number; detail: string; errors: { pointer: string; detail: string }[] };

/** What is wrong with an answer, in words; nothing where it is as promised. */
export function faultOf({ status, type, body }: Answer): string | undefined {
  if (status === 200) return type === "application/json" ? badFigure(body) : `answered as ${type}`;
  if (status !== 422) return `status ${status}`;
  if (type !== "application/problem+json") return `refused as ${type}`;
  const { errors, detail } = body as Refusal;
  if (!detail || !errors?.length) return "refused without fields";
  const odd = errors.find(({ pointer, detail: words }) => !/^#(\/|$)/.test(pointer) || !/^[A-Z“].*[^ ]$/.test(words));
  return odd && `refused with ${JSON.stringify(odd)}`;
}

/** Where an answer holds null or what is no number where one belongs. JSON has no NaN: it would be null. */
function badFigure(value: unknown, at = ""): string | undefined {
  if (value === null) return /^\/plans\/\w+$/.test(at) ? undefined : `null at ${at}`;
  if (typeof value === "number") return Number.isFinite(value) ? undefined : `${value} at ${at}`;
  if (typeof value !== "object") return undefined;
  for (const [name, inner] of Object.entries(value)) {
    const found = badFigure(inner, `${at}/${name}`);
    if (found) return found;
  }
  return undefined;
}

export const pointersOf = (body: unknown) => (body as Refusal).errors.map(({ pointer }) => pointer);
