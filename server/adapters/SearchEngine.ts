import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import type { Statement } from "../db/Statement";

/**
 * The window of one dimension, in micrometres: an item may be in it where
 * nominal + reach * halfWidth >= lower and nominal - reach * halfWidth <= upper.
 */
export type SizeWindow = { dimension: DimensionName; lowerUm: number; upperUm: number; reach: number };

/**
 * Something that would do: an item of this kind that states at least one of the windows' dimensions and lies in the window
 * of every one that it states. Without windows any item of the kind will do.
 */
export type Sought = { kind: PartKind; windows: readonly SizeWindow[] };

export type CandidateQuery = {
  /** An item that answers to one of these is wanted. Empty where words alone are searched. */
  sought: readonly Sought[];
  /** Every word has to be among those of the part; typing errors are forgiven. */
  words: string | null;
  limit: number;
};

/**
 * Measured items that may fit (parts of their own, or lines of kits), or by words alone parts, measured or not: as a SELECT
 * of their ids, each once, to be joined in the statement given.
 */
export type Candidates = { of: "items" | "parts"; select: (statement: Statement) => string };

/**
 * Finds the few items worth assessing among all that are published. What it gives may be more than what is published or
 * fits, never less: the caller looks everything up and assesses it, so that an index that lags behind shows nothing that
 * was taken away. One suite of tests holds both adapters to the same search results.
 */
export type SearchEngine = {
  candidates(query: CandidateQuery): Promise<Candidates>;
  /** Brings the index up to date with the database for these parts; a part no longer published leaves it. */
  index(partIds: readonly string[]): Promise<void>;
};
