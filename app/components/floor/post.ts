/** What an action of ours answers, as a screen reads it. */
export type Answered =
  | { ok: true; words: string; [more: string]: unknown }
  | {
      ok: false;
      kind: string;
      message: string;
      fields: Record<string, string>;
      detail: Record<string, unknown>;
    };

const refused = (kind: string, message: string): Answered => ({
  ok: false,
  kind,
  message,
  fields: {},
  detail: {},
});

const UNSENT = "Not sent: the shop did not answer. Nothing was changed here; try again.";

function read(status: number, body: unknown): Answered {
  const known = typeof body === "object" && body !== null ? (body as Record<string, unknown>) : {};
  if (known.ok === true) return { ...known, ok: true, words: String(known.words ?? "") };
  const message = typeof known.message === "string" ? known.message : null;
  if (status === 401) return refused("signed-out", "You are signed out. Sign in again: nothing was changed.");
  if (known.ok === false)
    return {
      ok: false,
      kind: String(known.kind ?? "conflict"),
      message: message ?? UNSENT,
      fields: (known.fields ?? {}) as Record<string, string>,
      detail: (known.detail ?? {}) as Record<string, unknown>,
    };
  return refused(status === 403 ? "forbidden" : "fault", message ?? UNSENT);
}

/**
 * Posts fields to one of our resource routes. Several may be under way at once, which one fetcher a route could not do.
 * @returns the action's answer; an answer in words also when nothing came back
 */
export async function post(path: string, fields: Record<string, string | number>): Promise<Answered> {
  const body = new URLSearchParams();
  for (const [name, value] of Object.entries(fields)) body.set(name, String(value));
  try {
    const response = await fetch(path, { method: "POST", body, headers: { Accept: "application/json" } });
    return read(response.status, await response.json().catch(() => null));
  } catch {
    return refused("unsent", UNSENT);
  }
}
