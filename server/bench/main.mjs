import pg from "pg";
import { openTestCluster } from "../launch/testCluster.mjs";
import { searchBench } from "./searchBench.ts";

// BENCH_DATABASE_URL names a scratch database to fill and keep; without it one is made, and dropped in the end.
const given = process.env.BENCH_DATABASE_URL;
const parts = Number(process.env.BENCH_PARTS ?? 100_000);
const print = (line) => process.stdout.write(`${line}\n`);

/** A database for the length of some work. */
async function withScratch(url, work) {
  const name = `bench_${process.pid}`;
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  await client.query(`CREATE DATABASE ${name}`);
  try {
    const scratch = new URL(url);
    scratch.pathname = `/${name}`;
    await work(scratch.href);
  } finally {
    await client.query(`DROP DATABASE ${name} WITH (FORCE)`);
    await client.end();
  }
}

if (given) await searchBench(given, parts, print);
else {
  const { url, close } = await openTestCluster();
  try {
    await withScratch(url, (scratch) => searchBench(scratch, parts, print));
  } finally {
    await close();
  }
}
