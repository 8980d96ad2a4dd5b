import type { DimensionName, PartKind } from "#shared/domain/partKinds";

/**
 * The window of one dimension, in micrometres: an item may be in it where
 * nominal + reach * halfWidth >= lower and nominal - reach * halfWidth <= upper.
 */
export type SizeWindow = { dimension: DimensionName; lowerUm: number; upperUm: number; reach: number };

export type CandidateQuery = {
  /** Kinds that are asked for; empty where words alone are searched. */
  kinds: readonly PartKind[];
  /** An item that states one of these dimensions must lie in its window; it must state at least one. */
  windows: readonly SizeWindow[];
  words: string | null;
  limit: number;
};

/** One measured item that may fit: a part of its own, or the line of a kit. */
export type CandidateRef = { itemId: string; partId: string };

/**
 * Finds the few items worth assessing among all that are published; ranking and words are the caller's.
 * Both adapters answer the same items for the same query: one suite of tests holds them to it.
 */
export type SearchEngine = {
  candidates(query: CandidateQuery): Promise<CandidateRef[]>;
  /** Brings the index up to date with the database for these parts; a part no longer published leaves it. */
  index(partIds: readonly string[]): Promise<void>;
};
