import { type Request, type Response, Router } from "express";
import { ApiError } from "../ApiError";
import { type Doc, isObject, pickFields } from "../documentValues";
import { checkFields } from "../filter/checkFields";
import type { FilterNode } from "../filter/FilterNode";
import { matchesFilter } from "../filter/matchesFilter";
import { readFilter } from "../filter/readFilter";
import { readDocuments, type SearchIndex } from "../SearchIndex";
import { checkUid, type World } from "../World";
import { readCount, sendEnqueued } from "./answers";

/** Source: Meilisearch documentation, "Documents". */
export function documentRoutes(world: World): Router {
  const router = Router();

  const add = (merge: boolean) => (req: Request, res: Response) => {
    const uid = checkUid(String(req.params.uid));
    const documents = readDocuments(req.body);
    const key = typeof req.query.primaryKey === "string" ? req.query.primaryKey : null;
    const details = { receivedDocuments: documents.length, indexedDocuments: null };
    const task = world.tasks.enqueue(uid, "documentAdditionOrUpdate", details, () => {
      const index = world.indexOrNew(uid);
      index.add(documents, merge, key);
      index.updatedAt = world.now();
      return { indexedDocuments: documents.length };
    });
    sendEnqueued(res, task);
  };

  const remove = (uid: string, details: object, work: (index: SearchIndex) => number, res: Response) => {
    const task = world.tasks.enqueue(checkUid(uid), "documentDeletion", { ...details }, () => {
      const index = world.index(uid);
      const deletedDocuments = work(index);
      index.updatedAt = world.now();
      return { deletedDocuments };
    });
    sendEnqueued(res, task);
  };

  router
    .route("/indexes/:uid/documents")
    .get((req, res) => {
      const fields = typeof req.query.fields === "string" ? req.query.fields.split(",") : undefined;
      const ids = typeof req.query.ids === "string" ? req.query.ids.split(",") : undefined;
      res.json(fetchDocuments(world.index(req.params.uid), { ...req.query, fields, ids }));
    })
    .post(add(false))
    .put(add(true))
    .delete((req, res) => {
      const all = { providedIds: 0, originalFilter: null };
      remove(req.params.uid, all, (index) => index.delete([...index.documents.keys()]), res);
    });

  router.post("/indexes/:uid/documents/fetch", (req, res) => {
    res.json(fetchDocuments(world.index(req.params.uid), isObject(req.body) ? req.body : {}));
  });

  router.post("/indexes/:uid/documents/delete-batch", (req, res) => {
    const ids = readIds(req.body);
    const details = { providedIds: ids.length, originalFilter: null };
    remove(req.params.uid, details, (index) => index.delete(ids), res);
  });

  router.post("/indexes/:uid/documents/delete", (req, res) => {
    const original: unknown = isObject(req.body) ? req.body.filter : undefined;
    const filter = documentFilter(() => readFilter(original));
    if (!filter) throw new ApiError("missing_document_filter", "Missing field `filter`");
    const details = { providedIds: 0, originalFilter: JSON.stringify(original) };
    const work = (index: SearchIndex) => index.deleteMatching(checked(filter, index));
    remove(req.params.uid, details, work, res);
  });

  router
    .route("/indexes/:uid/documents/:id")
    .get((req, res) => {
      const doc = world.index(req.params.uid).documents.get(req.params.id);
      if (!doc) throw new ApiError("document_not_found", `Document \`${req.params.id}\` not found.`);
      const fields = typeof req.query.fields === "string" ? req.query.fields.split(",") : ["*"];
      res.json(pickFields(doc, fields));
    })
    .delete((req, res) => {
      const { uid, id } = req.params;
      remove(uid, { providedIds: 1, originalFilter: null }, (index) => index.delete([id]), res);
    });

  return router;
}

function fetchDocuments(index: SearchIndex, query: Doc) {
  const offset = readCount(query.offset, 0, "invalid_document_offset");
  const limit = readCount(query.limit, 20, "invalid_document_limit");
  const fields = query.fields === undefined ? ["*"] : readFields(query.fields);
  const filter = documentFilter(() => readFilter(query.filter));
  if (filter) checked(filter, index);
  const ids = query.ids === undefined ? null : readIds(query.ids);

  const found = [...index.documents].filter(
    ([id, doc]) => (!ids || ids.includes(id)) && (!filter || matchesFilter(filter, doc)),
  );
  const results = found.slice(offset, offset + limit).map(([, doc]) => pickFields(doc, fields));
  return { results, offset, limit, total: found.length };
}

function readFields(fields: unknown): string[] {
  if (Array.isArray(fields) && fields.every((field) => typeof field === "string")) return fields;
  throw new ApiError("invalid_document_fields", "Invalid value type at `.fields`: expected an array of strings");
}

function readIds(ids: unknown): string[] {
  if (Array.isArray(ids) && ids.every((id) => typeof id === "string" || typeof id === "number")) return ids.map(String);
  throw new ApiError("invalid_document_id", "Invalid value type: expected an array of document identifiers");
}

const checked = (filter: FilterNode, index: SearchIndex) =>
  documentFilter(() => {
    checkFields(filter, index.settings.filterableAttributes);
    return filter;
  });

function documentFilter<T>(read: () => T): T {
  try {
    return read();
  } catch (error) {
    throw new ApiError("invalid_document_filter", error instanceof Error ? error.message : String(error));
  }
}
