import { Router } from "express";
import { ApiError } from "../ApiError";
import { taskStatuses } from "../TaskQueue";
import type { World } from "../World";
import { readCount } from "./answers";

/** Source: Meilisearch documentation, "Tasks". */
export function taskRoutes(world: World): Router {
  const router = Router();

  router.get("/tasks", (req, res) => {
    const limit = readCount(req.query.limit, 20, "invalid_task_limit");
    const statuses = readList(req.query.statuses);
    if (statuses && !statuses.every((status) => taskStatuses.includes(status))) {
      throw new ApiError("invalid_task_statuses", `\`${statuses.join(",")}\` is not a valid task status.`);
    }
    const wanted = {
      uid: readList(req.query.uids),
      status: statuses,
      type: readList(req.query.types),
      indexUid: readList(req.query.indexUids),
    };
    const fitting = world.tasks.tasks.filter((task) =>
      Object.entries(wanted).every(([field, values]) => !values || values.includes(String(task[field as "uid"]))),
    );
    const newestFirst = fitting.reverse();
    const from = readCount(req.query.from, Number.MAX_SAFE_INTEGER, "invalid_task_uids");
    const below = newestFirst.filter(({ uid }) => uid <= from);
    const results = below.slice(0, limit);
    res.json({
      results,
      total: fitting.length,
      limit,
      from: results[0]?.uid ?? null,
      next: below[limit]?.uid ?? null,
    });
  });

  router.get("/tasks/:uid", (req, res) => {
    res.json(world.tasks.get(readCount(req.params.uid, 0, "invalid_task_uids")));
  });

  return router;
}

/** A comma-separated list; left out, or "*", means any. */
function readList(value: unknown): string[] | null {
  return typeof value === "string" && value !== "*" ? value.split(",") : null;
}
