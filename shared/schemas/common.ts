import { z } from "zod";

export const Id = z.uuid();

/** A path segment made from a name: lower case words joined by hyphens. */
export const Slug = z
  .string()
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, "This is not a known address")
  .max(80);

/** Integer minor units of the currency that stands beside it. */
export const Minor = z.int().min(-100_000_000_00).max(100_000_000_00);

/** ISO 4217 code. */
export const Currency = z.string().regex(/^[A-Z]{3}$/);

/** ISO 3166-1 alpha-2 code of a country that somebody ships to. */
export const CountryCode = z.string().regex(/^[A-Z]{2}$/, "Choose a country");

/** RFC 3339, UTC. */
export const Time = z.iso.datetime();

export const IdParams = z.object({ id: Id });
export const SlugParams = z.object({ slug: Slug });

/** An opaque place in a list, as given by `nextCursor`. */
export const Cursor = z.string().max(300);
