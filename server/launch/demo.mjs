import { createHash } from "node:crypto";
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
 */
export async function openDemoDatabase(given, suffix) {
  if (given) {
    const name = createHash("sha256").update(given).digest("hex").slice(0, 8);
    return { databaseUrl: given, dataDir: inData(`store-${name}`), words: "the one in DATABASE_URL" };
  }
  const cluster = await openCluster("pg");
  const databaseUrl = await keepDatabase(cluster, `idlewright${suffix.replace("-", "_")}`);
  const words = `PostgreSQL 15 of our own on 127.0.0.1:${cluster.port}`;
  return { databaseUrl, dataDir: inData(`store${suffix}`), words };
}
