import { configure } from "@testing-library/react";
import { afterEach, vi } from "vitest";
import { type FieldError, type ProblemName, problems, problemType } from "#shared/problems";
import { forgetToken } from "../../../client/lib/api";

// Whole pages with drawings on a machine that is busy with other suites: room, not a wait.
configure({ asyncUtilTimeout: 5_000 });
vi.setConfig({ testTimeout: 30_000 });

export type Call = { method: string; path: string; query: URLSearchParams; body: unknown };
export type Answer = { status: number; body: unknown };
export type Routes = Record<string, (call: Call) => Answer | Promise<Answer>>;

export const ok = (body: unknown, status = 200): Answer => ({ status, body });

export function refused(name: ProblemName, detail: string = problems[name].title, errors?: FieldError[]): Answer {
  const { status, title } = problems[name];
  return { status, body: { type: problemType(name), title, status, detail, ...(errors ? { errors } : {}) } };
}

/** An answer that comes when the test lets it. */
export function held<T>() {
  let give: (value: T) => void = () => {};
  const promise = new Promise<T>((resolve) => {
    give = resolve;
  });
  return { promise, give };
}

/** Nobody answers. */
export const unreachable = (): never => {
  throw new TypeError("Failed to fetch");
};

/**
 * Stands in for the server of one test: routes by "GET /basket", the most exact first by their order. Keeps every call.
 * What no route answers fails the test with a 404 that names it.
 */
export function stubApi(routes: Routes): Call[] {
  const calls: Call[] = [];
  const stub = async (input: string, init: RequestInit = {}): Promise<Response> => {
    const url = new URL(input, "http://localhost");
    const path = url.pathname.replace("/api/v1", "");
    const method = init.method ?? "GET";
    const body: unknown = typeof init.body === "string" ? JSON.parse(init.body) : undefined;
    const call = { method, path, query: url.searchParams, body };
    calls.push(call);
    const route = routes[`${method} ${path}`];
    const answer = route ? await route(call) : refused("not-found", `The test has no answer to ${method} ${path}`);
    const type = answer.status >= 400 ? "application/problem+json" : "application/json";
    return new Response(JSON.stringify(answer.body), { status: answer.status, headers: { "content-type": type } });
  };
  vi.stubGlobal("fetch", vi.fn(stub));
  return calls;
}

afterEach(() => {
  vi.unstubAllGlobals();
  forgetToken();
});
