import { LaunchError } from "./LaunchError.mjs";

/**
 * Errors: LaunchError unless the version is of Node 20, from 20.20 on.
 * @param {string} [version] like "20.20.2"
 */
export function checkNodeVersion(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split(".").map(Number);
  if (major === 20 && minor >= 20) return;
  throw new LaunchError(`Idlewright runs on Node 20, from 20.20 on; this is ${version}.`);
}
