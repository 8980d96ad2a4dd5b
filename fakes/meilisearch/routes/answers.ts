import type { Response } from "express";
import { ApiError, type ErrorCode } from "../ApiError";
import type { SearchIndex } from "../SearchIndex";
import type { Task } from "../TaskQueue";

/** The short form a write is answered with: 202 and where to look for the task. */
export function sendEnqueued(res: Response, { uid, indexUid, status, type, enqueuedAt }: Task): void {
  res.status(202).json({ taskUid: uid, indexUid, status, type, enqueuedAt });
}

export const presentIndex = ({ uid, primaryKey, createdAt, updatedAt }: SearchIndex) => ({
  uid,
  primaryKey,
  createdAt,
  updatedAt,
});

/** A whole number from 0 in a query string or body, or what it is when left out. */
export function readCount(value: unknown, fallback: number, code: ErrorCode): number {
  if (value === undefined || value === null) return fallback;
  const count = typeof value === "string" && /^\d+$/.test(value) ? Number(value) : value;
  if (typeof count === "number" && Number.isSafeInteger(count) && count >= 0) return count;
  throw new ApiError(code, `Invalid value: expected a positive integer, but found ${JSON.stringify(value)}.`);
}
