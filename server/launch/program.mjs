import { spawn } from "node:child_process";
import { closeSync, mkdirSync, openSync } from "node:fs";
import { dirname } from "node:path";
import { LaunchError } from "./LaunchError.mjs";
import { logFile, root } from "./paths.mjs";
import { lastLines } from "./run.mjs";
import { onStop } from "./stops.mjs";

const stopMs = 30_000;

/**
 * Starts one of our own programs, which says `{ ready: true }` over IPC once it serves.
 *
 * It has a process group of its own, so that Ctrl-C reaches only us and we end things in order; if we are killed
 * outright, the kernel tells it to end (prctl PR_SET_PDEATHSIG, through setpriv).
 *
 * @param {string} name for its log and for messages
 * @param {string} file
 * @param {NodeJS.ProcessEnv} env
 */
export function startProgram(name, file, env) {
  const log = logFile(name);
  mkdirSync(dirname(log), { recursive: true });
  const out = openSync(log, "w");
  const child = spawn("setpriv", ["--pdeathsig", "TERM", process.execPath, "--enable-source-maps", file], {
    cwd: root,
    env,
    detached: true,
    stdio: ["ignore", out, out, "ipc"],
  });
  closeSync(out);

  /** @type {Promise<string>} */
  const ended = new Promise((done) => {
    child.once("error", (error) => done(error.message));
    child.once("close", (code, signal) => done(signal ?? `exit code ${code}`));
  });
  /** @type {Promise<void>} */
  const told = new Promise((done) => {
    child.on("message", (message) => {
      if (typeof message === "object" && message && "ready" in message) done();
    });
  });
  const failure = ended.then((how) => new LaunchError(`${name} stopped by itself (${how}).\n${lastLines(log)}`));
  const ready = Promise.race([
    told,
    failure.then((error) => {
      throw error;
    }),
  ]);
  // Whoever starts several waits for one of them: the failure of another is not lost, `failure` has it.
  ready.catch(() => undefined);

  /** Asks it to end, waits, and after 30 s ends it. */
  const stop = async () => {
    child.kill("SIGTERM");
    const timer = setTimeout(() => child.kill("SIGKILL"), stopMs);
    await ended;
    clearTimeout(timer);
  };
  void ended.then(onStop(stop));

  return {
    name,
    pid: child.pid,
    /** Resolves with an error in words when it ends, asked to or not. */
    failure,
    /** Resolves when it serves; LaunchError where it ends instead. */
    ready,
    stop,
  };
}
