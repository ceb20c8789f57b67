/*
 * From millimetres on the floor (x to the nose, y to the left side) to points of a drawing (x right, y down), at one
 * scale both ways. Zoom and pan are kept apart from the fit, so that a drawing that changes its size keeps its place.
 */

export type Size = { width: number; height: number };
/** A piece of the world in millimetres. */
export type Span = { minX: number; maxX: number; minY: number; maxY: number };
/** px = ox + k·x, py = oy − k·y; k in points a millimetre. */
export type Scale = { k: number; ox: number; oy: number };
/** zoom 1 shows everything; pan in points of the drawing. */
export type Look = { zoom: number; panX: number; panY: number };
export type Padding = { top: number; right: number; bottom: number; left: number };
export type Spot = { x: number; y: number };

export const WHOLE: Look = { zoom: 1, panX: 0, panY: 0 };
export const MOST_ZOOM = 24;

/** The smallest span that holds all points; null when there is none. */
export function spanOf(points: readonly Spot[]): Span | null {
  if (points.length === 0) return null;
  const xs = points.map(({ x }) => x);
  const ys = points.map(({ y }) => y);
  return { minX: Math.min(...xs), maxX: Math.max(...xs), minY: Math.min(...ys), maxY: Math.max(...ys) };
}

/** A span made wider by so many millimetres at every side. */
export function widened(span: Span, by: number): Span {
  return { minX: span.minX - by, maxX: span.maxX + by, minY: span.minY - by, maxY: span.maxY + by };
}

/** The scale that shows a whole span, centred in what the padding leaves of a drawing. */
export function fitScale(span: Span, size: Size, pad: Padding): Scale {
  const room = {
    width: Math.max(1, size.width - pad.left - pad.right),
    height: Math.max(1, size.height - pad.top - pad.bottom),
  };
  const wide = Math.max(1, span.maxX - span.minX);
  const high = Math.max(1, span.maxY - span.minY);
  const k = Math.min(room.width / wide, room.height / high);
  return {
    k,
    ox: pad.left + (room.width - k * wide) / 2 - k * span.minX,
    oy: pad.top + (room.height - k * high) / 2 + k * span.maxY,
  };
}

/** The fitted scale as it is looked at: zoomed about the middle of the drawing, then shifted. */
export function lookedAt(fit: Scale, look: Look, size: Size): Scale {
  const cx = size.width / 2;
  const cy = size.height / 2;
  return {
    k: fit.k * look.zoom,
    ox: cx + (fit.ox - cx) * look.zoom + look.panX,
    oy: cy + (fit.oy - cy) * look.zoom + look.panY,
  };
}

/** Keeps the middle of what was drawn within the drawing; at zoom 1 there is nothing to shift. */
export function kept(look: Look, size: Size): Look {
  if (look.zoom <= 1) return WHOLE;
  const mostX = (size.width * (look.zoom - 1)) / 2;
  const mostY = (size.height * (look.zoom - 1)) / 2;
  return {
    zoom: look.zoom,
    panX: Math.min(mostX, Math.max(-mostX, look.panX)),
    panY: Math.min(mostY, Math.max(-mostY, look.panY)),
  };
}

/** Zooms by a factor so that what is under a spot of the drawing stays there. */
export function zoomedAt(look: Look, at: Spot, factor: number, size: Size): Look {
  const zoom = Math.min(MOST_ZOOM, Math.max(1, look.zoom * factor));
  const real = zoom / look.zoom;
  const dx = at.x - size.width / 2;
  const dy = at.y - size.height / 2;
  return kept({ zoom, panX: dx - (dx - look.panX) * real, panY: dy - (dy - look.panY) * real }, size);
}

export const shifted = (look: Look, dx: number, dy: number, size: Size): Look =>
  kept({ ...look, panX: look.panX + dx, panY: look.panY + dy }, size);

/** A place of the world as a spot of the drawing. */
export const spotAt = (scale: Scale, point: Spot): Spot => ({
  x: scale.ox + scale.k * point.x,
  y: scale.oy - scale.k * point.y,
});

/** A spot of the drawing as a place of the world: the inverse of `spotAt`. */
export const placeAt = (scale: Scale, spot: Spot): Spot => ({
  x: (spot.x - scale.ox) / scale.k,
  y: (scale.oy - spot.y) / scale.k,
});

/** The nearest of several spots that lies within reach; null when none does. */
export function nearest<T extends { spot: Spot }>(things: readonly T[], at: Spot, reach: number): T | null {
  let found: T | null = null;
  let best = reach;
  for (const thing of things) {
    const far = Math.hypot(thing.spot.x - at.x, thing.spot.y - at.y);
    if (far <= best) {
      best = far;
      found = thing;
    }
  }
  return found;
}

/** A round length for a scale bar, the longest of the given ones that is at most so many points long. */
export function barLength(lengths: readonly number[], k: number, most: number): number {
  const fitting = lengths.filter((length) => length * k <= most);
  return fitting.length > 0 ? Math.max(...fitting) : Math.min(...lengths);
}
