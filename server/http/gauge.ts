import type { z } from "zod";
import { DomainError } from "#shared/domain/DomainError";
import { AppError } from "../errors/AppError";
import type { Endpoint, Limit } from "./endpoint";

/** One limit for the whole gauge desk, counted by address whether somebody is signed in or not. */
const limit: Limit = { name: "gauges", points: 1200, perSeconds: 60, by: "address" };

/** Does a computation; what it cannot answer becomes a 422 that points to the field. Its words are fit to be shown. */
export async function inWords<T>(compute: () => T | Promise<T>): Promise<T> {
  try {
    return await compute();
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    const { field, words } = error;
    const pointer = field === "" ? "#" : `#/${field}`;
    throw new AppError("invalid-request", words, { errors: [{ pointer, detail: words }], cause: error });
  }
}

type Gauge<T extends z.ZodType, A extends z.ZodType> = {
  method: "get" | "post";
  /** Below /gauges. */
  path: string;
  summary: string;
  /** The query of a GET, the body of a POST. */
  takes: T;
  answer: A;
};

/** A call of the gauge desk: open to all, changing nothing, and refusing in words whatever it cannot work out. */
export function gauge<T extends z.ZodType, A extends z.ZodType>(
  { method, path, summary, takes, answer }: Gauge<T, A>,
  compute: (asked: z.output<T>) => z.input<A> | Promise<z.input<A>>,
): Endpoint {
  return {
    method,
    path: `/gauges${path}`,
    summary,
    tag: "Gauges",
    access: "anyone",
    pure: true,
    limit,
    ...(method === "get" ? { query: takes } : { body: takes }),
    answer,
    run: ({ query, body }) => inWords(() => compute((method === "get" ? query : body) as z.output<T>)),
  };
}
