import { expect, test } from "vitest";
import {
  barLength,
  fitScale,
  kept,
  lookedAt,
  MOST_ZOOM,
  nearest,
  placeAt,
  shifted,
  spanOf,
  spotAt,
  WHOLE,
  widened,
  zoomedAt,
} from "./viewport";

const size = { width: 640, height: 400 };
const pad = { top: 20, right: 30, bottom: 40, left: 10 };
const span = { minX: -100, maxX: 3000, minY: -1200, maxY: 900 };

test("a span holds every point, and there is none without points", () => {
  expect(
    spanOf([
      { x: 1, y: 5 },
      { x: -2, y: 7 },
    ]),
  ).toEqual({ minX: -2, maxX: 1, minY: 5, maxY: 7 });
  expect(spanOf([])).toBeNull();
  expect(widened({ minX: 0, maxX: 1, minY: 0, maxY: 1 }, 2)).toEqual({
    minX: -2,
    maxX: 3,
    minY: -2,
    maxY: 3,
  });
});

test("the fit shows the whole span within the padding, at one scale both ways", () => {
  const fit = fitScale(span, size, pad);
  const a = spotAt(fit, { x: span.minX, y: span.maxY });
  const b = spotAt(fit, { x: span.maxX, y: span.minY });
  expect(a.x).toBeGreaterThanOrEqual(pad.left - 1e-9);
  expect(a.y).toBeGreaterThanOrEqual(pad.top - 1e-9);
  expect(b.x).toBeLessThanOrEqual(size.width - pad.right + 1e-9);
  expect(b.y).toBeLessThanOrEqual(size.height - pad.bottom + 1e-9);
  expect((b.x - a.x) / (span.maxX - span.minX)).toBeCloseTo((b.y - a.y) / (span.maxY - span.minY), 9);
});

test("the nose is to the right and the left side is up", () => {
  const fit = fitScale(span, size, pad);
  expect(spotAt(fit, { x: 1000, y: 0 }).x).toBeGreaterThan(spotAt(fit, { x: 0, y: 0 }).x);
  expect(spotAt(fit, { x: 0, y: 500 }).y).toBeLessThan(spotAt(fit, { x: 0, y: 0 }).y);
});

test("a spot and its place are each other's inverse, zoomed too", () => {
  const scale = lookedAt(fitScale(span, size, pad), { zoom: 3, panX: 40, panY: -25 }, size);
  const back = placeAt(scale, spotAt(scale, { x: 1234.5, y: -321 }));
  expect(back.x).toBeCloseTo(1234.5, 8);
  expect(back.y).toBeCloseTo(-321, 8);
});

test("zooming leaves in its place what is under the finger", () => {
  const fit = fitScale(span, size, pad);
  const finger = { x: 400, y: 150 };
  const under = placeAt(fit, finger);
  const look = zoomedAt(WHOLE, finger, 2.5, size);
  const after = spotAt(lookedAt(fit, look, size), under);
  expect(after.x).toBeCloseTo(finger.x, 8);
  expect(after.y).toBeCloseTo(finger.y, 8);
});

test("zoom stays between the whole and the most, and the whole is never shifted", () => {
  expect(zoomedAt(WHOLE, { x: 0, y: 0 }, 1000, size).zoom).toBe(MOST_ZOOM);
  expect(zoomedAt({ zoom: 2, panX: 90, panY: 10 }, { x: 0, y: 0 }, 0.1, size)).toEqual(WHOLE);
  expect(shifted(WHOLE, 50, 50, size)).toEqual(WHOLE);
  expect(kept({ zoom: 2, panX: 9999, panY: -9999 }, size)).toEqual({ zoom: 2, panX: 320, panY: -200 });
});

test("a tap takes the nearest within reach", () => {
  const things = [
    { key: "a", spot: { x: 10, y: 10 } },
    { key: "b", spot: { x: 30, y: 10 } },
  ];
  expect(nearest(things, { x: 24, y: 10 }, 24)?.key).toBe("b");
  expect(nearest(things, { x: 200, y: 10 }, 24)).toBeNull();
});

test("the scale bar is the longest that fits, or the shortest there is", () => {
  expect(barLength([10, 50, 100], 2, 120)).toBe(50);
  expect(barLength([10, 50, 100], 90, 120)).toBe(10);
});
