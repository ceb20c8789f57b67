import { useEffect, useState } from "react";

/**
 * Whether readings are typed on the pad on the screen: where a finger is the pointer it comes up by itself, elsewhere
 * when it is asked for.
 */
export function usePad(): { padUp: boolean; setPad: (up: boolean) => void } {
  const [padUp, setPad] = useState(false);
  useEffect(() => {
    const coarse = window.matchMedia("(pointer: coarse)");
    const follow = () => setPad(coarse.matches);
    follow();
    coarse.addEventListener("change", follow);
    return () => coarse.removeEventListener("change", follow);
  }, []);
  return { padUp, setPad };
}
