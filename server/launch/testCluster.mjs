import { openCluster, superuser } from "./cluster.mjs";
import { psql, urlOf } from "./database.mjs";

/** Databases that a test file has while it runs are named so; a template has its own prefix. */
const keptTemplates = 4;

/**
 * Opens the cluster that the tests share, apart from the demo's. A run that found it stopped first drops what runs
 * before it left behind: databases of tests that were killed, and templates of older schemas.
 *
 * @returns {Promise<{ url: string, close: () => Promise<void> }>} the address of a user who may make databases
 */
export async function openTestCluster() {
  const cluster = await openCluster("test-pg", { disposable: true });
  if (cluster.started) {
    const left = await psql(
      cluster,
      `SELECT datname FROM pg_database WHERE datname LIKE 'run\\_%' OR datname LIKE 'part\\_%';
       SELECT datname FROM pg_database WHERE datname LIKE 'template\\_%' ORDER BY oid DESC OFFSET ${keptTemplates};`,
    );
    for (const name of left.split("\n").filter(Boolean)) await psql(cluster, `DROP DATABASE "${name}" WITH (FORCE);`);
  }
  return { url: urlOf(cluster, superuser, "postgres"), close: cluster.close };
}
