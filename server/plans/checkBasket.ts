import { DomainError } from "#shared/domain/DomainError";
import type { BasketPlanRequest } from "#shared/schemas/gauges/basketPlan";

/** The place of each id in its list. Errors: DomainError on the second of two that are alike. */
function placesOf(list: string, ids: readonly string[], field = "id"): Map<string, number> {
  const places = new Map<string, number>();
  for (const [i, id] of ids.entries()) {
    if (places.has(id)) throw new DomainError(`${list}/${i}/${field}`, `“${id}” stands in this list twice.`);
    places.set(id, i);
  }
  return places;
}

export type Places = { needs: Map<string, number>; workshops: Map<string, number> };

/**
 * Holds the parts of a basket to each other, and gives the place of every need and workshop in its list.
 * Errors: DomainError on ids that stand twice in one list, and on ids that name nothing.
 */
export function checkBasket({ needs, workshops, offers }: BasketPlanRequest): Places {
  const ids = (list: readonly { id: string }[]) => list.map(({ id }) => id);
  const places = { needs: placesOf("needs", ids(needs)), workshops: placesOf("workshops", ids(workshops)) };
  placesOf("offers", ids(offers));
  for (const [i, { workshopId, covers }] of offers.entries()) {
    if (!places.workshops.has(workshopId)) {
      throw new DomainError(`offers/${i}/workshopId`, `No workshop here is called “${workshopId}”.`);
    }
    const needIds = covers.map(({ needId }) => needId);
    placesOf(`offers/${i}/covers`, needIds, "needId");
    const unknown = needIds.findIndex((needId) => !places.needs.has(needId));
    if (unknown >= 0) {
      throw new DomainError(`offers/${i}/covers/${unknown}/needId`, `No need here is called “${needIds[unknown]}”.`);
    }
  }
  return places;
}
