import { useEffect, useState } from "react";

const TICK_MS = 10_000;

/** The shop's clock: the server's time when the page was made, carried on here. An ISO string. */
export function useNow(servedAt: string): string {
  const [now, setNow] = useState(servedAt);
  useEffect(() => {
    const ahead = Date.parse(servedAt) - Date.now();
    const tick = () => setNow(new Date(Date.now() + ahead).toISOString());
    tick();
    const timer = setInterval(tick, TICK_MS);
    return () => clearInterval(timer);
  }, [servedAt]);
  return now;
}
