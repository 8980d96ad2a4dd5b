import { createTransport, type SendMailOptions } from "nodemailer";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { startMailFake } from "#fakes/mail/startMailFake";

type Fake = Awaited<ReturnType<typeof startMailFake>>;

/** A one-pixel PNG. */
const PIXEL = Buffer.from(
  "iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==",
  "base64",
);

describe("the mail fake over SMTP", () => {
  let fake: Fake;
  const at = new Date("2026-12-01T09:30:00.000Z");

  beforeEach(async () => {
    fake = await startMailFake({ keep: 3, now: () => at });
  });
  afterEach(() => fake.close());

  const send = (mail: SendMailOptions) => {
    const transport = createTransport({ host: "127.0.0.1", port: fake.smtpPort, secure: false });
    return transport.sendMail({ from: "Workshop <post@example.test>", to: "ada@example.test", ...mail });
  };

  it("takes a mail apart into parts, headers, recipients and attachments", async () => {
    await send({
      to: '"Ada, restorer" <ada@example.test>, bo@example.test',
      bcc: "records@example.test",
      subject: "Order 1042: körbchen",
      text: "Follow https://shop.example.test/orders/1042. Thanks — Ö",
      html: '<p>Follow <a href="https://shop.example.test/orders/1042?a=1&amp;b=2">your order</a> <img src="cid:part@x" alt=""></p>',
      messageId: "<m1@example.test>",
      headers: { "X-Order": "1042" },
      attachments: [
        { filename: "slip.txt", content: "packing slip" },
        { filename: "part.png", content: PIXEL, cid: "part@x" },
      ],
    });

    const [mail] = fake.messages();
    expect(mail).toMatchObject({
      id: "1",
      receivedAt: at,
      messageId: "m1@example.test",
      arrivals: 1,
      subject: "Order 1042: körbchen",
      from: '"Workshop" <post@example.test>',
      to: ["Ada, restorer <ada@example.test>", "bo@example.test"],
      envelope: {
        from: "post@example.test",
        to: ["ada@example.test", "bo@example.test", "records@example.test"],
      },
      links: ["https://shop.example.test/orders/1042?a=1&b=2", "https://shop.example.test/orders/1042"],
    });
    expect(mail?.text?.trim()).toBe("Follow https://shop.example.test/orders/1042. Thanks — Ö");
    expect(mail?.html).toContain("cid:part@x");
    expect(mail?.headers).toContainEqual({ name: "X-Order", value: "1042" });
    expect(mail?.headers.some(({ name }) => name.toLowerCase() === "bcc")).toBe(false);
    expect(
      mail?.attachments.map(({ filename, contentType, contentId, inline, size }) => [
        filename,
        contentType,
        contentId,
        inline,
        size,
      ]),
    ).toEqual([
      ["part.png", "image/png", "part@x", true, PIXEL.length],
      ["slip.txt", "text/plain", null, false, 12],
    ]);
    expect(mail?.attachments[0]?.content.equals(PIXEL)).toBe(true);
  });

  it("lists the newest first, keeps as many as told and never reuses an id", async () => {
    for (const subject of ["one", "two", "three", "four"]) await send({ subject, text: subject });
    expect(fake.messages().map(({ id, subject }) => [id, subject])).toEqual([
      ["4", "four"],
      ["3", "three"],
      ["2", "two"],
    ]);

    fake.clear();
    expect(fake.messages()).toEqual([]);
    await send({ subject: "five", text: "five" });
    expect(fake.messages().map(({ id }) => id)).toEqual(["5"]);
  });

  it("counts how often one Message-ID arrived", async () => {
    await send({ subject: "a", text: "a", messageId: "<same@example.test>" });
    await send({ subject: "b", text: "b" });
    await send({ subject: "a", text: "a", messageId: "<same@example.test>" });
    expect(fake.messages().map(({ subject, arrivals }) => [subject, arrivals])).toEqual([
      ["a", 2],
      ["b", 1],
      ["a", 2],
    ]);
  });

  it("waits for a mail to come, finds one that came, and says what did when none fits", async () => {
    const coming = fake.waitFor(({ subject }) => subject === "late");
    await send({ subject: "early", text: "x" });
    await send({ subject: "late", text: "x" });
    expect((await coming).id).toBe("2");
    expect((await fake.waitFor(({ subject }) => subject === "early")).id).toBe("1");
    await expect(fake.waitFor(() => false, 1)).rejects.toThrow('No such mail within 1 ms; there are: "late", "early"');
  });

  it("ends a wait when it is closed", async () => {
    const other = await startMailFake();
    const never = expect(other.waitFor(() => true)).rejects.toThrow("closed");
    await other.close();
    await never;
  });

  it("refuses as many as it was told to, with the reply it was told, then takes mail again", async () => {
    fake.failNext(1, { code: 550, text: "No such box" });
    fake.failNext(1);
    await expect(send({ subject: "refused", text: "x" })).rejects.toMatchObject({
      responseCode: 550,
      response: "550 No such box",
    });
    await expect(send({ subject: "later", text: "x" })).rejects.toMatchObject({ responseCode: 451 });
    await send({ subject: "taken", text: "x" });
    expect(fake.messages().map(({ subject }) => subject)).toEqual(["taken"]);
  });

  it("offers neither passwords nor encryption", async () => {
    const transport = createTransport({ host: "127.0.0.1", port: fake.smtpPort, requireTLS: true });
    await expect(transport.sendMail({ from: "a@example.test", to: "b@example.test", text: "x" })).rejects.toMatchObject(
      {
        code: "ETLS",
      },
    );
  });

  it("says so when its port is taken", async () => {
    await expect(startMailFake({ smtpPort: fake.smtpPort })).rejects.toMatchObject({ code: "EADDRINUSE" });
    const httpPort = Number(new URL(fake.url).port);
    await expect(startMailFake({ httpPort })).rejects.toMatchObject({ code: "EADDRINUSE" });
  });
});
