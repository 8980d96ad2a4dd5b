import { startMailFake } from "./mail/startMailFake";
import { startMeilisearchFake } from "./meilisearch/startMeilisearchFake";
import { startStripeFake } from "./stripe/startStripeFake";

/**
 * Starts the stand-ins for other people's services in one process, prints a line for each address, and stops them on
 * SIGTERM, SIGINT, or when the process that started this one goes away. A parent with an IPC channel is sent
 * `{ ready: true, addresses }` once all of them listen. Exits with 1, and a line on stderr, if any cannot start.
 *
 * STRIPE_SECRET_KEY, STRIPE_WEBHOOK_SECRET    needed
 * STRIPE_WEBHOOK_URL                          where events go; nowhere unless set
 * STRIPE_FAKE_PORT, MAIL_FAKE_SMTP_PORT,
 * MAIL_FAKE_HTTP_PORT                         a free port each unless set
 * MEILI_FAKE_PORT                             the search stand-in is left out unless set; 0 is a free port
 * MEILI_API_KEY                               the only key it lets in; everybody unless set
 */
type Running = { name: string; addresses: Record<string, string>; close(): Promise<void> };

const starters: (() => Promise<Running>)[] = [
  startPayments,
  startMail,
  ...(env("MEILI_FAKE_PORT") ? [startSearch] : []),
];

async function startPayments(): Promise<Running> {
  const fake = await startStripeFake({
    port: port("STRIPE_FAKE_PORT"),
    webhookUrl: env("STRIPE_WEBHOOK_URL"),
    webhookSecret: needed("STRIPE_WEBHOOK_SECRET"),
    apiKey: needed("STRIPE_SECRET_KEY"),
    tickMs: 5_000,
  });
  return { name: "Payments", addresses: { stripe: fake.url }, close: () => fake.close() };
}

async function startMail(): Promise<Running> {
  const fake = await startMailFake({ smtpPort: port("MAIL_FAKE_SMTP_PORT"), httpPort: port("MAIL_FAKE_HTTP_PORT") });
  const smtp = `smtp://127.0.0.1:${fake.smtpPort}`;
  return { name: "Mail", addresses: { smtp, mail: fake.url }, close: () => fake.close() };
}

async function startSearch(): Promise<Running> {
  const fake = await startMeilisearchFake({ port: port("MEILI_FAKE_PORT"), apiKey: env("MEILI_API_KEY") });
  return { name: "Search", addresses: { meilisearch: fake.url }, close: () => fake.close() };
}

/** An empty variable counts as not set. */
function env(name: string): string | undefined {
  return process.env[name] || undefined;
}

function needed(name: string): string {
  const value = env(name);
  if (value === undefined) throw new Error(`Set ${name} to start the stand-ins.`);
  return value;
}

function port(name: string): number {
  const value = Number(env(name) ?? 0);
  if (Number.isInteger(value) && value >= 0 && value <= 65_535) return value;
  throw new Error(`${name} must be a port number from 0 to 65535.`);
}

const running: Running[] = [];
let stopping = false;

async function stop(exitCode: number): Promise<void> {
  if (stopping) return;
  stopping = true;
  await Promise.allSettled(running.map((fake) => fake.close()));
  process.exit(exitCode);
}

for (const event of ["SIGTERM", "SIGINT", "disconnect"] as const) {
  process.once(event, () => void stop(0));
}

try {
  for (const start of starters) running.push(await start());
  const addresses = Object.assign({}, ...running.map((fake) => fake.addresses)) as Record<string, string>;
  for (const fake of running) process.stdout.write(`${fake.name}: ${Object.values(fake.addresses).join("  ")}\n`);
  process.send?.({ ready: true, addresses });
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  await stop(1);
}
