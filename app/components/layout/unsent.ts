/*
 * Readings kept on this tablet until the shop has confirmed them. Pure: the list in, the list out; where it is stored
 * is the caller's business.
 */

/** One reading on its way. */
export type Unsent = {
  /** Goes with every try, so that a reading sent twice counts once. */
  clientKey: string;
  to: string;
  fields: Record<string, string>;
  /** What it is, for the person: "Axle end, left". */
  what: string;
  /** Which cell it belongs to, so that the screen can show it as kept. */
  subject: string;
  /** Whose reading it is. Somebody else's is never sent under another name. */
  by: string;
  keptAt: string;
  /** Null: waits for the link. Otherwise why the shop did not take it, in words. */
  refused: string | null;
};

/** Where a layout's list is stored. */
export function unsentKey(layoutId: number): string {
  return `plumbay.layout.${layoutId}.unsent`;
}

const isText = (value: unknown): value is string => typeof value === "string";

function isUnsent(value: unknown): value is Unsent {
  if (typeof value !== "object" || value === null) return false;
  const it = value as Record<string, unknown>;
  return (
    [it.clientKey, it.to, it.what, it.subject, it.by, it.keptAt].every(isText) &&
    (it.refused === null || isText(it.refused)) &&
    typeof it.fields === "object" &&
    it.fields !== null &&
    Object.values(it.fields).every(isText)
  );
}

/** The list as it was stored. What cannot be read is left out: a torn entry must not block the good ones. */
export function parseUnsent(stored: string | null): Unsent[] {
  if (!stored) return [];
  try {
    const list: unknown = JSON.parse(stored);
    return Array.isArray(list) ? list.filter(isUnsent) : [];
  } catch {
    return [];
  }
}

/** Keeps a reading. A second keep with the same key takes the place of the first, where it stood. */
export function keepUnsent(list: readonly Unsent[], reading: Unsent): Unsent[] {
  return list.some((one) => one.clientKey === reading.clientKey)
    ? list.map((one) => (one.clientKey === reading.clientKey ? reading : one))
    : [...list, reading];
}

/** The list without a reading that was confirmed, or let go. */
export function dropUnsent(list: readonly Unsent[], clientKey: string): Unsent[] {
  return list.filter((one) => one.clientKey !== clientKey);
}

/** The list with a reading marked as not taken by the shop. It stays until a person has seen it. */
export function refuseUnsent(list: readonly Unsent[], clientKey: string, words: string): Unsent[] {
  return list.map((one) => (one.clientKey === clientKey ? { ...one, refused: words } : one));
}

/** What may be sent now, oldest first: waiting, and taken by the person who is signed in. */
export function sendable(list: readonly Unsent[], person: string): Unsent[] {
  return list.filter((one) => one.refused === null && one.by === person);
}

/** The newest reading of a cell that is still on its way. */
export function unsentOf(list: readonly Unsent[], subject: string): Unsent | null {
  return list.findLast((one) => one.subject === subject) ?? null;
}

/** How many wait, in words for the head of the page; null when nothing does. */
export function unsentWords(list: readonly Unsent[]): string | null {
  const waiting = list.filter((one) => one.refused === null).length;
  if (waiting === 0) return null;
  return waiting === 1 ? "1 reading kept here, not sent" : `${waiting} readings kept here, not sent`;
}
