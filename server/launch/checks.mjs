import { spawn } from "node:child_process";
import { existsSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { inData, root } from "./paths.mjs";
import { say, secondsSince } from "./progress.mjs";
import { ended } from "./run.mjs";

/** @typedef {{ name: string, passed: number, failed: number, took: string }} Outcome */

export const projects = ["unit", "client", "server", "browser"];

/** Checks that count as one test each, by the script of the package that makes them. */
export const wholes = {
  types: ["typescript/bin/tsc", "-b", "--pretty"],
  lint: ["@biomejs/biome/bin/biome", "check", "."],
  unused: ["knip/bin/knip.js", "--no-progress"],
};

/**
 * Which checks to run, from the names given: none are all of them.
 * @param {string[]} names
 */
export function chooseChecks(names) {
  const known = [...Object.keys(wholes), ...projects];
  const unknown = names.filter((name) => !known.includes(name));
  return { chosen: known.filter((name) => names.length === 0 || names.includes(name)), unknown, known };
}

/**
 * @param {string} name of `wholes`
 * @returns {Promise<Outcome>}
 */
export async function runWhole(name) {
  const since = performance.now();
  const [script = "", ...args] = wholes[/** @type {keyof typeof wholes} */ (name)];
  const passed = (await runPackage(script, args, {})) === "0";
  return { name, passed: passed ? 1 : 0, failed: passed ? 0 : 1, took: secondsSince(since) };
}

/**
 * Runs one project of the tests, its summary on the terminal.
 * @param {string} name
 * @param {NodeJS.ProcessEnv} env beyond our own
 * @returns {Promise<Outcome>}
 */
export async function runProject(name, env) {
  const since = performance.now();
  const report = inData("logs", `tests-${name}.json`);
  rmSync(report, { force: true });
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  const result = await runPackage("vitest/vitest.mjs", ["run", "--project", name, ...reporters], env);
  return { name, ...countTests(readReport(report), result === "0"), took: secondsSince(since) };
}

/** @param {string} path */
function readReport(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, "utf8")) : null;
}

/**
 * Tests that passed and failed, by vitest's report. A run that failed without a failed test, as where a file could
 * not be read or there was none, counts as one that failed.
 *
 * @param {{ numPassedTests: number, numFailedTests: number } | null} report
 * @param {boolean} succeeded
 */
export function countTests(report, succeeded) {
  const { numPassedTests: passed, numFailedTests: failed } = report ?? { numPassedTests: 0, numFailedTests: 0 };
  return { passed, failed: succeeded ? failed : Math.max(1, failed) };
}

/**
 * @param {string} script within node_modules
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} env beyond our own
 */
async function runPackage(script, args, env) {
  const path = join(root, "node_modules", script);
  say(`\n> ${script.split("/").at(-1)} ${args.join(" ")}`);
  return ended(
    spawn(process.execPath, [path, ...args], { cwd: root, env: { ...process.env, ...env }, stdio: "inherit" }),
  );
}
