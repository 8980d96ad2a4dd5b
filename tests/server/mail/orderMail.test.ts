import sharp from "sharp";
import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { queueMail } from "#server/commands/queueMail";
import { sendMail } from "#server/commands/sendMail";
import { inTransaction } from "#server/db/inTransaction";
import { Mail } from "#server/models/Mail";
import { Order } from "#server/models/Order";
import { OrderLine } from "#server/models/OrderLine";
import { Workshop } from "#server/models/Workshop";
import { checkOut, payAndApply, runJobs, sessionOf, signedInBuyer } from "#tests/server/orders/checkout";
import { buildPart, buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterEach(() => site.mail.clear());
afterAll(() => site.close());

const arrivedFor = (address: string) => site.mail.messages().filter(({ envelope }) => envelope.to.includes(address));

/** Two workshops, one of which collects tax and makes to size. */
async function paidOrder() {
  const taxed = await buildWorkshop({ tax: { DE: 1900 }, name: "Taxed Works", returnsTerms: "Clean parts only." });
  const abroad = await buildWorkshop({ country: "NO" });
  const wheel = await buildPart({
    workshopId: taxed.id,
    title: "Ground wheel",
    madeToSize: true,
    sizes: { outsideDiameter: [44.05, 0.1], bore: [4, 0.05] },
  });
  const belt = await buildPart({ workshopId: abroad.id, title: "Belt", kind: "round-belt", priceMinor: 999 });
  const { user, me } = await signedInBuyer(site, { displayName: "Ada <b>Example</b>" });
  await me.put(`/basket/lines/${wheel.id}`, { quantity: 2, forNeed: "platter idler" }).expect(200);
  await me.put(`/basket/lines/${belt.id}`, { quantity: 1 }).expect(200);
  const { body } = await checkOut(me);
  await payAndApply(site, await sessionOf(body.orderId));
  const order = await Order.findByPk(body.orderId, { rejectOnEmpty: true });
  return { order, user, taxed, abroad, wheel, belt };
}

describe("the mails of a paid order", () => {
  it("tell the buyer what, from whom, for how much, when, and how to withdraw", async () => {
    const { order, user, taxed, abroad } = await paidOrder();
    const [mail, ...more] = arrivedFor(user.email);
    expect(more).toEqual([]);
    expect(mail!.subject).toBe(`Order ${order.number} is paid`);
    expect(mail!.from).toContain("Idlewright");

    const leaves = new Intl.DateTimeFormat("en-GB", { dateStyle: "long", timeZone: "UTC" });
    const said = [
      "Ground wheel",
      "outside diameter 44.05 ±0.10 mm, bore 4.00 ±0.05 mm",
      "platter idler",
      "2 x €20.00 = €40.00",
      "1 x €9.99 = €9.99",
      "€7.00", // postage of two
      "€6.00", // postage of one
      "Tax contained (19 %)",
      "€7.50",
      "import tax and duty may be asked for on arrival",
      "€62.99",
      "EUR",
      taxed.legalName,
      ...taxed.legalAddress,
      taxed.contactEmail,
      taxed.phone,
      taxed.registration!,
      abroad.legalName,
      abroad.registration!,
      "Norway",
      "Clean parts only.",
      leaves.format(new Date(order.paidAt!.getTime() + 3 * 86_400_000)),
      "1 Workbench Row",
      "within 14 days of receiving the last part",
      "the standard postage within 14 days",
      "without this right: Ground wheel",
    ];
    for (const words of said) {
      expect(mail!.text).toContain(words);
      expect(mail!.html).toContain(words);
    }
    expect(mail!.links.filter((link) => link.startsWith(site.url))).toEqual([`${site.url}/orders/${order.id}`]);
    expect(mail!.html).toContain("Ada &lt;b&gt;Example&lt;/b&gt;");
    expect(mail!.html).not.toContain("<b>Example");
  });

  it("carry each part drawn, and work without the pictures", async () => {
    const { order, user } = await paidOrder();
    const mail = arrivedFor(user.email)[0]!;
    const lines = await OrderLine.findAll();
    const drawn = mail.attachments.filter(({ contentId }) => lines.some(({ id }) => contentId === `${id}@idlewright`));
    expect(drawn).toHaveLength(2);
    for (const { contentId, contentType, content, inline } of drawn) {
      expect([contentType, inline]).toEqual(["image/png", true]);
      expect(mail.html).toContain(`src="cid:${contentId}"`);
      const { width, channels, entropy } = await sharp(content)
        .metadata()
        .then(async ({ width, channels }) => ({
          width,
          channels,
          entropy: (await sharp(content).stats()).entropy,
        }));
      expect([width, channels]).toEqual([300, 4]);
      // A sheet with nothing on it has none.
      expect(entropy).toBeGreaterThan(0.1);
    }
    const pictures = [...mail.html!.matchAll(/<img [^>]*>/g)].map(([tag]) => tag);
    expect(pictures).toHaveLength(3);
    expect(pictures.every((tag) => / alt="/.test(tag))).toBe(true);
    expect(mail.text).toContain(order.number);
  });

  it("tell each workshop its own part, where it goes, and its share", async () => {
    const { order, taxed, abroad } = await paidOrder();
    const [mail, ...more] = arrivedFor(taxed.contactEmail);
    expect(more).toEqual([]);
    expect(mail!.subject).toBe(`New order ${order.number}`);
    // 47.00 less 8 % of 40.00.
    for (const words of ["Ground wheel", "2 pieces", "44.05 ±0.10", "1 Workbench Row", "-€3.20", "€43.80", "Germany"]) {
      expect(mail!.text).toContain(words);
    }
    expect(mail!.text).not.toContain("Belt");
    expect(mail!.text).not.toContain("€62.99");
    expect(arrivedFor(abroad.contactEmail)).toHaveLength(1);
  });
});

describe("a mail", () => {
  const verify = (cause: string, recipient: string, displayName = "Ada") =>
    inTransaction((transaction) =>
      queueMail(
        { cause, template: "verify-email", recipient, payload: { displayName, url: `${site.url}/verify-email#token` } },
        transaction,
      ),
    );
  const rowOf = (cause: string) => Mail.findOne({ where: { cause }, rejectOnEmpty: true });

  it("is queued once for its cause and sent once, whatever is repeated", async () => {
    await verify("once", "once@example.org");
    await verify("once", "once@example.org");
    await runJobs(site);
    const row = await rowOf("once");
    expect(row).toMatchObject({ state: "sent" });
    await sendMail(site.services, row.id, { lastTry: false });
    const arrived = arrivedFor("once@example.org");
    expect(arrived).toHaveLength(1);
    expect(arrived[0]).toMatchObject({ messageId: `${row.id}@127.0.0.1`, arrivals: 1 });
    expect(arrived[0]?.headers).toContainEqual({ name: "Auto-Submitted", value: "auto-generated" });
  });

  it("that the change does not commit is not sent", async () => {
    await expect(
      inTransaction(async (transaction) => {
        await queueMail(
          { cause: "undone", template: "password-changed", recipient: "x@example.org", payload: { displayName: "X" } },
          transaction,
        );
        throw new Error("undone");
      }),
    ).rejects.toThrow("undone");
    await runJobs(site);
    expect(await Mail.count({ where: { cause: "undone" } })).toBe(0);
    expect(arrivedFor("x@example.org")).toEqual([]);
  });

  it("that the server does not take stays queued with the reason, and goes out later", async () => {
    site.mail.failNext(1, { code: 451, text: "Come back later" });
    await verify("later", "later@example.org");
    await runJobs(site);
    const row = await rowOf("later");
    expect(row).toMatchObject({ state: "queued", sentAt: null, lastError: expect.stringContaining("Come back later") });
    const { rows } = await site.services.pool.query(
      "SELECT attempts, last_error FROM graphile_worker.jobs WHERE key = $1",
      [`mail:${row.id}`],
    );
    expect(rows).toEqual([{ attempts: 1, last_error: expect.stringContaining("Come back later") }]);
    await site.services.pool.query("UPDATE graphile_worker._private_jobs SET run_at = now() WHERE key = $1", [
      `mail:${row.id}`,
    ]);
    await runJobs(site);
    expect(await row.reload()).toMatchObject({ state: "sent" });
    expect(arrivedFor("later@example.org")).toHaveLength(1);
  });

  it("is marked as failed after the last try", async () => {
    site.mail.failNext(1, { code: 550, text: "Nobody here" });
    await verify("never", "never@example.org");
    const row = await rowOf("never");
    await site.services.pool.query("UPDATE graphile_worker._private_jobs SET attempts = 11 WHERE key = $1", [
      `mail:${row.id}`,
    ]);
    await runJobs(site);
    expect(await row.reload()).toMatchObject({ state: "failed", lastError: expect.stringContaining("Nobody here") });
  });

  it.each([
    ["verify-email", "Confirm this address", { displayName: "Ada", url: "http://x.example/verify-email#t" }],
    ["reset-password", "Set a new password", { displayName: "Ada", url: "http://x.example/reset-password#t" }],
    ["password-changed", "set a new password", { displayName: "Ada" }],
    ["address-in-use", "there is one: yours", { displayName: "Ada", url: "http://x.example/reset-password" }],
  ] as const)("of template %s says it in both twins, with one link", async (template, words, payload) => {
    const recipient = `${template}@example.org`;
    await inTransaction((transaction) =>
      queueMail({ cause: template, template, recipient, payload } as Parameters<typeof queueMail>[0], transaction),
    );
    await runJobs(site);
    const [mail] = arrivedFor(recipient);
    expect(mail!.text).toContain(words);
    expect(mail!.html ?? "").toContain(words);
    expect(mail!.text).toContain("Ada");
    expect(mail!.links).toHaveLength(1);
    if ("url" in payload) expect(mail!.links).toEqual([payload.url]);
  });

  it("gets no header from a name or a listing", async () => {
    const attack = "Ada\r\nBcc: stolen@example.org\r\n\r\nBody";
    await verify("attack", "attack@example.org", attack);
    const { taxed, order } = await paidOrder();
    await Workshop.update({ legalName: attack }, { where: { id: taxed.id } });
    await OrderLine.update({ title: attack }, { where: {} });
    await Order.update({ number: attack }, { where: { id: order.id } });
    await inTransaction((transaction) =>
      queueMail(
        { cause: "again", template: "order-confirmation", recipient: "b@example.org", payload: { orderId: order.id } },
        transaction,
      ),
    );
    await runJobs(site);
    for (const address of ["attack@example.org", "b@example.org"]) {
      const [mail] = arrivedFor(address);
      expect(mail!.envelope.to).toEqual([address]);
      expect(mail!.headers.map(({ name }) => name.toLowerCase())).not.toContain("bcc");
      expect(mail!.text).toContain("Ada Bcc: stolen@example.org Body");
    }
    const [second] = arrivedFor("b@example.org");
    expect(second!.subject).toBe("Order Ada Bcc: stolen@example.org Body is paid");
    expect(arrivedFor("stolen@example.org")).toEqual([]);
  });

  it("of a template that does not exist is kept with the reason", async () => {
    const row = await Mail.create({ cause: "unknown", template: "nothing", recipient: "n@example.org", payload: {} });
    await expect(sendMail(site.services, row.id, { lastTry: true })).rejects.toThrow("no mail template nothing");
    expect(await row.reload()).toMatchObject({ state: "failed", lastError: expect.stringContaining("nothing") });
  });
});
