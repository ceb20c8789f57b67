import { useEffect, useState } from "react";

/** The shop's clock on this screen: the server's time when the page was made, carried on by the screen's own clock. */
export function useNow(servedAt: string, everyMs = 1000): number {
  const [now, setNow] = useState(() => Date.parse(servedAt));
  useEffect(() => {
    const ahead = Date.parse(servedAt) - Date.now();
    const tick = () => setNow(Date.now() + ahead);
    tick();
    const timer = setInterval(tick, everyMs);
    return () => clearInterval(timer);
  }, [servedAt, everyMs]);
  return now;
}
