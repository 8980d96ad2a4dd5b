import { type DimensionName, dimensionsOf, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { partTolerance } from "#shared/domain/partTolerance";
import { type Material, materials } from "#shared/schemas/part";
import { partSearchText } from "../search/partSearchText";
import { type Dice, dice } from "./dice";

type Row = Record<string, unknown>;
export type Market = Record<
  | "users"
  | "workshops"
  | "shipping_rates"
  | "shipping_countries"
  | "parts"
  | "kit_lines"
  | "measured_items"
  | "measured_dimensions",
  Row[]
>;

const kinds: readonly [PartKind, number][] = [
  ["idler-wheel", 0.26],
  ["pinch-roller", 0.14],
  ["flat-belt", 0.2],
  ["square-belt", 0.1],
  ["round-belt", 0.06],
  ["drive-ring", 0.12],
  ["motor-mount", 0.05],
  ["brake-pad", 0.04],
  ["clutch-felt", 0.03],
];
const bores = [2, 2.5, 3, 3.2, 4, 4.76, 5, 6, 6.35, 8] as const;

/** Sizes as they come on such machines: diameters and lengths anywhere, bores on a few spindles. */
function nominalOf(kind: PartKind, dimension: DimensionName, { between, pick, next }: Dice): number {
  switch (dimension) {
    case "bore":
      return pick(bores) + (next() < 0.7 ? 0 : between(-0.05, 0.08));
    case "outsideDiameter":
      return kind === "pinch-roller" ? between(8, 45) : kind === "idler-wheel" ? between(18, 90) : between(6, 60);
    case "insideCircumference":
      return between(60, 900);
    case "insideDiameter":
      return kind === "drive-ring" ? between(8, 110) : between(3, 20);
    case "length":
      return between(5, 50);
    case "overallHeight":
      return between(6, 30);
    default:
      return between(0.6, 12);
  }
}

function sizesOf(itemId: string, kind: PartKind, roll: Dice): Row[] {
  return dimensionsOf(kind).flatMap((dimension): Row[] => {
    const isPrimary = dimension === kindFacts[kind].primary;
    const isOptional = kindFacts[kind].optional.includes(dimension);
    if (!isPrimary && roll.next() < (isOptional ? 0.85 : 0.15)) return [];
    const nominalMm = Number(nominalOf(kind, dimension, roll).toFixed(dimension === "bore" ? 2 : 1));
    const way = roll.next();
    const inForce = partTolerance(
      way < 0.5
        ? { nominalMm, plusMinusMm: dimension === "bore" ? 0.02 : Number(roll.between(0.05, 0.3).toFixed(2)) }
        : way < 0.8
          ? { nominalMm, toleranceClass: roll.pick(["M1", "M2", "M3"]) }
          : { nominalMm },
    );
    return [
      {
        item_id: itemId,
        kind,
        dimension,
        nominal_um: Math.round(nominalMm * 1000),
        half_width_um: Math.round(Math.min(inForce.plusMinusMm, nominalMm) * 1000),
        tolerance: inForce.basis,
        tolerance_class: inForce.toleranceClass ?? null,
      },
    ];
  });
}

const beginnings = "bar cor dal fen gal hol jor kel lam mar nor pel quil ros sal tor ulm ver wil zan".split(" ");
const endings = "ax by den dor eth fin gar ham ick lo mere nik ost pur rin stad tel um vik wen".split(" ");
const places = "platter,take-up,rewind,capstan,cycle,flywheel,counter,reel,motor,trip".split(",");
const finishes = "ground,cast,moulded,turned,lathe-cut,hand-finished,soft compound,firm compound".split(",");

function addWorkshops(market: Market, count: number, roll: Dice): void {
  for (let n = 0; n < count; n++) {
    const [id, owner, rate] = [roll.uuid(), roll.uuid(), roll.uuid()];
    market.users.push({
      id: owner,
      email: `bench${n}@example.org`,
      password_hash: "$argon2id$not-a-password",
      display_name: `Bench ${n}`,
      role: "workshop",
    });
    market.workshops.push({
      id,
      owner_id: owner,
      slug: `bench-${n}`,
      name: `${roll.pick(beginnings)}${roll.pick(endings)} works ${n}`,
      state: n % 40 === 39 ? "suspended" : "admitted",
      town: "Benchby",
      country: roll.pick(["DE", "NL", "NO", "US"]),
      legal_name: `Bench ${n}`,
      legal_address: ["1 Bench Lane"],
      phone: "+00 0",
      contact_email: `bench${n}@example.org`,
      dispatch_days: roll.whole(1, 10),
    });
    market.shipping_rates.push({
      id: rate,
      workshop_id: id,
      zone: "near",
      base_minor: roll.whole(300, 1200),
      per_item_minor: roll.whole(0, 100),
      currency: "EUR",
    });
    for (const country of n % 10 === 9 ? ["US"] : ["DE", "NO"]) {
      market.shipping_countries.push({ workshop_id: id, country, rate_id: rate });
    }
  }
}

function addItem(market: Market, partId: string, kitLineId: string | null, kind: PartKind, roll: Dice): void {
  const id = roll.uuid();
  const primary = kindFacts[kind].primary;
  market.measured_items.push({ id, part_id: partId, kit_line_id: kitLineId, kind, primary_dimension: primary });
  market.measured_dimensions.push(...sizesOf(id, kind, roll));
}

function kindBy(roll: Dice): PartKind {
  let left = roll.next();
  for (const [kind, share] of kinds) {
    left -= share;
    if (left < 0) return kind;
  }
  return "idler-wheel";
}

/** A market of `count` parts from 200 workshops, one in fifty a kit; the same in every run. */
export function benchMarket(count: number): Market {
  const roll = dice(20261201);
  const market: Market = {
    users: [],
    workshops: [],
    shipping_rates: [],
    shipping_countries: [],
    parts: [],
    kit_lines: [],
    measured_items: [],
    measured_dimensions: [],
  };
  addWorkshops(market, 200, roll);
  const makers = Array.from({ length: 60 }, () => `${roll.pick(beginnings)}${roll.pick(endings)}`);
  for (let n = 0; n < count; n++) {
    const id = roll.uuid();
    const isKit = n % 50 === 49;
    const lineKinds = isKit ? [kindBy(roll), kindBy(roll), kindBy(roll)] : [];
    const kind = isKit ? ("rebuild-kit" as const) : kindBy(roll);
    const workshop = roll.pick(market.workshops);
    const material: Material | null = isKit ? null : roll.pick(materials);
    const maker = roll.pick(makers);
    const title = `${roll.pick(places)} ${isKit ? "kit" : kindFacts[kind as PartKind].name}, ${roll.pick(finishes)}`;
    const isStocked = isKit || roll.next() < 0.8;
    market.parts.push({
      id,
      workshop_id: workshop.id,
      reference: `B-${n}`,
      kind,
      title,
      description: "Made for the bench.",
      material,
      hardness_shore_a: null,
      offer_type: isStocked ? "stocked" : "made-to-order",
      price_minor: roll.whole(400, 9000),
      currency: "EUR",
      stock_on_hand: isStocked ? roll.whole(0, 40) : null,
      stock_reserved: 0,
      lead_days: isStocked ? 0 : roll.whole(3, 20),
      made_to_size: false,
      weight_g: 20,
      state: n % 25 === 24 ? "hidden" : "published",
      search_text: partSearchText({
        title,
        kind,
        material,
        workshopName: String(workshop.name),
        lines: lineKinds.map((line) => ({ title: `${roll.pick(places)} part`, kind: line })),
        families: roll.next() < 0.7 ? [{ maker, name: `${maker} ${roll.whole(1, 9)}`, models: [] }] : [],
      }),
      created_at: "2026-01-01T00:00:00Z",
      updated_at: "2026-01-01T00:00:00Z",
    });
    if (!isKit) addItem(market, id, null, kind as PartKind, roll);
    for (const [index, line] of lineKinds.entries()) {
      const lineId = roll.uuid();
      market.kit_lines.push({
        id: lineId,
        part_id: id,
        position: index + 1,
        kind: line,
        title: kindFacts[line].name,
        quantity: 1,
      });
      addItem(market, id, lineId, line, roll);
    }
  }
  return market;
}
