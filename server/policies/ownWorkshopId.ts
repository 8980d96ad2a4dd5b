import { AppError } from "../errors/AppError";
import type { Actor } from "./Actor";

/** The workshop that the actor runs, which is the only one they reach; refused with 404 where they run none. */
export function ownWorkshopId(actor: Actor): string {
  if (actor.workshopId === null) throw new AppError("not-found", "No workshop belongs to this account");
  return actor.workshopId;
}
