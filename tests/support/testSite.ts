import { mkdtemp, rm } from "node:fs/promises";
import { createServer } from "node:http";
import { tmpdir } from "node:os";
import { join } from "node:path";
import type { Express } from "express";
import { startMailFake } from "#fakes/mail/startMailFake";
import { startStripeFake } from "#fakes/stripe/startStripeFake";
import { createApp } from "#server/app";
import { readConfig } from "#server/config";
import { closeServices, createServices } from "#server/createServices";
import { startWorker } from "#server/jobs/startWorker";
import { createTestDatabase } from "./database";

const webhookSecret = "whsec_test_secret_of_the_suite";

/**
 * The server on a database of its own, with its payment and mail stand-ins, listening on a free port.
 * `worker: true` also works through the job queue.
 */
export async function startTestSite({ worker = false }: { worker?: boolean } = {}) {
  const database = await createTestDatabase();
  const dataDir = await mkdtemp(join(tmpdir(), "idlewright-test-"));
  // The server's port must be known to the stand-in, and the stand-in's to the server: listen first, serve then.
  let app: Express | undefined;
  const server = createServer((req, res) => app?.(req, res));
  await new Promise<void>((done) => server.listen(0, "127.0.0.1", done));
  const address = server.address();
  const port = typeof address === "object" && address ? address.port : 0;
  const url = `http://127.0.0.1:${port}`;

  const mail = await startMailFake({});
  const stripe = await startStripeFake({
    apiKey: "sk_test_suite",
    webhookSecret,
    webhookUrl: `${url}/api/v1/webhooks/stripe`,
  });
  const config = readConfig({
    IDLEWRIGHT_MODE: "test",
    PORT: String(port),
    PUBLIC_URL: url,
    DATABASE_URL: database.url,
    SESSION_SECRET: "a secret of the test suite, long enough",
    STRIPE_SECRET_KEY: "sk_test_suite",
    STRIPE_WEBHOOK_SECRET: webhookSecret,
    STRIPE_API_URL: stripe.url,
    SMTP_URL: `smtp://127.0.0.1:${mail.smtpPort}`,
    DATA_DIR: dataDir,
    LOG_LEVEL: "silent",
  });
  const services = createServices(config);
  app = createApp(services);
  const runner = worker ? await startWorker(services) : undefined;

  return {
    url,
    app,
    services,
    stripe,
    mail,
    async close() {
      await runner?.stop();
      await stripe.close();
      await mail.close();
      server.closeAllConnections();
      await new Promise((done) => server.close(done));
      await closeServices(services);
      await database.drop();
      await rm(dataDir, { recursive: true, force: true });
    },
  };
}
export type TestSite = Awaited<ReturnType<typeof startTestSite>>;
