import { ApiError } from "./ApiError";
import { SearchIndex } from "./SearchIndex";
import { TaskQueue } from "./TaskQueue";

/** Everything one fake holds. */
export class World {
  readonly indexes = new Map<string, SearchIndex>();
  readonly tasks: TaskQueue;

  constructor(readonly now: () => Date) {
    this.tasks = new TaskQueue(now);
  }

  index(uid: string): SearchIndex {
    const index = this.indexes.get(checkUid(uid));
    if (!index) throw new ApiError("index_not_found", `Index \`${uid}\` not found.`);
    return index;
  }

  /** Documents and settings for an index that is not there make it. */
  indexOrNew(uid: string, primaryKey: string | null = null): SearchIndex {
    const existing = this.indexes.get(uid);
    if (existing) return existing;
    const made = new SearchIndex(uid, primaryKey, this.now());
    this.indexes.set(uid, made);
    return made;
  }
}

/** Source: Meilisearch documentation, "Indexes", "Index uid"; the 400 bytes: "Known limitations". */
export function checkUid(uid: string): string {
  if (/^[a-zA-Z0-9_-]{1,400}$/.test(uid)) return uid;
  throw new ApiError(
    "invalid_index_uid",
    `\`${uid}\` is not a valid index uid. Index uid can be an integer or a string containing only alphanumeric characters, hyphens (-) and underscores (_), and can not be more than 400 bytes.`,
  );
}
