import {
  appendFileSync,
  chownSync,
  existsSync,
  mkdirSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { join } from "node:path";
import { asOwner, clusterPlace } from "./clusterFolder.mjs";
import { postgresBin } from "./debian.mjs";
import { LaunchError } from "./LaunchError.mjs";
import { takeLock, tryLock } from "./lock.mjs";
import { freePort } from "./ports.mjs";
import { read, succeeds } from "./run.mjs";
import { keepSecrets } from "./secrets.mjs";
import { onStop } from "./stops.mjs";

/** @typedef {import("./clusterFolder.mjs").Place} Place */

export const superuser = "keeper";
const tries = 3;

const always = `
# Idlewright's own: this machine only, and by password.
listen_addresses = '127.0.0.1'
unix_socket_directories = ''
max_connections = 200
`;
// What a test loses in a power cut nobody misses.
const forTests = `
fsync = off
synchronous_commit = off
full_page_writes = off
`;

/**
 * Opens a private PostgreSQL cluster: made the first time, started if it is not running, and stopped at `close` by
 * the last process that has it open. Any number of processes may open one at once.
 *
 * @param {string} name of its folder
 * @param {{ disposable?: boolean }} [options] a disposable one is fast, and made anew where it does not start
 */
export async function openCluster(name, options = {}) {
  const opening = open(name, options);
  // Told to stop while it opens, we wait for that, and close it then.
  const forget = onStop(() => opening.then(({ close }) => close()).catch(() => undefined));
  const cluster = await opening;
  return {
    ...cluster,
    close() {
      forget();
      return cluster.close();
    },
  };
}

/**
 * @param {string} name
 * @param {{ disposable?: boolean }} options
 */
async function open(name, { disposable = false }) {
  const place = await clusterPlace(name);
  const lockPath = join(place.folder, "changing.lock");
  const usersPath = join(place.folder, "users.lock");

  const changed = await takeLock(lockPath);
  const leave = await takeLock(usersPath, { shared: true });
  try {
    const passwords = keepSecrets(join(place.folder, "passwords.json"), [superuser, "idlewright"]);
    const make = () => makeCluster(place, passwords[superuser], disposable);
    if (!existsSync(place.data)) await make();
    const started = await startCluster(place).catch(async (error) => {
      if (!disposable) throw error;
      rmSync(place.data, { recursive: true, force: true });
      await make();
      return startCluster(place);
    });
    return {
      port: started.port,
      /** Whether this call started it, so that nobody else can have it open yet. */
      started: started.fresh,
      passwords,
      async close() {
        const changing = await takeLock(lockPath);
        leave();
        const alone = await tryLock(usersPath);
        if (alone) await stopCluster(place);
        alone?.();
        changing();
      },
    };
  } catch (error) {
    leave();
    throw error;
  } finally {
    changed();
  }
}

/**
 * Whole or not at all: made under another name, then renamed.
 * @param {Place} place
 * @param {string | undefined} password
 * @param {boolean} disposable
 */
async function makeCluster(place, password, disposable) {
  const partial = `${place.data}.part`;
  const secret = join(place.folder, "first-password");
  rmSync(partial, { recursive: true, force: true });
  mkdirSync(partial, { mode: 0o700 });
  writeFileSync(secret, `${password}\n`, { mode: 0o600 });
  writeFileSync(join(place.folder, "postgres.log"), "", { mode: 0o600 });
  if (place.owner) {
    const { uid, gid } = place.owner;
    for (const path of [partial, secret, join(place.folder, "postgres.log")]) chownSync(path, uid, gid);
  }
  try {
    await postgres(place, "initdb", [
      ...["-D", partial, "--username", superuser, "--pwfile", secret, "--auth", "scram-sha-256"],
      ...["--encoding", "UTF8", "--locale", "C.UTF-8", ...(disposable ? ["--no-sync"] : [])],
    ]);
  } finally {
    rmSync(secret, { force: true });
  }
  appendFileSync(join(partial, "postgresql.conf"), disposable ? always + forTests : always);
  renameSync(partial, place.data);
}

/**
 * @param {Place} place
 * @returns {Promise<{ port: number, fresh: boolean }>}
 */
async function startCluster(place) {
  const running = await runningPort(place);
  if (running) return { port: running, fresh: false };

  const portFile = join(place.folder, "port");
  for (let attempt = 1; ; attempt++) {
    // The port of last time is tried first, so that an address somebody wrote down stays good.
    const port = attempt === 1 && existsSync(portFile) ? Number(readFileSync(portFile, "utf8")) : await freePort();
    try {
      await postgres(place, "pg_ctl", [
        ...["start", "-D", place.data, "-w", "-t", "60", "-s"],
        ...["-l", join(place.folder, "postgres.log"), "-o", `-p ${port}`],
      ]);
      writeFileSync(portFile, `${port}\n`);
      return { port, fresh: true };
    } catch (error) {
      if (attempt < tries) continue;
      throw new LaunchError(`PostgreSQL does not start; see ${join(place.folder, "postgres.log")}.`, { cause: error });
    }
  }
}

/**
 * The port of a cluster that answers, or null.
 * @param {Place} place
 */
async function runningPort(place) {
  if (!(await succeeds(...asOwner(place, [`${postgresBin}/pg_ctl`, "status", "-D", place.data])))) return null;
  // The fourth line of postmaster.pid is the port (PostgreSQL 15, src/include/utils/pidfile.h).
  const port = Number(readFileSync(join(place.data, "postmaster.pid"), "utf8").split("\n")[3]);
  const answers = await succeeds(`${postgresBin}/pg_isready`, [
    "-q",
    "-t",
    "10",
    "-h",
    "127.0.0.1",
    "-p",
    String(port),
  ]);
  return answers ? port : null;
}

/** @param {Place} place */
async function stopCluster(place) {
  if (await runningPort(place)) await postgres(place, "pg_ctl", ["stop", "-D", place.data, "-m", "fast", "-w", "-s"]);
}

/**
 * @param {Place} place
 * @param {string} program
 * @param {string[]} args
 */
async function postgres(place, program, args) {
  const { PATH, TZ } = process.env;
  const [command, all] = asOwner(place, [`${postgresBin}/${program}`, ...args]);
  return read(command, all, { cwd: "/", env: { PATH, TZ, LANG: "C.UTF-8" }, letFinish: true });
}
