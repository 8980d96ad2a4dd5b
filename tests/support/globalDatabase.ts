import { readFileSync } from "node:fs";
import type { TestProject } from "vitest/node";
import { connect } from "#server/db/connect";
import { migrate } from "#server/db/migrate";
import { migrations } from "#server/db/migrations";
import { openTestCluster } from "../../server/launch/testCluster.mjs";
import { keepTemplate } from "./templateDatabase";

declare module "vitest" {
  interface ProvidedContext {
    migratedDatabase: { serverUrl: string; template: string };
  }
}

/** What the schema is made from: our migrations, and the job queue's own, which come with its version. */
function schemaSource(): string {
  const queue = new URL("../../node_modules/graphile-worker/package.json", import.meta.url);
  return JSON.stringify([migrations, JSON.parse(readFileSync(queue, "utf8")).version]);
}

/**
 * Before the server's tests: a PostgreSQL to make databases on, TEST_DATABASE_URL or else our own private one, and
 * on it the migrated template that every test file gets a copy of.
 */
export default async function globalDatabase(project: TestProject): Promise<() => Promise<void>> {
  const given = process.env.TEST_DATABASE_URL;
  const { url, close } = given ? { url: given, close: async () => undefined } : await openTestCluster();
  const template = await keepTemplate(url, "migrated", schemaSource(), async (partial) => {
    const sequelize = connect(partial, { poolSize: 1 });
    await migrate(sequelize, partial);
    await sequelize.close();
  });
  project.provide("migratedDatabase", { serverUrl: url, template });
  return close;
}
