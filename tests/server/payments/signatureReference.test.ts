import { createHmac } from "node:crypto";
import Stripe from "stripe";
import { describe, expect, it } from "vitest";
import cases from "../../reference/webhookSignature.json";

/*
 * Signatures of payment events against reference cases, by the provider's own library as the server calls it, and by the
 * construction that the stand-in signs with: HMAC-SHA256 over `t.payload`. Source and status stand beside each case.
 */
const { webhooks } = new Stripe("sk_test_suite");
const caseOf = (id: string) => {
  const found = cases.find((one) => one.id.startsWith(id));
  if (!found) throw new Error(`no case ${id}`);
  const { inputs, expected } = found as { inputs: Record<string, unknown>; expected: Record<string, unknown> };
  return { inputs, expected };
};
const [secret, payload] = [String(caseOf("hook-07").inputs.secret), String(caseOf("hook-07").inputs.payload)];
const signatureOf = (key: string, text: string) => createHmac("sha256", key).update(text).digest("hex");

/** Whether the library takes a payload with its header at a moment, in seconds. */
function accepts(header: string, now: number, tolerance = 300): boolean {
  try {
    webhooks.constructEvent(payload, header, secret, tolerance, undefined, now * 1000);
    return true;
  } catch (error) {
    if (error instanceof Stripe.errors.StripeSignatureVerificationError) return false;
    throw error;
  }
}
const headerAt = (t: number) => `t=${t},v1=${signatureOf(secret, `${t}.${payload}`)}`;

describe("signatures of payment events", () => {
  it.each(["hook-01", "hook-02", "hook-03"])("%s is signed as the provider signs", (id) => {
    const { inputs, expected } = caseOf(id);
    const given = {
      payload: String(inputs.payload),
      secret: String(inputs.secret),
      timestamp: Number(inputs.timestamp),
    };
    expect(signatureOf(given.secret, `${given.timestamp}.${given.payload}`)).toBe(expected.v1);
    const header = webhooks.generateTestHeaderString(given);
    expect(header).toContain(`v1=${String(expected.v1)}`);
    expect(webhooks.constructEvent(given.payload, header, given.secret, 1e10)).toEqual(JSON.parse(given.payload));
  });

  it.each(["hook-04", "hook-05"])("%s: its age decides, to the second", (id) => {
    const { inputs, expected } = caseOf(id);
    const header = headerAt(Number(inputs.timestamp));
    expect(accepts(header, Number(inputs.now), Number(inputs.tolerance_s))).toBe(expected.accept);
  });

  it("hook-06: another scheme is no signature", () => {
    const { inputs, expected } = caseOf("hook-06");
    expect(accepts(String(inputs.header), 1_700_000_000)).toBe(expected.accept);
  });

  it("hook-07: one right signature among several is enough, and a changed one is not", () => {
    const { inputs, expected } = caseOf("hook-07");
    const header = String(inputs.header);
    expect(accepts(header, 1_700_000_010)).toBe(expected.accept_if_within_tolerance);
    expect(accepts(header.slice(0, -1).concat("0"), 1_700_000_010)).toBe(false);
  });

  it("hook-08 (from memory): only the signatures of scheme v1 are looked at", () => {
    const { inputs, expected } = caseOf("hook-08");
    // Its secret is not given: what can be seen is that its own signatures are not taken for ours, and a third one is.
    const t = Number(expected.timestamp);
    expect(accepts(String(inputs.header), t)).toBe(false);
    expect(accepts(`${String(inputs.header)},v1=${signatureOf(secret, `${t}.${payload}`)}`, t)).toBe(true);
  });

  it("hook-09 (from memory): the hash is that of RFC 4231, test case 2", () => {
    const { inputs, expected } = caseOf("hook-09");
    expect(signatureOf(String(inputs.key), String(inputs.data))).toBe(expected.hmac_sha256_hex);
  });
});
