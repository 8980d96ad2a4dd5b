/**
 * What one tab keeps of a checkout until its order is settled, so that a double click, the back button and a reload give one
 * order and lose nothing typed. It lives in session storage: it ends with the tab, and belongs to one account.
 */
const attemptKey = "idlewright-checkout";
const draftKey = "idlewright-checkout-draft";

type Attempt = { key: string; what: string; orderId: string | null };

function read(name: string): unknown {
  try {
    return JSON.parse(sessionStorage.getItem(name) ?? "null");
  } catch {
    return null;
  }
}

// Where the browser keeps no storage, the page's own memory has to do.
const memory = new Map<string, unknown>();
const load = (name: string): unknown => read(name) ?? memory.get(name) ?? null;
function store(name: string, value: unknown): void {
  try {
    sessionStorage.setItem(name, JSON.stringify(value));
  } catch {
    memory.set(name, value);
  }
}
function drop(name: string): void {
  memory.delete(name);
  try {
    sessionStorage.removeItem(name);
  } catch {
    // Nothing was stored either.
  }
}

/** A random UUID (RFC 9562, version 4), also on a page without TLS, where browsers leave randomUUID out. */
function newKey(): string {
  if (typeof crypto.randomUUID === "function") return crypto.randomUUID();
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x40;
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80;
  const hex = Array.from(bytes, (byte) => byte.toString(16).padStart(2, "0")).join("");
  return hex.replace(/^(.{8})(.{4})(.{4})(.{4})(.{12})$/, "$1-$2-$3-$4-$5");
}

function keptAttempt(): Attempt | null {
  const kept = load(attemptKey) as Partial<Attempt> | null;
  if (typeof kept?.key !== "string" || typeof kept.what !== "string") return null;
  return { key: kept.key, what: kept.what, orderId: typeof kept.orderId === "string" ? kept.orderId : null };
}

/** The key of an order of exactly this: the same for the same content, a new one for another. */
export function checkoutKeyFor(what: string): string {
  const kept = keptAttempt();
  if (kept?.what === what) return kept.key;
  const key = newKey();
  store(attemptKey, { key, what, orderId: null });
  return key;
}

/** Notes which order came of the attempt. */
export function keepOrderOfCheckout(orderId: string): void {
  const kept = keptAttempt();
  if (kept) store(attemptKey, { ...kept, orderId });
}

/** The order that was made here last and whose end is not known yet. */
export const keptOrderId = (): string | null => keptAttempt()?.orderId ?? null;

/** The attempt came to its end: the next order of the same parts is another order. */
export const forgetAttempt = (): void => drop(attemptKey);

/** Forgets the attempt and what was typed for it. */
export function forgetCheckout(): void {
  forgetAttempt();
  drop(draftKey);
}

/** What this account has typed; what another one left in this tab is thrown away. */
export function readDraft(userId: string): unknown {
  const kept = load(draftKey) as { userId?: unknown; values?: unknown } | null;
  if (!kept) return null;
  if (kept.userId === userId) return kept.values ?? null;
  forgetCheckout();
  return null;
}

export const keepDraft = (userId: string, values: unknown): void => store(draftKey, { userId, values });
