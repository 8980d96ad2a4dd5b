import { page } from "./lists";
import { ProviderError } from "./ProviderError";
import type { World } from "./World";

type Json = Record<string, unknown>;
const isObject = (value: unknown): value is Json => value !== null && typeof value === "object";

/** Lists that are left out of an object unless asked for by name. */
function includable(world: World, owner: Json, field: string): unknown {
  const id = String(owner.id);
  if (owner.object === "checkout.session" && field === "line_items") {
    return page(world.store.lineItems.get(id) ?? [], {}, `/v1/checkout/sessions/${id}/line_items`);
  }
  if (owner.object === "charge" && field === "refunds") {
    const refunds = [...world.store.refunds.values()].filter((refund) => refund.charge === id).reverse();
    return page(refunds, {}, `/v1/charges/${id}/refunds`);
  }
  return undefined;
}

const copy = (value: unknown): unknown => JSON.parse(JSON.stringify(value));

function expandOne(world: World, owner: unknown, [field, ...rest]: readonly string[], path: string): void {
  if (field === undefined || owner === null) return;
  if (Array.isArray(owner)) {
    for (const item of owner) expandOne(world, item, [field, ...rest], path);
    return;
  }
  if (!isObject(owner))
    throw new ProviderError(400, `This property cannot be expanded (${path}).`, { param: "expand" });

  const value = owner[field];
  const found = typeof value === "string" ? world.store.find(value) : includable(world, owner, field);
  if (found !== undefined) owner[field] = copy(found);
  else if (value === undefined || typeof value === "string") {
    throw new ProviderError(400, `This property cannot be expanded (${path}).`, { param: "expand" });
  }
  expandOne(world, owner[field], rest, path);
}

/**
 * A copy of an answer with ids replaced by objects along dotted paths (`payment_intent.latest_charge`, `data.charge`).
 * At most four levels deep (https://docs.stripe.com/expand); throws a 400 for what cannot be expanded.
 */
export function expandPaths(world: World, answer: unknown, paths: readonly string[] = []): unknown {
  const expanded = copy(answer);
  for (const path of paths) {
    const fields = path.split(".");
    if (fields.length > 4) throw new ProviderError(400, `You cannot expand more than 4 levels (${path}).`);
    expandOne(world, expanded, fields, path);
  }
  return expanded;
}
