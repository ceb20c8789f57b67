/** A class of slabs by the overall flatness and levelness that are specified. */
export type FloorClass = { name: string; flatness: number; levelness: number };

/** Source: ACI 117-10, table 4.8.5.1 (readings as ASTM E1155), the strictest last. */
export const FLOOR_CLASSES: readonly FloorClass[] = [
  { name: "conventional", flatness: 20, levelness: 15 },
  { name: "moderately flat", flatness: 25, levelness: 20 },
  { name: "flat", flatness: 35, levelness: 25 },
  { name: "very flat", flatness: 45, levelness: 35 },
  { name: "super flat", flatness: 60, levelness: 40 },
];

/** A minimum local value is three fifths of the overall one. Source: ACI 117-10, 4.8.5.3. */
export const LOCAL_SHARE = 3 / 5;

/**
 * The least that any one section of a floor of a class may have.
 * @example localMinimum({ name: "flat", flatness: 35, levelness: 25 }) // { flatness: 21, levelness: 15 }
 */
export const localMinimum = ({ flatness, levelness }: FloorClass): Omit<FloorClass, "name"> => ({
  flatness: flatness * LOCAL_SHARE,
  levelness: levelness * LOCAL_SHARE,
});

/**
 * The strictest class whose both numbers a floor reaches; by flatness alone where levelness could not be measured.
 * @returns null when it reaches none
 * @example floorClass(36, 24)?.name // "moderately flat"
 */
export const floorClass = (flatness: number, levelness: number | null): FloorClass | null =>
  FLOOR_CLASSES.filter(
    (one) => flatness >= one.flatness && (levelness === null || levelness >= one.levelness),
  ).at(-1) ?? null;
