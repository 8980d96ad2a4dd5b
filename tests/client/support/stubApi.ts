import { vi } from "vitest";

type Call = { method: string; path: string; query: URLSearchParams; body: unknown };
type Reply = { status?: number; body: unknown } | "offline" | "never";
export type Answers = Record<string, (call: Call) => Reply>;

const usual: Answers = {
  "/auth/session": () => ({ body: { user: null, csrfToken: "token" } }),
  "/families": () => ({ body: { items: [] } }),
  "/countries": () => ({
    body: {
      items: [
        { code: "DE", name: "Germany" },
        { code: "NO", name: "Norway" },
      ],
    },
  }),
  "/basket": () => ({ body: { count: 0, parcels: [] } }),
};

/** Answers fetch from these by path below /api/v1, and keeps every call. Anything not named is a failed test. */
export function stubApi(answers: Answers): Call[] {
  const calls: Call[] = [];
  const all = { ...usual, ...answers };
  vi.stubGlobal("fetch", async (input: string, init: RequestInit = {}) => {
    const url = new URL(input, "http://idlewright.example");
    const path = url.pathname.replace("/api/v1", "");
    const body = typeof init.body === "string" ? JSON.parse(init.body) : undefined;
    const call: Call = { method: init.method ?? "GET", path, query: url.searchParams, body };
    calls.push(call);
    const answer = all[path] ?? all[`${call.method} ${path}`];
    if (!answer) throw new Error(`The test does not answer ${call.method} ${path}`);
    const reply = answer(call);
    if (reply === "offline") throw new TypeError("Failed to fetch");
    if (reply === "never") return new Promise<Response>(() => {});
    const { status = 200 } = reply;
    const type = status < 400 ? "application/json" : "application/problem+json";
    return new Response(JSON.stringify(reply.body), { status, headers: { "content-type": type } });
  });
  return calls;
}
