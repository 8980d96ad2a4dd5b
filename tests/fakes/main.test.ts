import { type ChildProcess, fork } from "node:child_process";
import { once } from "node:events";
import { createServer } from "node:net";
import { fileURLToPath } from "node:url";
import { afterEach, describe, expect, it } from "vitest";

const script = fileURLToPath(new URL("../../fakes/main.ts", import.meta.url));
const keys = { STRIPE_SECRET_KEY: "sk_test_x", STRIPE_WEBHOOK_SECRET: "whsec_x" };

type Ready = { ready: true; addresses: Record<string, string> };

describe("the stand-ins in one process", { timeout: 30_000 }, () => {
  let child: ChildProcess | undefined;
  afterEach(() => void child?.kill("SIGKILL"));

  const start = (env: Record<string, string>) => {
    const started = fork(script, {
      execArgv: ["--import", "tsx"],
      env: { PATH: process.env.PATH, ...env },
      stdio: ["ignore", "pipe", "pipe", "ipc"],
    });
    child = started;
    const output = { out: "", err: "" };
    started.stdout?.on("data", (chunk) => {
      output.out += chunk;
    });
    started.stderr?.on("data", (chunk) => {
      output.err += chunk;
    });
    return { started, output };
  };

  it("tells its parent where they listen, prints the addresses and stops on SIGTERM", async () => {
    const { started, output } = start({ ...keys, MEILI_FAKE_PORT: "0", MEILI_API_KEY: "k" });
    const [message] = (await once(started, "message")) as [Ready];
    expect(message.ready).toBe(true);
    expect(Object.keys(message.addresses)).toEqual(["stripe", "smtp", "mail", "meilisearch"]);

    const { mail, meilisearch, stripe } = message.addresses;
    expect((await fetch(`${mail}/messages.json`)).status).toBe(200);
    expect((await fetch(`${meilisearch}/health`)).status).toBe(200);
    expect((await fetch(`${meilisearch}/indexes`)).status).toBe(401);
    expect((await fetch(`${stripe}/v1/balance`)).status).toBe(401);

    started.kill("SIGTERM");
    expect(await once(started, "close")).toEqual([0, null]);
    for (const address of Object.values(message.addresses)) expect(output.out).toContain(address);
    expect(output.err).toBe("");
  });

  it("leaves the search out unless asked for, and goes when its parent does", async () => {
    const { started } = start(keys);
    const [message] = (await once(started, "message")) as [Ready];
    expect(Object.keys(message.addresses)).toEqual(["stripe", "smtp", "mail"]);
    started.disconnect();
    expect(await once(started, "exit")).toEqual([0, null]);
  });

  it("says what is missing or taken and exits with 1", async () => {
    const missing = start({ STRIPE_WEBHOOK_SECRET: "whsec_x" });
    expect(await once(missing.started, "close")).toEqual([1, null]);
    expect(missing.output.err).toBe("Set STRIPE_SECRET_KEY to start the stand-ins.\n");

    const taken = createServer().listen(0, "127.0.0.1");
    await once(taken, "listening");
    const address = taken.address();
    const port = typeof address === "object" && address ? String(address.port) : "";
    const failed = start({ ...keys, MAIL_FAKE_HTTP_PORT: port });
    expect(await once(failed.started, "close")).toEqual([1, null]);
    expect(failed.output.err).toContain("EADDRINUSE");
    taken.close();
  });
});
