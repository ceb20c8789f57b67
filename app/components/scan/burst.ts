/** A scanner types a sign every few milliseconds; no person does. */
const BETWEEN_KEYS_MS = 60;
const LEAST_SIGNS = 4;

export type Burst = { signs: string; last: number };
export const NO_BURST: Burst = { signs: "", last: 0 };

/**
 * Follows the keys pressed on a page and finds the run that a scanner typed: fast, and ended by Enter.
 * @param key as in KeyboardEvent.key
 * @param at milliseconds on any steady clock
 * @returns the burst so far, and the whole text once it has ended
 */
export function takeKey(burst: Burst, key: string, at: number): { burst: Burst; text: string | null } {
  const fast = burst.signs !== "" && at - burst.last <= BETWEEN_KEYS_MS;
  if (key === "Enter")
    return { burst: NO_BURST, text: fast && burst.signs.length >= LEAST_SIGNS ? burst.signs : null };
  if (key === "Shift") return { burst: { ...burst, last: burst.signs ? at : 0 }, text: null };
  if (key.length !== 1) return { burst: NO_BURST, text: null };
  return { burst: { signs: fast ? burst.signs + key : key, last: at }, text: null };
}
