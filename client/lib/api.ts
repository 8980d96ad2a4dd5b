import type { Problem } from "#shared/problems";
import type { Session } from "#shared/schemas/session";
import { ApiProblem } from "./ApiProblem";
import { OfflineError } from "./OfflineError";

type Method = "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
type Options = { method?: Method; body?: unknown; signal?: AbortSignal };

let csrfToken: string | null = null;

async function send(path: string, { method = "GET", body, signal }: Options): Promise<Response> {
  const headers: Record<string, string> = { accept: "application/json" };
  if (body !== undefined && !(body instanceof FormData)) headers["content-type"] = "application/json";
  if (method !== "GET") headers["x-csrf-token"] = csrfToken ?? (await fetchSession()).csrfToken;
  const payload = body === undefined || body instanceof FormData ? body : JSON.stringify(body);
  try {
    return await fetch(`/api/v1${path}`, { method, headers, body: payload, signal, credentials: "same-origin" });
  } catch (error) {
    if (error instanceof DOMException && error.name === "AbortError") throw error;
    throw new OfflineError(error);
  }
}

async function problemOf(response: Response): Promise<ApiProblem> {
  const isProblem = response.headers.get("content-type")?.includes("problem+json");
  const read: Problem | undefined = isProblem ? await response.json().catch(() => undefined) : undefined;
  const problem = read ?? {
    type: "about:blank",
    title: "The answer could not be read",
    status: response.status,
    detail: "Idlewright answered in a way that this page does not understand. Try again in a moment.",
  };
  const retryAfter = Number(response.headers.get("retry-after") ?? Number.NaN);
  return new ApiProblem(problem, Number.isFinite(retryAfter) ? retryAfter : null);
}

/**
 * Calls the interface below /api/v1 and gives the answer's JSON, undefined for 204.
 *
 * Unsafe calls carry the session's CSRF token; where it has gone stale, it is fetched anew and the call sent once more.
 * Throws ApiProblem for every refusal, OfflineError where nobody answered.
 * The answer's type is the schema's; the server parses what it sends, so it is not parsed again here.
 */
export async function api<Answer>(path: string, options: Options = {}): Promise<Answer> {
  let response = await send(path, options);
  if (response.status === 403) {
    const problem = await problemOf(response);
    if (!problem.is("stale-page") || !options.method || options.method === "GET") throw problem;
    await fetchSession();
    response = await send(path, options);
  }
  if (!response.ok) throw await problemOf(response);
  if (response.status === 204) return undefined as Answer;
  return (await response.json()) as Answer;
}

/** Who is signed in; keeps the token that unsafe calls need. */
export async function fetchSession(signal?: AbortSignal): Promise<Session> {
  const session = await api<Session>("/auth/session", { signal });
  csrfToken = session.csrfToken;
  return session;
}

/** Takes over the token of a session that came with another answer, as sign-in and sign-out give one. */
export function keepToken(session: Session): void {
  csrfToken = session.csrfToken;
}

/** Forgets the token, so that the next unsafe call asks for one. For signing out, and for tests. */
export function forgetToken(): void {
  csrfToken = null;
}
