import { useCallback, useEffect, useRef, useState } from "react";

/** What a row that scrolls sideways hides: more ahead of what is shown, nothing but what is behind, or nothing at all. */
export type Beyond = "ahead" | "behind" | null;

/**
 * A row with more in it than fits, for those who would not think of scrolling.
 * @param count how many things are in the row; when it changes the row is measured again
 */
export function useRoomBeyond(count: number) {
  const row = useRef<HTMLDivElement>(null);
  const [beyond, setBeyond] = useState<Beyond>(null);
  // biome-ignore lint/correctness/useExhaustiveDependencies: a row with more or fewer in it has to be measured again
  useEffect(() => {
    const element = row.current;
    if (!element) return;
    const look = () => {
      const { scrollLeft, scrollWidth, clientWidth } = element;
      if (scrollWidth <= clientWidth + 4) setBeyond(null);
      else setBeyond(scrollLeft + clientWidth < scrollWidth - 4 ? "ahead" : "behind");
    };
    look();
    const sizes = new ResizeObserver(look);
    sizes.observe(element);
    element.addEventListener("scroll", look, { passive: true });
    return () => {
      sizes.disconnect();
      element.removeEventListener("scroll", look);
    };
  }, [count]);
  const goOn = useCallback(() => {
    const element = row.current;
    if (!element) return;
    const { scrollLeft, clientWidth, scrollWidth } = element;
    const atEnd = scrollLeft + clientWidth >= scrollWidth - 4;
    element.scrollTo({ left: atEnd ? 0 : scrollLeft + clientWidth * 0.8 });
  }, []);
  return { row, beyond, goOn };
}
