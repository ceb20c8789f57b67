import { criticalResidual } from "../geometry/snooping";
import { type Degrees, degrees, formatDegrees } from "../units/angle";
import { GAUGE_RESOLUTION, type LevelReading } from "./level";

export type SlopePair = { noseHigh: Degrees; rightHigh: Degrees };

export type CombinedLevel = SlopePair & {
  /** Standard uncertainty of the combined slopes. */
  uncertainty: SlopePair;
  /** How much the heights count, 0 to 1, each way. */
  heightsShare: { noseHigh: number; rightHigh: number };
  /** Gauge minus heights. */
  difference: SlopePair;
  /** They differ by no more than chance. */
  agree: boolean;
  words: string;
};

/**
 * Standard uncertainty of a slope by gauge, read both ways round at two places: a reading is rounded to the resolution
 * (rectangular, resolution/√12), and half the difference of two, averaged over two places, halves that.
 * Source: JCGM 100:2008, 4.3.7 (from memory). The gauge's own linearity is not in it.
 * @example gaugeUncertainty(degrees(0.1)) // 0.0144
 */
export const gaugeUncertainty = (resolution: Degrees = GAUGE_RESOLUTION): Degrees =>
  degrees(resolution / Math.sqrt(12) / 2);

/**
 * Level from heights and gauge together: the mean weighted by 1/u² each way, and whether the two agree, their
 * difference within 3.29 times its standard uncertainty. Where they do not agree the mean means nothing, and the words
 * say so. Source: weighted mean, any text on adjustment.
 * @example
 * // Heights say nose high 0.10 ± 0.02, gauge 0.20 ± 0.02: combined 0.15 ± 0.0141, not agreeing would need 0.093 apart.
 */
export function combineLevels(
  heights: Pick<LevelReading, keyof SlopePair>,
  heightsUncertainty: SlopePair,
  gauge: Pick<LevelReading, keyof SlopePair>,
  gaugeUncertain: Degrees = gaugeUncertainty(),
): CombinedLevel {
  const way = (key: keyof SlopePair) => {
    const [u, v] = [heightsUncertainty[key], gaugeUncertain];
    if (!(u > 0) || !(v > 0)) throw new RangeError("A level without uncertainty cannot be weighed.");
    const share = v ** 2 / (u ** 2 + v ** 2);
    const difference = gauge[key] - heights[key];
    return {
      share,
      mean: degrees(share * heights[key] + (1 - share) * gauge[key]),
      uncertainty: degrees((u * v) / Math.hypot(u, v)),
      difference: degrees(difference),
      agree: Math.abs(difference) <= criticalResidual() * Math.hypot(u, v),
    };
  };
  const [nose, right] = [way("noseHigh"), way("rightHigh")];
  return {
    noseHigh: nose.mean,
    rightHigh: right.mean,
    uncertainty: { noseHigh: nose.uncertainty, rightHigh: right.uncertainty },
    heightsShare: { noseHigh: nose.share, rightHigh: right.share },
    difference: { noseHigh: nose.difference, rightHigh: right.difference },
    agree: nose.agree && right.agree,
    words: combinedWords(nose, right),
  };
}

type Way = { difference: Degrees; agree: boolean };

function combinedWords(nose: Way, right: Way): string {
  const off = [
    ...(nose.agree ? [] : [`${formatDegrees(degrees(Math.abs(nose.difference)))} nose to tail`]),
    ...(right.agree ? [] : [`${formatDegrees(degrees(Math.abs(right.difference)))} side to side`]),
  ];
  return off.length === 0
    ? "Gauge and heights agree."
    : `Gauge and heights differ by ${off.join(" and ")}, more than both can be out by chance: measure both again before using either.`;
}
