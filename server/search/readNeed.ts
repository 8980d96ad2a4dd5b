import { DomainError } from "#shared/domain/DomainError";
import { kindFacts, type PartKind } from "#shared/domain/partKinds";
import type { Need, NeedDimension, NeedQuery } from "#shared/schemas/need";
import { familyRegister } from "./familyRegister";
import { inOrder, targetsOf } from "./familyTargets";
import { kindsSought } from "./kindsSought";
import { movedDimension, placedDimension, type WrittenDimension, writtenDimension } from "./needDimension";
import { readSizes, refused } from "./readSizes";
import { type Target, targetOf } from "./Target";

/** What is asked for, as shown, and everything that would do. The first target is the one shown. */
export type ReadNeed = {
  need: Need;
  kinds: readonly PartKind[];
  targets: readonly Target[];
  familyId: string | null;
};

function whenNew(kind: PartKind, sizes: readonly WrittenDimension[], query: NeedQuery): NeedDimension[] {
  return sizes.map((written) => {
    try {
      return writtenDimension(kind, written, query);
    } catch (error) {
      if (!(error instanceof DomainError)) throw error;
      const pointer = error.field === "condition" ? "#/condition" : `#/${written.dimension}`;
      throw refused([{ pointer, detail: error.words }], error);
    }
  });
}

function move({ kind, point, dimensions }: Target, toMm: number): Target {
  const { primary } = kindFacts[kind];
  const known = dimensions.some(({ dimension }) => dimension === primary);
  const moved = dimensions.map((size) => (size.dimension === primary ? movedDimension(kind, size, toMm) : size));
  return targetOf(kind, point, inOrder(kind, known ? moved : [...moved, placedDimension(kind, primary, toMm)]));
}

/**
 * What a query asks for: sizes read, as-new sizes with their uncertainty, and the bands that decide.
 *
 * Shape:  one target for each kind and service point that would do, the likeliest first. With a family, its register gives
 *         bands and the sizes that were not measured; a register that what was measured speaks against is not used, and
 *         `basis` says so. `estimateMm` moves the primary size of the first target, which is then the only one.
 * Errors: `invalid-request` with a pointer for each field that is not clear or not of the kind; `not-found` for a family.
 */
export async function readNeed(query: NeedQuery, q: string | null = null): Promise<ReadNeed> {
  const sizes = readSizes(query);
  const family = query.family ? await familyRegister(query.family) : null;
  const kinds = kindsSought(query, sizes, family);
  const found = kinds.flatMap((kind) => targetsOf(kind, whenNew(kind, sizes, query), family));
  const oneKind = kinds.length === 1 ? kinds[0] : undefined;

  let targets = found;
  if (query.estimateMm !== undefined) {
    if (!oneKind) {
      throw refused([{ pointer: "#/estimateMm", detail: "Choose the kind of part that this is the size of." }]);
    }
    targets = [move(found[0] ?? targetOf(oneKind, null, []), query.estimateMm)];
  }
  const shown = targets[0]?.dimensions ?? [];
  return {
    need: {
      kind: oneKind ?? null,
      // Sizes of the register belong to one kind; where several are searched only what was measured holds for all.
      dimensions: oneKind ? [...shown] : shown.filter(({ text }) => text !== null),
      instrument: query.instrument,
      condition: query.condition,
      family: family && { slug: family.slug, name: family.name },
      q,
      shipTo: query.shipTo,
    },
    kinds,
    targets,
    familyId: family?.id ?? null,
  };
}
