import type { DimensionName, PartKind } from "#shared/domain/partKinds";

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

/** One measured item that may fit: a part of its own, or the line of a kit. By words alone a part, without an item. */
export type CandidateRef = { itemId: string | null; partId: string };

/**
 * Finds the few items worth assessing among all that are published; ranking and words are the caller's.
 * Both adapters answer the same items for the same query: one suite of tests holds them to it.
 */
export type SearchEngine = {
  candidates(query: CandidateQuery): Promise<CandidateRef[]>;
  /** Brings the index up to date with the database for these parts; a part no longer published leaves it. */
  index(partIds: readonly string[]): Promise<void>;
};
