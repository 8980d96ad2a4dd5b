import { conditionProblem } from "#shared/domain/conditions";
import { DomainError } from "#shared/domain/DomainError";
import { traitsOf } from "#shared/domain/dimensionTraits";
import { dimensionsOf, dimensionWords, type PartKind, partKinds } from "#shared/domain/partKinds";
import type { FieldError } from "#shared/problems";
import type { NeedQuery } from "#shared/schemas/need";
import type { FamilyRegister } from "./familyRegister";
import type { WrittenDimension } from "./needDimension";
import { refused } from "./readSizes";

function checkKind(kind: PartKind, sizes: readonly WrittenDimension[], { condition }: NeedQuery): void {
  const errors: FieldError[] = [];
  for (const { dimension } of sizes) {
    try {
      traitsOf(kind, dimension);
    } catch (error) {
      if (!(error instanceof DomainError)) throw error;
      errors.push({ pointer: `#/${dimension}`, detail: error.words });
    }
  }
  const problem = conditionProblem(kind, condition);
  if (problem) errors.push({ pointer: "#/condition", detail: problem });
  if (errors.length > 0) throw refused(errors);
}

/**
 * The kinds of part that a query is about: the one named, else those of the family's service points, else all, less those
 * that lack a dimension measured or cannot be in the condition given. None where nothing but words is asked for.
 *
 * Errors: `invalid-request` in words where the kind has no such dimension or condition, or no kind is left.
 */
export function kindsSought(
  query: NeedQuery,
  sizes: readonly WrittenDimension[],
  family: FamilyRegister | null,
): readonly PartKind[] {
  if (query.kind) {
    checkKind(query.kind, sizes, query);
    return [query.kind];
  }
  if (!family && sizes.length === 0) return [];
  const possible = family ? [...new Set(family.points.map(({ kind }) => kind))] : partKinds;
  const measurable = possible.filter((kind) => sizes.every(({ dimension }) => dimensionsOf(kind).includes(dimension)));
  if (measurable.length === 0 && sizes.length > 0) {
    const names = sizes.map(({ dimension }) => dimensionWords[dimension]).join(" and ");
    const where = family ? ` at the service points of the ${family.name}` : "";
    const detail = `No kind of part${where} is measured by ${names}. Leave one out or choose the kind.`;
    throw refused(sizes.map(({ dimension }) => ({ pointer: `#/${dimension}`, detail })));
  }
  const kinds = measurable.filter((kind) => conditionProblem(kind, query.condition) === undefined);
  if (kinds.length === 0 && measurable.length > 0) {
    throw refused([{ pointer: "#/condition", detail: `None of these parts become ${query.condition}.` }]);
  }
  return kinds;
}
