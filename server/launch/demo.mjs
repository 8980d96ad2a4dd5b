import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { openCluster } from "./cluster.mjs";
import { keepDatabase } from "./database.mjs";
import { LaunchError } from "./LaunchError.mjs";
import { takeLock, tryLock } from "./lock.mjs";
import { inData } from "./paths.mjs";
import { keepSecrets } from "./secrets.mjs";

const most = 9;

/**
 * A place for one demo: its number among those that run from this checkout now. The first has the plain names; one
 * started beside it gets a database, photos and logs of its own, so that neither sees the other's orders and mail.
 *
 * @returns {Promise<{ number: number, suffix: string }>}
 */
export async function takePlace() {
  for (let number = 1; number <= most; number++) {
    // Held until this process ends.
    if (!(await tryLock(inData("locks", `demo-${number}`)))) continue;
    return { number, suffix: number === 1 ? "" : `-${number}` };
  }
  throw new LaunchError(`${most} starts of this checkout are running already.`);
}

/** Random secrets of this checkout, the same at every start. */
export async function demoSecrets() {
  const release = await takeLock(inData("locks", "secrets"));
  try {
    const { session, payment, webhook } = keepSecrets(inData("secrets.json"), ["session", "payment", "webhook"]);
    return { session, paymentKey: `sk_test_${payment}`, webhook: `whsec_${webhook}` };
  } finally {
    release();
  }
}

/**
 * The database of a demo and the folder of its photos: the given database, or one in our own private cluster.
 * @param {string | undefined} given as DATABASE_URL has it
 * @param {string} suffix
 * @returns {Promise<{ databaseUrl: string, dataDir: string, identity: string | null, words: string }>} `identity` tells
 *   a database of our own from one that had its name before it
 */
export async function openDemoDatabase(given, suffix) {
  if (given) {
    const name = createHash("sha256").update(given).digest("hex").slice(0, 8);
    return { databaseUrl: given, dataDir: inData(`store-${name}`), identity: null, words: "the one in DATABASE_URL" };
  }
  const cluster = await openCluster("pg");
  const { url, identity } = await keepDatabase(cluster, `idlewright${suffix.replace("-", "_")}`);
  const words = `PostgreSQL 15 of our own on 127.0.0.1:${cluster.port}`;
  return { databaseUrl: url, dataDir: inData(`store${suffix}`), identity, words };
}

/**
 * Fills a database unless a note says that the same programs filled the same database before. Nobody else changes one
 * of our own; one that was given has no identity here and is always looked at.
 *
 * @param {string | null} identity
 * @param {{ build: string, suffix: string }} settings
 * @param {() => Promise<void>} fill
 */
export async function fillOnce(identity, { build, suffix }, fill) {
  const note = inData(`filled${suffix}`);
  const programs = ["migrateMain", "seedMain"].map((name) => readFileSync(join(build, `server/${name}.js`)));
  const mark = `${identity} ${createHash("sha256").update(Buffer.concat(programs)).digest("hex")}`;
  if (identity && existsSync(note) && readFileSync(note, "utf8") === mark) return;
  await fill();
  if (identity) writeFileSync(note, mark);
}
