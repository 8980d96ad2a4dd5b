import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { takeLock } from "./lock.mjs";
import { inData, logFile, root } from "./paths.mjs";
import { run } from "./run.mjs";

/** @typedef {Record<string, { version?: string, optional?: boolean, link?: boolean }>} LockedPackages */

/**
 * Whether node_modules holds what the lock asks for. npm writes its own account of an install last of all, so an
 * install that was cut short counts as none; packages for other platforms may be missing.
 *
 * @param {LockedPackages} wanted of package-lock.json
 * @param {LockedPackages} installed of node_modules/.package-lock.json
 */
export function isInstalled(wanted, installed) {
  return Object.entries(wanted).every(([path, { version, optional }]) => {
    if (path === "") return true;
    const found = installed[path];
    return found ? found.version === version : optional === true;
  });
}

/** @param {string} file */
function packagesOf(file) {
  const path = join(root, file);
  if (!existsSync(path)) return null;
  return /** @type {LockedPackages} */ (JSON.parse(readFileSync(path, "utf8")).packages);
}

function upToDate() {
  const installed = packagesOf("node_modules/.package-lock.json");
  return installed !== null && isInstalled(packagesOf("package-lock.json") ?? {}, installed);
}

/**
 * Installs the locked packages where they are not. Gives null if there was nothing to do.
 * @param {(text: string) => void} note
 */
export async function installPackages(note) {
  if (upToDate()) return null;
  const release = await takeLock(inData("locks", "packages"));
  try {
    if (upToDate()) return null;
    note("installing from package-lock.json, most of a minute");
    // Development packages build the client, whatever NODE_ENV says.
    await run("npm", ["ci", "--include=dev", "--no-audit", "--no-fund"], { log: logFile("npm-ci") });
    return "installed";
  } finally {
    release();
  }
}
