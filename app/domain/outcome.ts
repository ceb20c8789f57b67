/** What a sum came to, or why it cannot be done, in a sentence that the person at the vehicle understands. */
export type Outcome<T> = { ok: true; value: T } | { ok: false; problem: string };

export const ok = <T>(value: T): Outcome<T> => ({ ok: true, value });
export const problem = (words: string): { ok: false; problem: string } => ({ ok: false, problem: words });
