import { DomainError } from "./DomainError";
import { type DimensionName, dimensionsOf, dimensionWords, kindFacts, type PartKind } from "./partKinds";

/**
 * What a dimension is made of and how age changes it.
 *
 * `tread`   a running diameter in rubber: it wears and glazes
 * `loop`    the length of a belt, or the inside diameter of a ring stretched over a hub: it sets and slackens
 * `section` the thickness or width of a belt or ring
 * `face`    the thickness of a pad or felt that is rubbed away
 * `body`    another size of the soft part: it only swells or shrinks
 * `rigid`   metal or bush: the rubber's condition leaves it alone
 */
export type WearRole = "tread" | "loop" | "section" | "face" | "body" | "rigid";
export type DimensionTraits = { role: WearRole; material: "rubber" | "felt" | "metal"; inside: boolean };

const wheel: Partial<Record<DimensionName, WearRole>> = {
  outsideDiameter: "tread",
  bore: "rigid",
  treadWidth: "body",
  // The hub's length, from face to face of the metal.
  overallHeight: "rigid",
  secondTreadDiameter: "tread",
};
const belt: Partial<Record<DimensionName, WearRole>> = {
  insideCircumference: "loop",
  width: "section",
  thickness: "section",
  section: "section",
};
const ring: Partial<Record<DimensionName, WearRole>> = {
  insideDiameter: "loop",
  section: "section",
  width: "section",
  height: "section",
};
const roles: Record<PartKind, Partial<Record<DimensionName, WearRole>>> = {
  "idler-wheel": wheel,
  "pinch-roller": wheel,
  "flat-belt": belt,
  "square-belt": belt,
  "round-belt": belt,
  "drive-ring": ring,
  "motor-mount": {},
  "brake-pad": { thickness: "face" },
  "clutch-felt": { thickness: "face" },
};
const insideSizes: readonly DimensionName[] = ["bore", "insideDiameter", "grooveWidth"];

/** Throws a DomainError on "dimension" when the kind has no such dimension. */
export function traitsOf(kind: PartKind, dimension: DimensionName): DimensionTraits {
  if (!dimensionsOf(kind).includes(dimension)) {
    const names = dimensionsOf(kind).map((name) => dimensionWords[name]);
    throw new DomainError(
      "dimension",
      `The ${kindFacts[kind].name} has no ${dimensionWords[dimension]}. Its sizes are: ${names.join(", ")}.`,
    );
  }
  const role = roles[kind][dimension] ?? "body";
  const soft = kind === "clutch-felt" ? "felt" : "rubber";
  return { role, material: role === "rigid" ? "metal" : soft, inside: insideSizes.includes(dimension) };
}
