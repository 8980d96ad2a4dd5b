import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { moneyText } from "#fakes/stripe/payPage";
import { type Bench, openBench, orderParams } from "./bench";

describe("the hosted payment page", () => {
  let bench: Bench;
  let id: string;
  beforeEach(async () => {
    bench = await openBench();
    id = (await bench.stripe.checkout.sessions.create(orderParams())).id;
  });
  afterEach(() => bench.close());

  const at = (path: string) => `${bench.fake.url}/pay/${path}`;
  const see = async (path = id) => {
    const res = await fetch(at(path));
    return { status: res.status, text: await res.text() };
  };
  const press = async (button: "pay" | "decline" | "leave") => {
    const res = await fetch(at(`${id}/${button}`), { method: "POST", redirect: "manual" });
    return { status: res.status, location: res.headers.get("location"), text: await res.text() };
  };

  it("says what it is, what is paid and what can be done", async () => {
    const { status, text } = await see();
    expect(status).toBe(200);
    expect(text).toContain('<html lang="en">');
    expect(text).toContain("No card is asked, no money moves.");
    expect(text).toContain("order-7");
    expect(text).toContain(moneyText(2990, "eur"));
    expect(text).toContain("Idler wheel &lt;44 mm&gt;");
    expect(text.match(/<button/g)).toHaveLength(3);
    expect(text).not.toContain("<script");
    expect(text).not.toContain("was refused");
  });

  it("takes the payment and goes to the shop", async () => {
    const { status, location } = await press("pay");
    expect([status, location]).toEqual([303, `http://shop.test/orders/7?session=${id}&done=1`]);
    expect((await bench.stripe.checkout.sessions.retrieve(id)).payment_status).toBe("paid");
  });

  it("shows a refusal and takes the payment afterwards", async () => {
    expect(await press("decline")).toMatchObject({ status: 303, location: `/pay/${id}` });
    const { status, text } = await see();
    expect(status).toBe(200);
    expect(text).toContain("The card was refused.");
    expect(bench.fake.control.events("payment_intent.payment_failed")).toHaveLength(1);
    expect((await press("pay")).status).toBe(303);
    expect((await bench.stripe.checkout.sessions.retrieve(id)).status).toBe("complete");
  });

  it("lets the buyer leave and changes nothing", async () => {
    const { status, location } = await press("leave");
    expect([status, location]).toEqual([303, `http://shop.test/basket?from=${id}`]);
    expect(await bench.stripe.checkout.sessions.retrieve(id)).toMatchObject({ status: "open", payment_intent: null });
  });

  it("offers no way back where there is none", async () => {
    const { cancel_url: _, ...params } = orderParams();
    const other = await bench.stripe.checkout.sessions.create(params);
    expect((await see(other.id)).text.match(/<button/g)).toHaveLength(2);
  });

  it("takes no second payment", async () => {
    await press("pay");
    const again = await press("pay");
    expect(again.status).toBe(409);
    expect(again.text).toContain("Already paid");
    expect((await see()).text).toContain(`http://shop.test/orders/7?session=${id}&amp;done=1`);
    expect((await bench.stripe.charges.list()).data).toHaveLength(1);
  });

  it("takes no payment once the session has expired", async () => {
    bench.fake.control.advanceClock(86_400);
    expect((await see()).status).toBe(410);
    const late = await press("pay");
    expect(late.status).toBe(410);
    expect(late.text).toContain("Payment expired");
    expect((await bench.stripe.charges.list()).data).toEqual([]);
  });

  it("knows nothing of other addresses", async () => {
    const { status, text } = await see("cs_test_none");
    expect(status).toBe(404);
    expect(text).toContain("No such payment");
    expect((await fetch(`${bench.fake.url}/other`)).status).toBe(404);
  });

  it("brings its style and lets no script in", async () => {
    const page = await fetch(at(id));
    expect(page.headers.get("content-security-policy")).toContain("default-src 'none'");
    const style = await fetch(`${bench.fake.url}/pay.css`);
    expect(style.headers.get("content-type")).toContain("text/css");
  });

  it.each([
    [2990, "eur", "EUR 29.90"],
    [500, "jpy", "JPY 500"],
    [-1, "eur", "-EUR 0.01"],
  ])("writes %i %s as %s", (amount, currency, written) => {
    expect(moneyText(amount, currency).replace(/\u00a0/g, " ")).toBe(written);
  });
});
