import { randomBytes } from "node:crypto";
import { chmodSync, existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";

/**
 * Random secrets of 192 bits kept in a file that only its owner reads: made the first time, the same after that.
 * The caller holds the lock that keeps two processes from making them at once.
 *
 * @template {string} Name
 * @param {string} path
 * @param {readonly Name[]} names
 * @returns {Record<Name, string>}
 */
export function keepSecrets(path, names) {
  const kept = existsSync(path) ? JSON.parse(readFileSync(path, "utf8")) : {};
  if (names.every((name) => kept[name])) return kept;
  for (const name of names) kept[name] ??= randomBytes(24).toString("base64url");
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(`${path}.part`, `${JSON.stringify(kept, null, 2)}\n`, { mode: 0o600 });
  chmodSync(`${path}.part`, 0o600);
  renameSync(`${path}.part`, path);
  return kept;
}
