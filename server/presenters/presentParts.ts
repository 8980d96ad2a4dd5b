import { Op } from "sequelize";
import { dimensionsOf, type PartKind } from "#shared/domain/partKinds";
import type { KitLine, PartSummary, Photo, StatedDimensions } from "#shared/schemas/part";
import { photoUrl } from "../adapters/PhotoStore";
import { KitLine as KitLineRow } from "../models/KitLine";
import { MeasuredDimension } from "../models/MeasuredDimension";
import { MeasuredItem } from "../models/MeasuredItem";
import { Part } from "../models/Part";
import { Photo as PhotoRow } from "../models/Photo";
import { ServicePoint } from "../models/ServicePoint";
import { Workshop } from "../models/Workshop";

const mm = (um: number) => um / 1000;

function groupBy<Row, Key>(rows: readonly Row[], keyOf: (row: Row) => Key): Map<Key, Row[]> {
  const groups = new Map<Key, Row[]>();
  for (const row of rows) {
    const group = groups.get(keyOf(row));
    if (group) group.push(row);
    else groups.set(keyOf(row), [row]);
  }
  return groups;
}

/** Sizes in the canonical order of their kind. */
function presentDimensions(kind: PartKind, rows: readonly MeasuredDimension[]): StatedDimensions {
  const byName = new Map(rows.map((row) => [row.dimension, row]));
  const sizes: StatedDimensions = {};
  for (const name of dimensionsOf(kind)) {
    const row = byName.get(name);
    if (!row) continue;
    sizes[name] = {
      nominalMm: mm(row.nominalUm),
      plusMinusMm: mm(row.halfWidthUm),
      tolerance: row.tolerance,
      toleranceClass: row.toleranceClass,
    };
  }
  return sizes;
}

export const presentPhoto = (row: PhotoRow, width: 320 | 960): Photo => ({
  url: photoUrl(row.file, width),
  alt: row.alt,
  width,
  height: Math.round((row.height * width) / row.width),
});

/** Pieces that can still be bought; null where the part is made when ordered. */
export const availableOf = (part: Part): number | null =>
  part.stockOnHand === null ? null : part.stockOnHand - part.stockReserved;

/**
 * Parts as they stand in a row, by id, in five queries however many there are. Ids with nothing behind them are absent.
 */
export async function presentParts(ids: readonly string[]): Promise<Map<string, PartSummary>> {
  const wanted = { [Op.in]: [...new Set(ids)] };
  const [parts, items, lines, photos] = await Promise.all([
    Part.findAll({ where: { id: wanted } }),
    MeasuredItem.findAll({ where: { partId: wanted } }),
    KitLineRow.findAll({ where: { partId: wanted }, order: [["position", "ASC"]] }),
    PhotoRow.findAll({ where: { partId: wanted, position: 1 } }),
  ]);
  const [dimensions, points, workshops] = await Promise.all([
    MeasuredDimension.findAll({ where: { itemId: { [Op.in]: items.map(({ id }) => id) } } }),
    ServicePoint.findAll({ where: { id: { [Op.in]: lines.flatMap(({ servicePointId }) => servicePointId ?? []) } } }),
    Workshop.findAll({ where: { id: { [Op.in]: [...new Set(parts.map(({ workshopId }) => workshopId))] } } }),
  ]);

  const dimensionsByItem = groupBy(dimensions, ({ itemId }) => itemId);
  const sizesOf = (item: MeasuredItem | undefined) =>
    item ? presentDimensions(item.kind, dimensionsByItem.get(item.id) ?? []) : {};
  const itemOfPart = new Map(items.filter(({ kitLineId }) => !kitLineId).map((item) => [item.partId, item]));
  const itemOfLine = new Map(items.map((item) => [item.kitLineId, item]));
  const linesOfPart = groupBy(lines, ({ partId }) => partId);
  const pointName = new Map(points.map(({ id, name }) => [id, name]));
  const photoOf = new Map(photos.map((photo) => [photo.partId, presentPhoto(photo, 320)]));
  const dispatchOf = new Map(workshops.map(({ id, dispatchDays }) => [id, dispatchDays]));

  const presentLine = (line: KitLineRow): KitLine => ({
    id: line.id,
    kind: line.kind,
    title: line.title,
    quantity: line.quantity,
    dimensions: sizesOf(itemOfLine.get(line.id)),
    servicePointName: line.servicePointId ? (pointName.get(line.servicePointId) ?? null) : null,
  });

  return new Map(
    parts.map((part) => [
      part.id,
      {
        id: part.id,
        kind: part.kind,
        title: part.title,
        offerType: part.offerType,
        material: part.material,
        hardnessShoreA: part.hardnessShoreA,
        priceMinor: part.priceMinor,
        currency: part.currency,
        available: availableOf(part),
        dispatchDays: (dispatchOf.get(part.workshopId) ?? 0) + part.leadDays,
        dimensions: sizesOf(itemOfPart.get(part.id)),
        kitLines: (linesOfPart.get(part.id) ?? []).map(presentLine),
        photo: photoOf.get(part.id) ?? null,
      },
    ]),
  );
}
