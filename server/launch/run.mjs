import { spawn } from "node:child_process";
import { closeSync, mkdirSync, openSync, readFileSync } from "node:fs";
import { basename, dirname } from "node:path";
import { LaunchError } from "./LaunchError.mjs";
import { root } from "./paths.mjs";
import { onStop } from "./stops.mjs";

/**
 * Runs a command to its end with its output in a log, which starts anew.
 *
 * Errors: LaunchError with the last lines of the log where the command fails.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {{ log: string, env?: NodeJS.ProcessEnv, cwd?: string }} options `log` is a path
 */
export async function run(command, args, { log, env = process.env, cwd = root }) {
  mkdirSync(dirname(log), { recursive: true });
  const out = openSync(log, "w");
  try {
    const result = await ended(spawn(command, args, { cwd, env, stdio: ["ignore", out, out] }));
    const name = [command, ...args.slice(0, 1)].map((word) => basename(word)).join(" ");
    if (result !== "0") throw new LaunchError(`${name} failed (${result}).\n${lastLines(log)}`);
  } finally {
    closeSync(out);
  }
}

/**
 * Runs a command and gives what it printed; `input` goes to its standard input. One that must not be cut short, and
 * is short itself, is let finish where we are told to stop.
 *
 * Errors: LaunchError with what it printed as errors where it fails.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {{ input?: string, env?: NodeJS.ProcessEnv, cwd?: string, letFinish?: boolean }} [options]
 */
export async function read(command, args, { input = "", env = process.env, cwd = root, letFinish = false } = {}) {
  const child = spawn(command, args, { cwd, env, stdio: "pipe" });
  const text = { out: "", err: "" };
  child.stdout.on("data", (chunk) => {
    text.out += chunk;
  });
  child.stderr.on("data", (chunk) => {
    text.err += chunk;
  });
  child.stdin.on("error", () => undefined);
  child.stdin.end(input);
  const result = await ended(child, letFinish);
  if (result !== "0") throw new LaunchError(`${command} failed (${result}): ${text.err.trim()}`);
  return text.out.trim();
}

/**
 * Whether a command ends well; its output is dropped.
 * @param {string} command
 * @param {string[]} args
 */
export async function succeeds(command, args) {
  const child = spawn(command, args, { cwd: "/", stdio: "ignore" });
  return (await ended(child)) === "0";
}

/**
 * The exit code or signal of a child, as text. If we are told to stop we end it, or let it finish.
 * @param {import("node:child_process").ChildProcess} child
 * @param {boolean} [letFinish]
 * @returns {Promise<string>}
 */
export async function ended(child, letFinish = false) {
  /** @type {Promise<string>} */
  const result = new Promise((done) => {
    child.once("error", (error) => done(error.message));
    child.once("close", (code, signal) => done(String(code ?? signal)));
  });
  const forget = onStop(() => {
    if (!letFinish) child.kill("SIGTERM");
    return result;
  });
  return result.finally(forget);
}

/**
 * The end of a log, indented, and where the rest is.
 * @param {string} log
 * @param {number} [count] how many lines
 */
export function lastLines(log, count = 12) {
  const lines = readFileSync(log, "utf8").trimEnd().split("\n").slice(-count);
  return [...lines.map((line) => `    ${line}`), `  The whole log: ${log}`].join("\n");
}
