import { type DimensionName, dimensionsOf, dimensionWords, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { dimensionText, type LengthUnit } from "./dimensionText";
import type { PartSizes } from "./parts/PartSizes";

/** The drawing in words: `title` names the part by its primary size, `description` gives every size. */
export function describePart(
  kind: PartKind,
  sizes: PartSizes,
  unit: LengthUnit,
): { title: string; description: string } {
  const { name, primary } = kindFacts[kind];
  const names = dimensionsOf(kind);
  const stated = names.filter((n) => sizes.role(n) === "outline");
  const found = names.filter((n) => sizes.found(n) !== undefined);
  const missing = kindFacts[kind].matters.filter((n) => !stated.includes(n) && !replaced(n, stated));

  const heading = name.charAt(0).toUpperCase() + name.slice(1);
  const size = stated.includes(primary) ? `, ${inWords(primary, sizes, unit, false)}` : "";
  const sentences = [`${heading} drawn to scale.`];
  if (stated.length > 0) sentences.push(`Stated: ${stated.map((n) => inWords(n, sizes, unit, true)).join(", ")}.`);
  if (found.length > 0) {
    const own = found.map(
      (n) => `${dimensionWords[n]} ${dimensionText({ nominalMm: sizes.found(n)! }, unit).nominal} ${unit}`,
    );
    sentences.push(`Your old part, dashed: ${own.join(", ")}.`);
  }
  if (missing.length > 0) sentences.push(`Not stated: ${missing.map((n) => dimensionWords[n]).join(", ")}.`);
  return { title: heading + size, description: sentences.join(" ") };
}

function inWords(name: DimensionName, sizes: PartSizes, unit: LengthUnit, withTolerance: boolean): string {
  const { nominal, tolerance } = dimensionText(sizes.stated[name]!, unit);
  const plusMinus = withTolerance && tolerance ? ` plus or minus ${tolerance.slice(1)}` : "";
  return `${dimensionWords[name]} ${nominal} ${unit}${plusMinus}`;
}

/** A rectangular ring states width and height in place of a section. */
function replaced(name: DimensionName, stated: readonly DimensionName[]): boolean {
  return name === "section" && (stated.includes("width") || stated.includes("height"));
}
