import { execFile } from "node:child_process";
import { createHash, randomBytes } from "node:crypto";
import { existsSync, mkdirSync, readFileSync } from "node:fs";
import { mkdtemp, rename, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { promisify } from "node:util";
import type { TestProject } from "vitest/node";
import { keepBuild } from "../../server/launch/build.mjs";
import { inData } from "../../server/launch/paths.mjs";
import { freePort } from "../../server/launch/ports.mjs";
import { migrateSite, seedSite, startSite } from "../../server/launch/site.mjs";
import { openTestCluster } from "../../server/launch/testCluster.mjs";
import { copyTemplate, keepTemplate } from "./templateDatabase";

declare module "vitest" {
  interface ProvidedContext {
    siteUrl: string;
    mailUrl: string;
    stripeUrl: string;
    siteDatabaseUrl: string;
  }
}

const secrets = { session: randomBytes(24).toString("hex"), paymentKey: "sk_test_browser", webhook: "whsec_browser" };
const copyTree = (from: string, to: string) => promisify(execFile)("cp", ["-r", from, to]);

/**
 * A template with the demo data, and the folder of the photos that belong to it. Both are made anew when the programs
 * that fill them change, or when one of the two is gone.
 */
async function keepSeeded(serverUrl: string, build: string) {
  const fillers = ["server/migrateMain.js", "server/seedMain.js"].map((file) => readFileSync(join(build, file)));
  const hash = createHash("sha256").update(Buffer.concat(fillers)).digest("hex").slice(0, 12);
  const store = inData("test-stores", hash);
  const mark = join(store, "mark");
  const id = existsSync(mark) ? readFileSync(mark, "utf8") : randomBytes(6).toString("hex");

  const template = await keepTemplate(serverUrl, "seeded", hash + id, async (databaseUrl) => {
    await rm(inData("test-stores"), { recursive: true, force: true });
    const dataDir = `${store}.part`;
    mkdirSync(dataDir, { recursive: true });
    const site = { build, databaseUrl, dataDir, port: 0, secrets, suffix: "-test" };
    await migrateSite(site);
    await seedSite(site);
    await writeFile(join(dataDir, "mark"), id);
    await rename(dataDir, store);
  });
  return { template, store };
}

/**
 * Before the browser tests: the whole site in demo mode, as `npm start` runs it, on a database and photos of its own
 * and with its own stand-ins, on free ports.
 */
export default async function globalSite(project: TestProject): Promise<() => Promise<void>> {
  const undo: (() => unknown)[] = [];
  const close = async () => {
    for (let last = undo.pop(); last; last = undo.pop()) await last();
  };
  try {
    const build = await keepBuild();
    undo.push(build.release);
    let serverUrl = process.env.TEST_DATABASE_URL;
    if (!serverUrl) {
      const cluster = await openTestCluster();
      undo.push(cluster.close);
      serverUrl = cluster.url;
    }
    const { template, store } = await keepSeeded(serverUrl, build.folder);
    const database = await copyTemplate(serverUrl, template);
    undo.push(database.drop);
    const folder = await mkdtemp(join(tmpdir(), "idlewright-site-"));
    undo.push(() => rm(folder, { recursive: true, force: true }));
    const dataDir = join(folder, "store");
    await copyTree(store, dataDir);

    const site = await startSite({
      ...{ build: build.folder, databaseUrl: database.url, dataDir, secrets, suffix: "-test" },
      port: await freePort(),
    });
    undo.push(site.stop);
    project.provide("siteUrl", site.url);
    project.provide("mailUrl", site.mailUrl);
    project.provide("stripeUrl", site.stripeUrl);
    project.provide("siteDatabaseUrl", database.url);
    return close;
  } catch (error) {
    await close();
    throw error;
  }
}
