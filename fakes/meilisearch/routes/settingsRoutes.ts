import { Router } from "express";
import { applySettings, defaultSettings, readSettingsPatch, type SettingsPatch, settingNames } from "../Settings";
import type { Task } from "../TaskQueue";
import { checkUid, type World } from "../World";
import { sendEnqueued } from "./answers";

/** All settings at once, and each at an address of its own. Source: Meilisearch documentation, "Settings". */
export function settingsRoutes(world: World): Router {
  const router = Router();
  const everyDefault = Object.fromEntries(settingNames.map((name) => [name, null]));

  const update = (uid: string, patch: SettingsPatch): Task => {
    checkUid(uid);
    // Tried on what is there now, so that what can never work is refused at once and not by the task.
    applySettings(world.indexes.get(uid)?.settings ?? defaultSettings, patch);
    return world.tasks.enqueue(uid, "settingsUpdate", { ...patch }, () => {
      const index = world.indexOrNew(uid);
      index.setSettings(applySettings(index.settings, patch));
      index.updatedAt = world.now();
      return undefined;
    });
  };

  router
    .route("/indexes/:uid/settings")
    .get((req, res) => {
      res.json(world.index(req.params.uid).settings);
    })
    .patch((req, res) => sendEnqueued(res, update(req.params.uid, readSettingsPatch(req.body))))
    .delete((req, res) => sendEnqueued(res, update(req.params.uid, everyDefault)));

  for (const name of settingNames) {
    const method = name === "typoTolerance" || name === "pagination" ? "patch" : "put";
    const kebab = name.replace(/[A-Z]/g, (c) => `-${c.toLowerCase()}`);
    router
      .route(`/indexes/:uid/settings/${kebab}`)
      .get((req, res) => {
        res.json(world.index(String(req.params.uid)).settings[name]);
      })
      [method]((req, res) => sendEnqueued(res, update(String(req.params.uid), readSettingsPatch({ [name]: req.body }))))
      .delete((req, res) => sendEnqueued(res, update(String(req.params.uid), { [name]: null })));
  }
  return router;
}
