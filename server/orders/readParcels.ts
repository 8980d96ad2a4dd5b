import { Op } from "sequelize";
import { OrderLine } from "../models/OrderLine";
import { Parcel } from "../models/Parcel";
import { Workshop } from "../models/Workshop";

const inOrder = { order: [["id", "ASC"]] as [string, string][] };

/** Parcels of some orders with their lines and workshops. */
export async function readParcels(orderIds: readonly string[]) {
  const parcels = await Parcel.findAll({ where: { orderId: { [Op.in]: [...orderIds] } }, ...inOrder });
  const [lines, workshops] = await Promise.all([
    OrderLine.findAll({ where: { parcelId: { [Op.in]: parcels.map(({ id }) => id) } }, ...inOrder }),
    Workshop.findAll({ where: { id: { [Op.in]: parcels.map(({ workshopId }) => workshopId) } } }),
  ]);
  const workshopOf = new Map(workshops.map((workshop) => [workshop.id, workshop]));
  return parcels.flatMap((parcel) => {
    const workshop = workshopOf.get(parcel.workshopId);
    return workshop ? [{ parcel, workshop, lines: lines.filter(({ parcelId }) => parcelId === parcel.id) }] : [];
  });
}
