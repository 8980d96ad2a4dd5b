import { mkdtempSync, rmSync, statSync } from "node:fs";
import { createServer, type Server } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, describe, expect, it } from "vitest";
import { chooseChecks, countTests } from "../../server/launch/checks.mjs";
import { checkNodeVersion } from "../../server/launch/nodeVersion.mjs";
import { isInstalled } from "../../server/launch/packages.mjs";
import { choosePort, freePort, probePort } from "../../server/launch/ports.mjs";
import { keepSecrets } from "../../server/launch/secrets.mjs";

describe("the Node that runs us", () => {
  it.each(["20.20.0", "20.20.2", "20.21.0"])("may be %s", (version) => {
    expect(() => checkNodeVersion(version)).not.toThrow();
  });
  it.each(["18.20.4", "20.19.9", "21.0.0", "22.12.0"])("may not be %s", (version) => {
    expect(() => checkNodeVersion(version)).toThrow(`this is ${version}`);
  });
});

describe("whether node_modules is what the lock asks for", () => {
  const wanted = {
    "": {},
    "node_modules/a": { version: "1.0.0" },
    "node_modules/b": { version: "2.0.0", optional: true },
  };
  it.each([
    ["all of it", { "node_modules/a": { version: "1.0.0" }, "node_modules/b": { version: "2.0.0" } }, true],
    ["without what is for another platform", { "node_modules/a": { version: "1.0.0" } }, true],
    ["with another version", { "node_modules/a": { version: "1.0.1" } }, false],
    [
      "with another version of what is optional",
      { "node_modules/a": { version: "1.0.0" }, "node_modules/b": { version: "1.9.0" } },
      false,
    ],
    ["without a package", { "node_modules/b": { version: "2.0.0" } }, false],
    ["empty", {}, false],
  ])("%s", (_, installed, expected) => {
    expect(isInstalled(wanted, installed)).toBe(expected);
  });
});

describe("the port to serve on", () => {
  const listening: Server[] = [];
  afterEach(() => {
    for (const server of listening.splice(0)) server.close();
  });
  const listen = (port: number) =>
    new Promise<void>((done) => {
      const server = createServer();
      listening.push(server.listen(port, "127.0.0.1", () => done()));
    });

  it("is the asked one where that is free", async () => {
    const port = await freePort();
    expect(await choosePort(String(port))).toBe(port);
  });

  it("is refused in words where the asked one is taken", async () => {
    const port = await freePort();
    await listen(port);
    expect(await probePort(port)).toBeNull();
    await expect(choosePort(String(port))).rejects.toThrow(`Port ${port} is taken.`);
  });

  it.each(["http", "-1", "65536", "3000.5"])("cannot be %s", async (asked) => {
    await expect(choosePort(asked)).rejects.toThrow("PORT must be a number");
  });

  it("is the first free one from 3000 up where none is asked for", async () => {
    const first = await choosePort(undefined);
    expect(first).toBeGreaterThanOrEqual(3000);
    await listen(first);
    expect(await choosePort(undefined)).toBeGreaterThan(first);
  });
});

describe("secrets", () => {
  it("are random, stay the same, and are for their owner alone", () => {
    const folder = mkdtempSync(join(tmpdir(), "idlewright-secrets-"));
    const path = join(folder, "secrets.json");
    const made = keepSecrets(path, ["one", "two"]);
    expect(made.one).toMatch(/^[\w-]{32}$/);
    expect(made.one).not.toBe(made.two);
    expect(keepSecrets(path, ["one", "three"])).toMatchObject(made);
    expect(statSync(path).mode & 0o777).toBe(0o600);
    expect(keepSecrets(join(folder, "other.json"), ["one"]).one).not.toBe(made.one);
    rmSync(folder, { recursive: true });
  });
});

describe("what is checked and how it is counted", () => {
  it("is all of it in order, or what is named, or a word that there is no such check", () => {
    const all = ["types", "lint", "unused", "unit", "client", "server", "browser"];
    expect(chooseChecks([])).toMatchObject({ chosen: all, unknown: [] });
    expect(chooseChecks(["server", "unit"])).toMatchObject({ chosen: ["unit", "server"], unknown: [] });
    expect(chooseChecks(["units"])).toMatchObject({ chosen: [], unknown: ["units"] });
  });

  it.each([
    ["all passed", { numPassedTests: 7, numFailedTests: 0 }, true, { passed: 7, failed: 0 }],
    ["two failed", { numPassedTests: 5, numFailedTests: 2 }, false, { passed: 5, failed: 2 }],
    ["a file that could not be read", { numPassedTests: 7, numFailedTests: 0 }, false, { passed: 7, failed: 1 }],
    ["no report at all", null, false, { passed: 0, failed: 1 }],
  ])("%s", (_, report, succeeded, expected) => {
    expect(countTests(report, succeeded)).toEqual(expected);
  });
});
