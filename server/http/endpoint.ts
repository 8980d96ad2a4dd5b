import type { Request, Response } from "express";
import type { z } from "zod";
import type { Role } from "#shared/schemas/session";
import type { Actor } from "../policies/Actor";

type Shape = z.ZodType | undefined;
type Read<S extends Shape> = S extends z.ZodType ? z.output<S> : undefined;

/** Who may call: anybody, anybody signed in, or the roles named. What they may see is the policies' affair. */
export type Access = "anyone" | "signed-in" | readonly Role[];

/** How many calls in how long, by signed-in user or else by address; `by: "address"` counts everybody by address. */
export type Limit = { name: string; points: number; perSeconds: number; by?: "address" };

type Definition<A extends Access, P extends Shape, Q extends Shape, B extends Shape, R extends Shape> = {
  method: "get" | "post" | "put" | "patch" | "delete";
  /** Below /api/v1, in Express's spelling: `/parts/:id`. */
  path: string;
  summary: string;
  tag: string;
  access: A;
  params?: P;
  query?: Q;
  body?: B;
  /** Its schema, parsed before it is sent; none answers 204. */
  answer?: R;
  status?: 200 | 201 | 202;
  /** A call that changes nothing may be sent without a CSRF token. */
  pure?: boolean;
  limit?: Limit;
};

/** What a call answers that gives a file: its name with ending, in plain letters, and its bytes. */
export type FileAnswer = { name: string; content: Buffer };

export type Call<A extends Access, P extends Shape, Q extends Shape, B extends Shape> = {
  actor: A extends "anyone" ? Actor | null : Actor;
  params: Read<P>;
  query: Read<Q>;
  body: Read<B>;
  now: Date;
  req: Request;
  res: Response;
};

type AnyCall = {
  actor: Actor | null;
  params: unknown;
  query: unknown;
  body: unknown;
  now: Date;
  req: Request;
  res: Response;
};

/** One call of the interface: its address, its schemas, and what it does. Routes and OpenAPI are both made from it. */
export type Endpoint = Definition<Access, Shape, Shape, Shape, Shape> & {
  /** The media type of the file that it answers with, in place of JSON. */
  file?: string;
  run: (call: AnyCall) => Promise<unknown>;
};

export function endpoint<
  const A extends Access,
  P extends Shape = undefined,
  Q extends Shape = undefined,
  B extends Shape = undefined,
  R extends Shape = undefined,
>(
  definition: Definition<A, P, Q, B, R>,
  run: (call: Call<A, P, Q, B>) => Promise<R extends z.ZodType ? z.input<R> : void>,
): Endpoint {
  return { ...definition, run: run as Endpoint["run"] };
}

/** A call that answers with a file, shown by the browser where it can; what it refuses is JSON as everywhere. */
export function fileEndpoint<
  const A extends Access,
  P extends Shape = undefined,
  Q extends Shape = undefined,
  B extends Shape = undefined,
>(
  definition: Omit<Definition<A, P, Q, B, undefined>, "answer" | "status"> & { file: string },
  run: (call: Call<A, P, Q, B>) => Promise<FileAnswer>,
): Endpoint {
  return { ...definition, run: run as Endpoint["run"] };
}
