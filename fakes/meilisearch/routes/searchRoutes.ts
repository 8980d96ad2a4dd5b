import { Router } from "express";
import { ApiError } from "../ApiError";
import { isObject } from "../documentValues";
import { readSearch } from "../search/readSearch";
import { searchDocuments } from "../search/searchDocuments";
import type { World } from "../World";

/** Source: Meilisearch documentation, "Search", "Search in an index with POST". */
export function searchRoutes(world: World): Router {
  const router = Router();
  router.post("/indexes/:uid/search", (req, res) => {
    const index = world.index(req.params.uid);
    if (!isObject(req.body)) throw new ApiError("bad_request", "Invalid value type: expected an object");
    res.json(searchDocuments(index, readSearch(req.body, index.settings)));
  });
  return router;
}
