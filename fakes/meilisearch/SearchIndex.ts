import { ApiError } from "./ApiError";
import { type Doc, isObject } from "./documentValues";
import type { FilterNode } from "./filter/FilterNode";
import { matchesFilter } from "./filter/matchesFilter";
import { defaultSettings, type Settings } from "./Settings";
import { WordList } from "./search/WordList";

/** One index: documents in the order they first came, their primary key, and the settings. */
export class SearchIndex {
  readonly documents = new Map<string, Doc>();
  settings: Settings = defaultSettings;
  updatedAt: Date;
  #words = new WeakMap<Doc, WordList>();

  constructor(
    readonly uid: string,
    public primaryKey: string | null,
    readonly createdAt: Date,
  ) {
    this.updatedAt = createdAt;
  }

  /**
   * Adds documents, replacing the ones with the same id, or with `merge` only their given fields. All or none.
   * Errors: no primary key to be found, or one that is missing or malformed in a document.
   */
  add(documents: readonly Doc[], merge: boolean, givenKey: string | null): void {
    const key = this.#keyFor(documents, givenKey);
    if (key === null) return;
    const withIds = documents.map((doc) => [readId(doc, key), doc] as const);
    this.primaryKey = key;
    for (const [id, doc] of withIds) {
      const old = merge ? this.documents.get(id) : undefined;
      this.documents.set(id, old ? { ...old, ...doc } : doc);
    }
  }

  /** Gives how many there were to delete. */
  delete(ids: readonly string[]): number {
    return ids.filter((id) => this.documents.delete(id)).length;
  }

  deleteMatching(filter: FilterNode): number {
    return this.delete([...this.documents].filter(([, doc]) => matchesFilter(filter, doc)).map(([id]) => id));
  }

  /** The words of a document, cut once for as long as document and settings stay the same. */
  wordsOf(doc: Doc): WordList {
    const known = this.#words.get(doc);
    if (known) return known;
    const words = new WordList(doc, this.settings.searchableAttributes);
    this.#words.set(doc, words);
    return words;
  }

  setSettings(settings: Settings): void {
    this.settings = settings;
    this.#words = new WeakMap();
  }

  #keyFor(documents: readonly Doc[], givenKey: string | null): string | null {
    if (this.primaryKey !== null) {
      if (givenKey === null || givenKey === this.primaryKey || this.documents.size > 0) return this.primaryKey;
      throw new ApiError(
        "index_primary_key_already_exists",
        `Index already has a primary key: \`${this.primaryKey}\`.`,
      );
    }
    if (givenKey !== null) return givenKey;
    const [first] = documents;
    return first ? guessKey(this.uid, first) : null;
  }
}

/**
 * The one field whose name ends in "id", case ignored.
 * Source: Meilisearch documentation, "Primary key", "Meilisearch guesses your primary key".
 */
function guessKey(uid: string, doc: Doc): string {
  const candidates = Object.keys(doc).filter((field) => field.toLowerCase().endsWith("id"));
  const [only] = candidates;
  if (only === undefined) {
    throw new ApiError(
      "index_primary_key_no_candidate_found",
      `Index \`${uid}\`: The primary key inference failed as the engine did not find any field ending with \`id\` in its name. Please specify the primary key manually.`,
    );
  }
  if (candidates.length > 1) {
    throw new ApiError(
      "index_primary_key_multiple_candidates_found",
      `Index \`${uid}\`: The primary key inference failed as the engine found ${candidates.length} fields ending with \`id\` in their names: '${candidates.join("' and '")}'. Please specify the primary key manually.`,
    );
  }
  return only;
}

/** Source: Meilisearch documentation, "Error codes", invalid_document_id; the 511 bytes: "Known limitations". */
function readId(doc: Doc, key: string): string {
  const id = Object.hasOwn(doc, key) ? doc[key] : undefined;
  if (id === undefined) {
    throw new ApiError(
      "missing_document_id",
      `Document doesn't have a \`${key}\` attribute: \`${JSON.stringify(doc)}\`.`,
    );
  }
  const valid = typeof id === "string" ? /^[a-zA-Z0-9_-]{1,511}$/.test(id) : Number.isSafeInteger(id);
  if (!valid) {
    throw new ApiError(
      "invalid_document_id",
      `Document identifier \`${JSON.stringify(id)}\` is invalid. A document identifier can be of type integer or string, only composed of alphanumeric characters (a-z A-Z 0-9), hyphens (-) and underscores (_), and can not be more than 511 bytes.`,
    );
  }
  return String(id);
}

/** A request's documents: one object, or a list of them. */
export function readDocuments(body: unknown): Doc[] {
  const list = Array.isArray(body) ? body : [body];
  if (list.every(isObject)) return list;
  throw new ApiError("malformed_payload", "The `json` payload provided is malformed: documents must be objects.");
}
