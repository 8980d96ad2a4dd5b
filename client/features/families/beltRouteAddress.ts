import type { DriveMap, ServicePoint } from "#shared/schemas/catalogue";
import { isBelt } from "../../lib/needParams";
import { inBeltOrder } from "./beltPath";

const shown = (mm: number) => String(Number(mm.toFixed(2)) + 0);

/**
 * The belt route gauge with the wheels of one belt of a drive map laid out on its board, or null where it needs more than
 * is known here. On the plan y points down the page, on the board up.
 */
export function beltRouteAddress(
  { wheels, belts }: DriveMap,
  label: string,
  points: readonly ServicePoint[],
  family: string,
): string | null {
  const belt = belts.find((one) => one.label === label);
  const round = inBeltOrder((belt?.wheels ?? []).flatMap((id) => wheels.find((wheel) => wheel.id === id) ?? []));
  if (round.length < 2) return null;
  const params = new URLSearchParams(
    round.map(({ label: name, xMm, yMm, diameterMm }) => [
      "pulley",
      [name.slice(0, 24).trim(), shown(xMm), shown(-yMm), shown(diameterMm)].join(" "),
    ]),
  );
  const kind = points.find(({ name, partKind }) => name === label && isBelt(partKind))?.partKind;
  params.set("kind", kind ?? "flat-belt");
  params.set("family", family);
  return `/gauges/belt-route?${params}`;
}
