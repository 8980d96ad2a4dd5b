import { resolve } from "node:path";
import { buildInto } from "./build.mjs";
import { LaunchError } from "./LaunchError.mjs";

const folder = process.argv[2];
try {
  if (!folder) throw new LaunchError("Say into which folder to build.");
  await buildInto(resolve(folder));
} catch (error) {
  process.stderr.write(`${error instanceof LaunchError ? error.message : error}\n`);
  process.exitCode = 1;
}
