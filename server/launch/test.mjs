import { keepBuild } from "./build.mjs";
import { chooseChecks, projects, runProject, runWhole } from "./checks.mjs";
import { installDebianPackages } from "./debian.mjs";
import { LaunchError } from "./LaunchError.mjs";
import { checkNodeVersion } from "./nodeVersion.mjs";
import { installPackages } from "./packages.mjs";
import { say, secondsSince, step } from "./progress.mjs";
import { listenForStop, stopAll } from "./stops.mjs";
import { openTestCluster } from "./testCluster.mjs";

const since = performance.now();
const { chosen, unknown, known } = chooseChecks(process.argv.slice(2));
/** @type {import("./checks.mjs").Outcome[]} */
const outcomes = [];
let stopping = false;

listenForStop(async (signal) => {
  stopping = true;
  say(`\nStopping (${signal}).`);
  await stopAll();
  process.exit(130);
});

/** @returns {("database" | "browser")[]} */
function neededPrograms() {
  if (chosen.includes("browser")) return ["database", "browser"];
  return chosen.includes("unit") || chosen.includes("server") ? ["database"] : [];
}

/** Puts in place what the chosen checks need, and gives the environment for the tests. */
async function setUp() {
  checkNodeVersion();
  await Promise.all([
    step("debian", (note) => installDebianPackages(neededPrograms(), note)),
    step("packages", installPackages),
  ]);
  /** @type {NodeJS.ProcessEnv} */
  const env = {};
  if (chosen.includes("server") || chosen.includes("browser")) {
    await step("database", async () => {
      if (process.env.TEST_DATABASE_URL) return "the one in TEST_DATABASE_URL";
      const cluster = await openTestCluster();
      env.TEST_DATABASE_URL = cluster.url;
      return "a PostgreSQL 15 for tests alone";
    });
  }
  if (chosen.includes("unit") || chosen.includes("browser")) {
    await step("build", async (note) => {
      const { fresh } = await keepBuild(note);
      return fresh ? "client and server built" : "nothing changed";
    });
  }
  return env;
}

async function runAll() {
  if (unknown.length > 0) throw new LaunchError(`No such check: ${unknown.join(", ")}. There are ${known.join(", ")}.`);
  const env = await setUp();
  for (const name of chosen) {
    outcomes.push(projects.includes(name) ? await runProject(name, env) : await runWhole(name));
    if (stopping) return;
  }
}

try {
  await runAll();
} catch (error) {
  say(`\n${error instanceof LaunchError ? error.message : error instanceof Error ? error.stack : error}`);
  outcomes.push({ name: "set-up", passed: 0, failed: 1, took: secondsSince(since) });
}
// Whoever told us to stop exits for us once that is done.
if (!stopping) {
  await stopAll();
  const sum = (/** @type {"passed" | "failed"} */ key) => outcomes.reduce((total, outcome) => total + outcome[key], 0);
  say("");
  for (const { name, passed, failed, took } of outcomes) {
    say(`  ${name.padEnd(10)} ${String(passed).padStart(5)} passed ${String(failed).padStart(4)} failed   ${took}`);
  }
  say(`\nAll of it took ${secondsSince(since)}.\n${sum("passed")} passed, ${sum("failed")} failed`);
  process.exit(sum("failed") === 0 ? 0 : 1);
}
