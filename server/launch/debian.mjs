import { accessSync, constants } from "node:fs";
import { LaunchError } from "./LaunchError.mjs";
import { takeLock } from "./lock.mjs";
import { logFile } from "./paths.mjs";
import { run, succeeds } from "./run.mjs";

export const postgresBin = "/usr/lib/postgresql/15/bin";
export const chromium = "/usr/bin/chromium";

const needs = {
  database: { file: `${postgresBin}/initdb`, packages: ["postgresql-15"] },
  browser: { file: chromium, packages: ["chromium", "fonts-dejavu-core"] },
};

/** @param {string} file */
function isExecutable(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/**
 * Installs the Debian packages that are missing, if we may. Gives null if there was nothing to do.
 *
 * Errors: LaunchError with the line to run where we are neither root nor let through by sudo without a password.
 *
 * @param {(keyof typeof needs)[]} wanted
 * @param {(text: string) => void} note
 */
export async function installDebianPackages(wanted, note) {
  const missing = () =>
    wanted.filter((need) => !isExecutable(needs[need].file)).flatMap((need) => needs[need].packages);
  if (missing().length === 0) return null;

  const install = (/** @type {string[]} */ names) => `apt-get install -y --no-install-recommends ${names.join(" ")}`;
  const log = logFile("apt");
  const asRoot = process.getuid?.() === 0;
  if (!asRoot && !(await succeeds("sudo", ["-n", "true"]))) {
    throw new LaunchError(`Some Debian packages are missing. Run this once as root, then start again:

  apt-get update && ${install(missing())}
`);
  }
  if (!isExecutable("/usr/bin/apt-get")) {
    throw new LaunchError(`This is not Debian: ${missing().join(" and ")} must be put in place by other means.`);
  }
  // Two starts beside each other must not meet in apt; its own lock on the package lists does not wait.
  const release = await takeLock("/var/lib/apt", { folder: true, onWait: () => note("waiting for another start") });
  try {
    const names = missing();
    if (names.length === 0) return null;
    note(`installing ${names.join(", ")}, about a minute`);
    const script = `export DEBIAN_FRONTEND=noninteractive
apt-get update
${install(names)} -o DPkg::Lock::Timeout=300`;
    const shell = ["sh", "-c", script];
    await (asRoot ? run("env", shell, { log }) : run("sudo", ["-n", ...shell], { log }));
    return `${names.join(", ")} installed`;
  } finally {
    release();
  }
}
