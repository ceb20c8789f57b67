import { useEffect, useRef } from "react";
import { NO_BURST, takeKey } from "./burst";

const isTyping = (target: EventTarget | null) =>
  target instanceof HTMLElement &&
  (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName));

/**
 * Listens on the whole page for a scanner that types, wherever the focus is. What goes into a field is left to that
 * field.
 */
export function useBurst(onText: (text: string) => void): void {
  const latest = useRef(onText);
  latest.current = onText;
  useEffect(() => {
    let burst = NO_BURST;
    const listen = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.altKey || event.metaKey || isTyping(event.target)) return;
      const next = takeKey(burst, event.key, event.timeStamp);
      burst = next.burst;
      if (next.text === null) return;
      // The Enter that ends a burst must not press the button that happens to have the focus.
      event.preventDefault();
      event.stopPropagation();
      latest.current(next.text);
    };
    window.addEventListener("keydown", listen, true);
    return () => window.removeEventListener("keydown", listen, true);
  }, []);
}
