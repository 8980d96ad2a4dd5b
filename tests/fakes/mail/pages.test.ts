// @vitest-environment jsdom
import { createTransport, type SendMailOptions } from "nodemailer";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { startMailFake } from "#fakes/mail/startMailFake";

type Fake = Awaited<ReturnType<typeof startMailFake>>;

const HOSTILE = `<!doctype html><html><head><title>x</title></head><body>
  <script>parent.document.title = "owned"</script>
  <img src="https://tracker.example.test/pixel.gif" onerror="alert(1)">
  <img alt="part" src="cid:part%40x">
  <iframe src="cid:page@x"></iframe>
  <a href="javascript:alert(1)">run</a> <a href="https://shop.example.test/verify?t=1">verify</a>
</body></html>`;

describe("the mail fake's pages", () => {
  let fake: Fake;

  beforeEach(async () => {
    fake = await startMailFake({ now: () => new Date("2026-12-01T09:30:00.000Z") });
  });
  afterEach(() => fake.close());

  const send = (mail: SendMailOptions) =>
    createTransport({ host: "127.0.0.1", port: fake.smtpPort }).sendMail({
      from: "post@example.test",
      to: "ada@example.test",
      ...mail,
    });

  const page = async (path: string) => {
    const res = await fetch(fake.url + path);
    return { res, document: new DOMParser().parseFromString(await res.text(), "text/html") };
  };

  const sendHostile = () =>
    send({
      subject: '<img src=x onerror="alert(1)">',
      text: "<script>alert(2)</script> read me",
      html: HOSTILE,
      attachments: [
        { filename: "part.png", content: Buffer.from("png"), contentType: "image/png", cid: "part@x" },
        { filename: "page.html", content: "<script>1</script>", contentType: "text/html", cid: "page@x" },
      ],
    });

  it("lists what came: whom to, what about, when, and how often", async () => {
    await send({ subject: "First", text: "x", messageId: "<twice@example.test>" });
    await send({ subject: "First", text: "x", messageId: "<twice@example.test>" });
    await send({ to: "bo@example.test", subject: "Second", text: "x" });

    const { res, document } = await page("/");
    expect(res.headers.get("content-security-policy")).toContain("default-src 'none'");
    expect(document.documentElement.lang).toBe("en");
    expect(document.querySelectorAll("h1")).toHaveLength(1);
    expect(document.querySelectorAll("script")).toHaveLength(0);
    const items = [...document.querySelectorAll(".mails li")].map((li) => li.textContent?.replace(/\s+/g, " ").trim());
    expect(items).toEqual([
      "Second To bo@example.test 2026-12-01 09:30:00 UTC",
      "First To ada@example.test 2026-12-01 09:30:00 UTC This Message-ID arrived 2 times",
      "First To ada@example.test 2026-12-01 09:30:00 UTC This Message-ID arrived 2 times",
    ]);
  });

  it("shows a hostile mail as text, and its HTML only in a sandboxed frame", async () => {
    await sendHostile();
    for (const path of ["/", "/messages/1"]) {
      const { document } = await page(path);
      expect(document.querySelectorAll("script, img, [onerror]")).toHaveLength(0);
      expect(document.body.textContent).toContain('<img src=x onerror="alert(1)">');
    }

    const { document } = await page("/messages/1");
    const frame = document.querySelector("iframe");
    expect(frame?.getAttribute("sandbox")?.split(" ")).toEqual(["allow-popups", "allow-popups-to-escape-sandbox"]);
    expect(frame?.getAttribute("src")).toBe("/messages/1/html");
    expect(frame?.title).toBe("HTML part of the mail");
    expect(document.querySelector("pre")?.textContent).toContain("<script>alert(2)</script> read me");
    const links = [...document.querySelectorAll("main ul a[rel]")].map((a) => a.getAttribute("href"));
    expect(links).toEqual(["https://shop.example.test/verify?t=1"]);
  });

  it("serves the HTML part under a policy that lets it run and fetch nothing", async () => {
    await sendHostile();
    const { res, document } = await page("/messages/1/html");
    const policy = (res.headers.get("content-security-policy") ?? "").split("; ");
    expect(policy).toContain("sandbox allow-popups allow-popups-to-escape-sandbox");
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("img-src data:");
    expect(policy.join()).not.toContain("script");
    expect(res.headers.get("x-content-type-options")).toBe("nosniff");

    const png = `data:image/png;base64,${Buffer.from("png").toString("base64")}`;
    expect(document.querySelector('img[alt="part"]')?.getAttribute("src")).toBe(png);
    expect(document.querySelector("iframe")?.getAttribute("src")).toBe("cid:page@x");
    expect(document.querySelector("head base")?.getAttribute("target")).toBe("_blank");
    expect(document.compatMode).toBe("CSS1Compat");
  });

  it("hands attachments out for saving only", async () => {
    await sendHostile();
    const res = await fetch(`${fake.url}/messages/1/attachments/1`);
    expect(res.headers.get("content-disposition")).toBe("attachment; filename=page.html");
    expect(res.headers.get("content-type")).toBe("application/octet-stream");
    expect(res.headers.get("content-security-policy")).toContain("sandbox");
    expect(await res.text()).toBe("<script>1</script>");
  });

  it("answers JSON for programs", async () => {
    await send({ subject: "Read by a test", text: "https://shop.example.test/a" });
    const list = await (await fetch(`${fake.url}/messages.json`)).json();
    expect(list).toMatchObject([{ id: "1", subject: "Read by a test", to: ["ada@example.test"], arrivals: 1 }]);
    const mail = await (await fetch(`${fake.url}/messages/1.json`)).json();
    expect(mail).toMatchObject({ links: ["https://shop.example.test/a"], html: null, attachments: [] });
    expect((await fetch(`${fake.url}/messages/1.json`)).headers.get("content-type")).toContain("application/json");
  });

  it("clears from its own button and from programs, not from another site or from inside a mail", async () => {
    await send({ subject: "x", text: "x" });
    const post = (origin?: string) =>
      fetch(`${fake.url}/clear`, { method: "POST", redirect: "manual", headers: origin ? { Origin: origin } : {} });

    expect((await post("https://elsewhere.example.test")).status).toBe(403);
    expect((await post("null")).status).toBe(403);
    expect(fake.messages()).toHaveLength(1);

    const { res, document } = await page("/");
    // With "no-referrer" browsers send the form with origin "null", which is refused above.
    expect(res.headers.get("referrer-policy")).toBe("same-origin");
    const form = document.querySelector("form");
    expect([form?.method, form?.getAttribute("action"), form?.querySelector("button")?.textContent]).toEqual([
      "post",
      "/clear",
      "Clear all mail",
    ]);
    const cleared = await post(fake.url);
    expect([cleared.status, cleared.headers.get("location")]).toEqual([303, "/"]);
    expect(fake.messages()).toEqual([]);

    await send({ subject: "y", text: "y" });
    expect((await fetch(`${fake.url}/messages`, { method: "DELETE" })).status).toBe(204);
    expect(fake.messages()).toEqual([]);
  });

  it("answers a plain 404 for what is not there", async () => {
    for (const path of ["/messages/9", "/messages/9.json", "/messages/9/html", "/messages/9/attachments/0", "/else"]) {
      expect((await fetch(fake.url + path)).status).toBe(404);
    }
    const { document } = await page("/");
    expect(document.querySelector("main")?.textContent).toContain("No mail has come in yet.");
  });
});
