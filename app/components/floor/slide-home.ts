import { flushSync } from "react-dom";

const HOME_MS = 240;

/** The thing as it is drawn now; the plan and the list of a narrow screen both draw it, only one is shown. */
function drawn(key: string): HTMLElement | null {
  const all = document.querySelectorAll<HTMLElement>(`[data-thing="${key}"]`);
  return [...all].find((element) => element.getClientRects().length > 0) ?? null;
}

export function focusThing(key: string): void {
  drawn(key)?.focus();
}

const wantsStill = () => window.matchMedia("(prefers-reduced-motion: reduce)").matches;

/**
 * Lets a thing slide from where it is drawn to where it belongs, and gives it the focus back.
 * @param key the thing's `data-thing`
 * @param putBack the state change that draws it at home again
 */
export function slideHome(key: string, putBack: () => void): void {
  const from = drawn(key)?.getBoundingClientRect();
  flushSync(putBack);
  const home = drawn(key);
  if (!home) return;
  const to = home.getBoundingClientRect();
  if (from && !wantsStill()) {
    const by = `translate(${from.left - to.left}px, ${from.top - to.top}px)`;
    home.animate([{ transform: by }, { transform: "none" }], { duration: HOME_MS, easing: "ease-out" });
  }
  home.focus();
}
