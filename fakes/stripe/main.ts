import { startStripeFake } from "./startStripeFake";

/** The stand-in on its own, for the demo. Settings come from the environment; prints its address once it listens. */
function needed(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`Set ${name} to start the payment stand-in.`);
  return value;
}

const webhookUrl = process.env.STRIPE_WEBHOOK_URL;
const fake = await startStripeFake({
  port: Number(process.env.STRIPE_FAKE_PORT ?? 0),
  webhookSecret: needed("STRIPE_WEBHOOK_SECRET"),
  apiKey: needed("STRIPE_SECRET_KEY"),
  tickMs: 5_000,
  ...(webhookUrl ? { webhookUrl } : {}),
});
process.stdout.write(`Payment stand-in at ${fake.url}\n`);

for (const signal of ["SIGINT", "SIGTERM"] as const) {
  process.once(signal, () => {
    void fake.close().then(() => process.exit(0));
  });
}
