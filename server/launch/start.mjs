import { keepBuild } from "./build.mjs";
import { installDebianPackages } from "./debian.mjs";
import { demoSecrets, fillOnce, openDemoDatabase, takePlace } from "./demo.mjs";
import { describeSite } from "./describeSite.mjs";
import { LaunchError } from "./LaunchError.mjs";
import { checkNodeVersion } from "./nodeVersion.mjs";
import { installPackages } from "./packages.mjs";
import { choosePort, probePort } from "./ports.mjs";
import { say, secondsSince, step } from "./progress.mjs";
import { migrateSite, seedSite, startSite } from "./site.mjs";
import { listenForStop, stopAll } from "./stops.mjs";

const since = performance.now();
const { PORT, HOST, PUBLIC_URL, DATABASE_URL } = process.env;
let up = false;
let about = "";
let ending = false;

listenForStop((signal) => void end(up ? 0 : 130, `Stopping (${signal}).`));

/**
 * Stops everything and exits. Only the first reason counts: what it stops fails in its turn.
 * @param {number} code
 * @param {string} words
 */
async function end(code, words) {
  if (ending) return;
  ending = true;
  const began = performance.now();
  say(`\n${words}`);
  await stopAll();
  if (up) say(`All stopped (${secondsSince(began)}).`);
  process.exit(code);
}

/** Everything that a demo needs, in order; what is started is remembered for `stopAll`. */
async function bringUp() {
  checkNodeVersion();
  if (PORT) await choosePort(PORT, HOST);
  await Promise.all([
    step("debian", (note) => installDebianPackages(DATABASE_URL ? [] : ["database"], note)),
    step("packages", installPackages),
  ]);

  const { number, suffix } = await takePlace();
  if (number > 1) say(`  Another start of this checkout is running; this is number ${number}, with data of its own.`);
  const secrets = await demoSecrets();

  let build = "";
  await step("build", async (note) => {
    const { folder, fresh } = await keepBuild(note);
    build = folder;
    return fresh ? "client and server built" : "nothing changed";
  });

  let identity = /** @type {string | null} */ (null);
  let place = { databaseUrl: "", dataDir: "" };
  await step("database", async () => {
    const { words, identity: found, ...opened } = await openDemoDatabase(DATABASE_URL, suffix);
    identity = found;
    place = opened;
    return words;
  });
  const settings = { ...place, build, secrets, suffix, host: HOST, publicUrl: PUBLIC_URL };
  await fillOnce(identity, settings, async () => {
    await step("schema", () => migrateSite(settings));
    await step("demo data", () => seedSite({ ...settings, port: 0 }));
  });

  await step("server", async () => {
    const site = await startOnPort(settings);
    for (const program of site.programs) {
      void program.failure.then((error) => end(1, error.message));
    }
    up = true;
    about = await describeSite(site);
    return `${site.url} is ready`;
  });
}

/**
 * Starts the site on the port that was asked for or the first free one. Between finding a port free and listening on
 * it another start may take it: then the next one is tried.
 * @param {Omit<import("./site.mjs").Site, "port">} settings
 */
async function startOnPort(settings) {
  for (let left = 3; ; left--) {
    const port = await choosePort(PORT, HOST);
    try {
      return await startSite({ ...settings, port });
    } catch (error) {
      const wasTaken = (await probePort(port, HOST)) === null;
      if (PORT || !wasTaken || left === 0) throw error;
    }
  }
}

say("Idlewright is starting.");
try {
  await bringUp();
  say(`\nReady after ${secondsSince(since)}.\n\n${about}\n\n  Ctrl-C stops everything.`);
} catch (error) {
  await end(1, error instanceof LaunchError ? error.message : String(error instanceof Error ? error.stack : error));
}
