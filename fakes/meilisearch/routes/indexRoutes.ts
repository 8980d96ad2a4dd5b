import { Router } from "express";
import { ApiError } from "../ApiError";
import { isObject } from "../documentValues";
import { SearchIndex } from "../SearchIndex";
import { checkUid, type World } from "../World";
import { presentIndex, readCount, sendEnqueued } from "./answers";

/** Source: Meilisearch documentation, "Indexes". */
export function indexRoutes(world: World): Router {
  const router = Router();

  router.get("/indexes", (req, res) => {
    const offset = readCount(req.query.offset, 0, "invalid_index_offset");
    const limit = readCount(req.query.limit, 20, "invalid_index_limit");
    const all = [...world.indexes.values()].sort((a, b) => (a.uid < b.uid ? -1 : 1));
    res.json({ results: all.slice(offset, offset + limit).map(presentIndex), offset, limit, total: all.length });
  });

  router.post("/indexes", (req, res) => {
    const { uid, primaryKey } = readNewIndex(req.body);
    const task = world.tasks.enqueue(uid, "indexCreation", { primaryKey }, () => {
      if (world.indexes.has(uid)) throw new ApiError("index_already_exists", `Index \`${uid}\` already exists.`);
      world.indexes.set(uid, new SearchIndex(uid, primaryKey, world.now()));
      return undefined;
    });
    sendEnqueued(res, task);
  });

  router.get("/indexes/:uid", (req, res) => {
    res.json(presentIndex(world.index(req.params.uid)));
  });

  router.delete("/indexes/:uid", (req, res) => {
    const uid = checkUid(req.params.uid);
    const task = world.tasks.enqueue(uid, "indexDeletion", {}, () => {
      const deletedDocuments = world.index(uid).documents.size;
      world.indexes.delete(uid);
      return { deletedDocuments };
    });
    sendEnqueued(res, task);
  });

  return router;
}

function readNewIndex(body: unknown): { uid: string; primaryKey: string | null } {
  const { uid, primaryKey = null } = isObject(body) ? body : {};
  if (uid === undefined) throw new ApiError("missing_index_uid", "Missing field `uid`");
  if (primaryKey !== null && typeof primaryKey !== "string") {
    throw new ApiError("invalid_index_primary_key", "Invalid value type at `.primaryKey`: expected a string");
  }
  return { uid: checkUid(String(uid)), primaryKey };
}
