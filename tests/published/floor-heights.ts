import type { FloorHeight } from "../../app/domain/floor-survey/survey";
import { mm } from "../../app/domain/units/length";

/** The heights of one line of a concrete pad, in mm, every 300 mm. */
export const PAD = [
  418.617, 419.938, 421.894, 423.748, 425.221, 424.739, 423.799, 424.307, 425.425, 424.688, 423.164, 422.758,
  420.472, 416.738,
].map((height) => mm(height));

/** Girth, height and volume of 31 felled trees: a plane of two slopes with published errors. */
export const TREES = [
  [8.3, 70, 10.3],
  [8.6, 65, 10.3],
  [8.8, 63, 10.2],
  [10.5, 72, 16.4],
  [10.7, 81, 18.8],
  [10.8, 83, 19.7],
  [11, 66, 15.6],
  [11, 75, 18.2],
  [11.1, 80, 22.6],
  [11.2, 75, 19.9],
  [11.3, 79, 24.2],
  [11.4, 76, 21],
  [11.4, 76, 21.4],
  [11.7, 69, 21.3],
  [12, 75, 19.1],
  [12.9, 74, 22.2],
  [12.9, 85, 33.8],
  [13.3, 86, 27.4],
  [13.7, 71, 25.7],
  [13.8, 64, 24.9],
  [14, 78, 34.5],
  [14.2, 80, 31.7],
  [14.5, 74, 36.3],
  [16, 72, 38.3],
  [16.3, 77, 42.6],
  [17.3, 81, 55.4],
  [17.5, 82, 55.7],
  [17.9, 80, 58.3],
  [18, 80, 51.5],
  [18, 80, 51],
  [20.6, 87, 77],
] as const;
/** A made-up floor with a slope and bumps. */
export const BUMPY: FloorHeight[] = Array.from({ length: 35 }, (_, i) => {
  const [x, y] = [(i % 7) * 600, Math.floor(i / 7) * 600 - 1200];
  return { x: mm(x), y: mm(y), height: mm(0.004 * x - 0.0025 * y + 2 * Math.sin(i * 1.7)) };
});
