import type { ParcelStep } from "#shared/domain/parcelSteps";
import { IdParams } from "#shared/schemas/common";
import {
  DispatchParcel,
  WorkshopParcel,
  WorkshopParcelList,
  WorkshopParcelQuery,
} from "#shared/schemas/workshopParcel";
import { takeParcelStep } from "../commands/takeParcelStep";
import { AppError } from "../errors/AppError";
import { type Endpoint, endpoint } from "../http/endpoint";
import { Parcel } from "../models/Parcel";
import { listWorkshopParcels } from "../orders/listWorkshopParcels";
import { parcelTarget } from "../orders/parcelTarget";
import type { Actor } from "../policies/Actor";
import { authorize } from "../policies/authorize";
import { parcelPolicy } from "../policies/parcelPolicy";
import { presentWorkshopParcel, presentWorkshopParcels } from "../presenters/presentWorkshopParcel";

const tag = "Workshop's parcels";
const access = ["workshop"] as const;
const limit = { name: "parcel-step", points: 120, perSeconds: 60 };

async function findParcel(actor: Actor, id: string): Promise<Parcel> {
  const parcel = await Parcel.findByPk(id);
  authorize(parcelPolicy, actor, "read", parcel && (await parcelTarget(parcel)));
  if (!parcel) throw new AppError("not-found");
  return parcel;
}

/** A step that needs no words. */
const step = (name: Exclude<ParcelStep, "dispatch">, summary: string): Endpoint =>
  endpoint(
    {
      method: "post",
      path: `/workshop/parcels/:id/${name}`,
      summary,
      tag,
      access,
      params: IdParams,
      answer: WorkshopParcel,
      limit,
    },
    async ({ actor, params, now }) => presentWorkshopParcel(await takeParcelStep(actor, params.id, name, now), actor),
  );

export function workshopParcelRoutes(): Endpoint[] {
  return [
    endpoint(
      {
        method: "get",
        path: "/workshop/parcels",
        summary: "A workshop's own parcels of paid orders; those still to leave first by when they must.",
        tag,
        access,
        query: WorkshopParcelQuery,
        answer: WorkshopParcelList,
      },
      async ({ actor, query }) => {
        const { parcels, ...rest } = await listWorkshopParcels(actor, query);
        return { items: await presentWorkshopParcels(parcels, actor), ...rest };
      },
    ),
    endpoint(
      {
        method: "get",
        path: "/workshop/parcels/:id",
        summary:
          "A workshop's own parcel: what to make and pack, where it goes, by when, and what may be done with it.",
        tag,
        access,
        params: IdParams,
        answer: WorkshopParcel,
      },
      async ({ actor, params }) => presentWorkshopParcel(await findParcel(actor, params.id), actor),
    ),
    step("accept", "Accepts a parcel: its work begins, or waits for the core of a re-mould."),
    step("core-received", "The core of a re-mould has come; the time until it leaves is counted from now."),
    step("start", "The core is sound and work on it begins."),
    step("ready", "A parcel is made and packed."),
    endpoint(
      {
        method: "post",
        path: "/workshop/parcels/:id/dispatch",
        summary: "A parcel has been handed over; its buyer is told by mail.",
        tag,
        access,
        params: IdParams,
        body: DispatchParcel,
        answer: WorkshopParcel,
        limit,
      },
      async ({ actor, params, body, now }) =>
        presentWorkshopParcel(await takeParcelStep(actor, params.id, "dispatch", now, body), actor),
    ),
  ];
}
