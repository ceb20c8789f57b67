import { useCallback, useEffect, useState } from "react";

/** Texts by field name, as a person typed them. */
export type Draft = Record<string, string>;

function parseDraft(stored: string | null): Draft | null {
  if (!stored) return null;
  try {
    const value: unknown = JSON.parse(stored);
    if (typeof value !== "object" || value === null || Array.isArray(value)) return null;
    return Object.values(value).every((text) => typeof text === "string") ? (value as Draft) : null;
  } catch {
    return null;
  }
}

/**
 * What is typed in a step but not yet sent, kept on this tablet so that a reload or a flat battery costs nothing.
 * @param name where it is stored
 * @param first what stands there when nothing was typed
 */
export function useDraft(name: string, first: Draft) {
  const [draft, setDraft] = useState(first);
  useEffect(() => {
    const stored = parseDraft(localStorage.getItem(name));
    if (stored) setDraft((now) => ({ ...now, ...stored }));
  }, [name]);
  const change = useCallback(
    (changes: Draft) =>
      setDraft((now) => {
        const next = { ...now, ...changes };
        localStorage.setItem(name, JSON.stringify(next));
        return next;
      }),
    [name],
  );
  const reset = useCallback(
    (to: Draft) => {
      localStorage.removeItem(name);
      setDraft(to);
    },
    [name],
  );
  return { draft, change, reset };
}
