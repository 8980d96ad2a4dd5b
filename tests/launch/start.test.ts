import { spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { root } from "../../server/launch/paths.mjs";
import { freePort, probePort } from "../../server/launch/ports.mjs";

// A data folder of its own keeps this apart from a demo that runs from the same checkout.
const data = mkdtempSync(join(tmpdir(), "idlewright-start-"));
afterAll(() => rmSync(data, { recursive: true, force: true }));

/** `npm start` without npm, on a port; `output` grows as it prints, `comesUp` fails where it ends instead. */
function start(port: number) {
  const child = spawn(process.execPath, ["server/launch/start.mjs"], {
    cwd: root,
    env: { ...process.env, IDLEWRIGHT_DATA: data, DEMO_PHOTOS: "none", PORT: String(port) },
    stdio: ["ignore", "pipe", "pipe"],
  });
  const ended = once(child, "close") as Promise<[number | null, string | null]>;
  let isUp: () => void = () => undefined;
  const up = new Promise<void>((done) => {
    isUp = done;
  });
  const started = { child, output: "", ended, comesUp: () => Promise.race([up, ended.then(fails)]) };
  const fails = () => {
    throw new Error(`It did not come up: ${started.output}`);
  };
  for (const stream of [child.stdout, child.stderr]) {
    stream.on("data", (chunk) => {
      started.output += chunk;
      if (started.output.includes("Ctrl-C stops everything")) isUp();
    });
  }
  return started;
}
type Started = ReturnType<typeof start>;

/** The address that a line of the printed block gives. */
const addressOf = (output: string, name: string) => new RegExp(`${name} +(http://\\S+)`).exec(output)?.[1] ?? "";
const portOf = (url: string) => Number(new URL(url).port);
const clusterPort = () => Number(readFileSync(join(data, "pg", "port"), "utf8"));
const isFree = async (port: number) => (await probePort(port)) === port;

/** The process that runs a program for a start. */
function childOf(started: Started, program: string): number {
  const children = readFileSync(`/proc/${started.child.pid}/task/${started.child.pid}/children`, "utf8").split(" ");
  const found = children.find((pid) => pid && readFileSync(`/proc/${pid}/cmdline`, "utf8").includes(program));
  return Number(found);
}

describe("two starts beside each other from one checkout", { timeout: 180_000 }, () => {
  let first: Started;
  let second: Started;
  let port: number;
  beforeAll(async () => {
    port = await freePort();
    first = start(port);
    await first.comesUp();
    second = start(await freePort());
    await second.comesUp();
  }, 300_000);
  afterAll(async () => {
    for (const started of [first, second]) {
      started?.child.kill("SIGTERM");
      await started?.ended;
    }
  });

  it("serve on the ports that they were given, and say where and who", async () => {
    const site = addressOf(first.output, "Idlewright");
    expect(portOf(site)).toBe(port);
    expect((await fetch(`${site}/readyz`)).status).toBe(200);
    expect(await (await fetch(site)).text()).toContain('<div id="root">');
    expect((await fetch(addressOf(first.output, "Mail"))).status).toBe(200);
    const { demoAccounts } = await (await fetch(`${site}/api/v1/auth/session`)).json();
    expect(demoAccounts.length).toBeGreaterThan(0);
    for (const { email, password } of demoAccounts) expect(first.output).toMatch(new RegExp(`${email} +${password}`));
    expect(second.output).toContain("number 2, with data of its own");
  });

  it("end on a signal with all that is theirs, and leave the other its cluster", async () => {
    first.child.kill("SIGINT");
    expect(await first.ended).toEqual([0, null]);
    expect(first.output).toContain("All stopped");
    const left = [port, ...["Mail", "Payments"].map((name) => portOf(addressOf(first.output, name)))];
    for (const each of left) expect(await isFree(each)).toBe(true);
    expect(await isFree(clusterPort())).toBe(false);
    expect((await fetch(`${addressOf(second.output, "Idlewright")}/readyz`)).status).toBe(200);
  });

  it("end with what went wrong where one of their programs dies; the last one stops the cluster", async () => {
    process.kill(childOf(second, "fakes/main.js"), "SIGKILL");
    expect(await second.ended).toEqual([1, null]);
    expect(second.output).toContain("stand-ins-2 stopped by itself (SIGKILL)");
    const left = ["Idlewright", "Mail", "Payments"].map((name) => portOf(addressOf(second.output, name)));
    for (const each of [...left, clusterPort()]) expect(await isFree(each)).toBe(true);
  });
});

it("says at once that the PORT is taken", async () => {
  const taken = createServer().listen(0, "127.0.0.1");
  await once(taken, "listening");
  const address = taken.address();
  const started = start(typeof address === "object" && address ? address.port : 0);
  expect(await started.ended).toEqual([1, null]);
  expect(started.output).toMatch(/Port \d+ is taken\./);
  expect(started.output).not.toContain("build");
  taken.close();
}, 30_000);
