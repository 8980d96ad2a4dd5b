import { z } from "zod";

const Env = z.object({
  IDLEWRIGHT_MODE: z.enum(["demo", "test", "production"]).default("production"),
  PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
  HOST: z.string().default("127.0.0.1"),
  PUBLIC_URL: z.url().optional(),
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  SESSION_SECRET: z.string().min(32, "at least 32 characters"),
  STRIPE_SECRET_KEY: z.string().min(1),
  STRIPE_WEBHOOK_SECRET: z.string().min(1),
  STRIPE_API_URL: z.url().optional(),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }),
  MAIL_FROM: z.string().default("Idlewright <post@idlewright.example>"),
  MAIL_READER_URL: z.url().optional(),
  MEILI_URL: z.url().optional(),
  MEILI_API_KEY: z.string().optional(),
  DATA_DIR: z.string().default(".data/store"),
  TRUST_PROXY: z.coerce.number().int().min(0).max(5).default(0),
  LOG_LEVEL: z.enum(["silent", "error", "warn", "info", "debug"]).default("info"),
});

export type Config = ReturnType<typeof readConfig>;

/**
 * Settings from the environment, checked once at the start.
 *
 * Errors: throws with every wrong setting named. Production refuses stand-ins for other people's services, since
 *         a stand-in that takes orders would ship parts that nobody paid for.
 */
export function readConfig(env: NodeJS.ProcessEnv) {
  const read = Env.safeParse(Object.fromEntries(Object.entries(env).filter(([, value]) => value !== "")));
  if (!read.success) throw new Error(`The settings are not right:\n${z.prettifyError(read.error)}`);
  const settings = read.data;
  const mode = settings.IDLEWRIGHT_MODE;
  const publicUrl = new URL(settings.PUBLIC_URL ?? `http://127.0.0.1:${settings.PORT}`);

  if (mode === "production") {
    const wrong = [
      settings.STRIPE_API_URL && "STRIPE_API_URL: the payment stand-in is for demo and test",
      settings.MAIL_READER_URL && "MAIL_READER_URL: the mail stand-in is for demo and test",
      !settings.STRIPE_SECRET_KEY.startsWith("sk_live_") && "STRIPE_SECRET_KEY: a live key is needed",
      publicUrl.protocol !== "https:" && "PUBLIC_URL: production is served over https",
    ].filter((problem) => typeof problem === "string");
    if (wrong.length > 0) throw new Error(`The settings are not right for production:\n${wrong.join("\n")}`);
  }

  return {
    mode,
    port: settings.PORT,
    host: settings.HOST,
    publicUrl: publicUrl.origin,
    secureCookies: publicUrl.protocol === "https:",
    trustProxy: settings.TRUST_PROXY,
    databaseUrl: settings.DATABASE_URL,
    sessionSecret: settings.SESSION_SECRET,
    stripe: {
      secretKey: settings.STRIPE_SECRET_KEY,
      webhookSecret: settings.STRIPE_WEBHOOK_SECRET,
      apiUrl: settings.STRIPE_API_URL,
    },
    mail: { smtpUrl: settings.SMTP_URL, from: settings.MAIL_FROM, readerUrl: settings.MAIL_READER_URL },
    meili: settings.MEILI_URL ? { url: settings.MEILI_URL, apiKey: settings.MEILI_API_KEY } : undefined,
    dataDir: settings.DATA_DIR,
    logLevel: settings.LOG_LEVEL,
  };
}
