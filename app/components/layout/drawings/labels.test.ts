import { expect, test } from "vitest";
import { type Label, overlap, placeLabels, textWidth } from "./labels";

const frame = { x: 0, y: 0, width: 400, height: 300 };
const label = (key: string, x: number, y: number, lean = { x: 1, y: 0 }): Label => ({
  key,
  text: "82 3/8",
  spot: { x, y },
  size: 15,
  lean,
});

test("a text stands outward of its spot where that is free", () => {
  const [right] = placeLabels([label("a", 100, 100)], [], frame);
  expect(right).toMatchObject({ anchor: "start" });
  expect(right!.at.x).toBeGreaterThan(100);
  const [left] = placeLabels([label("a", 100, 100, { x: -1, y: 0 })], [], frame);
  expect(left).toMatchObject({ anchor: "end" });
});

test("two texts at nearly one spot do not cover each other", () => {
  const [a, b] = placeLabels([label("a", 100, 100), label("b", 104, 102)], [], frame);
  expect(overlap(a!.box, b!.box)).toBe(0);
});

test("a text goes round what is taken and stays within the drawing", () => {
  const taken = { x: 105, y: 80, width: 100, height: 40 };
  const [beside] = placeLabels([label("a", 100, 100)], [taken], frame);
  expect(overlap(beside!.box, taken)).toBe(0);
  const [edge] = placeLabels([label("a", 396, 100)], [], frame);
  expect(edge!.box.x + edge!.box.width).toBeLessThanOrEqual(400);
});

test("the width grows with the text", () => {
  expect(textWidth("46 1/2", 15)).toBeGreaterThan(textWidth("46", 15));
});
