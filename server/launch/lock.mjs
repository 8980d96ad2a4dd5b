import { spawn } from "node:child_process";
import { once } from "node:events";
import { closeSync, mkdirSync, openSync } from "node:fs";
import { dirname } from "node:path";

/**
 * Takes a lock between processes and gives the function that lets it go.
 *
 * The lock sits on the open file, not on its name or a process number: the kernel lets go of it when this process
 * ends, however it ends, so there are no stale ones to clear. flock(1) takes it on our behalf, since Node cannot.
 *
 * @param {string} path made if it is not there; a folder may be locked too
 * @param {{ shared?: boolean, folder?: boolean, onWait?: () => void }} [how] `onWait` is called before a wait begins
 * @returns {Promise<() => void>}
 */
export async function takeLock(path, { onWait, ...how } = {}) {
  const taken = await tryLock(path, how);
  if (taken) return taken;
  onWait?.();
  const release = await flock(path, how, []);
  if (!release) throw new Error(`could not lock ${path}`);
  return release;
}

/**
 * The same without waiting: null where somebody else holds it.
 * @param {string} path
 * @param {{ shared?: boolean, folder?: boolean }} [how]
 */
export function tryLock(path, how = {}) {
  return flock(path, how, ["-n"]);
}

/**
 * @param {string} path
 * @param {{ shared?: boolean, folder?: boolean }} how
 * @param {string[]} options
 * @returns {Promise<(() => void) | null>}
 */
async function flock(path, { shared = false, folder = false }, options) {
  if (!folder) mkdirSync(dirname(path), { recursive: true });
  const fd = openSync(path, folder ? "r" : "a");
  try {
    const child = spawn("flock", [...options, shared ? "-s" : "-x", "3"], {
      stdio: ["ignore", "ignore", "ignore", fd],
    });
    const [code] = await once(child, "close");
    if (code === 0) {
      let held = true;
      return () => {
        if (held) closeSync(fd);
        held = false;
      };
    }
  } catch (error) {
    closeSync(fd);
    throw error;
  }
  closeSync(fd);
  return null;
}
