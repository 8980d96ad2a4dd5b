import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync } from "node:fs";
import { join } from "node:path";
import { LaunchError } from "./LaunchError.mjs";
import { takeLock, tryLock } from "./lock.mjs";
import { logFile, root } from "./paths.mjs";
import { run } from "./run.mjs";

const builds = join(root, "dist", "builds");
const lockOf = (/** @type {string} */ name) => join(root, "dist", "locks", name);
const sources = ["client", "server", "shared", "fakes"];
const settings = ["index.html", "vite.config.ts", "tailwind.config.ts", "package.json", "package-lock.json"];

/** Programs to run, and the source of each. */
const programs = {
  "server/main": "server/main.ts",
  // A thread of server/main, which looks for it beside itself.
  "server/planWorker": "server/plans/planWorker.ts",
  "server/migrateMain": "server/migrateMain.ts",
  "server/seedMain": "server/demo/seedMain.ts",
  "fakes/main": "fakes/main.ts",
};

/** A hash of every file that a build is made from. */
export function sourceHash() {
  const files = sources
    .flatMap((folder) =>
      readdirSync(join(root, folder), { recursive: true, withFileTypes: true })
        .filter((entry) => entry.isFile())
        .map((entry) => join(entry.parentPath, entry.name)),
    )
    .sort();
  const hash = createHash("sha256");
  for (const file of [...settings.map((name) => join(root, name)), ...files]) {
    hash
      .update(`${file.slice(root.length)}\0`)
      .update(readFileSync(file))
      .update("\0");
  }
  return hash.digest("hex").slice(0, 16);
}

/**
 * Builds client and programs into a folder: client/, server/ and fakes/ in it.
 * @param {string} folder
 */
export async function buildInto(folder) {
  const { VITEST: _, ...env } = process.env;
  const client = run(
    process.execPath,
    [join(root, "node_modules/vite/bin/vite.js"), "build", "--outDir", join(folder, "client")],
    { log: logFile("build-client"), env: { ...env, NODE_ENV: "production" } },
  );
  await Promise.all([client, bundlePrograms(folder)]);
}

/**
 * Packages stay outside the bundles and are found in node_modules; `#shared/...` and its like are ours and go in.
 * @param {string} folder
 */
async function bundlePrograms(folder) {
  const { build } = await import("esbuild");
  const { metafile } = await build({
    absWorkingDir: root,
    entryPoints: programs,
    outdir: folder,
    bundle: true,
    platform: "node",
    target: "node20",
    format: "esm",
    packages: "external",
    sourcemap: "linked",
    metafile: true,
    logLevel: "silent",
  });
  const left = Object.values(metafile.outputs)
    .flatMap(({ imports }) => imports)
    .filter(({ path, external }) => external && path.startsWith("#"));
  if (left.length > 0) throw new LaunchError(`The bundles lack ${left.map(({ path }) => path).join(", ")}.`);
}

/**
 * The build of the sources as they are, made if it is not there, and kept from being cleared away until `release`.
 *
 * Each build has a folder named after the hash of its sources and is never changed: whatever is built beside a
 * running server, that server's files stay. What no process uses any more is cleared when a new one is made.
 *
 * @param {(text: string) => void} [note]
 */
export async function keepBuild(note = () => undefined) {
  const hash = sourceHash();
  const folder = join(builds, hash);
  const building = await takeLock(lockOf("building"), { onWait: () => note("waiting for another build") });
  try {
    const release = await takeLock(lockOf(hash), { shared: true });
    const fresh = !existsSync(folder);
    if (fresh) {
      const partial = join(builds, "part");
      rmSync(partial, { recursive: true, force: true });
      mkdirSync(partial, { recursive: true });
      await buildInto(partial).catch((error) => {
        release();
        throw error;
      });
      renameSync(partial, folder);
      await clearUnused();
    }
    return { folder, fresh, release };
  } finally {
    building();
  }
}

/** Called with the lock on building held. */
async function clearUnused() {
  for (const hash of readdirSync(builds)) {
    const alone = await tryLock(lockOf(hash));
    if (!alone) continue;
    rmSync(join(builds, hash), { recursive: true, force: true });
    rmSync(lockOf(hash), { force: true });
    alone();
  }
}
