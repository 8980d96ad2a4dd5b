import { createHash } from "node:crypto";
import { chmodSync, existsSync, lstatSync, mkdirSync } from "node:fs";
import { join } from "node:path";
import { LaunchError } from "./LaunchError.mjs";
import { dataFolder } from "./paths.mjs";
import { read, succeeds } from "./run.mjs";

/**
 * Where a cluster lives and how to run PostgreSQL's programs on it.
 * @typedef {{ folder: string, data: string, owner: { uid: number, gid: number } | null }} Place
 */

const us = process.getuid?.() ?? 0;

/** @param {{ uid: number, gid: number }} owner */
const becoming = ({ uid, gid }) => [`--reuid=${uid}`, `--regid=${gid}`, "--clear-groups"];

/**
 * Finds the place of a cluster by its name: in the data folder, or in /var/tmp where PostgreSQL's own user, which
 * root must step down to, cannot reach that.
 *
 * @param {string} name
 * @returns {Promise<Place>} `owner` is null where we run the programs as ourselves
 */
export async function clusterPlace(name) {
  // Others pass through to what is theirs; what is secret in there has its own mode.
  mkdirSync(dataFolder, { recursive: true });
  if (us !== 0) return placeIn(join(dataFolder, name), null);

  chmodSync(dataFolder, 0o711);
  const owner = {
    uid: Number(await read("id", ["-u", "postgres"])),
    gid: Number(await read("id", ["-g", "postgres"])),
  };
  const near = join(dataFolder, name);
  if (existsSync(join(near, "cluster"))) {
    // Made earlier, perhaps by an ordinary user: PostgreSQL runs as whoever owns the files.
    const { uid, gid } = lstatSync(join(near, "cluster"));
    return placeIn(near, { uid, gid });
  }
  if (await succeeds("setpriv", [...becoming(owner), "test", "-x", dataFolder])) return placeIn(near, owner);

  const far = `/var/tmp/idlewright-${createHash("sha256").update(dataFolder).digest("hex").slice(0, 12)}`;
  return placeIn(join(ownFolder(far), name), owner);
}

/**
 * @param {string} folder
 * @param {Place["owner"]} owner
 */
function placeIn(folder, owner) {
  mkdirSync(folder, { recursive: true });
  chmodSync(folder, 0o711);
  const data = join(folder, "cluster");
  if (us !== 0 && existsSync(data) && lstatSync(data).uid !== us) {
    throw new LaunchError(`${data} belongs to another user: start as that user, or remove ${folder}.`);
  }
  return { folder, data, owner };
}

/**
 * A folder in a place where everybody may make one: it must be ours, not one that somebody laid there for us.
 * @param {string} path
 */
function ownFolder(path) {
  if (!existsSync(path)) mkdirSync(path, { mode: 0o711 });
  const found = lstatSync(path);
  if (!found.isDirectory() || found.uid !== us) throw new LaunchError(`${path} is not ours: remove it.`);
  return path;
}

/**
 * A program of PostgreSQL as a command line for the owner of the cluster.
 * @param {Place} place
 * @param {string[]} command
 * @returns {[string, string[]]}
 */
export function asOwner({ owner }, command) {
  const [program = "", ...args] = command;
  return owner ? ["setpriv", [...becoming(owner), program, ...args]] : [program, args];
}
