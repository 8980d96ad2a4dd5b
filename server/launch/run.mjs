import { spawn } from "node:child_process";
import { closeSync, mkdirSync, openSync, readFileSync } from "node:fs";
import { dirname } from "node:path";
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
    if (result !== "0") throw new LaunchError(`${command} ${args[0] ?? ""} failed (${result}).\n${lastLines(log)}`);
  } finally {
    closeSync(out);
  }
}

/**
 * Runs a command and gives what it printed; `input` goes to its standard input.
 *
 * Errors: LaunchError with what it printed as errors where it fails.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {{ input?: string, env?: NodeJS.ProcessEnv, cwd?: string }} [options]
 */
export async function read(command, args, { input = "", env = process.env, cwd = root } = {}) {
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
  const result = await ended(child);
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
 * The exit code or signal of a child, as text; it is ended with us if we are told to stop.
 * @param {import("node:child_process").ChildProcess} child
 * @returns {Promise<string>}
 */
export async function ended(child) {
  /** @type {Promise<string>} */
  const result = new Promise((done) => {
    child.once("error", (error) => done(error.message));
    child.once("close", (code, signal) => done(String(code ?? signal)));
  });
  const forget = onStop(() => {
    child.kill("SIGTERM");
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
