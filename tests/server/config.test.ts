import { describe, expect, it } from "vitest";
import { readConfig } from "#server/config";

const live = {
  IDLEWRIGHT_MODE: "production",
  PUBLIC_URL: "https://idlewright.example",
  DATABASE_URL: "postgres://app@db/idlewright",
  SESSION_SECRET: "a secret that is long enough for this",
  STRIPE_SECRET_KEY: "sk_live_x",
  STRIPE_WEBHOOK_SECRET: "whsec_x",
  SMTP_URL: "smtps://mail.example",
};

describe("settings of production", () => {
  it("are taken where nothing is a stand-in", () => {
    expect(readConfig(live)).toMatchObject({ mode: "production", secureCookies: true });
  });

  it.each([
    ["the payment stand-in", { STRIPE_API_URL: "http://127.0.0.1:1" }, /STRIPE_API_URL/],
    ["the mail stand-in", { MAIL_READER_URL: "http://127.0.0.1:1" }, /MAIL_READER_URL/],
    ["a test key", { STRIPE_SECRET_KEY: "sk_test_x" }, /STRIPE_SECRET_KEY/],
    ["plain http", { PUBLIC_URL: "http://idlewright.example" }, /https/],
    ["a short secret", { SESSION_SECRET: "short" }, /SESSION_SECRET/],
    ["no database", { DATABASE_URL: "" }, /DATABASE_URL/],
  ])("ASVS 15.2.3: refuse %s", (_what, change, words) => {
    expect(() => readConfig({ ...live, ...change })).toThrow(words);
  });

  it("are what is meant where nothing is said", () => {
    const { IDLEWRIGHT_MODE: _, ...unsaid } = live;
    expect(readConfig(unsaid).mode).toBe("production");
  });
});
