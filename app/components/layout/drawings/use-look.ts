import { type KeyboardEvent, type PointerEvent, useEffect, useRef, useState } from "react";
import { kept, type Look, type Size, shifted, WHOLE, zoomedAt } from "./viewport";

const STEP = 1.3;
const NUDGE = 40;
const ZOOM_KEYS: Record<string, number> = { "+": STEP, "=": STEP, "-": 1 / STEP };
const PAN_KEYS: Record<string, readonly [number, number]> = {
  ArrowLeft: [1, 0],
  ArrowRight: [-1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};
/** A press that moves less than this picks; more shifts the drawing. */
const SLACK = 6;

/**
 * Size, zoom and pan of a drawing: wheel and pinch zoom where the pointer is, a drag shifts, keys + − 0 and arrows do
 * both. `onPress` is told where a press without a drag landed.
 */
export function useLook(onPress: (x: number, y: number) => void) {
  const box = useRef<HTMLDivElement>(null);
  const [size, setSize] = useState<Size>({ width: 640, height: 400 });
  const [look, setLook] = useState<Look>(WHOLE);
  const pointers = useRef(new Map<number, { x: number; y: number }>());
  const travelled = useRef(0);

  useEffect(() => {
    const element = box.current;
    if (!element) return;
    const watch = new ResizeObserver(([entry]) => {
      if (!entry) return;
      const { width, height } = entry.contentRect;
      if (width > 0 && height > 0) setSize({ width, height });
    });
    watch.observe(element);
    return () => watch.disconnect();
  }, []);
  useEffect(() => setLook((now) => kept(now, size)), [size]);
  useEffect(() => {
    const element = box.current;
    if (!element) return;
    // Not passive: the page must not scroll away under the drawing.
    const onWheel = (event: WheelEvent) => {
      event.preventDefault();
      const frame = element.getBoundingClientRect();
      setLook((now) =>
        zoomedAt(
          now,
          { x: event.clientX - frame.left, y: event.clientY - frame.top },
          event.deltaY < 0 ? STEP : 1 / STEP,
          size,
        ),
      );
    };
    element.addEventListener("wheel", onWheel, { passive: false });
    return () => element.removeEventListener("wheel", onWheel);
  }, [size]);

  const spot = (event: PointerEvent<HTMLElement>) => {
    const frame = event.currentTarget.getBoundingClientRect();
    return { x: event.clientX - frame.left, y: event.clientY - frame.top };
  };
  const handlers = {
    onPointerDown(event: PointerEvent<HTMLElement>) {
      if (pointers.current.size === 0) travelled.current = 0;
      pointers.current.set(event.pointerId, spot(event));
    },
    onPointerMove(event: PointerEvent<HTMLElement>) {
      const before = pointers.current.get(event.pointerId);
      if (!before) return;
      const now = spot(event);
      const others = [...pointers.current].filter(([id]) => id !== event.pointerId).map(([, at]) => at);
      pointers.current.set(event.pointerId, now);
      travelled.current += Math.hypot(now.x - before.x, now.y - before.y);
      if (travelled.current < SLACK) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      const [other] = others;
      if (!other) return setLook((look) => shifted(look, now.x - before.x, now.y - before.y, size));
      const grown =
        Math.hypot(now.x - other.x, now.y - other.y) /
        Math.max(1, Math.hypot(before.x - other.x, before.y - other.y));
      setLook((look) => zoomedAt(look, { x: (now.x + other.x) / 2, y: (now.y + other.y) / 2 }, grown, size));
    },
    onPointerUp(event: PointerEvent<HTMLElement>) {
      const alone = pointers.current.size === 1;
      pointers.current.delete(event.pointerId);
      if (alone && travelled.current < SLACK) {
        const at = spot(event);
        onPress(at.x, at.y);
      }
    },
    onPointerCancel(event: PointerEvent<HTMLElement>) {
      pointers.current.delete(event.pointerId);
    },
    onKeyDown(event: KeyboardEvent<HTMLElement>) {
      const centre = { x: size.width / 2, y: size.height / 2 };
      const factor = ZOOM_KEYS[event.key];
      const way = PAN_KEYS[event.key];
      if (factor === undefined && (!way || look.zoom === 1) && event.key !== "0") return;
      event.preventDefault();
      if (factor !== undefined) setLook(zoomedAt(look, centre, factor, size));
      else if (way) setLook(shifted(look, way[0] * NUDGE, way[1] * NUDGE, size));
      else setLook(WHOLE);
    },
  };
  const zoomBy = (factor: number) =>
    setLook((now) => zoomedAt(now, { x: size.width / 2, y: size.height / 2 }, factor, size));
  return {
    box,
    size,
    look,
    handlers,
    zoomIn: () => zoomBy(STEP),
    zoomOut: () => zoomBy(1 / STEP),
    whole: () => setLook(WHOLE),
  };
}
