import { spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { takeLock, tryLock } from "../../server/launch/lock.mjs";

const folder = mkdtempSync(join(tmpdir(), "idlewright-lock-"));
afterAll(() => rmSync(folder, { recursive: true }));

const lockModule = new URL("../../server/launch/lock.mjs", import.meta.url).href;
const holder = (path: string) => `
  const { takeLock } = await import(${JSON.stringify(lockModule)});
  await takeLock(${JSON.stringify(path)});
  process.stdout.write("held");
  setInterval(() => {}, 1000);
`;

describe("a lock between processes", () => {
  it("is held by one at a time, and by the next once it is let go", async () => {
    const path = join(folder, "one");
    const release = await takeLock(path);
    expect(await tryLock(path)).toBeNull();
    const order: string[] = [];
    const second = takeLock(path, { onWait: () => order.push("waits") }).then((free) => {
      order.push("has it");
      free();
    });
    await expect.poll(() => order).toEqual(["waits"]);
    release();
    await second;
    expect(order).toEqual(["waits", "has it"]);
  });

  it("is shared by those who ask so, and keeps out whoever does not", async () => {
    const path = join(folder, "shared");
    const first = await takeLock(path, { shared: true });
    const second = await tryLock(path, { shared: true });
    expect(second).not.toBeNull();
    first();
    expect(await tryLock(path)).toBeNull();
    second?.();
    const alone = await tryLock(path);
    expect(alone).not.toBeNull();
    alone?.();
  });

  it("is let go by a second call once only", async () => {
    const path = join(folder, "twice");
    const release = await takeLock(path);
    release();
    const other = await takeLock(path);
    release();
    expect(await tryLock(path)).toBeNull();
    other();
  });

  it("is gone with the process that held it, however that ended", async () => {
    const path = join(folder, "killed");
    const child = spawn(process.execPath, ["--input-type=module", "-e", holder(path)], {
      stdio: ["ignore", "pipe", "inherit"],
    });
    const [said] = await once(child.stdout, "data");
    expect(String(said)).toBe("held");
    expect(await tryLock(path)).toBeNull();
    child.kill("SIGKILL");
    await once(child, "close");
    const free = await tryLock(path);
    expect(free).not.toBeNull();
    free?.();
  });
});
