import { keepBuild } from "./build.mjs";
import { installDebianPackages } from "./debian.mjs";
import { demoSecrets, openDemoDatabase, takePlace } from "./demo.mjs";
import { describeSite } from "./describeSite.mjs";
import { LaunchError } from "./LaunchError.mjs";
import { checkNodeVersion } from "./nodeVersion.mjs";
import { installPackages } from "./packages.mjs";
import { choosePort } from "./ports.mjs";
import { say, secondsSince, step } from "./progress.mjs";
import { migrateSite, seedSite, startSite } from "./site.mjs";
import { listenForStop, onStop, stopAll } from "./stops.mjs";

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

/** Everything that a demo needs, in order; each step undoes itself through `onStop`. */
async function bringUp() {
  checkNodeVersion();
  if (PORT) await choosePort(PORT, HOST);
  await step("packages", installPackages);
  await step("debian", (note) => installDebianPackages(DATABASE_URL ? [] : ["database"], note));

  const { number, suffix } = await takePlace();
  if (number > 1) say(`  Another start of this checkout is running; this is number ${number}, with data of its own.`);
  const secrets = await demoSecrets();

  let build = "";
  await step("build", async (note) => {
    const kept = await keepBuild(note);
    onStop(kept.release);
    build = kept.folder;
    return kept.fresh ? "client and server built" : "nothing changed";
  });

  let place = { databaseUrl: "", dataDir: "" };
  await step("database", async () => {
    const { words, ...opened } = await openDemoDatabase(DATABASE_URL, suffix);
    place = opened;
    return words;
  });
  const settings = { ...place, build, secrets, suffix, host: HOST, publicUrl: PUBLIC_URL };
  await step("schema", () => migrateSite(settings));
  await step("demo data", () => seedSite({ ...settings, port: 0 }));

  await step("server", async () => {
    const site = await startSite({ ...settings, port: await choosePort(PORT, HOST) });
    onStop(site.stop);
    for (const program of site.programs) {
      void program.failure.then((error) => end(1, error.message));
    }
    up = true;
    about = await describeSite(site);
    return `${site.url} is ready`;
  });
}

say("Idlewright is starting.");
try {
  await bringUp();
  say(`\nReady after ${secondsSince(since)}.\n\n${about}\n\n  Ctrl-C stops everything.`);
} catch (error) {
  await end(1, error instanceof LaunchError ? error.message : String(error instanceof Error ? error.stack : error));
}
