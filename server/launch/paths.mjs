import { resolve } from "node:path";
import { fileURLToPath } from "node:url";

/** The checkout. */
export const root = resolve(fileURLToPath(new URL("../..", import.meta.url)));

/** Where everything that is made while running lives: databases, photos, logs, secrets, locks. */
export const dataFolder = resolve(root, process.env.IDLEWRIGHT_DATA || ".data");

/**
 * A path in the data folder.
 * @param {string[]} names
 */
export const inData = (...names) => resolve(dataFolder, ...names);

/** @param {string} name */
export const logFile = (name) => inData("logs", `${name}.log`);
