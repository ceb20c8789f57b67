/*
 * Data sets with certified values for linear least squares: NIST Statistical Reference Datasets, public domain.
 * Each row: the observed value, then what it depends on.
 */

/** Ozone monitors, easy. */
export const NORRIS: readonly (readonly [y: number, x: number])[] = [
  [0.1, 0.2],
  [338.8, 337.4],
  [118.1, 118.2],
  [888, 884.6],
  [9.2, 10.1],
  [228.1, 226.5],
  [668.5, 666.3],
  [998.5, 996.3],
  [449.1, 448.6],
  [778.9, 777],
  [559.2, 558.2],
  [0.3, 0.4],
  [0.1, 0.6],
  [778.1, 775.5],
  [668.8, 666.9],
  [339.3, 338],
  [448.9, 447.5],
  [10.8, 11.6],
  [557.7, 556],
  [228.3, 228.1],
  [998, 995.8],
  [888.8, 887.6],
  [119.6, 120.2],
  [0.3, 0.3],
  [0.6, 0.3],
  [557.6, 556.8],
  [339.3, 339.1],
  [888, 887.2],
  [998.5, 999],
  [778.9, 779],
  [10.2, 11.1],
  [117.6, 118.3],
  [228.9, 229.2],
  [668.4, 669.1],
  [449.2, 448.9],
  [0.2, 0.5],
];

/** Deflection of a load cell: twenty loads from 150 000 by 150 000, twice. */
const DEFLECTIONS = [
  0.11019, 0.21956, 0.32949, 0.43899, 0.54803, 0.65694, 0.76562, 0.87487, 0.98292, 1.09146, 1.20001, 1.30822,
  1.41599, 1.52399, 1.63194, 1.73947, 1.84646, 1.95392, 2.06128, 2.16844, 0.11052, 0.22018, 0.32939, 0.43886,
  0.54798, 0.65739, 0.76596, 0.87474, 0.983, 1.0915, 1.20004, 1.30818, 1.41613, 1.52408, 1.63159, 1.73965,
  1.84696, 1.95445, 2.06177, 2.16829,
];
export const PONTIUS = DEFLECTIONS.map((y, i) => [y, 150_000 * ((i % 20) + 1)] as const);

/** Employment on six figures that rise together: ill-conditioned. */
export const LONGLEY: readonly (readonly number[])[] = [
  [60323, 83, 234289, 2356, 1590, 107608, 1947],
  [61122, 88.5, 259426, 2325, 1456, 108632, 1948],
  [60171, 88.2, 258054, 3682, 1616, 109773, 1949],
  [61187, 89.5, 284599, 3351, 1650, 110929, 1950],
  [63221, 96.2, 328975, 2099, 3099, 112075, 1951],
  [63639, 98.1, 346999, 1932, 3594, 113270, 1952],
  [64989, 99, 365385, 1870, 3547, 115094, 1953],
  [63761, 100, 363112, 3578, 3350, 116219, 1954],
  [66019, 101.2, 397469, 2904, 3048, 117388, 1955],
  [67857, 104.6, 419180, 2822, 2857, 118734, 1956],
  [68169, 108.4, 442769, 2936, 2798, 120445, 1957],
  [66513, 110.8, 444546, 4681, 2637, 121950, 1958],
  [68655, 112.6, 482704, 3813, 2552, 123366, 1959],
  [69564, 114.2, 502601, 3931, 2514, 125368, 1960],
  [69331, 115.7, 518173, 4806, 2572, 127852, 1961],
  [70551, 116.9, 554894, 4007, 2827, 130081, 1962],
];

const TWENTY = Array.from({ length: 21 }, (_, x) => x);
const polynomial = (x: number, coefficients: readonly number[]) =>
  coefficients.reduceRight((sum, one) => sum * x + one, 0);

/** Exact polynomials of the fifth degree. */
export const WAMPLER_1 = TWENTY.map((x) => [polynomial(x, [1, 1, 1, 1, 1, 1]), x] as const);
export const WAMPLER_2 = TWENTY.map((x) => [polynomial(x, [1, 0.1, 0.01, 1e-3, 1e-4, 1e-5]), x] as const);
/** The first, disturbed by a pattern that no polynomial of the fifth degree takes up. */
const DISTURBED = [
  760, -2042, 2111, -1684, 3888, 1858, 11379, 17560, 39287, 64382, 113159, 175108, 273291, 400186, 581243,
  811568, 1121004, 1506550, 2002767, 2611612, 3369180,
];
export const WAMPLER_3 = TWENTY.map((x) => [DISTURBED[x] ?? 0, x] as const);
/** The same disturbance a hundred and ten thousand times as strong. */
const stronger = (times: number) =>
  WAMPLER_3.map(([y, x]) => {
    const exact = WAMPLER_1[x]?.[0] ?? 0;
    return [exact + times * (y - exact), x] as const;
  });
export const WAMPLER_4 = stronger(100);
export const WAMPLER_5 = stronger(10_000);
