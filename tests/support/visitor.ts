import request, { type Test } from "supertest";
import type { TestSite } from "./testSite";

/** Somebody with a browser: keeps cookies and sends the CSRF token with every unsafe call. */
export async function visitor(site: TestSite) {
  const agent = request.agent(site.url);
  let token = "";
  const refresh = async () => {
    const res = await agent.get("/api/v1/auth/session").expect(200);
    token = res.body.csrfToken;
  };
  await refresh();
  const send = (test: Test) => test.set("X-CSRF-Token", token);
  const path = (rest: string) => `/api/v1${rest}`;
  return {
    agent,
    refresh,
    get: (to: string) => agent.get(path(to)),
    post: (to: string, body: object = {}) => send(agent.post(path(to))).send(body),
    /** A POST whose body is given afterwards, whatever it is. */
    raw: (to: string) => send(agent.post(path(to))),
    put: (to: string, body: object = {}) => send(agent.put(path(to))).send(body),
    patch: (to: string, body: object = {}) => send(agent.patch(path(to))).send(body),
    delete: (to: string) => send(agent.delete(path(to))),
    async signIn(email: string, password: string) {
      await send(agent.post(path("/auth/sign-in")))
        .send({ email, password })
        .expect(200);
      await refresh();
    },
  };
}
export type Visitor = Awaited<ReturnType<typeof visitor>>;
