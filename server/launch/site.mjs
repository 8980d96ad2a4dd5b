import { join } from "node:path";
import { setTimeout as delay } from "node:timers/promises";
import { LaunchError } from "./LaunchError.mjs";
import { logFile } from "./paths.mjs";
import { freePort } from "./ports.mjs";
import { startProgram } from "./program.mjs";
import { run } from "./run.mjs";

const readyMs = 30_000;

/**
 * What a site runs on.
 * @typedef {{
 *   build: string, databaseUrl: string, port: number, host?: string, publicUrl?: string, dataDir: string,
 *   secrets: { session: string, paymentKey: string, webhook: string }, suffix?: string,
 * }} Site
 */

/**
 * Brings the schema up to date, and puts the demo data in where it is not.
 * @param {Pick<Site, "build" | "databaseUrl" | "suffix">} site
 */
export async function migrateSite({ build, databaseUrl, suffix = "" }) {
  const env = { ...process.env, DATABASE_URL: databaseUrl };
  await run(process.execPath, [join(build, "server/migrateMain.js")], { env, log: logFile(`migrate${suffix}`) });
}

/** @param {Site} site */
export async function seedSite(site) {
  const env = settingsOf(site, {
    stripe: "http://127.0.0.1:1",
    smtp: "smtp://127.0.0.1:1",
    mail: "http://127.0.0.1:1",
  });
  await run(process.execPath, [join(site.build, "server/seedMain.js")], {
    env,
    log: logFile(`seed${site.suffix ?? ""}`),
  });
}

/**
 * Starts the stand-ins for other people's services and the server, at once, and waits until it answers that it is
 * ready. Stopping ends the server first, so that it can still reach what it uses.
 *
 * Errors: LaunchError where one of them does not come up; what had started is stopped again.
 *
 * @param {Site} site
 */
export async function startSite(site) {
  const { build, port, publicUrl, suffix = "", secrets } = site;
  const localUrl = `http://127.0.0.1:${port}`;
  const [stripePort, smtpPort, mailPort] = [await freePort(), await freePort(), await freePort()];
  const stripeUrl = `http://127.0.0.1:${stripePort}`;
  const mailUrl = `http://127.0.0.1:${mailPort}`;

  const fakes = startProgram(`stand-ins${suffix}`, join(build, "fakes/main.js"), {
    ...process.env,
    STRIPE_SECRET_KEY: secrets.paymentKey,
    STRIPE_WEBHOOK_SECRET: secrets.webhook,
    STRIPE_WEBHOOK_URL: `${localUrl}/api/v1/webhooks/stripe`,
    STRIPE_FAKE_PORT: String(stripePort),
    MAIL_FAKE_SMTP_PORT: String(smtpPort),
    MAIL_FAKE_HTTP_PORT: String(mailPort),
  });
  const server = startProgram(
    `server${suffix}`,
    join(build, "server/main.js"),
    settingsOf(site, { stripe: stripeUrl, smtp: `smtp://127.0.0.1:${smtpPort}`, mail: mailUrl }),
  );
  const programs = [server, fakes];
  const stop = async () => {
    for (const program of programs) await program.stop();
  };
  try {
    await Promise.all(programs.map(({ ready }) => ready));
    await answersReady(localUrl, server.failure);
    return { url: publicUrl ?? localUrl, localUrl, mailUrl, stripeUrl, programs, stop };
  } catch (error) {
    await stop();
    throw error;
  }
}

/**
 * @param {string} url
 * @param {Promise<Error>} failure
 */
async function answersReady(url, failure) {
  const giveUpAt = Date.now() + readyMs;
  for (;;) {
    const answer = await Promise.race([fetch(`${url}/readyz`).catch(() => null), failure]);
    if (answer instanceof Error) throw answer;
    if (answer?.ok) return;
    if (Date.now() > giveUpAt) {
      throw new LaunchError(
        `${url}/readyz does not answer that it is ready: ${answer ? await answer.text() : "nothing"}`,
      );
    }
    await delay(50);
  }
}

/**
 * @param {Site} site
 * @param {{ stripe: string, smtp: string, mail: string }} addresses
 * @returns {NodeJS.ProcessEnv}
 */
function settingsOf({ build, databaseUrl, port, host = "127.0.0.1", publicUrl, dataDir, secrets }, addresses) {
  return {
    ...process.env,
    NODE_ENV: "production",
    IDLEWRIGHT_MODE: "demo",
    PORT: String(port),
    HOST: host,
    PUBLIC_URL: publicUrl ?? `http://127.0.0.1:${port}`,
    DATABASE_URL: databaseUrl,
    SESSION_SECRET: secrets.session,
    STRIPE_SECRET_KEY: secrets.paymentKey,
    STRIPE_WEBHOOK_SECRET: secrets.webhook,
    STRIPE_API_URL: addresses.stripe,
    SMTP_URL: addresses.smtp,
    MAIL_READER_URL: addresses.mail,
    CLIENT_DIR: join(build, "client"),
    DATA_DIR: dataDir,
  };
}
