import pg from "pg";
import { openTestCluster } from "../launch/testCluster.mjs";
import { searchBench } from "./searchBench.ts";

const parts = Number(process.env.BENCH_PARTS ?? 100_000);
const name = `bench_${process.pid}`;

const given = process.env.BENCH_DATABASE_URL;
const { url, close } = given ? { url: given, close: async () => undefined } : await openTestCluster();
const client = new pg.Client({ connectionString: url });
await client.connect();
await client.query(`CREATE DATABASE ${name}`);
try {
  const scratch = new URL(url);
  scratch.pathname = `/${name}`;
  await searchBench(scratch.href, parts, (line) => process.stdout.write(`${line}\n`));
} finally {
  await client.query(`DROP DATABASE ${name} WITH (FORCE)`);
  await client.end();
  await close();
}
