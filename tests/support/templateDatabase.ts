import { createHash, randomBytes } from "node:crypto";
import pg from "pg";

/** Address of another database on the same server. */
export function withDatabase(url: string, name: string): string {
  const address = new URL(url);
  address.pathname = `/${name}`;
  return address.href;
}

/** One connection for the length of some work. */
export async function withClient<T>(url: string, work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

// One number for all that make templates on a server, so that two runs do not make the same one at once.
const lockKey = 0x1d1e;

/**
 * A database to copy from, made once and kept: its name carries a hash of what it was made from, and it is made
 * under another name, so that one which was cut short is never taken for whole. Nobody can connect to it.
 *
 * @param serverUrl of a user who may make databases
 * @param kind      goes into the name
 * @param madeFrom  whatever decides the content
 * @param fill      fills the database at the address it is given, and lets go of every connection
 */
export function keepTemplate(
  serverUrl: string,
  kind: string,
  madeFrom: string,
  fill: (url: string) => Promise<void>,
): Promise<string> {
  const name = `template_${kind}_${createHash("sha256").update(madeFrom).digest("hex").slice(0, 12)}`;
  return withClient(serverUrl, async (client) => {
    await client.query("SELECT pg_advisory_lock($1)", [lockKey]);
    const found = await client.query("SELECT 1 FROM pg_database WHERE datname = $1", [name]);
    if (found.rowCount) return name;
    const partial = `part_${randomBytes(6).toString("hex")}`;
    await client.query(`CREATE DATABASE ${partial}`);
    await fill(withDatabase(serverUrl, partial));
    await client.query(`ALTER DATABASE ${partial} RENAME TO ${name}`);
    await client.query(`ALTER DATABASE ${name} ALLOW_CONNECTIONS false`);
    return name;
  });
}

/** A copy of a template under a new name, and how to drop it. */
export async function copyTemplate(serverUrl: string, template: string) {
  const name = `run_${randomBytes(6).toString("hex")}`;
  await withClient(serverUrl, (client) => client.query(`CREATE DATABASE ${name} TEMPLATE ${template}`));
  return {
    url: withDatabase(serverUrl, name),
    drop: () =>
      withClient(serverUrl, async (client) => {
        await client.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
      }),
  };
}
