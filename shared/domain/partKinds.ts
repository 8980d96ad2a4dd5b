/**
 * The kinds of part that the marketplace knows, and the dimensions of each in canonical order.
 *
 * Shape:  `primary` is the dimension that the size rail runs along; `matters` are the dimensions that
 *         decide whether a part fits and that coverage counts; `optional` ones count only where stated.
 * Units:  every dimension is a length in millimetres.
 */
export const dimensionNames = [
  "outsideDiameter",
  "bore",
  "treadWidth",
  "overallHeight",
  "secondTreadDiameter",
  "insideCircumference",
  "width",
  "thickness",
  "section",
  "insideDiameter",
  "grooveDiameter",
  "grooveWidth",
  "height",
  "length",
] as const;
export type DimensionName = (typeof dimensionNames)[number];

export const partKinds = [
  "idler-wheel",
  "pinch-roller",
  "flat-belt",
  "square-belt",
  "round-belt",
  "drive-ring",
  "motor-mount",
  "brake-pad",
  "clutch-felt",
] as const;
/** A kind that is measured itself; a rebuild kit is measured through its lines. */
export type PartKind = (typeof partKinds)[number];

export const listingKinds = [...partKinds, "rebuild-kit"] as const;
export type ListingKind = (typeof listingKinds)[number];

type KindFacts = {
  name: string;
  plural: string;
  primary: DimensionName;
  matters: readonly DimensionName[];
  optional: readonly DimensionName[];
};

export const kindFacts: Record<PartKind, KindFacts> = {
  "idler-wheel": {
    name: "idler wheel",
    plural: "idler wheels",
    primary: "outsideDiameter",
    matters: ["outsideDiameter", "bore", "treadWidth", "overallHeight"],
    optional: ["secondTreadDiameter"],
  },
  "pinch-roller": {
    name: "pinch roller",
    plural: "pinch rollers",
    primary: "outsideDiameter",
    matters: ["outsideDiameter", "bore", "treadWidth", "overallHeight"],
    optional: [],
  },
  "flat-belt": {
    name: "flat belt",
    plural: "flat belts",
    primary: "insideCircumference",
    matters: ["insideCircumference", "width", "thickness"],
    optional: [],
  },
  "square-belt": {
    name: "square belt",
    plural: "square belts",
    primary: "insideCircumference",
    matters: ["insideCircumference", "section"],
    optional: [],
  },
  "round-belt": {
    name: "round belt",
    plural: "round belts",
    primary: "insideCircumference",
    matters: ["insideCircumference", "section"],
    optional: [],
  },
  "drive-ring": {
    name: "drive ring",
    plural: "drive rings",
    primary: "insideDiameter",
    matters: ["insideDiameter", "section"],
    optional: ["width", "height"],
  },
  "motor-mount": {
    name: "motor mount",
    plural: "motor mounts",
    primary: "outsideDiameter",
    matters: ["outsideDiameter", "insideDiameter", "grooveDiameter", "grooveWidth", "height"],
    optional: [],
  },
  "brake-pad": {
    name: "brake pad",
    plural: "brake pads",
    primary: "length",
    matters: ["length", "width", "thickness"],
    optional: [],
  },
  "clutch-felt": {
    name: "clutch felt",
    plural: "clutch felts",
    primary: "outsideDiameter",
    matters: ["outsideDiameter", "insideDiameter", "thickness"],
    optional: [],
  },
};

/** Every dimension that a part of this kind may state, in canonical order. */
export function dimensionsOf(kind: PartKind): readonly DimensionName[] {
  const { matters, optional } = kindFacts[kind];
  return [...matters, ...optional];
}

/** What a dimension is called on a page, as used in a sentence. */
export const dimensionWords: Record<DimensionName, string> = {
  outsideDiameter: "outside diameter",
  bore: "bore",
  treadWidth: "tread width",
  overallHeight: "overall height",
  secondTreadDiameter: "second tread diameter",
  insideCircumference: "inside circumference",
  width: "width",
  thickness: "thickness",
  section: "section",
  insideDiameter: "inside diameter",
  grooveDiameter: "groove diameter",
  grooveWidth: "groove width",
  height: "height",
  length: "length",
};
