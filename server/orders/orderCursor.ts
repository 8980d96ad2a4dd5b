import { z } from "zod";
import { AppError } from "../errors/AppError";

const Place = z.tuple([z.iso.datetime(), z.uuid()]);

/** A place in a list of orders, newest first. */
export type OrderPlace = { createdAt: Date; id: string };

export const writeOrderCursor = ({ createdAt, id }: OrderPlace): string =>
  Buffer.from(JSON.stringify([createdAt.toISOString(), id])).toString("base64url");

/** Errors: `invalid-request` for a cursor that we did not give. */
export function readOrderCursor(cursor: string): OrderPlace {
  try {
    const [createdAt, id] = Place.parse(JSON.parse(Buffer.from(cursor, "base64url").toString()));
    return { createdAt: new Date(createdAt), id };
  } catch (cause) {
    const detail = "This place in the list is not known: begin at the top";
    throw new AppError("invalid-request", detail, { errors: [{ pointer: "#/cursor", detail }], cause });
  }
}
