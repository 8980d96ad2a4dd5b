import { existsSync, readdirSync, rmSync, statSync } from "node:fs";
import { join } from "node:path";
import pg from "pg";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { openCluster, superuser } from "../../server/launch/cluster.mjs";
import { clusterPlace } from "../../server/launch/clusterFolder.mjs";
import { keepDatabase, psql, urlOf } from "../../server/launch/database.mjs";
import { probePort } from "../../server/launch/ports.mjs";

const name = `scratch-pg-${process.pid}`;

async function answer(url: string, sql: string) {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query(sql)).rows[0];
  } finally {
    await client.end();
  }
}

describe("a private PostgreSQL cluster", { timeout: 60_000 }, () => {
  let cluster: Awaited<ReturnType<typeof openCluster>>;
  let folder: string;
  beforeAll(async () => {
    ({ folder } = await clusterPlace(name));
    cluster = await openCluster(name, { disposable: true });
  }, 60_000);
  afterAll(async () => {
    await cluster?.close();
    rmSync(folder, { recursive: true, force: true });
  });

  it("lets in whoever has the password and nobody else", async () => {
    const url = urlOf(cluster, superuser, "postgres");
    expect(await answer(url, "SELECT 1 AS one")).toEqual({ one: 1 });
    const wrong = new URL(url);
    wrong.password = "guessed";
    await expect(answer(wrong.href, "SELECT 1")).rejects.toThrow("password authentication failed");
    const rules = await psql(cluster, "SELECT string_agg(DISTINCT auth_method, ' ') FROM pg_hba_file_rules;");
    expect(rules).toBe("scram-sha-256");
    expect(statSync(join(folder, "passwords.json")).mode & 0o777).toBe(0o600);
    expect(readdirSync(folder)).not.toContain("first-password");
  });

  it("listens on this machine alone, without a socket", async () => {
    expect(await psql(cluster, "SHOW listen_addresses;")).toBe("127.0.0.1");
    expect(await psql(cluster, "SHOW unix_socket_directories;")).toBe("");
    expect(existsSync(`/tmp/.s.PGSQL.${cluster.port}`)).toBe(false);
  });

  it("gives the server a database of its own role, which is no superuser and makes no databases", async () => {
    const { url, identity } = await keepDatabase(cluster, "shop");
    expect(await keepDatabase(cluster, "shop")).toEqual({ url, identity });
    expect((await keepDatabase(cluster, "other")).identity).not.toBe(identity);
    const sql = "SELECT rolsuper, rolcreatedb, rolcreaterole FROM pg_roles WHERE rolname = current_user";
    expect(await answer(url, sql)).toEqual({ rolsuper: false, rolcreatedb: false, rolcreaterole: false });
    await answer(url, "CREATE EXTENSION IF NOT EXISTS pg_trgm");
  });

  it("runs until the last one that has it open closes it, and keeps its port and data", async () => {
    const other = await openCluster(name, { disposable: true });
    expect([other.port, other.started]).toEqual([cluster.port, false]);
    await cluster.close();
    expect(await probePort(other.port)).toBeNull();
    await other.close();
    expect(await probePort(other.port)).toBe(other.port);

    cluster = await openCluster(name, { disposable: true });
    expect([cluster.port, cluster.started]).toEqual([other.port, true]);
    expect(await psql(cluster, "SELECT 1 FROM pg_database WHERE datname = 'shop';")).toBe("1");
  });
});
