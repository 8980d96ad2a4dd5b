import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { Mail } from "#server/models/Mail";
import { User } from "#server/models/User";
import { buildUser, testPassword } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const goodPassword = "a long walk by the canal";

/** The token that a queued mail carries in its link. */
async function tokenFor(email: string, template: string): Promise<string> {
  const mail = await Mail.findOne({
    where: { recipient: email, template },
    order: [["createdAt", "DESC"]],
    rejectOnEmpty: true,
  });
  return (mail.payload as { url: string }).url.split("#")[1] ?? "";
}

describe("sign-up", () => {
  it("opens an account, mails a link, and the link confirms the address once", async () => {
    const someone = await visitor(site);
    await someone
      .post("/auth/sign-up", { email: "new@example.org", password: goodPassword, displayName: "New" })
      .expect(201);
    await someone.signIn("new@example.org", goodPassword);
    expect((await someone.get("/auth/session")).body.user).toMatchObject({ role: "restorer", emailVerified: false });

    const token = await tokenFor("new@example.org", "verify-email");
    await someone.post("/auth/verify-email", { token }).expect(204);
    expect((await someone.get("/auth/session")).body.user.emailVerified).toBe(true);
    await someone.post("/auth/verify-email", { token }).expect(404);
  });

  it("answers the same for an address that has an account, and tells its owner by mail", async () => {
    const owner = await buildUser();
    const someone = await visitor(site);
    const res = await someone.post("/auth/sign-up", { email: owner.email, password: goodPassword, displayName: "X" });
    expect(res.status).toBe(201);
    expect(res.body).toEqual({ email: owner.email });
    expect(await Mail.count({ where: { recipient: owner.email, template: "address-in-use" } })).toBe(1);
    expect(await User.count({ where: { email: owner.email } })).toBe(1);
  });

  it.each([
    ["ASVS 6.2.1: under 15 characters", "short password", "#/password"],
    ["ASVS 6.2.4: often used", "1qaz2wsx3edc4rfv", "#/password"],
    ["a short word repeated", "abcabcabcabcabcabc", "#/password"],
    ["made of the own address", "someperson someperson", "#/password"],
  ])("refuses a password %s", async (_why, password, pointer) => {
    const someone = await visitor(site);
    const res = await someone.post("/auth/sign-up", { email: "someperson@example.org", password, displayName: "Y" });
    expect(res.status).toBe(422);
    expect(res.body.errors[0].pointer).toBe(pointer);
  });

  it("ASVS 6.2.5, 6.2.9, 6.2.8: takes spaces, emoji and 100 characters, and all of them count", async () => {
    const password = `${"walk the dog 🐕 ".repeat(6)}and the last sign counts!`;
    const someone = await visitor(site);
    await someone.post("/auth/sign-up", { email: "long@example.org", password, displayName: "L" }).expect(201);
    await someone.post("/auth/sign-in", { email: "long@example.org", password: password.slice(0, -1) }).expect(401);
    await someone.signIn("long@example.org", password);
  });

  it("ASVS 11.4.2: keeps argon2id at no less than the parameters asked for", async () => {
    const someone = await visitor(site);
    await someone
      .post("/auth/sign-up", { email: "hash@example.org", password: goodPassword, displayName: "H" })
      .expect(201);
    const user = await User.findOne({ where: { email: "hash@example.org" }, rejectOnEmpty: true });
    const [, memory, passes] = /^\$argon2id\$v=19\$m=(\d+),t=(\d+),p=\d+\$/.exec(user.passwordHash) ?? [];
    expect(Number(memory)).toBeGreaterThanOrEqual(47_104);
    expect(Number(passes)).toBeGreaterThanOrEqual(2);
  });

  it("ASVS 15.3.3: does not let a role be posted", async () => {
    const someone = await visitor(site);
    const body = { email: "role@example.org", password: goodPassword, displayName: "R", role: "administrator" };
    await someone.post("/auth/sign-up", body).expect(201);
    expect((await User.findOne({ where: { email: "role@example.org" } }))?.role).toBe("restorer");
  });
});

describe("sign-in and out", () => {
  it("ASVS 6.3.8: says the same of a wrong password and of an unknown address", async () => {
    const user = await buildUser();
    const someone = await visitor(site);
    const wrong = await someone.post("/auth/sign-in", { email: user.email, password: "not the password" });
    const unknown = await someone.post("/auth/sign-in", { email: "nobody@example.org", password: "not the password" });
    expect(wrong.status).toBe(401);
    expect(unknown.status).toBe(401);
    expect(unknown.body).toEqual(wrong.body);
    expect(wrong.type).toBe("application/problem+json");
  });

  it("ASVS 7.2.4, 7.4.1: makes a new session at sign-in, and kills it at sign-out", async () => {
    const user = await buildUser();
    const someone = await visitor(site);
    const before = (await someone.get("/auth/session")).headers["set-cookie"] ?? [];
    const res = await someone.post("/auth/sign-in", { email: user.email, password: testPassword }).expect(200);
    const cookie = String(res.headers["set-cookie"]);
    expect(cookie).toMatch(/HttpOnly/);
    expect(cookie).toMatch(/SameSite=Lax/);
    expect(cookie.split(";")[0]).not.toBe(String(before).split(";")[0]);
    await someone.refresh();
    await someone.post("/auth/sign-out").expect(204);
    const stolen = await visitor(site);
    const after = await stolen.agent.get("/api/v1/auth/session").set("Cookie", cookie.split(";")[0] ?? "");
    expect(after.body.user).toBeNull();
  });

  it("ASVS 7.4.2: a disabled account is out at once", async () => {
    const user = await buildUser();
    const someone = await visitor(site);
    await someone.signIn(user.email, testPassword);
    await user.update({ disabledAt: new Date() });
    expect((await someone.get("/auth/session")).body.user).toBeNull();
  });

  it("ASVS 3.5.1: refuses an unsafe call without the token, with a wrong one, and from another site", async () => {
    const user = await buildUser();
    const someone = await visitor(site);
    const body = { email: user.email, password: testPassword };
    await someone.agent.post("/api/v1/auth/sign-in").send(body).expect(403);
    await someone.agent.post("/api/v1/auth/sign-in").set("X-CSRF-Token", "x".repeat(43)).send(body).expect(403);
    await someone.post("/auth/sign-in", body).set("Origin", "https://elsewhere.example").expect(403);
    await someone.post("/auth/sign-in", body).set("Sec-Fetch-Site", "cross-site").expect(403);
    const form = await someone.agent.post("/api/v1/auth/sign-in").type("form").send(body);
    expect(form.status).toBe(403);
  });
});

describe("passwords", () => {
  it("are reset by a link that works once; every session ends and the owner is told", async () => {
    const user = await buildUser();
    const signedIn = await visitor(site);
    await signedIn.signIn(user.email, testPassword);
    const someone = await visitor(site);
    await someone.post("/auth/request-password-reset", { email: user.email }).expect(204);
    await someone.post("/auth/request-password-reset", { email: "nobody@example.org" }).expect(204);
    const token = await tokenFor(user.email, "reset-password");
    const reset = { token, newPassword: goodPassword };
    await someone.post("/auth/reset-password", { ...reset, newPassword: "short" }).expect(422);
    await someone.post("/auth/reset-password", reset).expect(204);
    await someone.post("/auth/reset-password", reset).expect(404);
    expect((await signedIn.get("/auth/session")).body.user).toBeNull();
    expect(await Mail.count({ where: { recipient: user.email, template: "password-changed" } })).toBe(1);
    await someone.signIn(user.email, goodPassword);
  });

  it("ASVS 6.2.3, 7.4.3: are changed only with the present one, and other sessions end", async () => {
    const user = await buildUser();
    const [here, elsewhere] = [await visitor(site), await visitor(site)];
    await here.signIn(user.email, testPassword);
    await elsewhere.signIn(user.email, testPassword);
    const refused = await here.post("/auth/change-password", { currentPassword: "wrong", newPassword: goodPassword });
    expect(refused.status).toBe(422);
    expect(refused.body.errors[0].pointer).toBe("#/currentPassword");
    await here.post("/auth/change-password", { currentPassword: testPassword, newPassword: goodPassword }).expect(204);
    expect((await here.get("/auth/session")).body.user.email).toBe(user.email);
    expect((await elsewhere.get("/auth/session")).body.user).toBeNull();
  });

  it("are not asked for by the signed-out", async () => {
    const someone = await visitor(site);
    await someone.post("/auth/change-password", { currentPassword: "a", newPassword: goodPassword }).expect(401);
  });
});
