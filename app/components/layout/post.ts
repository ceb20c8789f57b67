/** What an action answered: done, or refused in words beside the fields. */
export type PostAnswer = { ok: true; [more: string]: unknown } | Refused;
export type Refused = {
  ok: false;
  kind: string;
  message: string;
  fields: Record<string, string>;
  detail: Record<string, unknown>;
};

/** How a post went. `no-link`: nothing is known of it, it may be sent again. `shut-out`: somebody has to sign in first. */
export type Posted =
  | { state: "answered"; answer: PostAnswer }
  | { state: "no-link" }
  | { state: "shut-out"; words: string };

const PATIENCE_MS = 12_000;

function asAnswer(body: unknown): PostAnswer | null {
  if (typeof body !== "object" || body === null || !("ok" in body)) return null;
  if (body.ok === true) return { ...body, ok: true };
  if (body.ok !== false || !("message" in body) || typeof body.message !== "string") return null;
  const { fields, detail, kind } = body as { fields?: unknown; detail?: unknown; kind?: unknown };
  return {
    ok: false,
    kind: typeof kind === "string" ? kind : "invalid",
    message: body.message,
    fields: (fields ?? {}) as Record<string, string>,
    detail: (detail ?? {}) as Record<string, unknown>,
  };
}

/**
 * Posts a reading. Not by a route fetcher: without a link that would throw to the error page and take the typed numbers
 * with it; here it only means "not yet".
 */
export async function post(to: string, fields: Record<string, string>): Promise<Posted> {
  const body = new FormData();
  for (const [name, value] of Object.entries(fields)) body.set(name, value);
  try {
    const response = await fetch(to, {
      method: "POST",
      body,
      headers: { accept: "application/json" },
      redirect: "manual",
      signal: AbortSignal.timeout(PATIENCE_MS),
    });
    if (response.status === 401 || response.type === "opaqueredirect")
      return { state: "shut-out", words: "Signed out meanwhile. Sign in again; what you typed stays here." };
    if (response.status === 403) return { state: "shut-out", words: "This is not for your role." };
    const answer = asAnswer(await response.json());
    return answer ? { state: "answered", answer } : { state: "no-link" };
  } catch {
    return { state: "no-link" };
  }
}
